import { arcOf } from "@/lib/geometry/arc";
import type { Point, Region, Ring } from "@/lib/geometry/region";

/** Largest turn between neighbouring tangents round an arc: 5°, so that a circle has 72 of them. */
const TANGENT_STEP_RAD = Math.PI / 36;

const cross = (o: Point, a: Point, b: Point): number => (a.x - o.x) * (b.y - o.y) - (a.y - o.y) * (b.x - o.x);

/** Corners of the tangents drawn round an arc that bulges out of the material, ends included. */
const tangentCorners = (ring: Ring, i: number): readonly Point[] => {
  const from = ring[i];
  const to = ring[(i + 1) % ring.length];
  if (from === undefined || to === undefined) return [];
  const arc = arcOf(from, to);
  if (arc === null || arc.sweep < 0) return [from];
  const steps = Math.ceil(arc.sweep / TANGENT_STEP_RAD);
  const half = arc.sweep / steps / 2;
  const reach = arc.radius / Math.cos(half);
  const corners = Array.from({ length: steps }, (_, k) => {
    const angle = arc.start + (2 * k + 1) * half;
    return { x: arc.centre.x + reach * Math.cos(angle), y: arc.centre.y + reach * Math.sin(angle) };
  });
  return [from, ...corners];
};

const chain = (points: readonly Point[]): readonly Point[] => {
  const hull: Point[] = [];
  for (const p of points) {
    for (let n = hull.length; n >= 2; n = hull.length) {
      const [a, b] = [hull[n - 2], hull[n - 1]];
      if (a === undefined || b === undefined || cross(a, b, p) > 0) break;
      hull.pop();
    }
    hull.push(p);
  }
  return hull.slice(0, -1);
};

/**
 * The convex polygon round regions, anticlockwise, without points inside its sides. Round an arc it runs along tangents at
 * most 5° apart: it never cuts into the material, and stands off an arc by at most 0.1 % of its radius.
 * @returns fewer than three points where the regions have no area.
 * @source Monotone chain, A. M. Andrew, Inf. Proc. Letters 9 (1979).
 */
export const convexHull = (regions: readonly Region[]): readonly Point[] => {
  const points = regions
    .flatMap(({ outer }) => outer.flatMap((_, i) => tangentCorners(outer, i)))
    .map(({ x, y }) => ({ x, y }))
    .sort((a, b) => a.x - b.x || a.y - b.y);
  return [...chain(points), ...chain(points.toReversed())];
};
