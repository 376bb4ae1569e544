import type { Drawing } from "@/lib/drawing/schema";
import type { SectionProperties } from "@/lib/section/properties";
import type { Section } from "@/lib/section/section";
import { composeFigure, ringsOf, SHOW_ALL, type FigureShow } from "@/lib/figure/compose-figure";
import type { DisplayList } from "@/lib/figure/display-list";
import type { FigurePart } from "@/lib/figure/figure-part";
import { boxOfRings } from "@/lib/figure/outline";
import { isTimber, levelsOf, standsSquare } from "@/lib/figure/part-facts";
import { fittingScale } from "@/lib/figure/view";
import { weldMarks } from "@/lib/figure/welds";

const plainNumber = (mm: number): string => String(Math.round(mm * 10) / 10).replace("-", "\u2212");

export type SectionFigureInput = Readonly<{
  drawing: Drawing;
  section: Section;
  properties: SectionProperties | null;
  /** Size of the sheet the figure is to fit, px; or a fixed scale. */
  fit: Readonly<{ widthPx: number; heightPx: number } | { pxPerMm: number }>;
  formatLength?: (mm: number) => string;
  show?: FigureShow;
}>;

/** The figure of a computed section, cut-outs taken away, as shown on sheets and in exports. */
export const sectionFigure = (input: SectionFigureInput): DisplayList => {
  const { drawing, section, properties } = input;
  const order = new Map(drawing.parts.map((p, i) => [p.id, i]));
  const parts = section.parts.flatMap((part): FigurePart[] => {
    const rings = ringsOf(part.regions);
    const box = boxOfRings(rings);
    const index = order.get(part.id);
    const drawn = index === undefined ? undefined : drawing.parts[index];
    if (!box || index === undefined || !drawn) return [];
    return [
      {
        id: part.id,
        item: String(index + 1),
        rings,
        box,
        cutout: false,
        plain: standsSquare(drawn),
        levels: levelsOf(drawn, box),
        timber: isTimber(part.material),
        inHand: false,
      },
    ];
  });
  const ringsById = new Map(parts.map((p) => [p.id, p.rings]));
  const compose = (pxPerMm: number) =>
    composeFigure({
      parts,
      touching: section.contacts.map((c) => c.parts),
      properties,
      welds: weldMarks(section.contacts, drawing.joints, (id) => ringsById.get(id) ?? []),
      pxPerMm,
      formatLength: input.formatLength ?? plainNumber,
      show: input.show ?? SHOW_ALL,
    });
  if ("pxPerMm" in input.fit) return compose(input.fit.pxPerMm);
  const { widthPx, heightPx } = input.fit;
  const rough = { left: 80, right: 80, top: 60, bottom: 60 };
  const first = compose(fittingScale(boundsOf(parts), widthPx, heightPx, rough));
  return compose(fittingScale(first.bounds, widthPx, heightPx, first.marginPx));
};

const boundsOf = (parts: readonly FigurePart[]) =>
  boxOfRings(parts.flatMap((p) => p.rings)) ?? { xMin: 0, xMax: 100, yMin: 0, yMax: 100 };
