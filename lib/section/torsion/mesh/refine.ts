import type { Result } from "@/lib/result";
import { err, ok } from "@/lib/result";
import type { TooBig } from "@/lib/section/torsion/mesh/size-field";
import {
  cavityAt,
  insertPoint,
  isOpen,
  next,
  previous,
  turn,
  type Triangulation,
} from "@/lib/section/torsion/mesh/triangulation";
import type { Pacer } from "@/lib/section/torsion/pacer";

/** Least angle of a triangle: 20°, the bound for which the refinement is proved to end. */
const LEAST_SINE = Math.sin((20 / 180) * Math.PI);

/** Shells round an acute vertex count as one when their radii differ by less than this share. */
const SAME_SHELL_REL = 1e-6;

type Judge = Readonly<{
  tooBig: TooBig;
  /** Ends of each drawn segment, and whether edges meet there at less than 60°. */
  ends: readonly (readonly [number, number])[];
  acute: readonly boolean[];
}>;

const squared = (t: Triangulation, a: number, b: number): number => {
  const [dx, dy] = [t.x[a]! - t.x[b]!, t.y[a]! - t.y[b]!];
  return dx * dx + dy * dy;
};

/** The end of a drawn segment that another shares, where the two meet at less than 60°; −1 without. */
const sharedAcuteEnd = ({ ends, acute }: Judge, s: number, r: number): number => {
  const [p, q] = [ends[s]!, ends[r]!];
  for (const v of p) if (acute[v] === true && (v === q[0] || v === q[1])) return v;
  return -1;
};

/** Whether the edge a–b joins two segments at the same distance from the acute vertex they share: it can get no better. */
const joinsShells = (t: Triangulation, judge: Judge, a: number, b: number): boolean => {
  const [s, r] = [t.line[a]!, t.line[b]!];
  if (s < 0 || r < 0 || s === r) return false;
  const v = sharedAcuteEnd(judge, s, r);
  if (v < 0) return false;
  const [da, db] = [Math.sqrt(squared(t, a, v)), Math.sqrt(squared(t, b, v))];
  return Math.abs(da - db) <= SAME_SHELL_REL * da;
};

const isBad = (t: Triangulation, judge: Judge, n: number): boolean => {
  const [a, b, c] = [t.corner[3 * n]!, t.corner[3 * n + 1]!, t.corner[3 * n + 2]!];
  const [ab, bc, ca] = [squared(t, a, b), squared(t, b, c), squared(t, c, a)];
  const longest = Math.sqrt(Math.max(ab, bc, ca));
  if (judge.tooBig((t.x[a]! + t.x[b]! + t.x[c]!) / 3, (t.y[a]! + t.y[b]! + t.y[c]!) / 3, longest))
    return true;
  const shortest = Math.min(ab, bc, ca);
  const twice = (t.x[b]! - t.x[a]!) * (t.y[c]! - t.y[a]!) - (t.x[c]! - t.x[a]!) * (t.y[b]! - t.y[a]!);
  // Sine of the angle opposite the shortest edge, squared: (2·area)² over the product of the other two squares.
  if (twice * twice * shortest >= LEAST_SINE * LEAST_SINE * ab * bc * ca) return false;
  const [p, q] = shortest === ab ? [a, b] : shortest === bc ? [b, c] : [c, a];
  return !joinsShells(t, judge, p, q);
};

const sees = (t: Triangulation, a: number, b: number, x: number, y: number): boolean =>
  (t.x[a]! - x) * (t.x[b]! - x) + (t.y[a]! - y) * (t.y[b]! - y) < 0;

const isEncroached = (t: Triangulation, s: number): boolean => {
  const e = t.halfOf[s]!;
  const [a, b] = [t.corner[e]!, t.corner[next(e)]!];
  return [e, t.twin[e]!].some((half) => {
    if (half < 0) return false;
    const apex = t.corner[previous(half)]!;
    return sees(t, a, b, t.x[apex]!, t.y[apex]!);
  });
};

/** Where to cut a segment: its middle, or at a power of two from the end where edges meet at less than 60°. */
const cutShare = (t: Triangulation, { acute }: Judge, a: number, b: number): number => {
  const [atA, atB] = [acute[a] === true, acute[b] === true];
  if (atA === atB) return 0.5;
  const length = Math.sqrt(squared(t, a, b));
  const shell = 2 ** Math.round(Math.log2(length / 2)) / length;
  return atA ? shell : 1 - shell;
};

/** What the walk from a triangle towards a point met: the triangle that holds it, or the segment in the way. */
type Met = Readonly<{ triangle: number; segment: number }> | null;

