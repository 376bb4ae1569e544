import type { Body } from "@/lib/section/torsion/body";
import { emptyGeometry, readGeometry } from "@/lib/section/torsion/element/geometry";
import { stressFunctionSpace, unknownsOf, type Space } from "@/lib/section/torsion/element/space";
import { writeStiffness } from "@/lib/section/torsion/element/stiffness";
import type { Pacer } from "@/lib/section/torsion/pacer";
import { solveMultifrontal } from "@/lib/section/torsion/solve/multifrontal";

/** Prandtl's stress function f (mm² per unit G·twist), as unknowns of `space`, and the lower bound of J it gives, mm⁴. */
export type StressFunction = Readonly<{ space: Space; f: Float64Array; Jlower: number }>;

/** 2∫f + 2 Σ c_k A_k = ∫ (1/g) |grad f|² for the discrete solution. */
const workOn = ({ mesh, sorted }: Body, space: Space, f: Float64Array): number => {
  const { n, load } = space.element;
  const g = emptyGeometry();
  const own = new Int32Array(n);
  let work = 0;
  for (const { thing, area } of space.holes) work += 2 * area * f[space.start[thing]!]!;
  for (let t = 0; t < mesh.region.length; t++) {
    readGeometry(mesh, sorted, t, g);
    unknownsOf(space, t, own);
    let sum = 0;
    for (let i = 0; i < n; i++)
      if (own[i]! >= 0) sum += f[own[i]!]! * (load[i]! + load[n + i]! + load[2 * n + i]!);
    work += 2 * g.area2 * sum;
  }
  return work;
};

/**
 * Solves for Prandtl's stress function: ∫ (1/g) grad f · grad v = 2∫v + 2 Σ A_k v_k, f = 0 on the outer boundary and a
 * constant of its own on each hole k of area A_k; g = G/G_ref.
 * @param p degree of the elements.
 * @returns null where the system is not positive definite. J from it is a lower bound (Prager & Synge 1947).
 * @source L. Prandtl 1903; hole constants by minimum complementary energy (Bredt 1896 in the thin-walled limit).
 */
export function* solveStressFunction(
  body: Body,
  p: number,
  pacer: Pacer,
): Generator<void, StressFunction | null> {
  const { mesh, sorted, tree, shear } = body;
  const space = stressFunctionSpace(mesh, sorted, p);
  const { element } = space;
  const { n, load } = element;
  const g = emptyGeometry();
  const system = (t: number, matrix: Float64Array, sides: Float64Array): void => {
    readGeometry(mesh, sorted, t, g);
    writeStiffness(element, g, 1 / shear[t]!, matrix);
    for (let i = 0; i < n; i++) sides[i] = 2 * g.area2 * (load[i]! + load[n + i]! + load[2 * n + i]!);
  };
  const loads = space.holes.map(({ thing, area }) => ({
    unknown: space.start[thing]!,
    side: 0,
    value: 2 * area,
  }));
  const solved = yield* solveMultifrontal(space, tree, system, 1, loads, pacer, body.arenas);
  const f = solved?.[0];
  return f === undefined ? null : { space, f, Jlower: workOn(body, space, f) };
}
