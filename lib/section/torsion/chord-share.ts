import type { Body } from "@/lib/section/torsion/body";
import { EDGE_ENDS } from "@/lib/section/torsion/element/basis";
import { gradientTable } from "@/lib/section/torsion/element/gradient-at";
import type { Warping } from "@/lib/section/torsion/warping";

/** The shift of the boundary is known to first order only; this covers the rest. */
const MARGIN = 1.5;

/** Middles of the edges 01, 02, 12. */
const MIDDLES = [
  [0.5, 0],
  [0, 0.5],
  [0.5, 0.5],
] as const;

/**
 * Share of J that drawing arcs as chords may have cost, for the error estimates; 0 without arcs.
 * @param J of the body, mm⁴.
 * @source A boundary moved inwards by δ changes J by ∮ g|t|² δ ds (Hadamard's formula for ∫|grad f|²); δ from `chordRing`.
 */
export const chordShare = (body: Body, { space, w }: Warping, J: number): number => {
  const { mesh, sorted, inside, shear } = body;
  if (inside.every((offset) => offset === 0)) return 0;
  const table = gradientTable(mesh, sorted, space, [w], MIDDLES);
  let change = 0;
  for (let t = 0; t < mesh.region.length; t++) {
    for (let e = 3 * t; e < 3 * t + 3; e++) {
      if (mesh.twin[e]! >= 0 || mesh.line[e]! < 0) continue;
      const offset = inside[mesh.line[e]!]!;
      if (offset === 0) continue;
      const k = EDGE_ENDS.findIndex((_, i) => sorted.edges[3 * t + i] === mesh.edge[e]);
      const [a, b] = [mesh.triangles[e]!, mesh.triangles[e % 3 === 2 ? e - 2 : e + 1]!];
      const { x, y, dx, dy } = table.at(t);
      const [tx, ty] = [dx[0]![k]! - y[k]!, dy[0]![k]! + x[k]!];
      const length = Math.hypot(mesh.x[b]! - mesh.x[a]!, mesh.y[b]! - mesh.y[a]!);
      change += shear[t]! * (tx * tx + ty * ty) * offset * length;
    }
  }
  return (MARGIN * change) / J;
};
