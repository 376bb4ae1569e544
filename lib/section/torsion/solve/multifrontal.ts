import type { Space } from "@/lib/section/torsion/element/space";
import { unknownsOf } from "@/lib/section/torsion/element/space";
import type { Pacer } from "@/lib/section/torsion/pacer";
import { eliminate } from "@/lib/section/torsion/solve/front";
import type { BisectionTree } from "@/lib/section/torsion/solve/nested-bisection";

/**
 * Writes an element's matrix (n × n by rows) and its right-hand sides (one after the other, n each).
 */
export type ElementSystem = (t: number, matrix: Float64Array, sides: Float64Array) => void;

/** Loads on single unknowns beside those of the elements. */
export type PointLoad = Readonly<{ unknown: number; side: number; value: number }>;

type Kept = Readonly<{ unknowns: Int32Array; count: number; size: number; factor: Float64Array }>;
type Passed = Readonly<{
  things: Int32Array;
  unknowns: Int32Array;
  schur: Float64Array;
  size: number;
  rows: number;
}>;

/** First and last place, in the tree's order, of an element that carries a thing. */
const spans = (space: Space, tree: BisectionTree): Readonly<{ first: Int32Array; last: Int32Array }> => {
  const things = space.start.length - 1;
  const first = new Int32Array(things).fill(-1);
  const last = new Int32Array(things);
  tree.order.forEach((t, place) => {
    for (let k = 7 * t; k < 7 * t + 7; k++) {
      const thing = space.things[k]!;
      if (thing < 0) continue;
      if (first[thing]! < 0) first[thing] = place;
      last[thing] = place;
    }
  });
  return { first, last };
};

/**
 * Solves a symmetric positive definite finite-element system for several right-hand sides by the multifrontal Cholesky
 * method over a bisection tree: a node's unknowns are eliminated when all elements that carry them lie below it.
 * @param sides number of right-hand sides.
 * @returns one vector of unknowns to a side, or null where the matrix is not positive definite.
 * @yields about every 8 ms.
 * @source I. Duff & J. Reid, ACM TOMS 9 (1983).
 */
