import { describe, expect, test } from "vitest";
import type { Region } from "@/lib/geometry/region";
import { runToEnd } from "@/lib/section/torsion/run-to-end";
import { solveTorsion, type TorsionOptions } from "@/lib/section/torsion/solve-torsion";
import { eliminate } from "@/lib/section/torsion/solve/front";
import { propertiesWithTorsion, withTorsion } from "@/lib/section/with-torsion";
import { sectionProperties } from "@/lib/section/section-properties";
import { expectRel } from "@/tests/helpers/expect-rel";
import { fault, must } from "@/tests/helpers/must";
import { partOf, rectangleAt, sectionOfParts, sectionOfRegions } from "@/tests/helpers/sections";

const faultOf = (regions: readonly Region[], options: TorsionOptions = {}) =>
  fault(runToEnd(solveTorsion(sectionOfRegions(regions), options)));

describe("what cannot be computed is a fault with words", () => {
  test("two parts on the same place", () => {
    expect(faultOf([rectangleAt(0, 0, 10, 10), rectangleAt(0, 0, 10, 10)]).code).toBe("torsion.overlap");
  });

  test("outlines that cross", () => {
    expect(faultOf([rectangleAt(0, 0, 10, 10), rectangleAt(5, 5, 10, 10)]).code).toBe("torsion.crossing");
  });

  test("arcs that cross are tried with finer chords before they are refused", () => {
    const round = (x: number): Region => ({
      outer: [
        { x: x + 10, y: 0, bulge: 1 },
        { x: x - 10, y: 0, bulge: 1 },
      ],
      holes: [],
    });
    expect(faultOf([round(0), round(15)]).code).toBe("torsion.crossing");
  });

  test("a mesh that would grow too large", () => {
    const { code, detail } = faultOf([rectangleAt(0, 0, 1000, 1)], { maxVertices: 50 });
    expect(code).toBe("torsion.tooManyVertices");
    expect(detail).toContain("50");
  });

  test("too long a time", () => {
    expect(faultOf([rectangleAt(0, 0, 20_000, 1)], { timeLimitMs: 0 }).code).toBe("torsion.timeOut");
  });

  test("nothing that counts for stiffness", () => {
    const section = sectionOfParts([partOf([rectangleAt(0, 0, 10, 10)], { counts: "mass" })]);
    expect(fault(runToEnd(solveTorsion(section))).code).toBe("torsion.noArea");
  });

  test("a matrix that is not positive definite is told, not divided by", () => {
    expect(eliminate({ size: 1, rows: 1, a: Float64Array.of(-1) }, 1)).toBe(false);
  });
});

test("a part that only weighs takes no share in torsion", () => {
  const steel = partOf([rectangleAt(0, 0, 100, 10)], { id: "a" });
  const rail = partOf([rectangleAt(0, 10, 100, 10)], { id: "b", counts: "mass" });
  const found = must(runToEnd(solveTorsion(sectionOfParts([steel, rail]))));
  expectRel(found.J, 31232.50375, { rel: 1e-4 });
});

test("a computation hands over control again and again, and can be dropped", () => {
  const steps = solveTorsion(sectionOfRegions([rectangleAt(0, 0, 2500, 8)]));
  for (let i = 0; i < 3; i++) expect(steps.next().done).toBe(false);
  expect(steps.return(fault0()).done).toBe(true);
});

const fault0 = () => ({ ok: false, error: { code: "stopped", detail: "Stopped." } }) as const;

describe("properties with torsion", () => {
  const plate = sectionOfRegions([rectangleAt(0, 0, 100, 10)]);

  test("hold the torsion values, their estimates, and no reason for their absence", () => {
    const found = must(runToEnd(propertiesWithTorsion(plate)));
    expectRel(found.J, 31232.50375, { rel: 1e-4 });
    expectRel(found.Cw, 6642911.093, { rel: 2e-4 });
    expect(found.shearCentre).toEqual(found.centroid);
    expectRel(found.Avy, (5 / 6) * 1000, { rel: 1e-4 });
    expect([found.betaX, found.betaY]).toEqual([0, 0]);
    expectRel(found.r0, Math.hypot(found.rx, found.ry), { rel: 1e-12 });
    expect(found.estimates.J).toBeLessThan(1e-3);
    expect(found.absent).toEqual([]);
    expectRel(found.area, 1000, { rel: 1e-12 });
  });

  test("carry the fault of torsion as the reason of each absent value", () => {
    const area = must(sectionProperties(plate));
    const found = withTorsion(area, runToEnd(solveTorsion(plate, { maxVertices: 1 })));
    expect(found.J).toBeNull();
    expect(found.absent.map(({ property, code }) => `${property} ${code}`)).toEqual(
      ["J", "Cw", "shearCentre", "Avx", "Avy", "betaX", "betaY", "r0"].map(
        (p) => `${p} torsion.tooManyVertices`,
      ),
    );
  });

  test("say of pieces apart why only J is known", () => {
    const apart = sectionOfRegions([rectangleAt(0, 0, 100, 10), rectangleAt(0, 50, 100, 10)]);
    const found = must(runToEnd(propertiesWithTorsion(apart)));
    expectRel(found.J, 2 * 31232.50375, { rel: 1e-4 });
    expect(found.shearCentre).toBeNull();
    expect(found.absent.every(({ code }) => code === "torsion.notConnected")).toBe(true);
  });

  test("are refused where the areas are", () => {
    const none = sectionOfParts([partOf([rectangleAt(0, 0, 10, 10)], { counts: "mass" })]);
    expect(fault(runToEnd(propertiesWithTorsion(none))).code).toBe("section.nothingStiff");
  });
});
