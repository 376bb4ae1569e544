import { convexHull } from "@/lib/geometry/convex-hull";
import type { Point } from "@/lib/geometry/region";
import { elasticOf } from "@/lib/section/elastic";
import { everyNumberIsFinite } from "@/lib/section/finite";
import type { Section } from "@/lib/section/section";
import { modularRatio, stiffParts, weightedBy } from "@/lib/section/stiffness";

/**
 * The kern: where a normal force may act so that the whole section is stressed in one sense.
 * @param section any section with area; transformed values where E differs.
 * @returns its corners in drawing coordinates (mm), anticlockwise: one for each side of the convex polygon round the
 * section. Round an arc the sides are tangents at most 5° apart: the polygon never leaves the true kern, and falls short of
 * it by no more than if the arc stood out by another 0.1 % of its radius. Null where no part has area, or outlines cross themselves.
 * @source A force at e (from the centroid) gives σ ∝ 1 + A·pᵀM⁻¹e with M = [[∫x², ∫xy], [∫xy, ∫y²]]; σ vanishes on the
 * tangent p·n = d for e = −M·n/(A·d).
 */
export const kern = (section: Section): readonly Point[] | null => {
  const parts = stiffParts(section);
  const elastic = elasticOf(weightedBy(parts, modularRatio(section.reference)));
  if (elastic === null) return null;
  const { area, Ix, Iy, Ixy, centroid } = elastic.values;
  const hull = convexHull(parts.flatMap((part) => part.regions));
  const corners = hull.map((a, i) => {
    const b = hull[(i + 1) % hull.length] ?? a;
    const length = Math.hypot(b.x - a.x, b.y - a.y);
    const n = { x: (b.y - a.y) / length, y: (a.x - b.x) / length };
    const d = (a.x - centroid.x) * n.x + (a.y - centroid.y) * n.y;
    return {
      x: centroid.x - (Iy * n.x + Ixy * n.y) / (area * d),
      y: centroid.y - (Ixy * n.x + Ix * n.y) / (area * d),
    };
  });
  return everyNumberIsFinite(corners) ? corners : null;
};
