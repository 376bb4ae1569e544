/**
 * Legendre polynomials P_0 … P_n at z with their first derivatives.
 * @source (k+1) P_{k+1} = (2k+1) z P_k − k P_{k−1}; P'_{k+1} = P'_{k−1} + (2k+1) P_k.
 */
export const legendre = (n: number, z: number): Readonly<{ value: Float64Array; slope: Float64Array }> => {
  const value = new Float64Array(n + 1);
  const slope = new Float64Array(n + 1);
  value[0] = 1;
  if (n > 0) {
    value[1] = z;
    slope[1] = 1;
  }
  for (let k = 1; k < n; k++) {
    value[k + 1] = ((2 * k + 1) * z * value[k]! - k * value[k - 1]!) / (k + 1);
    slope[k + 1] = slope[k - 1]! + (2 * k + 1) * value[k]!;
  }
  return { value, slope };
};

/** Derivatives of P_k at z up to the second, for one k. */
export const legendreDerivatives = (k: number, z: number): readonly [number, number] => {
  const { value, slope } = legendre(k, z);
  // (P'_k)' by the recurrence of the derivatives: P''_{k+1} = P''_{k−1} + (2k+1) P'_k.
  let [before, second] = [0, 0];
  for (let j = 1; j < k; j++) [before, second] = [second, before + (2 * j + 1) * slope[j]!];
  return k === 0 ? [0, 0] : [slope[k] ?? value[0]!, second];
};

/** Points in (−1, 1) and weights of Gauss's rule, exact to degree 2n − 1. @source Newton's method on P_n. */
export const gauss = (n: number): Readonly<{ points: readonly number[]; weights: readonly number[] }> => {
  const points: number[] = [];
  const weights: number[] = [];
  for (let i = 0; i < n; i++) {
    let z = Math.cos((Math.PI * (i + 0.75)) / (n + 0.5));
    for (let step = 0; step < 20; step++) {
      const { value, slope } = legendre(n, z);
      z -= value[n]! / slope[n]!;
    }
    const slope = legendre(n, z).slope[n]!;
    points.push(z);
    weights.push(2 / ((1 - z * z) * slope * slope));
  }
  return { points, weights };
};
