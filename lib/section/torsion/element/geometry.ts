import type { SortedElements } from "@/lib/section/torsion/element/space";
import type { Mesh } from "@/lib/section/torsion/mesh/mesh";

/**
 * The affine map of an element from the reference triangle, corners sorted: x and y of the corners (mm), `area2` = |det| =
 * twice the area, and the derivatives ∂r/∂x … ∂s/∂y (1/mm).
 */
export type ElementGeometry = {
  x: Float64Array;
  y: Float64Array;
  area2: number;
  rx: number;
  ry: number;
  sx: number;
  sy: number;
};

export const emptyGeometry = (): ElementGeometry => ({
  x: new Float64Array(3),
  y: new Float64Array(3),
  area2: 0,
  rx: 0,
  ry: 0,
  sx: 0,
  sy: 0,
});

/** Writes the geometry of element t. */
export const readGeometry = (
  mesh: Mesh,
  { corners }: SortedElements,
  t: number,
  into: ElementGeometry,
): void => {
  const { x, y } = into;
  for (let k = 0; k < 3; k++) {
    x[k] = mesh.x[corners[3 * t + k]!]!;
    y[k] = mesh.y[corners[3 * t + k]!]!;
  }
  const [bx, by, cx, cy] = [x[1]! - x[0]!, y[1]! - y[0]!, x[2]! - x[0]!, y[2]! - y[0]!];
  const det = bx * cy - cx * by;
  into.area2 = Math.abs(det);
  into.rx = cy / det;
  into.ry = -cx / det;
  into.sx = -by / det;
  into.sy = bx / det;
};