const walk = (t: Triangulation, from: number, x: number, y: number): Met => {
  const [a, b, c] = [t.corner[3 * from]!, t.corner[3 * from + 1]!, t.corner[3 * from + 2]!];
  const [qx, qy] = [(t.x[a]! + t.x[b]! + t.x[c]!) / 3, (t.y[a]! + t.y[b]! + t.y[c]!) / 3];
  let at = from;
  for (let steps = 0; steps < t.region.length; steps++) {
    let out = -1;
    for (let e = 3 * at; e < 3 * at + 3; e++) {
      const [p, q] = [t.corner[e]!, t.corner[next(e)]!];
      const [px, py, rx, ry] = [t.x[p]!, t.y[p]!, t.x[q]!, t.y[q]!];
      if (turn(px, py, rx, ry, x, y) >= 0) continue;
      if (turn(qx, qy, x, y, px, py) > 0 || turn(qx, qy, x, y, rx, ry) < 0) continue;
      out = e;
      break;
    }
    if (out < 0) return { triangle: at, segment: -1 };
    if (t.segment[out]! >= 0) return { triangle: at, segment: t.segment[out]! };
    at = (t.twin[out]! / 3) | 0;
  }
  return null;
};

const circumcentre = (t: Triangulation, n: number): readonly [number, number] => {
  const [a, b, c] = [t.corner[3 * n]!, t.corner[3 * n + 1]!, t.corner[3 * n + 2]!];
  const [ax, ay] = [t.x[a]!, t.y[a]!];
  const [bx, by, cx, cy] = [t.x[b]! - ax, t.y[b]! - ay, t.x[c]! - ax, t.y[c]! - ay];
  const d = 2 * (bx * cy - by * cx);
  const [bb, cc] = [bx * bx + by * by, cx * cx + cy * cy];
  return [ax + (cy * bb - by * cc) / d, ay + (bx * cc - cx * bb) / d];
};

/**
 * Refines a triangulation in place until every triangle has angles of 20° or more and the size wanted, as far as the
 * boundaries allow.
 * @param judge the wanted sizes, and the ends of the drawn segments with the vertices where they meet at less than 60°.
 * @param maxVertices more than this is refused with `torsion.tooManyVertices`.
 * @yields about every 8 ms.
 * @source J. Ruppert, J. Algorithms 18 (1995); J. Shewchuk, Comput. Geom. 22 (2002) for small angles (concentric shells).
 */
export function* refine(
  t: Triangulation,
  judge: Judge,
  maxVertices: number,
  pacer: Pacer,
): Generator<void, Result<Triangulation>> {
  const segments: number[] = t.halfOf.map((_, s) => s);
  const triangles: number[] = [];
  const queueTriangle = (n: number): void => {
    if (isBad(t, judge, n)) triangles.push(n, t.corner[3 * n]!, t.corner[3 * n + 1]!, t.corner[3 * n + 2]!);
  };
  const settle = (made: readonly number[]): void => {
    for (const n of made) {
      queueTriangle(n);
      for (let e = 3 * n; e < 3 * n + 3; e++) {
        const s = t.segment[e]!;
        if (s >= 0 && isEncroached(t, s)) segments.push(s);
      }
    }
  };
  const split = (s: number): boolean => {
    const e = t.halfOf[s]!;
    const [a, b] = [t.corner[e]!, t.corner[next(e)]!];
    const share = cutShare(t, judge, a, b);
    const [x, y] = [t.x[a]! + share * (t.x[b]! - t.x[a]!), t.y[a]! + share * (t.y[b]! - t.y[a]!)];
    const start = t.twin[e]! < 0 ? [(e / 3) | 0] : [(e / 3) | 0, (t.twin[e]! / 3) | 0];
    const cavity = cavityAt(t, x, y, start, s);
    if (!isOpen(t, x, y, cavity)) return false;
    settle(insertPoint(t, x, y, cavity, s));
    return true;
  };
  const improve = (n: number): void => {
    const [x, y] = circumcentre(t, n);
    const met = walk(t, n, x, y);
    if (met === null) return;
    if (met.segment >= 0) {
      if (split(met.segment)) requeue(n);
      return;
    }
    const cavity = cavityAt(t, x, y, [met.triangle], -1);
    const hurt = cavity.rim.filter(
      (e) => t.segment[e]! >= 0 && sees(t, t.corner[e]!, t.corner[next(e)]!, x, y),
    );
    if (hurt.length === 0) {
      if (isOpen(t, x, y, cavity)) settle(insertPoint(t, x, y, cavity, -1));
      return;
    }
    const names = hurt.map((e) => t.segment[e]!);
    if (names.map(split).includes(true)) requeue(n);
  };
  const requeue = (n: number): void => {
    if (t.region[n]! >= 0) queueTriangle(n);
  };
  for (let n = 0; n < t.region.length; n++) queueTriangle(n);
  for (;;) {
    if (t.x.length > maxVertices)
      return err({
        code: "torsion.tooManyVertices",
        detail: `The mesh for torsion would need more than ${maxVertices} points. Leave out details that do not matter, such as very thin gaps.`,
      });
    if (pacer.due()) yield;
    const s = segments.pop();
    if (s !== undefined) {
      if (isEncroached(t, s)) split(s);
      continue;
    }
    const c = triangles.pop();
    if (c === undefined) return ok(t);
    const [b, a, n] = [triangles.pop()!, triangles.pop()!, triangles.pop()!];
    const alive =
      t.region[n]! >= 0 && t.corner[3 * n] === a && t.corner[3 * n + 1] === b && t.corner[3 * n + 2] === c;
    if (alive) improve(n);
  }
}
