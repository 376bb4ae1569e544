import type { Arc, Box } from "@/lib/geometry/arc";
import { arcOf, furthestOnEdge } from "@/lib/geometry/arc";
import type { Point, Ring, Vertex } from "@/lib/geometry/region";

/** An edge of a ring with its circle worked out once; `arc` is null for a straight edge. mm. */
export type Edge = Readonly<{ from: Vertex; to: Point; arc: Arc | null }>;

/** The edge that leaves `from` for `to`. */
export const edgeOf = (from: Vertex, to: Point): Edge => ({ from, to, arc: arcOf(from, to) });

/** The edges of a ring, in order; edge i leaves vertex i. */
export const ringEdges = (ring: Ring): readonly Edge[] =>
  ring.map((from, i) => edgeOf(from, ring[(i + 1) % ring.length] ?? from));

/** The least rectangle parallel to the axes round an edge, arcs exact. */
export const edgeBox = ({ from, to, arc }: Edge): Box => {
  const box = {
    xMin: Math.min(from.x, to.x),
    xMax: Math.max(from.x, to.x),
    yMin: Math.min(from.y, to.y),
    yMax: Math.max(from.y, to.y),
  };
  if (arc === null) return box;
  return {
    xMin: Math.min(box.xMin, furthestOnEdge(from, to, { x: -1, y: 0 }).x),
    xMax: Math.max(box.xMax, furthestOnEdge(from, to, { x: 1, y: 0 }).x),
    yMin: Math.min(box.yMin, furthestOnEdge(from, to, { x: 0, y: -1 }).y),
    yMax: Math.max(box.yMax, furthestOnEdge(from, to, { x: 0, y: 1 }).y),
  };
};

/** The box grown by `by` on every side. */
export const growBox = (box: Box, by: number): Box => ({
  xMin: box.xMin - by,
  xMax: box.xMax + by,
  yMin: box.yMin - by,
  yMax: box.yMax + by,
});

/** Whether two boxes share a point; touching counts. */
export const boxesMeet = (a: Box, b: Box): boolean =>
  a.xMin <= b.xMax && b.xMin <= a.xMax && a.yMin <= b.yMax && b.yMin <= a.yMax;

/** Whether a point lies in a box, its sides included. */
export const boxHolds = (box: Box, p: Point): boolean =>
  p.x >= box.xMin && p.x <= box.xMax && p.y >= box.yMin && p.y <= box.yMax;

const TURN = 2 * Math.PI;

/**
 * Share of the arc's sweep at which it is seen from its centre in the direction of `p`, continued past both ends: below 0
 * before the start, above 1 past the end, whichever end is nearer.
 */
export const arcShareOf = (arc: Arc, p: Point): number => {
  const angle = Math.atan2(p.y - arc.centre.y, p.x - arc.centre.x);
  const along = arc.sweep > 0 ? angle - arc.start : arc.start - angle;
  const sweep = Math.abs(arc.sweep);
  const turned = ((along % TURN) + TURN) % TURN;
  return (turned > sweep + (TURN - sweep) / 2 ? turned - TURN : turned) / sweep;
};

/** Share of the edge's length at which it passes nearest to `p`; may lie outside 0 to 1, where the edge is continued. */
export const shareOf = ({ from, to, arc }: Edge, p: Point): number => {
  if (arc !== null) return arcShareOf(arc, p);
  const dx = to.x - from.x;
  const dy = to.y - from.y;
  const squared = dx * dx + dy * dy;
  return squared === 0 ? 0 : ((p.x - from.x) * dx + (p.y - from.y) * dy) / squared;
};

/** The point at a share of the edge's length; the ends are returned as they are, without rounding. */
export const pointOnEdge = ({ from, to, arc }: Edge, share: number): Point => {
  if (share <= 0) return { x: from.x, y: from.y };
  if (share >= 1) return { x: to.x, y: to.y };
  if (arc !== null) {
    const angle = arc.start + share * arc.sweep;
    return {
      x: arc.centre.x + arc.radius * Math.cos(angle),
      y: arc.centre.y + arc.radius * Math.sin(angle),
    };
  }
  return { x: from.x + share * (to.x - from.x), y: from.y + share * (to.y - from.y) };
};

/** Distance of `p` from the nearest point of the edge, ends included, mm. */
export const distanceToEdge = (edge: Edge, p: Point): number => {
  const { from, to, arc } = edge;
  const share = shareOf(edge, p);
  if (share <= 0) return Math.hypot(p.x - from.x, p.y - from.y);
  if (share >= 1) return Math.hypot(p.x - to.x, p.y - to.y);
  if (arc !== null) return Math.abs(Math.hypot(p.x - arc.centre.x, p.y - arc.centre.y) - arc.radius);
  const near = pointOnEdge(edge, share);
  return Math.hypot(p.x - near.x, p.y - near.y);
};

/**
 * Unit direction in which the edge runs at a share of its length.
 * @returns (0, 0) for an edge without length.
 */
export const directionAt = ({ from, to, arc }: Edge, share: number): Point => {
  if (arc !== null) {
    const angle = arc.start + share * arc.sweep;
    const side = Math.sign(arc.sweep);
    return { x: -side * Math.sin(angle), y: side * Math.cos(angle) };
  }
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  return length === 0 ? { x: 0, y: 0 } : { x: (to.x - from.x) / length, y: (to.y - from.y) / length };
};

/** Bulge of the stretch of an edge between two shares of its length, run from `start` to `end` (backwards where end < start). */
export const bulgeBetween = ({ arc, from }: Edge, start: number, end: number): number => {
  if (arc === null) return 0;
  if (start === 0 && end === 1) return from.bulge ?? 0;
  if (start === 1 && end === 0) return -(from.bulge ?? 0);
  return Math.tan(((end - start) * arc.sweep) / 4);
};
