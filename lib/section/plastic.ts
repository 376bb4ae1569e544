import { bracketedRoot } from "@/lib/geometry/bracketed-root";
import { stripsAlong, type Strips } from "@/lib/geometry/half-plane-integrals";
import type { WeightedRegions } from "@/lib/geometry/moments";
import type { Point } from "@/lib/geometry/region";

/**
 * An axis that halves the weighted area, parallel to a given direction.
 * `offset` is its distance from the origin along the normal, mm; `gap` the width of the strip in which any axis halves
 * the area (0 when there is one axis only; else `offset` is its middle); `modulus` = ∫|s − offset| dA: Z in mm³ for
 * weight 1, Mp in N·mm for weight fy; `total` the weighted area.
 */
export type PlasticAxis = Readonly<{ offset: number; gap: number; modulus: number; total: number }>;

/** The axis is found to this share of the depth across it: far below what any coordinate of a drawing resolves. */
const AXIS_REL = 1e-15;

/** Halves equal to this share of the area are equal: what rounding leaves of a sum over thousands of edges. */
const HALF_REL = 1e-12;

/** An axis where the section is narrower than this share of A/depth may lie in a gap, which is then measured. */
const NARROW_REL = 1e-6;

const edgeOfGap = (strips: Strips, half: number, slack: number, from: number, to: number): number => {
  let [inside, outside] = [from, to];
  for (let i = 0; i < 60; i += 1) {
    const middle = (inside + outside) / 2;
    if (Math.abs(strips.below(middle).area - half) <= slack) inside = middle;
    else outside = middle;
  }
  return inside;
};

/**
 * The equal-area (or equal-force) axis parallel to a direction, and the plastic modulus about it.
 * @param sets regions with weights: 1 for geometry, fy for forces.
 * @param angle of the axis, radians from +x anticlockwise. The normal points to its left (up, for an axis along +x).
 * @param origin from which `offset` is measured; take it near the section.
 * @returns null where the weighted area is not positive. The modulus does not depend on where in a gap the axis lies.
 * @source Plastic bending: equal forces on both sides of the axis; the halves by Green's theorem, exact over arcs.
 */
export const plasticAxis = (
  sets: readonly WeightedRegions[],
  angle: number,
  origin: Point,
): PlasticAxis | null => {
  const normal = { x: -Math.sin(angle), y: Math.cos(angle) };
  const strips = stripsAlong(sets, normal, origin);
  const { sMin, sMax, below } = strips;
  const depth = sMax - sMin;
  if (!(depth > 0)) return null;
  const whole = below(sMax);
  if (!(whole.area > 0)) return null;
  const half = whole.area / 2;
  const slack = HALF_REL * whole.area;
  const root = bracketedRoot(
    (d) => {
      const { area, width } = below(d);
      return { value: area - half, slope: width };
    },
    sMin,
    sMax,
    AXIS_REL * depth,
  );
  const step = 1e-9 * depth;
  const narrow = [root - step, root + step].some((d) => below(d).width <= (NARROW_REL * whole.area) / depth);
  let [offset, gap] = [root, 0];
  if (narrow) {
    const low = edgeOfGap(strips, half, slack, root, sMin);
    const high = edgeOfGap(strips, half, slack, root, sMax);
    if (high - low > 10 * step) [offset, gap] = [(low + high) / 2, high - low];
  }
  // ∫|s − d| over everything = 2∫(d − s) below + ∫(s − d) over all, and ∫(s − d) = −moment of the whole at its far edge.
  const firstAboutTop = whole.moment - (sMax - offset) * whole.area;
  return { offset, gap, modulus: 2 * below(offset).moment - firstAboutTop, total: whole.area };
};
