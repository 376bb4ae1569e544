import { furthestOnEdge } from "@/lib/geometry/arc";
import type { Point, Region } from "@/lib/geometry/region";

/** The point of an area furthest in a direction, and how far it is from the origin of that measure, mm. */
export type ExtremePoint = Readonly<{ point: Point; distance: number }>;

/**
 * The point of these regions furthest from `origin` in a direction; exact on arcs.
 * @param direction unit vector.
 * @returns distance in mm, negative when everything lies behind the origin; null without regions.
 */
export const extremePoint = (
  regions: readonly Region[],
  direction: Point,
  origin: Point,
): ExtremePoint | null => {
  const { x: dx, y: dy } = direction;
  let furthest = -Infinity;
  let at: Point | null = null;
  for (const { outer } of regions) {
    let from = outer[outer.length - 1];
    for (const to of outer) {
      const s = (to.x - origin.x) * dx + (to.y - origin.y) * dy;
      if (s > furthest) {
        furthest = s;
        at = to;
      }
      // An arc that bends into the material reaches no further than its ends.
      if (from?.bulge !== undefined && from.bulge > 0) {
        const point = furthestOnEdge(from, to, direction);
        const onArc = (point.x - origin.x) * dx + (point.y - origin.y) * dy;
        if (onArc > furthest) {
          furthest = onArc;
          at = point;
        }
      }
      from = to;
    }
  }
  return at === null ? null : { point: { x: at.x, y: at.y }, distance: furthest };
};
