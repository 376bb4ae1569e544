import type { Arc } from "@/lib/geometry/arc";
import type { Edge } from "@/lib/geometry/edge";
import { distanceToEdge } from "@/lib/geometry/edge";
import type { Point } from "@/lib/geometry/region";

const cross = (ax: number, ay: number, bx: number, by: number): number => ax * by - ay * bx;

/** Where two straight lines, continued without end, cross; none where they are parallel. */
const lineLine = (a: Edge, b: Edge): readonly Point[] => {
  const [ax, ay] = [a.to.x - a.from.x, a.to.y - a.from.y];
  const [bx, by] = [b.to.x - b.from.x, b.to.y - b.from.y];
  const turn = cross(ax, ay, bx, by);
  if (turn === 0) return [];
  const t = cross(b.from.x - a.from.x, b.from.y - a.from.y, bx, by) / turn;
  return [{ x: a.from.x + t * ax, y: a.from.y + t * ay }];
};

/** Where a straight line, continued, meets a full circle; the foot of the centre where they pass by less than `tolerance`. */
const lineCircle = (line: Edge, arc: Arc, tolerance: number): readonly Point[] => {
  const [dx, dy] = [line.to.x - line.from.x, line.to.y - line.from.y];
  const length = Math.hypot(dx, dy);
  if (length === 0) return [];
  const [ux, uy] = [dx / length, dy / length];
  const along = (arc.centre.x - line.from.x) * ux + (arc.centre.y - line.from.y) * uy;
  const off = cross(ux, uy, arc.centre.x - line.from.x, arc.centre.y - line.from.y);
  const squared = (arc.radius - off) * (arc.radius + off);
  if (squared < 0 && Math.abs(off) > arc.radius + tolerance) return [];
  const half = Math.sqrt(Math.max(0, squared));
  const at = (s: number) => ({ x: line.from.x + s * ux, y: line.from.y + s * uy });
  return half === 0 ? [at(along)] : [at(along - half), at(along + half)];
};

/** Where two full circles meet; the point between them where they pass by less than `tolerance`; none when concentric. */
const circleCircle = (a: Arc, b: Arc, tolerance: number): readonly Point[] => {
  const [dx, dy] = [b.centre.x - a.centre.x, b.centre.y - a.centre.y];
  const distance = Math.hypot(dx, dy);
  if (distance === 0) return [];
  const [ux, uy] = [dx / distance, dy / distance];
  const along = distance / 2 + ((a.radius - b.radius) * (a.radius + b.radius)) / (2 * distance);
  const squared = (a.radius - along) * (a.radius + along);
  const gap = Math.max(distance - a.radius - b.radius, Math.abs(a.radius - b.radius) - distance);
  if (gap > tolerance) return [];
  const half = Math.sqrt(Math.max(0, squared));
  const at = (h: number) => ({
    x: a.centre.x + along * ux - h * uy,
    y: a.centre.y + along * uy + h * ux,
  });
  return half === 0 ? [at(0)] : [at(-half), at(half)];
};

/**
 * Where the curves that two edges lie on meet, both continued without end: crossings of lines and full circles.
 * @param tolerance mm; curves that pass each other by less count as touching.
 * @returns no point, one (touching or crossing lines) or two; none for parallel lines and concentric circles.
 */
export const curvesMeet = (a: Edge, b: Edge, tolerance: number): readonly Point[] => {
  if (a.arc === null) return b.arc === null ? lineLine(a, b) : lineCircle(a, b.arc, tolerance);
  return b.arc === null ? lineCircle(b, a.arc, tolerance) : circleCircle(a.arc, b.arc, tolerance);
};

/**
 * The points that two edges share: crossings, and ends of one that lie on the other.
 * @param tolerance mm; how far off a point may lie from either edge and still count as on it.
 * @returns every such point; where the edges run along each other, the ends of the common stretch. A point may be
 * returned more than once.
 */
export const edgesMeet = (a: Edge, b: Edge, tolerance: number): readonly Point[] => {
  const crossings = curvesMeet(a, b, tolerance).filter(
    (p) => distanceToEdge(a, p) <= tolerance && distanceToEdge(b, p) <= tolerance,
  );
  const endsOfA = [a.from, a.to].filter((p) => distanceToEdge(b, p) <= tolerance);
  const endsOfB = [b.from, b.to].filter((p) => distanceToEdge(a, p) <= tolerance);
  return [...crossings, ...endsOfA, ...endsOfB].map(({ x, y }) => ({ x, y }));
};
