import { runToEnd } from "@/lib/section/torsion/run-to-end";
import { solveTorsion } from "@/lib/section/torsion/solve-torsion";
import type { Ratio } from "@/tests/performance/area-moments";
import { sectionOfRegions } from "@/tests/helpers/sections";
import { REFERENCE_SHAPES } from "@/tests/helpers/torsion-shapes";

const SIZE = 400;

/**
 * The calibration: a plain Cholesky factorisation of a full matrix of 400 rows, 10.7 million multiplications. It is about as
 * long as a solution, so that what else the machine does falls on both alike.
 */
const calibration = (): number => {
  const a = new Float64Array(SIZE * SIZE);
  for (let i = 0; i < SIZE; i += 1)
    for (let j = 0; j <= i; j += 1) {
      let sum = i === j ? SIZE : 1 / (1 + i - j);
      for (let k = 0; k < j; k += 1) sum -= (a[i * SIZE + k] ?? 0) * (a[j * SIZE + k] ?? 0);
      a[i * SIZE + j] = i === j ? Math.sqrt(sum) : sum / (a[j * SIZE + j] ?? 1);
    }
  return a[SIZE * SIZE - 1] ?? 0;
};

const ROUNDS = 25;

const median = (values: readonly number[]): number =>
  values.toSorted((a, b) => a - b)[values.length >> 1] ?? 0;

/** Processor time, ms: a shared machine's waiting is not ours. */
const time = (call: () => unknown): number => {
  const start = process.cpuUsage();
  call();
  const { user, system } = process.cpuUsage(start);
  return (user + system) / 1e3;
};

/**
 * J with its bounds, shear centre, Cw, both shear fields and all estimates, warm: median over that of the calibration loop,
 * run in turn. The aim is 30 ms for 16 vertices and one cell, 60 ms for two cells, on a machine that does the loop in 10 ms.
 */
export const torsionRatios = (): readonly Ratio[] =>
  (
    [
      ["girder, 12 vertices", "500 × 25", 5],
      ["channel, 8 vertices", "channel 300", 2],
      ["box with a cell, 16 vertices", "box 1500", 8],
      ["two cells", "two cells", 6],
    ] as const
  ).map(([name, find, limit]): Ratio => {
    const shape = REFERENCE_SHAPES.find((s) => s.name.includes(find));
    if (shape === undefined) throw new Error(`no shape ${find}`);
    const section = sectionOfRegions([shape.region]);
    const rounds = Array.from({ length: ROUNDS }, () => ({
      loop: time(calibration),
      torsion: time(() => runToEnd(solveTorsion(section))),
    }));
    const ratio = median(rounds.map((r) => r.torsion)) / median(rounds.map((r) => r.loop));
    return { name: `torsion, ${name}`, ratio, limit };
  });
