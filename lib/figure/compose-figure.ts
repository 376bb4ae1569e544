import type { Ring } from "@/lib/geometry/region";
import type { Box, DisplayList, FigureItem, Hatch } from "@/lib/figure/display-list";
import { axisItems, type AxisProperties } from "@/lib/figure/axis-items";
import { placeBalloons } from "@/lib/figure/balloons";
import { planDimensions } from "@/lib/figure/dimension-plan";
import { dimensionLineBox, dimensionTextBox } from "@/lib/figure/dimension-strokes";
import type { FigurePart } from "@/lib/figure/figure-part";
import { hatchByPart } from "@/lib/figure/hatch";
import { joinBoxes } from "@/lib/figure/outline";
import { Room } from "@/lib/figure/place";

export type FigureShow = Readonly<{
  dimensions: boolean;
  axes: boolean;
  balloons: boolean;
  centroidDimension: boolean;
}>;

export const SHOW_ALL: FigureShow = { dimensions: true, axes: true, balloons: true, centroidDimension: true };

export type ComposeInput = Readonly<{
  parts: readonly FigurePart[];
  /** Pairs of parts that share an edge: they hatch differently. */
  touching: readonly (readonly [string, string])[];
  properties: AxisProperties | null;
  welds: readonly FigureItem[];
  pxPerMm: number;
  formatLength: (mm: number) => string;
  show: FigureShow;
}>;

const EMPTY: Box = { xMin: -100, xMax: 100, yMin: 0, yMax: 200 };

/** Parts, marks, axes and dimensions of a section as a display list, placed for one scale. */
export const composeFigure = (input: ComposeInput): DisplayList => {
  const { parts, pxPerMm, show, properties } = input;
  const solid = parts.filter((p) => !p.cutout);
  const bounds = joinBoxes((solid.length > 0 ? solid : parts).map((p) => p.box)) ?? EMPTY;
  const hatches = hatchByPart(
    solid.map((p) => p.id),
    input.touching,
  );
  const plan = show.dimensions
    ? planDimensions({
        parts,
        bounds,
        pxPerMm,
        formatLength: input.formatLength,
        axes: show.axes && properties ? properties.centroid : null,
        centroidDimension: show.centroidDimension,
      })
    : { items: [], marginPx: { left: 34, right: 34, top: 34, bottom: 34 } };
  const room = new Room();
  for (const p of parts)
    room.take({
      left: p.box.xMin * pxPerMm - 2,
      right: p.box.xMax * pxPerMm + 2,
      top: -p.box.yMax * pxPerMm - 2,
      bottom: -p.box.yMin * pxPerMm + 2,
    });
  for (const d of plan.items) {
    room.take(dimensionTextBox(d, pxPerMm));
    room.take(dimensionLineBox(d, pxPerMm));
  }
  if (properties) {
    const c = { x: properties.centroid.x * pxPerMm, y: -properties.centroid.y * pxPerMm };
    room.take({ left: c.x - 16, right: c.x + 28, top: c.y - 16, bottom: c.y + 28 });
  }
  const fill = (p: FigurePart): Hatch =>
    p.cutout ? "void" : p.timber ? "grain" : (hatches.get(p.id) ?? "rising");
  const material = (p: FigurePart): FigureItem => ({
    kind: "material",
    part: p.id,
    rings: p.rings,
    hatch: fill(p),
    inHand: p.inHand,
  });
  const ordered = [...solid, ...parts.filter((p) => p.cutout)];
  const items: FigureItem[] = [
    ...ordered.filter((p) => !p.inHand).map(material),
    ...ordered.filter((p) => p.inHand).map(material),
    ...input.welds,
    ...(show.axes && properties
      ? axisItems(properties, bounds, pxPerMm, Math.max(plan.marginPx.left, plan.marginPx.right) + 6)
      : []),
    ...plan.items,
    ...(show.balloons ? placeBalloons(parts, pxPerMm, room) : []),
  ];
  return { items, bounds, pxPerMm, marginPx: plan.marginPx };
};

/** Rings of a region list in one flat list, for even-odd filling. */
export const ringsOf = (regions: readonly Readonly<{ outer: Ring; holes: readonly Ring[] }>[]): Ring[] =>
  regions.flatMap((r) => [r.outer, ...r.holes]);
