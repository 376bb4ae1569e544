import type { Polygons } from "@/lib/geometry/clip";
import { chordPoints } from "@/lib/geometry/chords";
import type { Edge } from "@/lib/geometry/edge";
import { bulgeBetween, directionAt, distanceToEdge, edgeOf, ringEdges, shareOf } from "@/lib/geometry/edge";
import type { EdgeGrid } from "@/lib/geometry/edge-grid";
import { edgeGrid, edgesNear } from "@/lib/geometry/edge-grid";
import { curvesMeet } from "@/lib/geometry/meet";
import type { Point, Region, Ring } from "@/lib/geometry/region";
import { orientRing, ringArea, vertexOf } from "@/lib/geometry/ring";
import { CHORDS_PER_CIRCLE, SNAP_STEPS_MM, TOUCH_MM } from "@/lib/geometry/tolerance";

/**
 * The curves that clipped polygons came from, found again by place: `grid` holds their chords, `sourceOf` names for each
 * chord the curve in `curves`.
 */
export type Sources = Readonly<{ curves: readonly Edge[]; grid: EdgeGrid; sourceOf: readonly number[] }>;

/** Prepares the search for the curves behind clipped polygons. */
export const sourcesOf = (curves: readonly Edge[]): Sources => {
  const chords: Edge[] = [];
  const sourceOf: number[] = [];
  curves.forEach((curve, source) => {
    const stops = [curve.from, ...chordPoints(curve), curve.to];
    stops.slice(1).forEach((to, i) => {
      const from = stops[i] ?? to;
      chords.push(edgeOf({ x: from.x, y: from.y }, to));
      sourceOf.push(source);
    });
  });
  return { curves, grid: edgeGrid(chords, 4 * Math.max(...SNAP_STEPS_MM)), sourceOf };
};

const NO_SOURCE = -1;

/** A stretch of a clipped ring that follows one curve; `from` is its first corner as clipped. */
type Run = Readonly<{ source: number; from: Point }>;

/** Distance of a point from the straight line that a chord lies on, without end. */
const offLine = ({ from, to }: Edge, p: Point): number => {
  const [dx, dy] = [to.x - from.x, to.y - from.y];
  const length = Math.hypot(dx, dy);
  return length === 0 ? Infinity : Math.abs(dx * (p.y - from.y) - dy * (p.x - from.x)) / length;
};

/** The curve that a clipped edge lies along: its chord passes the middle and runs the same way. */
const nearestSource = (sources: Sources, from: Point, to: Point, step: number): number => {
  const at = (share: number) => ({
    x: from.x + share * (to.x - from.x),
    y: from.y + share * (to.y - from.y),
  });
  const middle = at(0.5);
  let best = NO_SOURCE;
  let least = 3 * step;
  for (const index of edgesNear(sources.grid, middle)) {
    const chord = sources.grid.edges[index];
    if (chord === undefined || distanceToEdge(chord, middle) > least) continue;
    const off = Math.max(offLine(chord, at(0.25)), offLine(chord, middle), offLine(chord, at(0.75)));
    if (off < least) [least, best] = [off, sources.sourceOf[index] ?? NO_SOURCE];
  }
  return best;
};

const runsOf = (corners: readonly Point[], sources: Sources, step: number): readonly Run[] => {
  const single = corners.map((from, i) => {
    const to = corners[(i + 1) % corners.length] ?? from;
    return { source: nearestSource(sources, from, to, step), from };
  });
  const starts = single.filter(
    ({ source }, i) =>
      source === NO_SOURCE || source !== single[(i + single.length - 1) % single.length]?.source,
  );
  return starts.length < 2 ? single.map(({ from }) => ({ source: NO_SOURCE, from })) : starts;
};

/** How far the true crossing of two curves may lie from that of their chords. */
const reachOf = (edge: Edge): number =>
  edge.arc === null ? 0 : (edge.arc.radius * 4 * Math.PI) / CHORDS_PER_CIRCLE;

