import type { WeightedRegions } from "@/lib/geometry/moments";
import type { Material, Section, SectionPart } from "@/lib/section/section";

/** The parts that count for stiffness and strength; the others ("mass") only weigh. */
export const stiffParts = (section: Section): readonly SectionPart[] =>
  section.parts.filter((part) => part.counts === "stiffness and mass");

/** Regions of parts, each weighted by a number of its material. */
export const weightedBy = (
  parts: readonly SectionPart[],
  weightOf: (material: Material) => number,
): readonly WeightedRegions[] =>
  parts.map((part) => ({ regions: part.regions, weight: weightOf(part.material) }));

/** n = E / E_ref of a material. */
export const modularRatio =
  (reference: Material) =>
  (material: Material): number =>
    material.E / reference.E;

/** Whether a number of the material differs between parts. */
export const differs = (parts: readonly SectionPart[], numberOf: (material: Material) => number): boolean =>
  new Set(parts.map((part) => numberOf(part.material))).size > 1;
