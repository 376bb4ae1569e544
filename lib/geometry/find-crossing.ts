import SplayTree from "splaytree";
import type { Edge } from "@/lib/geometry/edge";
import { boxesMeet, edgeBox, edgeOf, growBox, pointOnEdge } from "@/lib/geometry/edge";
import { shareAtAngle } from "@/lib/geometry/arc";
import { edgesMeet } from "@/lib/geometry/meet";
import type { Point, Ring } from "@/lib/geometry/region";
import { cosSinOfDegrees, vertexOf } from "@/lib/geometry/ring";

/** An edge of one of several rings, by the index of the ring and of the vertex it leaves. */
export type EdgeName = Readonly<{ ring: number; edge: number }>;

/** Two edges that share a point they should not share, mm. */
export type Crossing = Readonly<{ a: EdgeName; b: EdgeName; at: Point }>;

/** The sweep runs over axes turned by this angle, so that drawn lines, mostly upright or level, are neither. */
const SWEEP_DEGREES = 32.718281828;

type Whole = Readonly<{ name: EdgeName; size: number; edge: Edge }>;

/** A stretch of an edge on which x only grows: the whole line, or an arc between its leftmost and rightmost points. */
type Stretch = Readonly<{ whole: Whole; left: Point; right: Point; upper: boolean; order: number }>;

const turned = (ring: Ring, origin: Point): Ring => {
  const [c, s] = cosSinOfDegrees(SWEEP_DEGREES);
  return ring.map((v) => {
    const [x, y] = [v.x - origin.x, v.y - origin.y];
    return vertexOf(c * x - s * y, s * x + c * y, v.bulge);
  });
};

const stretchesOf = (whole: Whole, order: number): readonly Stretch[] => {
  const { edge } = whole;
  const { arc } = edge;
  if (arc === null) {
    const [left, right] = edge.from.x <= edge.to.x ? [edge.from, edge.to] : [edge.to, edge.from];
    return [{ whole, left, right, upper: false, order }];
  }
  const turns = [shareAtAngle(arc, 0), shareAtAngle(arc, Math.PI)].filter((share) => share !== null);
  const shares = [0, ...turns.toSorted((a, b) => a - b), 1];
  return shares.slice(1).flatMap((end, i) => {
    const start = shares[i] ?? 0;
    if (end <= start) return [];
    const [p, q] = [pointOnEdge(edge, start), pointOnEdge(edge, end)];
    const [left, right] = p.x <= q.x ? [p, q] : [q, p];
    const middle = pointOnEdge(edge, (start + end) / 2);
    return [{ whole, left, right, upper: middle.y > arc.centre.y, order: order + i / 4 }];
  });
};

const heightAt = (s: Stretch, x: number): number => {
  if (x <= s.left.x) return s.left.y;
  if (x >= s.right.x) return s.right.y;
  const { arc } = s.whole.edge;
  if (arc !== null) {
    const off = x - arc.centre.x;
    const rise = Math.sqrt(Math.max(0, (arc.radius - off) * (arc.radius + off)));
    return arc.centre.y + (s.upper ? rise : -rise);
  }
  return s.left.y + ((x - s.left.x) / (s.right.x - s.left.x)) * (s.right.y - s.left.y);
};

/** Which of two stretches lies lower where both run: judged where they are furthest apart. */
const lower = (a: Stretch, b: Stretch): number => {
  if (a === b) return 0;
  const start = Math.max(a.left.x, b.left.x);
  const end = Math.min(a.right.x, b.right.x);
  let apart = 0;
  for (const x of [start, (start + end) / 2, end]) {
    const here = heightAt(a, x) - heightAt(b, x);
    if (Math.abs(here) > Math.abs(apart)) apart = here;
  }
  return apart || a.order - b.order;
};

const sharedEnds = (a: Whole, b: Whole): readonly Point[] => {
  if (a.name.ring !== b.name.ring) return [];
  const n = a.size;
  return [
    ...((a.name.edge + 1) % n === b.name.edge ? [b.edge.from] : []),
    ...((b.name.edge + 1) % n === a.name.edge ? [a.edge.from] : []),
  ];
};

/** Whether two lines lie further apart, along x or y, than any point can be within the tolerance of both. */
const farApart = ({ edge: a }: Whole, { edge: b }: Whole, tolerance: number): boolean =>
  a.arc === null &&
  b.arc === null &&
  !boxesMeet(growBox(edgeBox(a), 2 * tolerance), growBox(edgeBox(b), 2 * tolerance));

