import Delaunator from "delaunator";
import type { Result } from "@/lib/result";
import { err, ok } from "@/lib/result";
import type { BoundaryGraph } from "@/lib/section/torsion/mesh/boundary-graph";
import { constrain } from "@/lib/section/torsion/mesh/constrain.mjs";
import { next, type Triangulation } from "@/lib/section/torsion/mesh/triangulation";

const UNKNOWN = -2;

const crossing = <T>(): Result<T> =>
  err({
    code: "torsion.crossing",
    detail:
      "The boundaries of the parts cross or touch in a way that cannot be meshed. Move them apart, or let their edges meet exactly.",
  });

/** Triangles of all points with the segments as edges; anticlockwise. Null where segments cross or pass through points. */
const constrained = (graph: BoundaryGraph): Readonly<{ corner: Uint32Array; twin: Int32Array }> | null => {
  // The library calls a triangle anticlockwise with y down.
  const coordinates = Float64Array.from({ length: 2 * graph.x.length }, (_, i) =>
    i % 2 === 0 ? graph.x[i / 2]! : -graph.y[(i - 1) / 2]!,
  );
  const delaunay = new Delaunator(coordinates);
  try {
    const edges = graph.a.map((a, s): [number, number] => [a, graph.b[s]!]);
    constrain(delaunay, edges);
  } catch (error) {
    // The library throws plain errors, and only for constraints that cross each other, a point or the hull.
    if (error instanceof Error) return null;
    throw error;
  }
  return { corner: delaunay.triangles, twin: delaunay.halfedges };
};

const onlyUsedVertices = (
  graph: BoundaryGraph,
): Readonly<{ graph: BoundaryGraph; used: readonly number[] }> => {
  const number = new Map<number, number>();
  const used: number[] = [];
  const rename = (v: number): number => {
    const known = number.get(v);
    if (known !== undefined) return known;
    number.set(v, used.length);
    return used.push(v) - 1;
  };
  const a = graph.a.map(rename);
  const b = graph.b.map(rename);
  return {
    graph: { ...graph, x: used.map((v) => graph.x[v]!), y: used.map((v) => graph.y[v]!), a, b },
    used,
  };
};

/** Region of each triangle by flooding from the segments, −1 outside; null where two regions flood into one another. */
const regionsOf = (
  graph: BoundaryGraph,
  corner: Uint32Array,
  twin: Int32Array,
): Readonly<{ region: Int32Array; segment: Int32Array }> | null => {
  const n = graph.x.length;
  const known = new Map(graph.a.map((a, s) => [a * n + graph.b[s]!, s]));
  const segment = new Int32Array(corner.length).fill(-1);
  const region = new Int32Array(corner.length / 3).fill(UNKNOWN);
  const queue: number[] = [];
  const found = new Set<number>();
  const settle = (t: number, r: number): boolean => {
    if (region[t] !== UNKNOWN) return region[t] === r;
    region[t] = r;
    queue.push(t);
    return true;
  };
  for (let e = 0; e < corner.length; e++) {
    const [a, b] = [corner[e]!, corner[next(e)]!];
    const along = known.get(a * n + b);
    const s = along ?? known.get(b * n + a);
    if (s === undefined) continue;
    segment[e] = s;
    found.add(s);
    if (!settle((e / 3) | 0, along === undefined ? graph.right[s]! : graph.left[s]!)) return null;
  }
  if (found.size < graph.a.length) return null;
  for (let i = 0; i < queue.length; i++) {
    const t = queue[i]!;
    for (let e = 3 * t; e < 3 * t + 3; e++) {
      if (segment[e]! >= 0 || twin[e]! < 0) continue;
      if (!settle((twin[e]! / 3) | 0, region[t]!)) return null;
    }
  }
  return { region, segment };
};

/** A triangulation of a body's boundaries and the graph's number of each of its vertices. */
export type FirstTriangulation = Readonly<{ triangulation: Triangulation; used: readonly number[] }>;

/**
 * Constrained Delaunay triangulation of the inside of a body, without points of its own.
 * @returns `torsion.crossing` where boundaries cross, pass through vertices, or leave regions open.
 * @source Sloan 1993 (constraining by flips), through the libraries delaunator and constrainautor.
 */
export const triangulate = (whole: BoundaryGraph): Result<FirstTriangulation> => {
  const { graph, used } = onlyUsedVertices(whole);
  if (used.length < 3) return crossing();
  const raw = constrained(graph);
  if (raw === null) return crossing();
  const flooded = regionsOf(graph, raw.corner, raw.twin);
  if (flooded === null) return crossing();
  const inside = [...flooded.region.keys()].filter((t) => flooded.region[t]! >= 0);
  if (inside.length === 0) return crossing();
  const number = new Map(inside.map((t, i) => [t, i]));
  const halves = inside.flatMap((t) => [3 * t, 3 * t + 1, 3 * t + 2]);
  const twin = halves.map((e) => {
    const f = raw.twin[e]!;
    const other = f < 0 ? undefined : number.get((f / 3) | 0);
    return other === undefined ? -1 : 3 * other + (f % 3);
  });
  const segment = halves.map((e) => flooded.segment[e]!);
  const halfOf = graph.a.map(() => -1);
  segment.forEach((s, e) => {
    if (s >= 0) halfOf[s] = e;
  });
  return ok({
    used,
    triangulation: {
      x: [...graph.x],
      y: [...graph.y],
      line: graph.x.map(() => -1),
      corner: halves.map((e) => raw.corner[e]!),
      twin,
      segment,
      region: inside.map((t) => flooded.region[t]!),
      halfOf,
      origin: graph.a.map((_, s) => s),
      free: [],
      stamp: inside.map(() => 0),
      stamped: 0,
    },
  });
};
