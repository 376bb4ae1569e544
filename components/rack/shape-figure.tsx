"use client";
import { useMemo } from "react";
import { useDisplay } from "@/components/display/display-provider";
import { FigureSvg } from "@/components/figure/figure-svg";
import { sectionOf } from "@/lib/drawing/section-of";
import type { Drawing } from "@/lib/drawing/schema";
import type { FigureShow } from "@/lib/figure/compose-figure";
import { sectionFigure } from "@/lib/figure/section-figure";
import type { Properties } from "@/lib/schemas/properties";
import { displayRule } from "@/lib/units/display-units";
import { fieldText } from "@/lib/units/format";
import { fromStored } from "@/lib/units/conversion";

type ShapeFigureProps = Readonly<{
  drawing: Drawing;
  properties: Properties | null;
  width: number;
  height: number;
  label: string;
  show?: FigureShow;
  className?: string;
}>;

/** The figure of a revision, drawn in the browser from its drawing and the properties the server stored. */
export default function ShapeFigure({
  drawing,
  properties,
  width,
  height,
  label,
  show,
  className,
}: ShapeFigureProps) {
  const { settings } = useDisplay();
  const list = useMemo(() => {
    const section = sectionOf(drawing);
    if (!section.ok) return null;
    const rule = displayRule("length", settings.system);
    return sectionFigure({
      drawing,
      section: section.value,
      properties,
      fit: { widthPx: width, heightPx: height },
      formatLength: (mm) =>
        fieldText(fromStored(mm, rule.unit), settings.system === "metric" ? 1 : 3, settings.decimal),
      ...(show && { show }),
    });
  }, [drawing, properties, width, height, show, settings]);
  if (!list) return <p className="p-4 text-note text-ink-3">This drawing cannot be shown here.</p>;
  return (
    <FigureSvg list={list} width={width} height={height} label={label} {...(className && { className })} />
  );
}
