import { shapeRegions } from "@/lib/drawing/part-regions";
import type { Drawing, DrawingPart } from "@/lib/drawing/schema";
import { ringBox, type Box } from "@/lib/geometry/arc";
import type { Point, Region } from "@/lib/geometry/region";
import { cosSinOfDegrees, placeRegion } from "@/lib/geometry/ring";

/** A point of the part's own axes in drawing axes. */
export const toPlaced = (part: DrawingPart, p: Point): Point => {
  const [c, s] = cosSinOfDegrees(part.angle);
  const x = part.mirror === true ? -p.x : p.x;
  return { x: part.at.x + c * x - s * p.y, y: part.at.y + s * x + c * p.y };
};

/** A point of the drawing in the part's own axes: the inverse of `toPlaced`. */
export const toOwn = (part: DrawingPart, p: Point): Point => {
  const [c, s] = cosSinOfDegrees(part.angle);
  const [dx, dy] = [p.x - part.at.x, p.y - part.at.y];
  const x = c * dx + s * dy;
  return { x: part.mirror === true ? -x : x, y: c * dy - s * dx };
};

const placed = new WeakMap<DrawingPart, readonly Region[]>();

/**
 * Where a part lies in drawing axes (mm), before overlaps and cut-outs are dealt with; none where its shape is faulty.
 * Remembered by the part's identity: edits make new objects of what they change.
 */
export const placedRegions = (part: DrawingPart): readonly Region[] => {
  const known = placed.get(part);
  if (known) return known;
  const shape = shapeRegions(part.shape);
  const regions = shape.ok ? shape.value.map((region) => placeRegion(region, part)) : [];
  placed.set(part, regions);
  return regions;
};

export const joinBoxes = (boxes: readonly Box[]): Box | null =>
  boxes.length === 0
    ? null
    : boxes.reduce((sum, b) => ({
        xMin: Math.min(sum.xMin, b.xMin),
        xMax: Math.max(sum.xMax, b.xMax),
        yMin: Math.min(sum.yMin, b.yMin),
        yMax: Math.max(sum.yMax, b.yMax),
      }));

/** Box of a placed part, mm; null where its shape is faulty. */
export const partBox = (part: DrawingPart): Box | null =>
  joinBoxes(placedRegions(part).flatMap((r) => ringBox(r.outer) ?? []));

/** Box of the parts with the given ids (all material without ids), mm; null where there is none. */
export const boxOfParts = (drawing: Drawing, ids?: readonly string[]): Box | null =>
  joinBoxes(
    drawing.parts
      .filter((p) => (ids ? ids.includes(p.id) : p.cutout !== true))
      .flatMap((p) => partBox(p) ?? []),
  );

export const middleOf = (box: Box) => ({ x: (box.xMin + box.xMax) / 2, y: (box.yMin + box.yMax) / 2 });
