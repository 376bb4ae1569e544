import type { BenchFigures } from "@/lib/client/compute/bench-figures";
import { jointForcesInCells } from "@/lib/section/joint-forces-in-cells";
import { solveTorsion } from "@/lib/section/torsion/solve-torsion";
import { withTorsion } from "@/lib/section/with-torsion";

/** Torsion of a drawing that takes longer than this is given up, and the figures say so. */
const LIMIT_MS = 20_000;

/** The figures with torsion and shear put in: what the Bench shows a moment after the areas. */
export function* benchTorsion(figures: BenchFigures): Generator<void, BenchFigures> {
  const torsion = yield* solveTorsion(figures.section, { timeLimitMs: LIMIT_MS, fields: true });
  return {
    ...figures,
    properties: withTorsion(figures.properties, torsion),
    torsion: torsion.ok ? torsion.value : null,
    jointForces: torsion.ok
      ? jointForcesInCells(figures.jointForces, torsion.value.joints)
      : figures.jointForces,
  };
}
