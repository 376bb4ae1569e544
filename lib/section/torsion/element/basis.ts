import { legendre, legendreDerivatives } from "@/lib/section/torsion/element/legendre";

/** Number of functions of degree p on a triangle, and on one of its edges and in its inside. */
export const sizesOf = (p: number) => ({
  all: ((p + 1) * (p + 2)) / 2,
  edge: p - 1,
  inside: ((p - 1) * (p - 2)) / 2,
});

/** Corners of the edges, in the order of the edge functions. */
export const EDGE_ENDS = [
  [0, 1],
  [0, 2],
  [1, 2],
] as const;

/**
 * Values and derivatives of the hierarchical basis at (r, s) of the reference triangle (0,0), (1,0), (0,1):
 * corner functions l_i; edge functions l_i l_j D_k(l_j − l_i), D_k = 2 P'_{k+1}/(k+1), k = 0 … p − 2, for the edges 01, 02, 12;
 * inside l₀ l₁ l₂ P_a(l₁ − l₀) P_b(2l₂ − 1), a + b ≤ p − 3. Corners must be sorted by vertex number, so that edge
 * functions agree from both sides.
 * @source B. Szabó & I. Babuška, Finite Element Analysis (1991), ch. 6.
 */
export const basisAt = (
  p: number,
  r: number,
  s: number,
): Readonly<{ value: Float64Array; dr: Float64Array; ds: Float64Array }> => {
  const l = [1 - r - s, r, s];
  const lr = [-1, 1, 0];
  const ls = [-1, 0, 1];
  const { all, edge } = sizesOf(p);
  const value = new Float64Array(all);
  const dr = new Float64Array(all);
  const ds = new Float64Array(all);
  for (let i = 0; i < 3; i++) [value[i], dr[i], ds[i]] = [l[i]!, lr[i]!, ls[i]!];
  let n = 3;
  for (const [i, j] of EDGE_ENDS) {
    const [li, lj] = [l[i]!, l[j]!];
    for (let k = 0; k < edge; k++) {
      const [first, second] = legendreDerivatives(k + 1, lj - li);
      const scale = 2 / (k + 1);
      const [d, dd] = [scale * first, scale * second];
      value[n] = li * lj * d;
      dr[n] = (lr[i]! * lj + li * lr[j]!) * d + li * lj * dd * (lr[j]! - lr[i]!);
      ds[n] = (ls[i]! * lj + li * ls[j]!) * d + li * lj * dd * (ls[j]! - ls[i]!);
      n += 1;
    }
  }
  const bubble = l[0]! * r * s;
  const [bubbleR, bubbleS] = [s * (l[0]! - r), r * (l[0]! - s)];
  const u = legendre(Math.max(0, p - 3), l[1]! - l[0]!);
  const v = legendre(Math.max(0, p - 3), 2 * s - 1);
  for (let a = 0; a <= p - 3; a++)
    for (let b = 0; a + b <= p - 3; b++) {
      const [pa, pb] = [u.value[a]!, v.value[b]!];
      // l₁ − l₀ = 2r + s − 1.
      const [dar, das, dbs] = [2 * u.slope[a]!, u.slope[a]!, 2 * v.slope[b]!];
      value[n] = bubble * pa * pb;
      dr[n] = bubbleR * pa * pb + bubble * dar * pb;
      ds[n] = bubbleS * pa * pb + bubble * (das * pb + pa * dbs);
      n += 1;
    }
  return { value, dr, ds };
};
