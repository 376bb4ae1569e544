import type { Space } from "@/lib/section/torsion/element/space";
import { unknownsOf } from "@/lib/section/torsion/element/space";
import type { Pacer } from "@/lib/section/torsion/pacer";
import { giveBack, take, type Arena, type Arenas } from "@/lib/section/torsion/solve/arena";
import { eliminate } from "@/lib/section/torsion/solve/front";
import type { BisectionTree } from "@/lib/section/torsion/solve/nested-bisection";

/**
 * Writes an element's matrix (n × n by rows) and its right-hand sides (one after the other, n each).
 */
export type ElementSystem = (t: number, matrix: Float64Array, sides: Float64Array) => void;

/** Loads on single unknowns beside those of the elements. */
export type PointLoad = Readonly<{ unknown: number; side: number; value: number }>;

/** An eliminated front: its factor's `count` columns stand in the arena from `at`, `size` + sides rows of them. */
type Kept = Readonly<{ unknowns: Int32Array; count: number; size: number; at: number }>;
/** What a node leaves to its parent: the Schur complement of `unknowns`, right-hand sides below it, in the arena from `at`. */
type Passed = Readonly<{ things: readonly number[]; unknowns: Int32Array; at: number }>;

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
 * @param arenas to work in; nothing else may use them until this ends.
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
  arenas: Arenas,
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
  const { factors, passedOn, front } = arenas;
  giveBack(factors, 0);
  giveBack(passedOn, 0);
  const passed: (Passed | undefined)[] = [];

  const gather = (node: number): readonly [number[], number[]] => {
    const [lo, hi] = [tree.low[node]!, tree.high[node]!];
    const [done, open]: [number[], number[]] = [[], []];
    const note = (thing: number): void => {
      if (thing < 0 || seen[thing] === node) return;
      seen[thing] = node;
      (first[thing]! >= lo && last[thing]! < hi ? done : open).push(thing);
    };
    for (const child of [tree.left[node]!, tree.right[node]!]) passed[child]?.things.forEach(note);
    if (tree.left[node]! < 0)
      for (let i = lo; i < hi; i++)
        for (let k = 7 * tree.order[i]!; k < 7 * tree.order[i]! + 7; k++) note(things[k]!);
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

  const addChild = ({ unknowns, at }: Passed, a: Float64Array, size: number): void => {
    const m = unknowns.length;
    const schur = passedOn.data;
    for (let i = 0; i < m; i++) {
      const row = place[unknowns[i]!]!;
      for (let j = 0, k = at + i * m; j <= i; j++, k++) {
        const column = place[unknowns[j]!]!;
        if (column <= row) a[row * size + column]! += schur[k]!;
        else a[column * size + row]! += schur[k]!;
      }
    }
    for (let side = 0; side < sides; side++)
      for (let j = 0, k = at + (m + side) * m; j < m; j++, k++)
        a[(size + side) * size + place[unknowns[j]!]!]! += schur[k]!;
  };

  for (let node = 0; node < tree.low.length; node++) {
    if (pacer.due()) yield;
    const [done, open] = gather(node);
    const unknowns = spread([...done, ...open]);
    const size = unknowns.length;
    const rows = size + sides;
    giveBack(front, 0);
    take(front, rows * size);
    const a = front.data;
    a.fill(0, 0, rows * size);
    unknowns.forEach((u, i) => {
      place[u] = i;
    });
    const count = done.reduce((sum, thing) => sum + start[thing + 1]! - start[thing]!, 0);
    for (let i = 0; i < count; i++)
      for (const { side, value } of extra.get(unknowns[i]!) ?? []) a[(size + side) * size + i]! += value;
    let lowest = passedOn.used;
    for (const child of [tree.left[node]!, tree.right[node]!]) {
      const from = passed[child];
      if (from === undefined) continue;
      addChild(from, a, size);
      lowest = Math.min(lowest, from.at);
      passed[child] = undefined;
    }
    // Children are the last to have passed anything on: their place is free again.
    giveBack(passedOn, lowest);
    if (tree.left[node]! < 0)
      for (let i = tree.low[node]!; i < tree.high[node]!; i++) addElement(tree.order[i]!, a, size);
    if (!eliminate({ size, rows, a }, count)) return null;
    kept.push({ unknowns, count, size, at: copyBlock(a, size, [0, rows], [0, count], factors) });
    passed[node] = {
      things: open,
      unknowns: unknowns.subarray(count),
      at: copyBlock(a, size, [count, rows], [count, size], passedOn),
    };
  }
  return backSubstitute(kept, factors.data, total, sides);
}

/** Copies rows × columns of a front, given as from and to, into an arena; returns where. */
const copyBlock = (
  a: Float64Array,
  size: number,
  [top, bottom]: readonly [number, number],
  [left, right]: readonly [number, number],
  into: Arena,
): number => {
  const width = right - left;
  const at = take(into, (bottom - top) * width);
  const { data } = into;
  for (let i = top, k = at; i < bottom; i++)
    for (let j = i * size + left, end = i * size + right; j < end; j++, k++) data[k] = a[j]!;
  return at;
};

const backSubstitute = (
  kept: readonly Kept[],
  factor: Float64Array,
  total: number,
  sides: number,
): readonly Float64Array[] =>
  Array.from({ length: sides }, (_, side) => {
    const x = new Float64Array(total);
    const y = new Float64Array(kept.reduce((most, { count }) => Math.max(most, count), 0));
    for (let f = kept.length - 1; f >= 0; f--) {
      const { unknowns, count, size, at } = kept[f]!;
      const own = at + (size + side) * count;
      for (let i = 0; i < count; i++) y[i] = factor[own + i]!;
      for (let k = count; k < size; k++) {
        const value = x[unknowns[k]!]!;
        const row = at + k * count;
        for (let i = 0; i < count; i++) y[i]! -= factor[row + i]! * value;
      }
      for (let i = count - 1; i >= 0; i--) {
        const value = y[i]! / factor[at + i * count + i]!;
        x[unknowns[i]!] = value;
        const row = at + i * count;
        for (let k = 0; k < i; k++) y[k]! -= factor[row + k]! * value;
      }
    }
    return x;
  });
