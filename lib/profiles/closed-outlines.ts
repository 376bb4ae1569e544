import type { Region, Ring } from "@/lib/geometry/region";
import { reverseRing } from "@/lib/geometry/reverse-ring";
import type { FamilyDimensions } from "@/lib/profiles/families";
import { misfit } from "@/lib/profiles/fit";
import { roundedRing, type Corner } from "@/lib/profiles/rounded-ring";
import { err, ok, type Result } from "@/lib/result";

/** A circle about the origin as two half circles, anticlockwise. @param diameter mm. */
export const circleRing = (diameter: number): Ring => [
  { x: -diameter / 2, y: 0, bulge: 1 },
  { x: diameter / 2, y: 0, bulge: 1 },
];

/** Corners of a rectangle about the origin, anticlockwise, all rounded alike. */
const rectangle = (width: number, height: number, radius: number, field: string): readonly Corner[] =>
  [
    [-1, -1],
    [1, -1],
    [1, 1],
    [-1, 1],
  ].map(([sx = 0, sy = 0]) => ({ x: (sx * width) / 2, y: (sy * height) / 2, radius, field }));

/**
 * A rectangular hollow section: outer corners of `outerRadius`, inner ones of `innerRadius` (independent: hot-finished,
 * cold-formed and 0.93 t rules differ). Refused where the radii leave no wall across the corner.
 * @source Wall across the corner: t√2 − (√2 − 1)(ro − ri) > 0, plane geometry.
 */
export const rectangularHollowRegions = (
  d: FamilyDimensions["rectangular-hollow"],
): Result<readonly Region[]> => {
  const [width, depth] = [d.width - 2 * d.thickness, d.depth - 2 * d.thickness];
  if (width <= 0 || depth <= 0)
    return misfit("thickness", "The walls meet: make thickness smaller than half of depth and of width.");
  if (d.thickness * Math.SQRT2 <= (Math.SQRT2 - 1) * (d.outerRadius - d.innerRadius))
    return misfit("outerRadius", "The outer radius cuts through the corner: make outerRadius smaller.");
  const outer = roundedRing(rectangle(d.width, d.depth, d.outerRadius, "outerRadius"));
  if (!outer.ok) return err(outer.error);
  const inner = roundedRing(rectangle(width, depth, d.innerRadius, "innerRadius"));
  if (!inner.ok) return err(inner.error);
  return ok([{ outer: outer.value, holes: [reverseRing(inner.value)] }]);
};

/** A round hollow section; one without a bore is refused. */
export const roundHollowRegions = (d: FamilyDimensions["round-hollow"]): Result<readonly Region[]> => {
  const bore = d.diameter - 2 * d.thickness;
  if (bore <= 0)
    return misfit("thickness", "The wall fills the bore: make thickness smaller, or use a solid round.");
  return ok([{ outer: circleRing(d.diameter), holes: [reverseRing(circleRing(bore))] }]);
};

/** A solid rectangle about the origin. */
export const rectangleRegions = (width: number, height: number): Result<readonly Region[]> =>
  ok([{ outer: rectangle(width, height, 0, "width").map(({ x, y }) => ({ x, y })), holes: [] }]);
