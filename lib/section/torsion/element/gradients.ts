import { emptyGeometry, readGeometry } from "@/lib/section/torsion/element/geometry";
import { unknownsOf, type Space, type SortedElements } from "@/lib/section/torsion/element/space";
import type { Mesh } from "@/lib/section/torsion/mesh/mesh";

/** Sample points of an element with their weights (mm²) and the gradient of a function there. */
export type Samples = Readonly<{
  x: Float64Array;
  y: Float64Array;
  weight: Float64Array;
  dx: Float64Array;
  dy: Float64Array;
}>;

/**
 * Walks over all elements with the gradient of a function at the points of the rule, which is exact for its square. The
 * arrays handed over are used again for the next element.
 */
export const visitGradients = (
  mesh: Mesh,
  sorted: SortedElements,
  space: Space,
  f: Float64Array,
  visit: (t: number, samples: Samples) => void,
): void => {
  const { n, samples } = space.element;
  const { count } = samples;
  const g = emptyGeometry();
  const own = new Int32Array(n);
  const c = new Float64Array(n);
  const blank = () => new Float64Array(count);
  const at = { x: blank(), y: blank(), weight: blank(), dx: blank(), dy: blank() };
  for (let t = 0; t < mesh.region.length; t++) {
    readGeometry(mesh, sorted, t, g);
    unknownsOf(space, t, own);
    for (let i = 0; i < n; i++) c[i] = own[i]! < 0 ? 0 : f[own[i]!]!;
    const { x, y, area2, rx, ry, sx, sy } = g;
    for (let q = 0; q < count; q++) {
      const [r, s] = [samples.r[q]!, samples.s[q]!];
      let [dr, ds] = [0, 0];
      for (let i = 0, k = q * n; i < n; i++, k++) {
        dr += c[i]! * samples.dr[k]!;
        ds += c[i]! * samples.ds[k]!;
      }
      at.x[q] = x[0]! + r * (x[1]! - x[0]!) + s * (x[2]! - x[0]!);
      at.y[q] = y[0]! + r * (y[1]! - y[0]!) + s * (y[2]! - y[0]!);
      at.weight[q] = area2 * samples.weight[q]!;
      at.dx[q] = dr * rx + ds * sx;
      at.dy[q] = dr * ry + ds * sy;
    }
    visit(t, at);
  }
};
