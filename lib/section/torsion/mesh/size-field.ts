import type { Corner } from "@/lib/section/torsion/mesh/corners";

/** Whether an element with this longest edge (mm) and centroid is larger than wanted there. */
export type TooBig = (x: number, y: number, longest: number) => boolean;

/** Elements may be this many times as long as their distance from a corner. */
const GROWTH = 1.5;

/**
 * The wanted element size h(x) = least over the corners of max(h0, 1.5 distance), as a test.
 * @param corners of the body; without any, nothing is too big.
 */
export const sizeField = (corners: readonly Corner[]): TooBig => {
  const sorted = corners.toSorted((p, q) => p.x - q.x);
  const xs = Float64Array.from(sorted, (corner) => corner.x);
  const ys = Float64Array.from(sorted, (corner) => corner.y);
  const h0 = Float64Array.from(sorted, (corner) => corner.h0);
  const firstFrom = (x: number): number => {
    let [low, high] = [0, xs.length];
    while (low < high) {
      const middle = (low + high) >> 1;
      if (xs[middle]! < x) low = middle + 1;
      else high = middle;
    }
    return low;
  };
  return (x, y, longest) => {
    const reach = longest / GROWTH;
    for (let i = firstFrom(x - reach); i < xs.length; i++) {
      const dx = xs[i]! - x;
      if (dx >= reach) return false;
      if (h0[i]! >= longest) continue;
      const dy = ys[i]! - y;
      if (dx * dx + dy * dy < reach * reach) return true;
    }
    return false;
  };
};
