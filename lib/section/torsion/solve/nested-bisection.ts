/**
 * A tree over the elements: `order` lists them; node i holds order[low[i]] … order[high[i] − 1] and has the children
 * left[i], right[i] (−1 for a leaf). Children come before their parent; the last node is the root.
 */
export type BisectionTree = Readonly<{
  order: Int32Array;
  low: readonly number[];
  high: readonly number[];
  left: readonly number[];
  right: readonly number[];
}>;

const LEAF = 4;
/** The cut lies in the middle two fifths of the elements. */
const MARGIN = 0.3;

/**
 * Orders elements by nested bisection: each set is walked breadth-first from an element at its far end and cut where the
 * fewest edges are crossed.
 * @param twin half-edges of the mesh, three to an element, −1 at boundaries.
 * @source A. George, Nested dissection (1973); level structures from a pseudo-peripheral element.
 */
export const nestedBisection = (twin: Int32Array): BisectionTree => {
  const count = twin.length / 3;
  const order = Int32Array.from({ length: count }, (_, i) => i);
  const set = new Int32Array(count);
  const walked = new Int32Array(count);
  const found = new Int32Array(count);
  let [sets, walks] = [0, 0];
  const low: number[] = [];
  const high: number[] = [];
  const left: number[] = [];
  const right: number[] = [];

  const walk = (lo: number, hi: number, start: number): void => {
    walks += 1;
    const id = set[order[lo]!]!;
    let [end, restart] = [0, lo];
    found[end++] = start;
    walked[start] = walks;
    for (let i = 0; i < hi - lo; i++) {
      if (i === end) {
        while (walked[order[restart]!] === walks) restart += 1;
        walked[order[restart]!] = walks;
        found[end++] = order[restart]!;
      }
      const t = found[i]!;
      for (let e = 3 * t; e < 3 * t + 3; e++) {
        if (twin[e]! < 0) continue;
        const other = (twin[e]! / 3) | 0;
        if (set[other] !== id || walked[other] === walks) continue;
        walked[other] = walks;
        found[end++] = other;
      }
    }
  };

  const cutOf = (lo: number, hi: number): number => {
    const size = hi - lo;
    const [from, to] = [
      Math.max(1, Math.floor(MARGIN * size)),
      Math.min(size - 1, Math.ceil((1 - MARGIN) * size)),
    ];
    walks += 1;
    let [crossed, best, least] = [0, from, Infinity];
    const id = set[order[lo]!]!;
    for (let i = 0; i < to; i++) {
      const t = order[lo + i]!;
      walked[t] = walks;
      for (let e = 3 * t; e < 3 * t + 3; e++) {
        if (twin[e]! < 0) continue;
        const other = (twin[e]! / 3) | 0;
        if (set[other] === id) crossed += walked[other] === walks ? -1 : 1;
      }
      const taken = i + 1;
      if (taken < from) continue;
      const nearer = Math.abs(2 * taken - size) < Math.abs(2 * best - size);
      if (crossed < least || (crossed === least && nearer)) [best, least] = [taken, crossed];
    }
    return lo + best;
  };

  const divide = (lo: number, hi: number): number => {
    let children = [-1, -1];
    if (hi - lo > LEAF) {
      sets += 1;
      for (let i = lo; i < hi; i++) set[order[i]!] = sets;
      walk(lo, hi, order[lo]!);
      walk(lo, hi, found[hi - lo - 1]!);
      order.set(found.subarray(0, hi - lo), lo);
      const cut = cutOf(lo, hi);
      children = [divide(lo, cut), divide(cut, hi)];
    }
    low.push(lo);
    high.push(hi);
    left.push(children[0]!);
    return right.push(children[1]!) - 1;
  };
  if (count > 0) divide(0, count);
  return { order, low, high, left, right };
};
