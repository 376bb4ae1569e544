import type { Body } from "@/lib/section/torsion/body";
import { chordShare } from "@/lib/section/torsion/chord-share";
import { estimatesOf, type BodyEstimates } from "@/lib/section/torsion/estimates";
import type { Pacer } from "@/lib/section/torsion/pacer";
import { solveStressFunction } from "@/lib/section/torsion/prandtl";
import { solveWarping, type Warping } from "@/lib/section/torsion/warping";
import { warpingFigures, type WarpingFigures } from "@/lib/section/torsion/warping-figures";

/** A solved body: its fields of the higher degree, the figures they give, J with its bounds (mm⁴), and the estimates. */
export type BodySolution = Readonly<{
  body: Body;
  warping: Warping;
  figures: WarpingFigures;
  J: number;
  Jlower: number;
  Jupper: number;
  estimates: BodyEstimates;
}>;

/**
 * Solves a body at degree p, and at p − 1 for the estimates.
 * @returns null where a system is not positive definite: the mesh is damaged.
 * @yields about every 8 ms.
 */
export function* solveBody(body: Body, p: number, pacer: Pacer): Generator<void, BodySolution | null> {
  const warping = yield* solveWarping(body, p, pacer);
  if (warping === null) return null;
  const figures = warpingFigures(body, warping);
  yield;
  const stress = yield* solveStressFunction(body, p, pacer);
  if (stress === null) return null;
  yield;
  const coarse = yield* solveWarping(body, p - 1, pacer);
  if (coarse === null) return null;
  const low = warpingFigures(body, coarse);
  const { Jlower } = stress;
  const { Jupper } = figures;
  const J = (Jupper + Jlower) / 2;
  const { Ixx, Iyy, area } = body;
  const chords = chordShare(body, warping, J);
  const estimates = estimatesOf({ Jlower, high: figures, low, Ip: Ixx + Iyy, area, chords });
  return { body, warping, figures, J, Jlower, Jupper, estimates };
}
