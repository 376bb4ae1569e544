import type { Arc } from "@/lib/geometry/arc";
import { arcOf } from "@/lib/geometry/arc";
import type { Point, Region, Ring, Vertex } from "@/lib/geometry/region";

/** On which side of the chord a point lies: left positive. A point on it counts as moved a little in +x, then in +y. */
const sideOf = (from: Point, to: Point, p: Point): number => {
  const [dx, dy] = [to.x - from.x, to.y - from.y];
  return dx * (p.y - from.y) - dy * (p.x - from.x) || -dy || dx;
};

/**
 * Whether a ray from `p` towards +x crosses the edge an odd number of times: the sum over the edges of a ring says
 * whether `p` lies inside. An arc is its chord and the circular segment beside it.
 * @param arc what `arcOf` gives for the edge.
 */
export const rayCrosses = (from: Vertex, to: Point, arc: Arc | null, p: Point): boolean => {
  const spans = from.y > p.y !== to.y > p.y;
  if (arc === null && !spans) return false;
  const side = sideOf(from, to, p);
  const crossesChord = spans && (to.y > from.y ? side > 0 : side < 0);
  if (arc === null || side > 0 === arc.sweep > 0) return crossesChord;
  const [dx, dy] = [p.x - arc.centre.x, p.y - arc.centre.y];
  const inSegment = dx * dx + dy * dy < arc.radius * arc.radius;
  return crossesChord !== inSegment;
};

/**
 * Whether `p` lies inside the ring of lines and arcs, whichever way it runs.
 * A point on the boundary may be answered either way. O(n).
 */
export const ringContains = (ring: Ring, p: Point): boolean => {
  let inside = false;
  let from = ring.at(-1);
  for (const to of ring) {
    if (from !== undefined && rayCrosses(from, to, arcOf(from, to), p)) inside = !inside;
    from = to;
  }
  return inside;
};

/** Whether `p` lies in the material of the region: inside its outer ring and in none of its holes. O(n). */
export const regionContains = (region: Region, p: Point): boolean =>
  ringContains(region.outer, p) && !region.holes.some((hole) => ringContains(hole, p));
