import { basisAt, sizesOf } from "@/lib/section/torsion/element/basis";
import { gauss } from "@/lib/section/torsion/element/legendre";

/**
 * Tables of the reference triangle for degree p with n functions, matrices by rows.
 * `rr`, `rs` (symmetrised: ∫(∂rNi ∂sNj + ∂sNi ∂rNj)), `ss`: ∫ of products of derivatives; `load[c·n + i]` = ∫ l_c N_i;
 * `loadR`, `loadS` = ∫ l_c ∂N_i; `mass` = ∫ N_i N_j; `samples` points of a rule exact for
 * products of derivatives (degree 2p − 2) with their weights, r, s, and derivatives of the functions there (n to a point).
 */
export type ReferenceElement = Readonly<{
  p: number;
  n: number;
  rr: Float64Array;
  rs: Float64Array;
  ss: Float64Array;
  mass: Float64Array;
  load: Float64Array;
  loadR: Float64Array;
  loadS: Float64Array;
  samples: Readonly<{
    count: number;
    weight: Float64Array;
    r: Float64Array;
    s: Float64Array;
    dr: Float64Array;
    ds: Float64Array;
  }>;
}>;

type Rule = ReferenceElement["samples"] & Readonly<{ value: Float64Array }>;

/** A rule of k × k points, exact to degree 2k − 2 on the triangle. */
const ruleOf = (p: number, k: number): Rule => {
  const { points, weights } = gauss(k);
  const { all } = sizesOf(p);
  const count = points.length ** 2;
  const samples = {
    count,
    weight: new Float64Array(count),
    r: new Float64Array(count),
    s: new Float64Array(count),
    value: new Float64Array(count * all),
    dr: new Float64Array(count * all),
    ds: new Float64Array(count * all),
  };
  points.forEach((u, i) =>
    points.forEach((v, j) => {
      const q = i * points.length + j;
      // The square collapsed onto the triangle: s = (1+v)/2, r = (1+u)/2 · (1−s).
      const s = (1 + v) / 2;
      const r = ((1 + u) / 2) * (1 - s);
      samples.r[q] = r;
      samples.s[q] = s;
      samples.weight[q] = (weights[i]! * weights[j]! * (1 - s)) / 4;
      const at = basisAt(p, r, s);
      samples.value.set(at.value, q * all);
      samples.dr.set(at.dr, q * all);
      samples.ds.set(at.ds, q * all);
    }),
  );
  return samples;
};

const build = (p: number): ReferenceElement => {
  const n = sizesOf(p).all;
  const rule = ruleOf(p, p + 1);
  const square = () => new Float64Array(n * n);
  const rows = () => new Float64Array(3 * n);
  const [rr, rs, ss, mass, load, loadR, loadS] = [
    square(),
    square(),
    square(),
    square(),
    rows(),
    rows(),
    rows(),
  ];
  for (let q = 0; q < rule.count; q++) {
    const w = rule.weight[q]!;
    const l = [1 - rule.r[q]! - rule.s[q]!, rule.r[q]!, rule.s[q]!];
    const [N, R, S] = [rule.value, rule.dr, rule.ds].map((table) => table.subarray(q * n, q * n + n)) as [
      Float64Array,
      Float64Array,
      Float64Array,
    ];
    for (let i = 0; i < n; i++) {
      for (let j = 0; j < n; j++) {
        rr[i * n + j]! += w * R[i]! * R[j]!;
        rs[i * n + j]! += w * (R[i]! * S[j]! + S[i]! * R[j]!);
        ss[i * n + j]! += w * S[i]! * S[j]!;
        mass[i * n + j]! += w * N[i]! * N[j]!;
      }
      for (let c = 0; c < 3; c++) {
        load[c * n + i]! += w * l[c]! * N[i]!;
        loadR[c * n + i]! += w * l[c]! * R[i]!;
        loadS[c * n + i]! += w * l[c]! * S[i]!;
      }
    }
  }
  return { p, n, rr, rs, ss, mass, load, loadR, loadS, samples: ruleOf(p, p) };
};

const built = new Map<number, ReferenceElement>();

/** The tables for degree p (1 to 8), worked out once. */
export const referenceElement = (p: number): ReferenceElement => {
  const known = built.get(p);
  if (known !== undefined) return known;
  const element = build(p);
  built.set(p, element);
  return element;
};
