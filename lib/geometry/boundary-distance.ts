import { distanceToEdge, ringEdges } from "@/lib/geometry/edge";
import type { Point, Region } from "@/lib/geometry/region";

/** Distance of a point from the nearest edge of a region, holes included, mm; +∞ for a region without vertices. O(n). */
export const boundaryDistance = ({ outer, holes }: Region, p: Point): number =>
  [outer, ...holes]
    .flatMap((ring) => ringEdges(ring))
    .reduce((least, edge) => Math.min(least, distanceToEdge(edge, p)), Infinity);

/** Index of the region whose boundary lies nearest to a point; −1 for an empty list. */
export const nearestRegion = (regions: readonly Region[], p: Point): number => {
  const distances = regions.map((region) => boundaryDistance(region, p));
  return distances.indexOf(distances.reduce((least, d) => Math.min(least, d), Infinity));
};
