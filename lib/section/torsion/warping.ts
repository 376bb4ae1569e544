import type { Body } from "@/lib/section/torsion/body";
import { emptyGeometry, readGeometry } from "@/lib/section/torsion/element/geometry";
import { freeSpace, type Space } from "@/lib/section/torsion/element/space";
import { writeStiffness } from "@/lib/section/torsion/element/stiffness";
import type { Pacer } from "@/lib/section/torsion/pacer";
import { solveMultifrontal } from "@/lib/section/torsion/solve/multifrontal";

/**
 * Warping function w (mm², about the centroid) and the shear potentials px, py (mm³), as unknowns of `space`; each up to
 * a constant.
 */
export type Warping = Readonly<{ space: Space; w: Float64Array; px: Float64Array; py: Float64Array }>;

/**
 * Solves for the warping function and for transverse shear on one factorisation, with g = G/G_ref and e = E/E_ref:
 * ∫ g grad w · grad v = ∫ g (y ∂v/∂x − x ∂v/∂y), and ∫ g grad px · grad v = ∫ e x v (py with y), for every v. Every
 * boundary is free of stress; w is single-valued, so that holes need no condition.
 * @param p degree of the elements.
 * @returns null where the system is not positive definite, which sound meshes do not give.
 * @source Saint-Venant 1855; weak form as in Szabó & Babuška, Finite Element Analysis (1991). ν = 0.
 */
export function* solveWarping(body: Body, p: number, pacer: Pacer): Generator<void, Warping | null> {
  const { mesh, sorted, tree, shear, axial } = body;
  const space = freeSpace(mesh, sorted, p);
  const { element } = space;
  const { n, load, loadR, loadS } = element;
  const g = emptyGeometry();
  const system = (t: number, matrix: Float64Array, sides: Float64Array): void => {
    readGeometry(mesh, sorted, t, g);
    const stiff = shear[t]!;
    writeStiffness(element, g, stiff, matrix);
    const [scale, force] = [stiff * g.area2, axial[t]! * g.area2];
    for (let i = 0; i < n; i++) {
      let [w, fx, fy] = [0, 0, 0];
      for (let c = 0; c < 3; c++) {
        const [R, S, L] = [loadR[c * n + i]!, loadS[c * n + i]!, load[c * n + i]!];
        w += g.y[c]! * (g.rx * R + g.sx * S) - g.x[c]! * (g.ry * R + g.sy * S);
        fx += g.x[c]! * L;
        fy += g.y[c]! * L;
      }
      sides[i] = scale * w;
      sides[n + i] = force * fx;
      sides[2 * n + i] = force * fy;
    }
  };
  const solved = yield* solveMultifrontal(space, tree, system, 3, [], pacer, body.arenas);
  if (solved === null) return null;
  const [w, px, py] = solved as [Float64Array, Float64Array, Float64Array];
  return { space, w, px, py };
}
