import { describe, expect, test } from "vitest";
import { profileRegions } from "@/lib/profiles/profile-regions";
import { sectionProperties } from "@/lib/section/section-properties";
import { expectRel } from "@/tests/helpers/expect-rel";
import { fault, must } from "@/tests/helpers/must";
import { partOf, rectangleAt, sectionOfParts, sectionOfRegions } from "@/tests/helpers/sections";

/** Rounding of sums over a handful of edges: a few units in the sixteenth digit, with three orders to spare. */
const EXACT = { rel: 1e-12 };

describe("a rectangle of 12.7 by 203.3", () => {
  const [b, h] = [12.7, 203.3];
  const p = must(sectionProperties(sectionOfRegions([rectangleAt(-400, 900, b, h)])));

  test("has the area, centroid and moments of the closed forms", () => {
    expectRel(p.area, b * h, EXACT);
    expectRel(p.centroid.x, -400 + b / 2, EXACT);
    expectRel(p.centroid.y, 900 + h / 2, EXACT);
    expectRel(p.Ix, (b * h ** 3) / 12, EXACT);
    expectRel(p.Iy, (h * b ** 3) / 12, EXACT);
    expectRel(p.Ixy, 0, { ...EXACT, scale: p.Ix });
    expectRel(p.I1, (b * h ** 3) / 12, EXACT);
    expect(p.angle).toBe(0);
    expect(p.unsymmetrical).toBeNull();
  });

  test("has S = bh²/6 on both faces, Z = bh²/4 and r = h/√12", () => {
    for (const S of [p.SxTop, p.SxBottom, p.Sx, p.S1]) expectRel(S, (b * h ** 2) / 6, EXACT);
    for (const S of [p.SyLeft, p.SyRight, p.Sy, p.S2]) expectRel(S, (h * b ** 2) / 6, EXACT);
    expectRel(p.Zx, (b * h ** 2) / 4, EXACT);
    expectRel(p.Zy, (h * b ** 2) / 4, EXACT);
    expectRel(p.rx, h / Math.sqrt(12), EXACT);
    expectRel(p.pna?.y ?? null, 900 + h / 2, EXACT);
    expectRel(p.pna?.x ?? null, -400 + b / 2, EXACT);
  });

  test("has mass, perimeter and painted surface", () => {
    expectRel(p.mass, b * h * 7850e-6, EXACT);
    expectRel(p.perimeter.outer, 2 * (b + h), EXACT);
    expect(p.perimeter.inner).toBe(0);
    expectRel(p.surface, (2 * (b + h)) / 1000, EXACT);
  });
});

test("a tube has A, I, Z and both perimeters of the closed forms", () => {
  const [D, t] = [219.1, 8];
  const d = D - 2 * t;
  const regions = must(profileRegions({ family: "round-hollow", dimensions: { diameter: D, thickness: t } }));
  const p = must(sectionProperties(sectionOfRegions(regions)));
  expectRel(p.area, (Math.PI / 4) * (D ** 2 - d ** 2), EXACT);
  expectRel(p.Ix, (Math.PI / 64) * (D ** 4 - d ** 4), EXACT);
  expectRel(p.Zx, (D ** 3 - d ** 3) / 6, EXACT);
  expectRel(p.Z2, (D ** 3 - d ** 3) / 6, EXACT);
  expectRel(p.perimeter.outer, Math.PI * D, EXACT);
  expectRel(p.perimeter.inner, Math.PI * d, EXACT);
  expect(p.angle).toBe(0);
  expect(p.warnings.map((w) => w.code)).toContain("principal.any");
});

test("torsion values are absent with a reason, never 0", () => {
  const p = must(sectionProperties(sectionOfRegions([rectangleAt(0, 0, 10, 10)])));
  expect([p.J, p.Cw, p.shearCentre, p.Avx, p.Avy, p.betaX, p.betaY, p.r0]).toEqual(Array(8).fill(null));
  expect(p.absent.map((a) => a.property)).toEqual([
    "J",
    "Cw",
    "shearCentre",
    "Avx",
    "Avy",
    "betaX",
    "betaY",
    "r0",
  ]);
});

test("a part that counts for mass only weighs and does nothing else", () => {
  const plate = partOf([rectangleAt(0, 0, 100, 10)]);
  const rail = partOf([rectangleAt(0, 10, 50, 50)], { id: "rail", counts: "mass" });
  const p = must(sectionProperties(sectionOfParts([plate, rail])));
  expectRel(p.area, 1000, EXACT);
  expectRel(p.mass, 3500 * 7850e-6, EXACT);
  expect(fault(sectionProperties(sectionOfParts([rail]))).code).toBe("section.nothingStiff");
});

test("parts without area are a fault", () => {
  expect(fault(sectionProperties(sectionOfRegions([]))).code).toBe("section.noArea");
});
