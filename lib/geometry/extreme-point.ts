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
  let best: ExtremePoint | null = null;
  for (const { outer } of regions)
    outer.forEach((from, i) => {
      const to = outer[(i + 1) % outer.length];
      if (to === undefined) return;
      const point = furthestOnEdge(from, to, direction);
      const distance = (point.x - origin.x) * direction.x + (point.y - origin.y) * direction.y;
      if (best === null || distance > best.distance) best = { point, distance };
    });
  return best;
};