export function* solveMultifrontal(
  space: Space,
  tree: BisectionTree,
  system: ElementSystem,
  sides: number,
  loads: readonly PointLoad[],
  pacer: Pacer,
): Generator<void, readonly Float64Array[] | null> {
  const { start, things } = space;
  const total = start[start.length - 1]!;
  const { first, last } = spans(space, tree);
  const seen = new Int32Array(start.length - 1).fill(-1);
  const place = new Int32Array(total);
  const n = space.element.n;
  const [matrix, right] = [new Float64Array(n * n), new Float64Array(n * sides)];
  const own = new Int32Array(n);
  const extra = new Map<number, PointLoad[]>();
  for (const load of loads) extra.set(load.unknown, [...(extra.get(load.unknown) ?? []), load]);
  const kept: Kept[] = [];
  const passed: (Passed | undefined)[] = [];

  const gather = (node: number): readonly [number[], number[]] => {
    const [lo, hi] = [tree.low[node]!, tree.high[node]!];
    const [done, open]: [number[], number[]] = [[], []];
    const take = (thing: number): void => {
      if (thing < 0 || seen[thing] === node) return;
      seen[thing] = node;
      (first[thing]! >= lo && last[thing]! < hi ? done : open).push(thing);
    };
    for (const child of [tree.left[node]!, tree.right[node]!]) passed[child]?.things.forEach(take);
    if (tree.left[node]! < 0)
      for (let i = lo; i < hi; i++)
        for (let k = 7 * tree.order[i]!; k < 7 * tree.order[i]! + 7; k++) take(things[k]!);
    return [done, open];
  };

  const spread = (list: readonly number[]): Int32Array => {
    let size = 0;
    for (const thing of list) size += start[thing + 1]! - start[thing]!;
    const unknowns = new Int32Array(size);
    let at = 0;
    for (const thing of list) for (let u = start[thing]!; u < start[thing + 1]!; u++) unknowns[at++] = u;
    return unknowns;
  };

  const addElement = (t: number, a: Float64Array, size: number): void => {
    system(t, matrix, right);
    unknownsOf(space, t, own);
    for (let i = 0; i < n; i++) {
      if (own[i]! < 0) continue;
      const row = place[own[i]!]!;
      for (let j = 0; j < n; j++) {
        if (own[j]! < 0) continue;
        const column = place[own[j]!]!;
        if (column <= row) a[row * size + column]! += matrix[i * n + j]!;
      }
      for (let side = 0; side < sides; side++) a[(size + side) * size + row]! += right[side * n + i]!;
    }
  };

  const addChild = ({ unknowns, schur, size: own_ }: Passed, a: Float64Array, size: number): void => {
    const m = unknowns.length;
    for (let i = 0; i < m; i++) {
      const row = place[unknowns[i]!]!;
      for (let j = 0; j <= i; j++) {
        const column = place[unknowns[j]!]!;
        const value = schur[i * own_ + j]!;
        if (column <= row) a[row * size + column]! += value;
        else a[column * size + row]! += value;
      }
    }
    for (let side = 0; side < sides; side++)
      for (let j = 0; j < m; j++)
        a[(size + side) * size + place[unknowns[j]!]!]! += schur[(m + side) * own_ + j]!;
  };

  for (let node = 0; node < tree.low.length; node++) {
    if (pacer.due()) yield;
    const [done, open] = gather(node);
    const unknowns = spread([...done, ...open]);
    const size = unknowns.length;
    const rows = size + sides;
    const a = new Float64Array(rows * size);
    unknowns.forEach((u, i) => {
      place[u] = i;
    });
    const count = done.reduce((sum, thing) => sum + start[thing + 1]! - start[thing]!, 0);
    for (let i = 0; i < count; i++)
      for (const { side, value } of extra.get(unknowns[i]!) ?? []) a[(size + side) * size + i]! += value;
    for (const child of [tree.left[node]!, tree.right[node]!]) {
      const from = passed[child];
      if (from === undefined) continue;
      addChild(from, a, size);
      passed[child] = undefined;
    }
    if (tree.left[node]! < 0)
      for (let i = tree.low[node]!; i < tree.high[node]!; i++) addElement(tree.order[i]!, a, size);
    if (!eliminate({ size, rows, a }, count)) return null;
    kept.push({ unknowns, count, size, factor: columnsOf(a, rows, size, count) });
    const rest = size - count;
    passed[node] = {
      things: Int32Array.from(open),
      unknowns: unknowns.subarray(count),
      schur: restOf(a, rows, size, count),
      size: rest,
      rows: rest + sides,
    };
  }
  return backSubstitute(kept, total, sides);
}

/** The first `count` columns of a front. */
const columnsOf = (a: Float64Array, rows: number, size: number, count: number): Float64Array => {
  const columns = new Float64Array(rows * count);
  for (let i = 0; i < rows; i++) columns.set(a.subarray(i * size, i * size + count), i * count);
  return columns;
};

/** The Schur complement left in a front, right-hand sides below it. */
const restOf = (a: Float64Array, rows: number, size: number, count: number): Float64Array => {
  const rest = size - count;
  const schur = new Float64Array((rows - count) * rest);
  for (let i = count; i < rows; i++)
    schur.set(a.subarray(i * size + count, i * size + size), (i - count) * rest);
  return schur;
};

const backSubstitute = (kept: readonly Kept[], total: number, sides: number): readonly Float64Array[] =>
  Array.from({ length: sides }, (_, side) => {
    const x = new Float64Array(total);
    for (let f = kept.length - 1; f >= 0; f--) {
      const { unknowns, count, size, factor } = kept[f]!;
      const y = factor.slice((size + side) * count, (size + side + 1) * count);
      for (let k = count; k < size; k++) {
        const value = x[unknowns[k]!]!;
        const row = k * count;
        for (let i = 0; i < count; i++) y[i]! -= factor[row + i]! * value;
      }
      for (let i = count - 1; i >= 0; i--) {
        const value = y[i]! / factor[i * count + i]!;
        x[unknowns[i]!] = value;
        const row = i * count;
        for (let k = 0; k < i; k++) y[k]! -= factor[row + k]! * value;
      }
    }
    return x;
  });
