import { centralMoments } from "@/lib/geometry/moments";
import type { Point } from "@/lib/geometry/region";
import { everyNumberIsFinite } from "@/lib/section/finite";
import { plasticAxis } from "@/lib/section/plastic";
import type { Section } from "@/lib/section/section";
import { stiffParts, weightedBy } from "@/lib/section/stiffness";

/**
 * Plastic values about an axis of given direction. `Z` in mm³ about the equal-area axis through `at`; `Mp` in N·mm about
 * the equal-force axis through `atForce` (the same axis where fy is one); `gap` and `gapForce` are the widths of the
 * strips in which such an axis may lie anywhere (0 when there is one only; the points then lie in the middle).
 */
export type PlasticAbout = Readonly<{
  Z: number;
  at: Point;
  gap: number;
  Mp: number;
  atForce: Point;
  gapForce: number;
}>;

/**
 * Z and Mp of a section about any direction.
 * @param angle of the axis, degrees from +x anticlockwise; angle + 180° gives the same.
 * @returns points of the axes nearest to the centroid of the plain area, drawing coordinates, mm. Null where no part that
 * counts for stiffness has area.
 */
export const plasticAbout = (section: Section, angle: number): PlasticAbout | null => {
  const parts = stiffParts(section);
  const areas = weightedBy(parts, () => 1);
  const centroid = centralMoments(areas)?.centroid;
  if (centroid === undefined) return null;
  const radians = (angle * Math.PI) / 180;
  const area = plasticAxis(areas, radians, centroid);
  const force = plasticAxis(
    weightedBy(parts, (material) => material.fy),
    radians,
    centroid,
  );
  if (area === null || force === null) return null;
  const at = (offset: number): Point => ({
    x: centroid.x - offset * Math.sin(radians),
    y: centroid.y + offset * Math.cos(radians),
  });
  const about = {
    Z: area.modulus,
    at: at(area.offset),
    gap: area.gap,
    Mp: force.modulus,
    atForce: at(force.offset),
    gapForce: force.gap,
  };
  return everyNumberIsFinite(about) ? about : null;
};
