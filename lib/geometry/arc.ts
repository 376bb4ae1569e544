import { chordArcOf, furthestOnChordArc, onChordArc } from "@/lib/geometry/chord-arc";
import type { Point, Vertex } from "@/lib/geometry/region";

/** A circular arc. Angles in radians from +x anticlockwise; `sweep` is signed, positive anticlockwise; radius in mm. */
export type Arc = Readonly<{ centre: Point; radius: number; start: number; sweep: number }>;

/** A rectangle parallel to the axes that holds a shape, mm. */
export type Box = Readonly<{ xMin: number; xMax: number; yMin: number; yMax: number }>;

/** Flatter than this an edge has no centre worth computing: it stands off its chord by half a nanometre on a metre. */
const FLAT_BULGE = 1e-9;

/** Whether the edge that leaves this vertex is an arc with a centre (an absent or tiny bulge is a straight line). */
export const isArc = (vertex: Vertex): boolean => Math.abs(vertex.bulge ?? 0) > FLAT_BULGE;

/**
 * Centre, radius, start angle and signed sweep of the arc edge from `from` to `to`.
 * @param from vertex with its bulge (tan of a quarter of the included angle, positive anticlockwise), mm.
 * @param to end of the edge, mm.
 * @returns null where the edge is straight (no bulge, or one of at most 1e-9) or has no length: neither has a centre.
 * @source Plane geometry: for a chord L and bulge b, r = L(1 + b²)/(4|b|) and the centre lies L(1 − b²)/(4b) to the
 * left of the chord's middle.
 */
export const arcOf = (from: Vertex, to: Point): Arc | null => {
  if (!isArc(from)) return null;
  const bulge = from.bulge ?? 0;
  const dx = to.x - from.x;
  const dy = to.y - from.y;
  const chord = Math.hypot(dx, dy);
  if (chord === 0) return null;
  const offset = (1 - bulge * bulge) / (4 * bulge);
  const centre = { x: (from.x + to.x) / 2 - dy * offset, y: (from.y + to.y) / 2 + dx * offset };
  const radius = (chord * (1 + bulge * bulge)) / (4 * Math.abs(bulge));
  const start = Math.atan2(from.y - centre.y, from.x - centre.x);
  return { centre, radius, start, sweep: 4 * Math.atan(bulge) };
};

/**
 * Bulge of an arc from its signed sweep in radians (positive anticlockwise, |sweep| < 2π).
 * @source Definition of the bulge: tan(sweep / 4).
 */
export const bulgeOfSweep = (sweep: number): number => Math.tan(sweep / 4);

/** Bulge of a quarter circle turned anticlockwise: tan(22.5°) = √2 − 1. Negative for a clockwise one. */
export const QUARTER_BULGE = Math.SQRT2 - 1;

/** Point of the arc at a share of its sweep: 0 is the start, 1 the end. */
export const pointAt = (arc: Arc, share: number): Point => {
  const angle = arc.start + share * arc.sweep;
  return {
    x: arc.centre.x + arc.radius * Math.cos(angle),
    y: arc.centre.y + arc.radius * Math.sin(angle),
  };
};

/** Length of the arc, mm. */
export const arcLength = (arc: Arc): number => arc.radius * Math.abs(arc.sweep);

/**
 * Share of the sweep at which the arc passes the direction `angle` (radians, as seen from the centre), or null when it
 * does not pass it. A whole number of turns in `angle` makes no difference.
 */
export const shareAtAngle = (arc: Arc, angle: number): number | null => {
  const turn = 2 * Math.PI;
  const along = arc.sweep > 0 ? angle - arc.start : arc.start - angle;
  const share = (((along % turn) + turn) % turn) / Math.abs(arc.sweep);
  return share <= 1 ? share : null;
};

/**
 * Length of the edge from `from` to `to`, mm: chord or arc.
 * @source Arc length r·θ with r from `arcOf`.
 */
export const edgeLength = (from: Vertex, to: Point): number => {
  const arc = arcOf(from, to);
  if (arc !== null) return arcLength(arc);
  const dx = to.x - from.x;
  const dy = to.y - from.y;
  return Math.sqrt(dx * dx + dy * dy);
};

/**
 * The point of the edge that lies furthest in the direction of the unit vector `direction`, found exactly on arcs.
 * Where the whole edge is equally far, its start is returned.
 */
export const furthestOnEdge = (from: Vertex, to: Point, direction: Point): Point => {
  const arc = chordArcOf(from, to);
  const x = arc === null ? null : furthestOnChordArc(arc, direction);
  if (arc !== null && x !== null) {
    const { u, v } = onChordArc(arc, x);
    return {
      x: arc.middle.x + u * arc.along.x + v * arc.towards.x,
      y: arc.middle.y + u * arc.along.y + v * arc.towards.y,
    };
  }
  const startDistance = from.x * direction.x + from.y * direction.y;
  const endDistance = to.x * direction.x + to.y * direction.y;
  return endDistance > startDistance ? { x: to.x, y: to.y } : { x: from.x, y: from.y };
};

/** The box round a ring of lines and arcs; `null` for a ring without vertices. */
export const ringBox = (ring: readonly Vertex[]): Box | null => {
  if (ring.length === 0) return null;
  let [xMin, xMax, yMin, yMax] = [Infinity, -Infinity, Infinity, -Infinity];
  const take = (p: Point) => {
    xMin = Math.min(xMin, p.x);
    xMax = Math.max(xMax, p.x);
    yMin = Math.min(yMin, p.y);
    yMax = Math.max(yMax, p.y);
  };
  ring.forEach((from, i) => {
    take(from);
    const to = ring[(i + 1) % ring.length];
    if (to === undefined || !isArc(from)) return;
    take({ x: furthestOnEdge(from, to, { x: 1, y: 0 }).x, y: from.y });
    take({ x: furthestOnEdge(from, to, { x: -1, y: 0 }).x, y: from.y });
    take({ x: from.x, y: furthestOnEdge(from, to, { x: 0, y: 1 }).y });
    take({ x: from.x, y: furthestOnEdge(from, to, { x: 0, y: -1 }).y });
  });
  return { xMin, xMax, yMin, yMax };
};
