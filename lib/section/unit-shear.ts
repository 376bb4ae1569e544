import type { ElasticValues } from "@/lib/section/elastic";

/** σ' = a·x + b·y: how the bending stress grows along the member, per unit shear force; x, y from the centroid. 1/mm⁴. */
export type StressGrowth = Readonly<{ a: number; b: number }>;

/**
 * Growth of bending stress along the member under a shear force (Vx, Vy) of 1 N, for any axes.
 * @source Jourawski with unsymmetrical bending: a = (Vx·Ix − Vy·Ixy)/D, b = (Vy·Iy − Vx·Ixy)/D, D = Ix·Iy − Ixy².
 */
export const stressGrowth = (
  { Ix, Iy, Ixy, I1, I2 }: Pick<ElasticValues, "Ix" | "Iy" | "Ixy" | "I1" | "I2">,
  direction: "x" | "y",
): StressGrowth => {
  const D = I1 * I2;
  return direction === "x" ? { a: Ix / D, b: -Ixy / D } : { a: -Ixy / D, b: Iy / D };
};
