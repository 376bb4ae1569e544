import type { ElementGeometry } from "@/lib/section/torsion/element/geometry";
import type { ReferenceElement } from "@/lib/section/torsion/element/reference-element";

/** Writes weight · ∫ grad N_i · grad N_j over the element: three scaled reference matrices. */
export const writeStiffness = (
  element: ReferenceElement,
  { area2, rx, ry, sx, sy }: ElementGeometry,
  weight: number,
  into: Float64Array,
): void => {
  const scale = weight * area2;
  const [a, b, c] = [scale * (rx * rx + ry * ry), scale * (rx * sx + ry * sy), scale * (sx * sx + sy * sy)];
  const { rr, rs, ss } = element;
  for (let k = 0; k < rr.length; k++) into[k] = a * rr[k]! + b * rs[k]! + c * ss[k]!;
};
