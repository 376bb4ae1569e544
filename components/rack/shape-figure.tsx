"use client";
import { useMemo } from "react";
import { useDisplay } from "@/components/display/display-provider";
import { FigureSvg } from "@/components/figure/figure-svg";
import { sectionOf } from "@/lib/drawing/section-of";
import type { Drawing } from "@/lib/drawing/schema";
import type { FigureShow } from "@/lib/figure/compose-figure";
import type { DisplayList, FigureItem } from "@/lib/figure/display-list";
import { sectionFigure } from "@/lib/figure/section-figure";
import type { Properties } from "@/lib/schemas/properties";
import { fromStored } from "@/lib/units/conversion";
import { displayRule } from "@/lib/units/display-units";
import { fieldText } from "@/lib/units/format";

type Size = Readonly<{ width: number; height: number }>;

export type ShapeFigureProps = Readonly<{
  drawing: Drawing;
  properties: Properties | null;
  label: string;
  /** The sheet the figure is to fill, px; or a true scale, px per mm, when the figure takes the size it needs. */
  fit: Size | Readonly<{ pxPerMm: number }>;
  /** Another revision, laid under this one in double dots. */
  under?: Drawing | null;
  show?: FigureShow;
  className?: string;
}>;

/** The figure of a revision, drawn in the browser from its drawing and the properties the server stored. */
export default function ShapeFigure({
  drawing,
  properties,
  label,
  fit,
  under,
  show,
  className,
}: ShapeFigureProps) {
  const { settings } = useDisplay();
  const [width, height, scale] = "pxPerMm" in fit ? [null, null, fit.pxPerMm] : [fit.width, fit.height, null];
  const list = useMemo(() => {
    const section = sectionOf(drawing);
    if (!section.ok) return null;
    const rule = displayRule("length", settings.system);
    const decimals = settings.system === "metric" ? 1 : 3;
    const figure = sectionFigure({
      drawing,
      section: section.value,
      properties,
      fit: scale === null ? { widthPx: width, heightPx: height } : { pxPerMm: scale },
      formatLength: (mm) => fieldText(fromStored(mm, rule.unit), decimals, settings.decimal),
      ...(show && { show }),
    });
    return under ? { ...figure, items: [...ghostOf(under), ...figure.items] } : figure;
  }, [drawing, properties, width, height, scale, under, show, settings]);
  if (!list) return <p className="p-4 text-note text-ink-3">This drawing cannot be shown here.</p>;
  const size = scale === null ? { width, height } : sizeOf(list);
  return <FigureSvg list={list} {...size} label={label} {...(className && { className })} />;
}

const sizeOf = ({ bounds, pxPerMm, marginPx }: DisplayList): Size => ({
  width: Math.ceil((bounds.xMax - bounds.xMin) * pxPerMm + marginPx.left + marginPx.right),
  height: Math.ceil((bounds.yMax - bounds.yMin) * pxPerMm + marginPx.top + marginPx.bottom),
});

/** The outline of another revision as double-dot lines. */
function ghostOf(drawing: Drawing): FigureItem[] {
  const section = sectionOf(drawing);
  if (!section.ok) return [];
  return section.value.parts.flatMap((part) =>
    part.regions.flatMap((region) =>
      [region.outer, ...region.holes].map((ring): FigureItem => ({
        kind: "path",
        role: "ghost",
        ring,
        closed: true,
      })),
    ),
  );
}
