import { regionArea } from "@/lib/geometry/ring";
import type { Section } from "@/lib/section/section";

/**
 * Mass of each part, kg/m: net area (mm², overlaps counted once, cut-outs taken away) × density (kg/m³) / 10⁶.
 * @param section parts that are drawn but do not count for mass are not in it.
 * @returns one entry for each part of the section, by part id.
 */
export const partMasses = (section: Section): ReadonlyMap<string, number> =>
  new Map(
    section.parts.map((part) => [
      part.id,
      (part.regions.reduce((sum, region) => sum + regionArea(region), 0) * part.material.density) / 1e6,
    ]),
  );