/** The true corner where two curves follow each other: a common end, or where they cross; else the clipped corner. */
const cornerOf = (before: Edge | undefined, after: Edge | undefined, clipped: Point, step: number): Point => {
  const away = (p: Point) => Math.hypot(p.x - clipped.x, p.y - clipped.y);
  const ends = [before, after].flatMap((edge) => (edge === undefined ? [] : [edge.from, edge.to]));
  const end = ends.find((p) => away(p) <= 2 * step);
  if (end !== undefined) return { x: end.x, y: end.y };
  if (before === undefined || after === undefined) return clipped;
  const [d, e] = [directionAt(before, shareOf(before, clipped)), directionAt(after, shareOf(after, clipped))];
  const sine = Math.abs(d.x * e.y - d.y * e.x);
  const reach = reachOf(before) + reachOf(after) + (4 * step) / Math.max(sine, 1e-6);
  const onBoth = (p: Point) => distanceToEdge(before, p) <= TOUCH_MM && distanceToEdge(after, p) <= TOUCH_MM;
  // A circle that stops short of its tangent by rounding still has its corner at the point of contact.
  const crossings = curvesMeet(before, after, TOUCH_MM).filter((p) => away(p) <= reach && onBoth(p));
  return (
    crossings.reduce<Point | null>((best, p) => (best === null || away(p) < away(best) ? p : best), null) ??
    clipped
  );
};

const shareOn = (edge: Edge, p: Point): number => {
  if (p.x === edge.from.x && p.y === edge.from.y) return 0;
  if (p.x === edge.to.x && p.y === edge.to.y) return 1;
  return shareOf(edge, p);
};

const recoverRing = (
  closed: readonly (readonly [number, number])[],
  sources: Sources,
  step: number,
): Ring => {
  const corners = closed.slice(0, -1).map(([x, y]) => ({ x, y }));
  const runs = runsOf(corners, sources, step);
  const at = runs.map(({ source, from }, i) =>
    cornerOf(
      sources.curves[runs[(i + runs.length - 1) % runs.length]?.source ?? NO_SOURCE],
      sources.curves[source],
      from,
      step,
    ),
  );
  return runs.flatMap(({ source }, i) => {
    const [from, to] = [at[i], at[(i + 1) % at.length]];
    if (from === undefined || to === undefined || (from.x === to.x && from.y === to.y)) return [];
    const curve = sources.curves[source];
    const bulge = curve === undefined ? 0 : bulgeBetween(curve, shareOn(curve, from), shareOn(curve, to));
    return [vertexOf(from.x, from.y, bulge)];
  });
};

const lengthOf = (ring: Ring): number =>
  ring.reduce((sum, v, i) => {
    const next = ring[(i + 1) % ring.length] ?? v;
    return sum + Math.hypot(next.x - v.x, next.y - v.y);
  }, 0);

/** Slivers thinner than the tolerance are what is left of edges that nearly coincide. */
const isSliver = (ring: Ring): boolean =>
  ring.length < 2 || Math.abs(ringArea(ring)) <= (TOUCH_MM * lengthOf(ring)) / 2;

/** Area between chords and their arc, as a share of radius squared: the end chords of a run are cut anywhere. */
const CHORD_AREA_REL = 1e-6;

/** The ring with its true curves; with its chords, where the curves found do not enclose the area that was clipped. */
const ringOf = (closed: readonly (readonly [number, number])[], sources: Sources, step: number): Ring => {
  const clipped = closed.slice(0, -1).map(([x, y]) => ({ x, y }));
  const ring = recoverRing(closed, sources, step);
  const radii = ringEdges(ring).reduce((sum, { arc }) => sum + (arc === null ? 0 : arc.radius ** 2), 0);
  const allowed = TOUCH_MM * lengthOf(clipped) + CHORD_AREA_REL * radii;
  return Math.abs(ringArea(ring) - ringArea(clipped)) <= allowed ? ring : clipped;
};

/**
 * Clipped polygons as regions of true lines and arcs: corners go back to the vertices they came from or to the true
 * crossings of their curves, and runs of chords become their arcs. Where no curve is found, the clipped corner stays.
 * Slivers thinner than `TOUCH_MM` are left out.
 * @param step the grid step the polygons were clipped on, mm.
 */
export const recoverRegions = (polygons: Polygons, sources: Sources, step: number): readonly Region[] =>
  polygons.flatMap(([outer = [], ...holes]) => {
    const ring = ringOf(outer, sources, step);
    if (isSliver(ring)) return [];
    return [
      {
        outer: orientRing(ring, "outer"),
        holes: holes
          .map((hole) => ringOf(hole, sources, step))
          .filter((hole) => !isSliver(hole))
          .map((hole) => orientRing(hole, "hole")),
      },
    ];
  });