const radiusOf = ({ arc }: Edge): number => arc?.radius ?? 0;

/** A point two edges share other than the vertex that joins neighbours in a ring. */
const badMeeting = (a: Whole, b: Whole, tolerance: number): Point | null => {
  if (farApart(a, b, tolerance)) return null;
  const shared = sharedEnds(a, b);
  const points = edgesMeet(a.edge, b.edge, tolerance);
  if (shared.length === 0) return points[0] ?? null;
  // Neighbours that touch smoothly (a fillet) are closer than the tolerance over √(2·r·tolerance) beside their vertex.
  const radius = radiusOf(a.edge) + radiusOf(b.edge);
  const near = 10 * tolerance + 4 * Math.sqrt(tolerance * radius);
  return points.find((p) => shared.every((v) => Math.hypot(p.x - v.x, p.y - v.y) > near)) ?? null;
};

const sweep = (stretches: readonly Stretch[], tolerance: number): readonly [Whole, Whole] | null => {
  const events = stretches
    .flatMap((stretch) => [
      { x: stretch.left.x, opens: true, stretch },
      { x: stretch.right.x, opens: false, stretch },
    ])
    .toSorted((a, b) => a.x - b.x || Number(b.opens) - Number(a.opens));
  const active = new SplayTree<Stretch, null>(lower);
  const bad = (a: Stretch | undefined, b: Stretch | undefined) =>
    a !== undefined &&
    b !== undefined &&
    a.whole !== b.whole &&
    badMeeting(a.whole, b.whole, tolerance) !== null;
  for (const { opens, stretch } of events) {
    const node = opens ? active.insert(stretch, null) : active.find(stretch);
    const below = node === null ? undefined : active.prev(node)?.key;
    const above = node === null ? undefined : active.next(node)?.key;
    if (opens) {
      if (below !== undefined && bad(below, stretch)) return [below.whole, stretch.whole];
      if (above !== undefined && bad(stretch, above)) return [stretch.whole, above.whole];
    } else {
      if (below !== undefined && above !== undefined && bad(below, above)) return [below.whole, above.whole];
      active.remove(stretch);
    }
  }
  return null;
};

/** Two vertices, not of one edge, that lie on one point. */
const touchingVertices = (wholes: readonly Whole[], tolerance: number): readonly [Whole, Whole] | null => {
  const sorted = wholes.toSorted((a, b) => a.edge.from.x - b.edge.from.x);
  for (const [i, a] of sorted.entries()) {
    for (let k = i + 1; k < sorted.length; k++) {
      const b = sorted[k];
      if (b === undefined || b.edge.from.x - a.edge.from.x > tolerance) break;
      if (Math.abs(a.edge.from.y - b.edge.from.y) <= tolerance) return [a, b];
    }
  }
  return null;
};

const inOrder = (a: Whole, b: Whole): boolean =>
  a.name.ring < b.name.ring || (a.name.ring === b.name.ring && a.name.edge < b.name.edge);

/**
 * The first pair of edges found that cross, touch or run along each other, among the edges of all rings of one outline;
 * null where there is none. The vertex that joins two edges of a ring does not count, but doubling back does.
 * @param rings lines and arcs, mm, without edges of zero length.
 * @param tolerance mm; edges nearer than this touch.
 * @source M. Shamos & D. Hoey, Geometric intersection problems, FOCS 1976: a sweep over the edges in order of x with the
 * cut edges kept in order of y, O(n log n); arcs are cut where they turn back in x.
 */
export const findCrossing = (rings: readonly Ring[], tolerance: number): Crossing | null => {
  const origin = rings[0]?.[0];
  if (origin === undefined) return null;
  const wholes = rings.flatMap((ring, r) => {
    const moved = turned(ring, origin);
    return moved.map((from, i) => ({
      name: { ring: r, edge: i },
      size: ring.length,
      edge: edgeOf(from, moved[(i + 1) % moved.length] ?? from),
    }));
  });
  const pair =
    touchingVertices(wholes, tolerance) ??
    sweep(
      wholes.flatMap((whole, i) => stretchesOf(whole, i)),
      tolerance,
    );
  if (pair === null) return null;
  const [a, b] = inOrder(pair[0], pair[1]) ? pair : [pair[1], pair[0]];
  const at = badMeeting(a, b, tolerance) ?? a.edge.from;
  const [c, s] = cosSinOfDegrees(SWEEP_DEGREES);
  return {
    a: a.name,
    b: b.name,
    at: { x: origin.x + c * at.x + s * at.y, y: origin.y - s * at.x + c * at.y },
  };
};
