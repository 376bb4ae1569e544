import type { Point, Region, Ring } from "@/lib/geometry/region";
import { TOUCH_MM } from "@/lib/geometry/tolerance";
import type { Fault, Result } from "@/lib/result";
import { err, ok } from "@/lib/result";
import { chordRing } from "@/lib/section/torsion/mesh/chords";

/** A region to mesh: what it belongs to and how stiff it is against the reference material (G/G_ref and E/E_ref). */
export type MeshRegion = Readonly<{ part: number; region: Region; shear: number; axial: number }>;

/**
 * The boundaries of all regions as one planar straight-line graph. Vertices in mm, measured from `origin` (drawing
 * coordinates). Segment s runs from a[s] to b[s] with region left[s] on its left and right[s] on its right; −1 is no
 * material. Each pair of vertices has at most one segment. `inside` says how far inside its arc a chord acts, mm.
 */
export type BoundaryGraph = Readonly<{
  origin: Point;
  x: readonly number[];
  y: readonly number[];
  a: readonly number[];
  b: readonly number[];
  left: readonly number[];
  right: readonly number[];
  inside: readonly number[];
}>;

const overlap = (): Fault => ({
  code: "torsion.overlap",
  detail: "Two parts cover the same place. Separate them, or let one be cut by the other, and compute again.",
});

/** Gives vertices within the touching distance of each other one number. */
const vertexNumbering = () => {
  const x: number[] = [];
  const y: number[] = [];
  const cells = new Map<string, number[]>();
  const size = 2 * TOUCH_MM;
  const numberOf = (px: number, py: number): number => {
    const [column, row] = [Math.floor(px / size), Math.floor(py / size)];
    for (let c = column - 1; c <= column + 1; c++)
      for (let r = row - 1; r <= row + 1; r++)
        for (const k of cells.get(`${c} ${r}`) ?? [])
          if (Math.hypot(x[k]! - px, y[k]! - py) <= TOUCH_MM) return k;
    const id = x.push(px) - 1;
    y.push(py);
    const key = `${column} ${row}`;
    const here = cells.get(key);
    if (here === undefined) cells.set(key, [id]);
    else here.push(id);
    return id;
  };
  return { x, y, numberOf };
};

type Segments = { a: number[]; b: number[]; left: number[]; right: number[]; inside: number[] };
type RingEdge = Readonly<{ vertex: number; inside: number }>;

const addRing = (
  ring: readonly RingEdge[],
  region: number,
  segments: Segments,
  known: Map<string, number>,
): boolean => {
  for (let i = 0; i < ring.length; i++) {
    const { vertex: from, inside } = ring[i]!;
    const to = ring[(i + 1) % ring.length]!.vertex;
    if (from === to) continue;
    const back = known.get(`${to} ${from}`);
    if (known.has(`${from} ${to}`)) return false;
    if (back === undefined) {
      known.set(`${from} ${to}`, segments.a.push(from) - 1);
      segments.b.push(to);
      segments.left.push(region);
      segments.right.push(-1);
      segments.inside.push(inside);
    } else {
      if (segments.right[back] !== -1) return false;
      segments.right[back] = region;
    }
  }
  return true;
};

/**
 * The graph of the regions' boundaries: arcs as area-matched chords, vertices nearer than the touching distance merged,
 * edges that two regions share kept once.
 * @param regions disjoint, noded against each other (touching edges have equal ends), mm.
 * @param chordsPerCircle for arcs.
 * @returns `torsion.overlap` where two regions lie on the same side of one edge; `torsion.noArea` where nothing is left.
 */
export const boundaryGraph = (
  regions: readonly MeshRegion[],
  chordsPerCircle: number,
): Result<BoundaryGraph> => {
  const first = regions[0]?.region.outer[0];
  if (first === undefined)
    return err({ code: "torsion.noArea", detail: "There is no area to mesh: add a part." });
  const origin = { x: first.x, y: first.y };
  const { x, y, numberOf } = vertexNumbering();
  const segments: Segments = { a: [], b: [], left: [], right: [], inside: [] };
  const known = new Map<string, number>();
  for (const [index, { region }] of regions.entries()) {
    for (const ring of [region.outer, ...region.holes] as readonly Ring[]) {
      const edges = chordRing(ring, chordsPerCircle).map((p) => ({
        vertex: numberOf(p.x - origin.x, p.y - origin.y),
        inside: p.inside,
      }));
      if (!addRing(edges, index, segments, known)) return err(overlap());
    }
  }
  return ok(withoutStraightVertices({ origin, x, y, ...segments }));
};

