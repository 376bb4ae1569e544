import { incircle, orient2d } from "robust-predicates";

/**
 * A constrained Delaunay triangulation that points can be put into. Triangles run anticlockwise; half-edge 3t + k leaves
 * corner k of triangle t; `twin` is the half-edge on the other side, −1 at the outside; `segment` the constraint it lies
 * on, −1 for none; `region` of a removed triangle is −1. `halfOf` is a half-edge of each segment; `origin` the number of
 * the drawn segment it was cut from; `line` the drawn segment a vertex was put on, −1 elsewhere.
 */
export type Triangulation = {
  readonly x: number[];
  readonly y: number[];
  readonly line: number[];
  readonly corner: number[];
  readonly twin: number[];
  readonly segment: number[];
  readonly region: number[];
  readonly halfOf: number[];
  readonly origin: number[];
  readonly free: number[];
  readonly stamp: number[];
  stamped: number;
};

export const next = (e: number): number => (e % 3 === 2 ? e - 2 : e + 1);
export const previous = (e: number): number => (e % 3 === 0 ? e + 2 : e - 1);
const triangleOf = (e: number): number => (e / 3) | 0;

/** Positive where a, b, c run anticlockwise; the sign is exact (the library's own is for y down). */
export const turn = (ax: number, ay: number, bx: number, by: number, cx: number, cy: number): number =>
  -orient2d(ax, ay, bx, by, cx, cy);

/** The triangles a new point replaces, and the edges around them in pairs of half-edge and region. */
export type Cavity = Readonly<{ triangles: readonly number[]; rim: readonly number[] }>;

/** The triangles whose circle holds (x, y), reached from `start` without crossing a constraint other than `split`. */
export const cavityAt = (
  t: Triangulation,
  x: number,
  y: number,
  start: readonly number[],
  split: number,
): Cavity => {
  const mark = ++t.stamped;
  const triangles = [...start];
  for (const s of start) t.stamp[s] = mark;
  const rim: number[] = [];
  for (let i = 0; i < triangles.length; i++) {
    const base = 3 * triangles[i]!;
    for (let e = base; e < base + 3; e++) {
      const s = t.segment[e]!;
      if (s >= 0 && s === split) continue;
      const across = t.twin[e]!;
      if (s < 0 && across >= 0) {
        const other = triangleOf(across);
        if (t.stamp[other] === mark) continue;
        const [a, b, c] = [t.corner[3 * other]!, t.corner[3 * other + 1]!, t.corner[3 * other + 2]!];
        if (incircle(t.x[a]!, t.y[a]!, t.x[b]!, t.y[b]!, t.x[c]!, t.y[c]!, x, y) > 0) {
          t.stamp[other] = mark;
          triangles.push(other);
          continue;
        }
      }
      rim.push(e);
    }
  }
  // A triangle taken in later may have swallowed the far side of an edge noted before.
  const edges = rim.filter(
    (e) => t.segment[e]! >= 0 || t.twin[e]! < 0 || t.stamp[triangleOf(t.twin[e]!)] !== mark,
  );
  return { triangles, rim: edges };
};

/** Whether the whole rim sees the point; where it does not, which rounding can cause, the point must not be put in. */
export const isOpen = (t: Triangulation, x: number, y: number, { rim }: Cavity): boolean =>
  rim.every((e) => {
    const [a, b] = [t.corner[e]!, t.corner[next(e)]!];
    return turn(t.x[a]!, t.y[a]!, t.x[b]!, t.y[b]!, x, y) > 0;
  });

const newTriangle = (t: Triangulation): number => {
  const slot = t.free.pop();
  if (slot !== undefined) return slot;
  t.corner.push(0, 0, 0);
  t.twin.push(-1, -1, -1);
  t.segment.push(-1, -1, -1);
  t.stamp.push(0);
  return t.region.push(-1) - 1;
};

const join = (t: Triangulation, e: number, f: number): void => {
  t.twin[e] = f;
  if (f >= 0) t.twin[f] = e;
};

/**
 * Puts a point into the triangulation in place of its cavity.
 * @param split the segment that the point divides, or −1.
 * @returns the new triangles.
 */
export const insertPoint = (
  t: Triangulation,
  x: number,
  y: number,
  { triangles, rim }: Cavity,
  split: number,
): readonly number[] => {
  const p = t.x.push(x) - 1;
  t.y.push(y);
  t.line.push(split < 0 ? -1 : t.origin[split]!);
  const edges = rim.map((e) => ({
    a: t.corner[e]!,
    b: t.corner[next(e)]!,
    twin: t.twin[e]!,
    segment: t.segment[e]!,
    region: t.region[triangleOf(e)]!,
  }));
  const half = split < 0 ? -1 : t.halfOf[split]!;
  const [end0, end1] = half < 0 ? [-1, -1] : [t.corner[half]!, t.corner[next(half)]!];
  const second = split < 0 ? -1 : t.halfOf.push(-1) - 1;
  if (second >= 0) t.origin.push(t.origin[split]!);
  for (const old of triangles) {
    t.region[old] = -1;
    t.free.push(old);
  }
  const leaving = new Map<number, number>();
  const arriving = new Map<number, number>();
  const made = edges.map(({ a, b, twin, segment, region }) => {
    const n = newTriangle(t);
    const e = 3 * n;
    t.corner[e] = a;
    t.corner[e + 1] = b;
    t.corner[e + 2] = p;
    t.region[n] = region;
    join(t, e, twin);
    t.segment[e] = segment;
    if (segment >= 0) t.halfOf[segment] = e;
    t.twin[e + 1] = -1;
    t.twin[e + 2] = -1;
    const sideOf = (v: number): number => (v === end0 ? split : v === end1 ? second : -1);
    t.segment[e + 1] = sideOf(b);
    t.segment[e + 2] = sideOf(a);
    if (t.segment[e + 1]! >= 0) t.halfOf[t.segment[e + 1]!] = e + 1;
    if (t.segment[e + 2]! >= 0) t.halfOf[t.segment[e + 2]!] = e + 2;
    const before = arriving.get(a);
    if (before !== undefined) join(t, e + 2, before);
    else leaving.set(a, e + 2);
    const after = leaving.get(b);
    if (after !== undefined) {
      join(t, e + 1, after);
      leaving.delete(b);
    } else arriving.set(b, e + 1);
    return n;
  });
  return made;
};
