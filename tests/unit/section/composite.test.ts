import { expect, test, describe } from "vitest";
import { sectionProperties } from "@/lib/section/section-properties";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";
import { partOf, rectangleAt, sectionOfParts, STEEL } from "@/tests/helpers/sections";

const EXACT = { rel: 1e-12 };
const TIMBER = { id: "c24", name: "Timber", E: 10_500, G: 650, fy: 24, density: 420 };

describe("a flitch beam: a steel plate between two timbers", () => {
  const parts = [
    partOf([rectangleAt(-63, 0, 60, 240)], { id: "left", material: TIMBER }),
    partOf([rectangleAt(-3, 20, 6, 200)], { id: "plate" }),
    partOf([rectangleAt(3, 0, 60, 240)], { id: "right", material: TIMBER }),
  ];
  const p = must(sectionProperties(sectionOfParts(parts, TIMBER)));
  const n = 210_000 / 10_500;

  test("has transformed values for the reference material", () => {
    expectRel(p.area, 2 * 60 * 240 + n * 6 * 200, EXACT);
    expectRel(p.Ix, (2 * 60 * 240 ** 3) / 12 + (n * 6 * 200 ** 3) / 12, EXACT);
    expectRel(p.Sx, p.Ix / 120, EXACT);
  });

  test("has the plain geometric values beside them", () => {
    expectRel(p.plain?.area ?? null, 2 * 60 * 240 + 1200, EXACT);
    expectRel(p.plain?.Ix ?? null, (2 * 60 * 240 ** 3 + 6 * 200 ** 3) / 12, EXACT);
  });

  test("has a stress factor for each material", () => {
    expect(p.stressFactors).toEqual([
      { material: "c24", name: "Timber", factor: 1 },
      { material: "steel", name: "Steel", factor: n },
    ]);
  });

  test("weighs by density, keeps Z geometric and takes Mp from both strengths", () => {
    expectRel(p.mass, (2 * 60 * 240 * 420 + 1200 * 7850) / 1e6, EXACT);
    expectRel(p.Zx, (2 * 60 * 240 ** 2 + 6 * 200 ** 2) / 4, EXACT);
    expectRel(p.Mp?.x ?? null, (2 * 60 * 240 ** 2 * 24 + 6 * 200 ** 2 * 355) / 4, EXACT);
  });

  test("has the same EI whichever material is the reference", () => {
    const steel = must(sectionProperties(sectionOfParts(parts, STEEL)));
    expectRel(steel.Ix * STEEL.E, p.Ix * TIMBER.E, EXACT);
    expectRel(steel.rx, p.rx, EXACT);
  });
});

test("one E leaves the plain values out, unless the reference is of another E", () => {
  const steelOnly = [partOf([rectangleAt(0, 0, 10, 20)])];
  expect(must(sectionProperties(sectionOfParts(steelOnly))).plain).toBeNull();
  const seen = must(sectionProperties(sectionOfParts(steelOnly, TIMBER)));
  expectRel(seen.plain?.area ?? null, 200, EXACT);
  expectRel(seen.area, 200 * 20, EXACT);
});