/** A vertex nearer than this to the line through its neighbours lies on it, mm. */
const STRAIGHT_MM = 1e-7;

/** The graph without vertices that only divide a straight boundary in two. */
const withoutStraightVertices = (graph: BoundaryGraph): BoundaryGraph => {
  const { origin, x, y } = graph;
  const a = [...graph.a];
  const b = [...graph.b];
  const left = [...graph.left];
  const right = [...graph.right];
  const incident: number[][] = x.map(() => []);
  const joined = new Set<string>();
  a.forEach((from, s) => {
    incident[from]!.push(s);
    incident[b[s]!]!.push(s);
    joined.add(`${Math.min(from, b[s]!)} ${Math.max(from, b[s]!)}`);
  });
  const gone = new Set<number>();
  x.forEach((_, v) => {
    const [s, t, more] = incident[v]!;
    if (s === undefined || t === undefined || more !== undefined) return;
    const [into, out] = b[s] === v ? [s, t] : [t, s];
    if (b[into] !== v || a[out] !== v || left[into] !== left[out] || right[into] !== right[out]) return;
    const [p, q] = [a[into]!, b[out]!];
    const [dx, dy] = [x[q]! - x[p]!, y[q]! - y[p]!];
    const length = Math.hypot(dx, dy);
    const along = (x[v]! - x[p]!) * dx + (y[v]! - y[p]!) * dy;
    const off = Math.abs((x[v]! - x[p]!) * dy - (y[v]! - y[p]!) * dx);
    if (length === 0 || off > STRAIGHT_MM * length || along <= 0 || along >= length * length) return;
    const key = `${Math.min(p, q)} ${Math.max(p, q)}`;
    if (joined.has(key)) return;
    joined.add(key);
    b[into] = q;
    incident[q] = incident[q]!.map((e) => (e === out ? into : e));
    gone.add(out);
  });
  const kept = a.map((_, s) => s).filter((s) => !gone.has(s));
  const pick = (values: readonly number[]) => kept.map((s) => values[s]!);
  return {
    origin,
    x,
    y,
    a: pick(a),
    b: pick(b),
    left: pick(left),
    right: pick(right),
    inside: pick(graph.inside),
  };
};

/** For each region the number of its body: regions that share a segment hang together. Numbers run from 0. */
export const bodiesOf = (graph: BoundaryGraph, regionCount: number): readonly number[] => {
  const parent = Array.from({ length: regionCount }, (_, i) => i);
  const rootOf = (i: number): number => {
    let at = i;
    while (parent[at] !== at) at = parent[at]!;
    return at;
  };
  graph.left.forEach((l, s) => {
    const r = graph.right[s]!;
    if (l >= 0 && r >= 0) parent[rootOf(l)] = rootOf(r);
  });
  const numbers = new Map<number, number>();
  return parent.map((_, i) => {
    const root = rootOf(i);
    const number = numbers.get(root) ?? numbers.size;
    numbers.set(root, number);
    return number;
  });
};

/** The part of the graph that bounds the regions of one body. Vertices keep their numbers. */
export const graphOfBody = (graph: BoundaryGraph, bodies: readonly number[], body: number): BoundaryGraph => {
  const kept = graph.a
    .map((_, s) => s)
    .filter((s) => bodies[Math.max(graph.left[s]!, graph.right[s]!)] === body);
  const pick = (values: readonly number[]) => kept.map((s) => values[s]!);
  return {
    ...graph,
    a: pick(graph.a),
    b: pick(graph.b),
    left: pick(graph.left),
    right: pick(graph.right),
    inside: pick(graph.inside),
  };
};
