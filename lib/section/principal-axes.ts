/** Second moments about the centroid in axes x–y, mm⁴. */
export type SecondMoments = Readonly<{ Ix: number; Iy: number; Ixy: number }>;

/** I1 ≥ I2, mm⁴; `angle` in degrees from +x anticlockwise to axis 1, in (−90, 90]; `any` when every axis is principal. */
export type PrincipalAxes = Readonly<{ I1: number; I2: number; angle: number; any: boolean }>;

/** Below this share of I1 + I2 the difference I1 − I2 is rounding: every axis is principal and the angle means nothing. */
export const ROUND_REL = 1e-9;

/** Below this share of Ix + Iy the product Ixy is the rounding of a sum that should vanish. */
export const PRODUCT_ROUNDING_REL = 1e-13;

/** A tilt of the axes below this (radians) is rounding of the coordinates. It keeps −90° from standing for 90°. */
const TILT_RAD = 1e-12;

/**
 * Principal second moments and the angle of axis 1.
 * @returns angle 0 and `any` true where I1 − I2 ≤ 1e-9 (I1 + I2), as for a circle or a square.
 * @source I1,2 = (Ix + Iy)/2 ± √(((Ix − Iy)/2)² + Ixy²), tan 2θ = −2Ixy/(Ix − Iy): Mohr's circle. I2 is taken from the
 * invariant I1·I2 = Ix·Iy − Ixy² where that loses fewer digits than the difference.
 */
export const principalAxes = ({ Ix, Iy, Ixy }: SecondMoments): PrincipalAxes => {
  const mean = (Ix + Iy) / 2;
  const radius = Math.hypot((Ix - Iy) / 2, Ixy);
  const I1 = mean + radius;
  if (2 * radius <= ROUND_REL * 2 * mean) return { I1, I2: mean - radius, angle: 0, any: true };
  const product = Math.abs(Ixy) <= TILT_RAD * 2 * radius ? 0 : Ixy;
  const I2 = product === 0 ? Math.min(Ix, Iy) : (Ix * Iy - Ixy * Ixy) / I1;
  const half = (Math.atan2(-2 * product, Ix - Iy) * 90) / Math.PI;
  const angle = half <= -90 ? 90 : half;
  return { I1: product === 0 ? Math.max(Ix, Iy) : I1, I2, angle: angle === 0 ? 0 : angle, any: false };
};
