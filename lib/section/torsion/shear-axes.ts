import type { Point } from "@/lib/geometry/region";
import { centralMoments } from "@/lib/geometry/moments";
import type { Section } from "@/lib/section/section";
import { modularRatio, stiffParts, weightedBy } from "@/lib/section/stiffness";

/** The shear centre in drawing coordinates, monosymmetry constants and polar radius about the shear centre, mm. */
export type ShearAxes = Readonly<{ shearCentre: Point; betaX: number; betaY: number; r0: number }>;

/** A shear centre off the centroid by less than this share of the polar radius lies on it: the solution is no finer. */
const ON_AXIS_REL = 1e-6;

/**
 * What follows from the shear centre and the exact area moments (lines and arcs, weighted by E/E_ref).
 * @returns βx = ∫ σx (x² + y²) dA − 2 ys with σx the bending stress under a unit Mx, which is (1/Ix) ∫ y (x² + y²) dA − 2 ys
 * where x–y are principal axes; βy alike; coordinates from the centroid, ys of the shear centre. Both are 0 for a doubly
 * symmetric section. r0² = (Ix + Iy)/A + xs² + ys². Null where the section has no area.
 * @source Wagner's coefficients: Trahair, Flexural-Torsional Buckling of Structures (1993), ch. 2; AISC 360, E4 for r0 (both
 * cited from memory).
 */
export const shearAxes = (section: Section, found: Point): ShearAxes | null => {
  const central = centralMoments(weightedBy(stiffParts(section), modularRatio(section.reference)));
  if (central === null) return null;
  const { centroid, moments: m } = central;
  const rp = Math.sqrt((m.xx + m.yy) / m.area);
  const onAxis = (s: number): number => (Math.abs(s) <= ON_AXIS_REL * rp ? 0 : s);
  const [xs, ys] = [onAxis(found.x - centroid.x), onAxis(found.y - centroid.y)];
  const D = m.xx * m.yy - m.xy * m.xy;
  const [ux, uy] = [m.xxx + m.xyy, m.xxy + m.yyy];
  const small = (beta: number): number => (Math.abs(beta) <= 2 * ON_AXIS_REL * rp ? 0 : beta);
  return {
    shearCentre: { x: centroid.x + xs, y: centroid.y + ys },
    betaX: small((m.xx * uy - m.xy * ux) / D - 2 * ys),
    betaY: small((m.yy * ux - m.xy * uy) / D - 2 * xs),
    r0: Math.sqrt(rp * rp + xs * xs + ys * ys),
  };
};
