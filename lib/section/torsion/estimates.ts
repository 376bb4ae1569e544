import type { WarpingFigures } from "@/lib/section/torsion/warping-figures";

/** Relative errors: of J, of Cw, of the shear centre over the polar radius of gyration, of the shear areas. */
export type BodyEstimates = Readonly<{
  J: number;
  Cw: number;
  shearCentre: number;
  Avx: number;
  Avy: number;
}>;

/** What an estimate of a body is made from; `Ip` = Ixx + Iyy and `area` weighted by E. `chords`: share of J that replacing
 * arcs by chords may have cost. */
export type EstimateInput = Readonly<{
  Jlower: number;
  high: WarpingFigures;
  low: WarpingFigures;
  Ip: number;
  area: number;
  chords: number;
}>;

/** Five times the change from degree p − 1 to p: the change alone is too small in 40 % of cases (r^(2/3) at corners). */
const CHANGE = 5;
const OF_SHEAR_CENTRE = 0.25;
const OF_CW = 1;

/** Below this share of Ip²/A a warping constant counts as none, and its error is judged against that. */
export const NO_CW_REL = 1e-6;

const between = (a: number, b: number): number => Math.abs(a - b) / Math.abs(a);

/**
 * Error estimates of one body, relative.
 * @returns J: half the distance of its bounds, which is rigorous for the meshed polygon; shear centre: 5|S_p − S_{p−1}| +
 * 0.25 g r_p; Cw: 5|Cw_p − Cw_{p−1}| + g Cw, over the greater of Cw and 1e-6 Ip²/A; shear areas: 5|Av_p − Av_{p−1}| +
 * g Av; each with what the chords cost. g = (J_up − J_lo)/2J.
 * @source The factors were fitted on 73 shapes of two meshes each, on which no estimate was too small; the share of g in Cw was
 * 0.75 there and left a square with a small square hole 0.5 % outside (an example in tests/long).
 */
export const estimatesOf = ({ Jlower, high, low, Ip, area, chords }: EstimateInput): BodyEstimates => {
  const J = (high.Jupper + Jlower) / 2;
  const g = Math.abs(high.Jupper - Jlower) / (2 * J);
  const rp = Math.sqrt(Ip / area);
  const moved = Math.hypot(high.shearCentre.x - low.shearCentre.x, high.shearCentre.y - low.shearCentre.y);
  const CwSize = Math.max(high.Cw, (NO_CW_REL * Ip * Ip) / area);
  return {
    J: g + chords,
    shearCentre: (CHANGE * moved) / rp + OF_SHEAR_CENTRE * g + chords,
    Cw: (CHANGE * Math.abs(high.Cw - low.Cw) + OF_CW * g * high.Cw) / CwSize + chords,
    Avx: CHANGE * between(high.Avx, low.Avx) + g + chords,
    Avy: CHANGE * between(high.Avy, low.Avy) + g + chords,
  };
};
