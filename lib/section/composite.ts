import { elasticOf } from "@/lib/section/elastic";
import type { PlainProperties, StressFactor } from "@/lib/section/properties";
import type { Material, SectionPart } from "@/lib/section/section";
import { differs, modularRatio, weightedBy } from "@/lib/section/stiffness";

/**
 * Plain geometric values (every part with weight 1) where E differs between parts; null where it does not, since the
 * transformed values are then the plain ones up to the one ratio of E.
 */
export const plainProperties = (
  parts: readonly SectionPart[],
  reference: Material,
): PlainProperties | null => {
  const transformed =
    differs(parts, (material) => material.E) || parts.some((p) => p.material.E !== reference.E);
  const elastic = transformed ? elasticOf(weightedBy(parts, () => 1)) : null;
  if (elastic === null) return null;
  const { area, centroid, Ix, Iy, Ixy, I1, I2, angle, Sx, Sy, rx, ry } = elastic.values;
  return { area, centroid, Ix, Iy, Ixy, I1, I2, angle, Sx, Sy, rx, ry };
};

/**
 * For each material of the section, the factor that turns M/S of the transformed section into the stress in it.
 * @source Transformed-section method: equal strain, so σ = n·σ_ref with n = E/E_ref.
 */
export const stressFactors = (
  parts: readonly SectionPart[],
  reference: Material,
): readonly StressFactor[] => {
  const byId = new Map(parts.map((part) => [part.material.id, part.material]));
  return [...byId.values()].map((material) => ({
    material: material.id,
    name: material.name,
    factor: modularRatio(reference)(material),
  }));
};
