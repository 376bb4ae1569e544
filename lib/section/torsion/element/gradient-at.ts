import { basisAt } from "@/lib/section/torsion/element/basis";
import { emptyGeometry, readGeometry } from "@/lib/section/torsion/element/geometry";
import { unknownsOf, type Space, type SortedElements } from "@/lib/section/torsion/element/space";
import type { Mesh } from "@/lib/section/torsion/mesh/mesh";

/** Gradients of several functions of one space at a fixed set of places of the reference triangle. */
export type GradientTable = Readonly<{
  count: number;
  /** Evaluates element t: gradients come as dx[k][q], dy[k][q] for function k at place q; x, y are the places in mm. */
  at: (t: number) => Readonly<{
    x: Float64Array;
    y: Float64Array;
    dx: readonly Float64Array[];
    dy: readonly Float64Array[];
  }>;
}>;

/**
 * A table of the basis at the given places (r, s), for evaluating gradients element by element. What `at` returns is
 * written over by the next call.
 */
export const gradientTable = (
  mesh: Mesh,
  sorted: SortedElements,
  space: Space,
  functions: readonly Float64Array[],
  places: readonly (readonly [number, number])[],
): GradientTable => {
  const { p, n } = space.element;
  const bases = places.map(([r, s]) => basisAt(p, r, s));
  const g = emptyGeometry();
  const own = new Int32Array(n);
  const [x, y] = [new Float64Array(places.length), new Float64Array(places.length)];
  const dx = functions.map(() => new Float64Array(places.length));
  const dy = functions.map(() => new Float64Array(places.length));
  const at = (t: number) => {
    readGeometry(mesh, sorted, t, g);
    unknownsOf(space, t, own);
    places.forEach(([r, s], q) => {
      x[q] = g.x[0]! + r * (g.x[1]! - g.x[0]!) + s * (g.x[2]! - g.x[0]!);
      y[q] = g.y[0]! + r * (g.y[1]! - g.y[0]!) + s * (g.y[2]! - g.y[0]!);
      const basis = bases[q]!;
      functions.forEach((f, k) => {
        let [dr, ds] = [0, 0];
        for (let i = 0; i < n; i++) {
          const u = own[i]!;
          if (u < 0) continue;
          dr += f[u]! * basis.dr[i]!;
          ds += f[u]! * basis.ds[i]!;
        }
        dx[k]![q] = dr * g.rx + ds * g.sx;
        dy[k]![q] = dr * g.ry + ds * g.sy;
      });
    });
    return { x, y, dx, dy };
  };
  return { count: places.length, at };
};
