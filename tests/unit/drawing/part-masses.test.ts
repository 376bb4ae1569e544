import { expect, test } from "vitest";
import { computeProperties } from "@/lib/drawing/compute-properties";
import { computeWithTorsion } from "@/lib/drawing/compute-with-torsion";
import { partMasses } from "@/lib/drawing/part-masses";
import type { Drawing } from "@/lib/drawing/schema";
import { sectionOf } from "@/lib/drawing/section-of";
import { expectRel } from "@/tests/helpers/expect-rel";

const STEEL = { id: "s", name: "Steel", E: 210_000, G: 81_000, fy: 355, density: 7850 };
const plate = (id: string, width: number, height: number, y: number) => ({
  id,
  name: id,
  material: "s",
  at: { x: 0, y },
  angle: 0,
  shape: { kind: "plate" as const, width, height },
});
const drawing = (parts: Drawing["parts"]): Drawing => ({
  version: 1,
  unit: "mm",
  reference: "s",
  materials: [STEEL],
  parts,
  joints: [],
});

/** Sums and products of a few numbers. */
const ROUNDING = { rel: 1e-12 };

const tee = drawing([plate("flange", 300, 20, 310), plate("web", 10, 300, 150)]);

const finished = <T>(work: Generator<void, T>): T => {
  for (;;) {
    const step = work.next();
    if (step.done) return step.value;
  }
};

test("the masses of parts are area times density, and add up to the mass of the section", () => {
  const section = sectionOf(tee);
  if (!section.ok) throw new Error("the tee is a valid drawing");
  const masses = partMasses(section.value);
  expectRel(masses.get("flange") ?? null, (300 * 20 * 7850) / 1e6, ROUNDING);
  expectRel(masses.get("web") ?? null, (10 * 300 * 7850) / 1e6, ROUNDING);
  const whole = computeProperties(tee);
  if (!whole.ok) throw new Error("the tee has properties");
  expectRel(
    [...masses.values()].reduce((sum, mass) => sum + mass, 0),
    whole.value.mass,
    ROUNDING,
  );
});

test("a drawing's properties with torsion carry J between its bounds, and the area properties unchanged", () => {
  const solved = finished(computeWithTorsion(tee));
  const plain = computeProperties(tee);
  if (!solved.ok || !plain.ok) throw new Error("the tee has properties");
  expect(solved.value.Ix).toBe(plain.value.Ix);
  expect(solved.value.absent).toEqual([]);
  // Sum of b·t³/3 over thin strips leaves out ends and the junction: a few per cent at these proportions.
  expectRel(solved.value.J, (300 * 20 ** 3 + 300 * 10 ** 3) / 3, { rel: 0.06 });
});

test("a drawing that cannot be computed comes back as faults that name the part", () => {
  const bad = drawing([{ ...plate("web", 10, 300, 150), material: "nothing" }]);
  const solved = finished(computeWithTorsion(bad));
  expect(solved).toMatchObject({ ok: false, error: [{ part: "web" }] });
});
