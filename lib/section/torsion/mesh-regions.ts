import { ringArea } from "@/lib/geometry/ring";
import { arcOf, edgeLength } from "@/lib/geometry/arc";
import type { Region, Ring } from "@/lib/geometry/region";
import type { Section } from "@/lib/section/section";
import { stiffParts } from "@/lib/section/stiffness";
import type { MeshRegion } from "@/lib/section/torsion/mesh/boundary-graph";

/** The regions of the parts that count for stiffness, with G and E over those of the reference material. */
export const meshRegions = (section: Section): readonly MeshRegion[] =>
  stiffParts(section).flatMap(({ material, regions }, part) =>
    regions.map((region) => ({
      part,
      region,
      shear: material.G / section.reference.G,
      axial: material.E / section.reference.E,
    })),
  );

const LEAST_CHORDS = 64;
const MOST_CHORDS = 512;
/** The rise of a chord over its arc, as a share of the mean thickness. */
const RISE_SHARE = 0.01;

const ringsOf = ({ outer, holes }: Region): readonly Ring[] => [outer, ...holes];

/**
 * Chords to a full circle: 64, or more where the rise of a chord (radius × δ²/8) would come to 0.01 of the mean thickness,
 * twice the area over the perimeter.
 */
export const chordsFor = (regions: readonly MeshRegion[]): number => {
  let chords = LEAST_CHORDS;
  for (const { region } of regions) {
    const rings = ringsOf(region);
    const area = rings.reduce((sum, ring) => sum + ringArea(ring), 0);
    let [perimeter, radius] = [0, 0];
    for (const ring of rings)
      ring.forEach((from, i) => {
        const to = ring[(i + 1) % ring.length] ?? from;
        perimeter += edgeLength(from, to);
        radius = Math.max(radius, arcOf(from, to)?.radius ?? 0);
      });
    const thickness = (2 * area) / perimeter;
    chords = Math.max(chords, Math.PI * Math.sqrt(radius / (2 * RISE_SHARE * thickness)));
  }
  return Math.min(MOST_CHORDS, 4 * Math.ceil(chords / 4));
};
