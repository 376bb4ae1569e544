/**
 * Integrals over the circular segment between a chord and its arc, in the frame of the chord: u along the chord from its
 * middle, v from the chord towards the arc. Those with an odd power of u vanish. mm² to mm⁵.
 */
export type SegmentIntegrals = Readonly<{
  area: number;
  v: number;
  uu: number;
  vv: number;
  uuv: number;
  vvv: number;
}>;

/** Half angles up to this use the series: the closed form loses digits as 1/α⁴ there, the series converges as (α²/7)ⁿ. */
const SERIES_UP_TO_RAD = 0.3;

/**
 * Maclaurin coefficients in the half angle α of the closed forms below, for a chord of length 1. Each row belongs to
 * α^k, α^(k+2), … with the lowest power k beside it. Derived by exact rational arithmetic from the closed forms.
 */
const SERIES = {
  area: [1 / 6, 1 / 45, 1 / 315, 2 / 4725, 1 / 18711, 1382 / 212837625, 2 / 2606175, 14468 / 162820783125],
  v: [
    1 / 60,
    1 / 252,
    1 / 1350,
    1 / 8316,
    691 / 38697750,
    1 / 400950,
    3617 / 10854718875,
    43867 / 1019066548500,
  ],
  uu: [
    1 / 120,
    1 / 630,
    1 / 3150,
    1 / 17325,
    823 / 85135050,
    323 / 212837625,
    1 / 4417875,
    701626 / 21655164155625,
  ],
  vv: [
    1 / 420,
    1 / 1260,
    19 / 103950,
    397 / 11351340,
    2539 / 425675250,
    53 / 56388150,
    336341 / 2406129350625,
    3790121 / 190565444569500,
  ],
  uuv: [
    1 / 1680,
    1 / 5040,
    1 / 19800,
    823 / 75675600,
    323 / 154791000,
    13 / 35343000,
    350813 / 5774710441500,
    164333 / 17245741590000,
  ],
  vvv: [
    1 / 2520,
    1 / 5940,
    83 / 1801800,
    157 / 15479100,
    133 / 68161500,
    9403 / 27498621150,
    6270809 / 112097320335000,
    2574227 / 296594338540500,
  ],
} as const;

const inSquare = (coefficients: readonly number[], square: number): number =>
  coefficients.reduceRight((sum, c) => sum * square + c, 0);

const bySeries = (chord: number, alpha: number): SegmentIntegrals => {
  const square = alpha * alpha;
  const [L2, L3] = [chord * chord, chord * chord * chord];
  return {
    area: L2 * alpha * inSquare(SERIES.area, square),
    v: L3 * square * inSquare(SERIES.v, square),
    uu: L2 * L2 * alpha * inSquare(SERIES.uu, square),
    vv: L2 * L2 * alpha * square * inSquare(SERIES.vv, square),
    uuv: L2 * L3 * square * inSquare(SERIES.uuv, square),
    vvv: L2 * L3 * square * square * inSquare(SERIES.vvv, square),
  };
};

/**
 * Integrals of 1, v, u², v², u²v and v³ over the segment cut off by a chord.
 * @param chord length of the chord, mm, > 0.
 * @param bulge |tan(included angle / 4)|, > 0; above 1 the segment is more than a half circle.
 * @source With w from the circle's centre towards the arc, half angle α, s = sin α, c = cos α: ∫1 = r²(α − sc),
 * ∫w = ⅔r³s³, ∫w² = r⁴[(α − sc)/4 + s³c/2], ∫u² = r⁴[α/4 − sin 2α/6 + sin 4α/48], ∫w³ = 2r⁵(s³/3 − s⁵/5),
 * ∫u²w = 2r⁵s⁵/15, by substituting w = r cos t; then shifted from the centre to the chord (v = w − rc).
 */
export const segmentIntegrals = (chord: number, bulge: number): SegmentIntegrals => {
  const alpha = 2 * Math.atan(bulge);
  if (alpha <= SERIES_UP_TO_RAD) return bySeries(chord, alpha);
  const square = bulge * bulge;
  const s = (2 * bulge) / (1 + square);
  const c = (1 - square) / (1 + square);
  const r = (chord * (1 + square)) / (4 * bulge);
  const s3 = s * s * s;
  const s5 = s3 * s * s;
  const area = alpha - s * c;
  const w = (2 / 3) * s3;
  const ww = area / 4 + (s3 * c) / 2;
  const uu = alpha / 4 - Math.sin(2 * alpha) / 6 + Math.sin(4 * alpha) / 48;
  const www = 2 * (s3 / 3 - s5 / 5);
  const uuw = (2 / 15) * s5;
  const r2 = r * r;
  return {
    area: r2 * area,
    v: r2 * r * (w - c * area),
    uu: r2 * r2 * uu,
    vv: r2 * r2 * (ww - 2 * c * w + c * c * area),
    uuv: r2 * r2 * r * (uuw - c * uu),
    vvv: r2 * r2 * r * (www - 3 * c * ww + 3 * c * c * w - c * c * c * area),
  };
};
