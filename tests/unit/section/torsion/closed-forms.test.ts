import { describe, expect, test } from "vitest";
import { profileRegions } from "@/lib/profiles/profile-regions";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";
import { rectangleAt, sectionOfRegions } from "@/tests/helpers/sections";
import { connectedTorsion } from "@/tests/helpers/torsion";

/** What the program promises of J. */
const J_REL = 1e-4;

/** Torsion of a rectangle b ≥ t by the series. @source Timoshenko & Goodier, Theory of Elasticity, art. 109. */
const rectangleSeries = (b: number, t: number): Readonly<{ J: number; greatest: number }> => {
  let [sum, edge] = [0, 0];
  for (let n = 1; n < 200; n += 2) {
    const z = (n * Math.PI * b) / (2 * t);
    sum += Math.tanh(z) / n ** 5;
    edge += 1 / (n * n * Math.cosh(z));
  }
  const J = (b * t ** 3 * (1 - (192 / Math.PI ** 5) * (t / b) * sum)) / 3;
  return { J, greatest: t * (1 - (8 / Math.PI ** 2) * edge) };
};

describe.each([1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 10, 40])("a rectangle with b/t = %d", (ratio) => {
  const [b, t] = [20 * ratio, 20];
  const found = connectedTorsion(sectionOfRegions([rectangleAt(0, 0, b, t)]), { fields: true });
  const series = rectangleSeries(b, t);

  test("has the J of the series", () => {
    expectRel(found.J, series.J, { rel: 2e-6 });
  });

  test("has its greatest torsion stress in the middle of the long sides, as the series says", () => {
    // Two decimals of a per cent: the stress is a derivative, and is sampled at corners and middles of element edges.
    expectRel(found.fields!.greatest.torsion.value, series.greatest / series.J, { rel: 5e-3 });
    if (ratio > 1) expect(Math.abs(found.fields!.greatest.torsion.at.y - 10)).toBeGreaterThan(9.99);
  });
});

/** β of J = β b t³, three decimals. @source Timoshenko & Goodier, Theory of Elasticity, art. 109, table. */
test.each([
  [1, 0.1406],
  [1.2, 0.166],
  [1.5, 0.196],
  [2, 0.229],
  [2.5, 0.249],
  [3, 0.263],
  [4, 0.281],
  [5, 0.291],
  [10, 0.312],
])("b/t = %d gives the β of the published table", (ratio, beta) => {
  const { J } = connectedTorsion(sectionOfRegions([rectangleAt(0, 0, 10 * ratio, 10)]));
  expect(Math.abs(J / (ratio * 1e4) - beta)).toBeLessThan(5.1e-4);
});

test("a flat plate has the thickness warping b³t³/144", () => {
  const { Cw } = connectedTorsion(sectionOfRegions([rectangleAt(0, 0, 2000, 5)]));
  expectRel(Cw, (2000 ** 3 * 5 ** 3) / 144, { rel: 1e-4 });
});

test.each([
  [100, 50],
  [210, 20],
  [201, 2],
])(
  "a round of %d with a wall of %d has J = 2I, its shear centre in the middle and no warping to speak of",
  (d, wall) => {
    const bore = d - 2 * wall;
    const regions = must(
      bore > 0
        ? profileRegions({
            family: "round-hollow",
            dimensions: { diameter: d, thickness: wall },
          })
        : profileRegions({ family: "round", dimensions: { diameter: d } }),
    );
    const found = connectedTorsion(sectionOfRegions(regions));
    const exact = (Math.PI * (d ** 4 - bore ** 4)) / 32;
    expectRel(found.J, exact, { rel: J_REL });
    expect(Math.abs(found.J / exact - 1)).toBeLessThanOrEqual(found.estimates.J);
    expectRel(found.shearCentre.x, 0, { rel: 1e-12, scale: d });
    expectRel(found.shearCentre.y, 0, { rel: 1e-12, scale: d });
    const area = (Math.PI * (d * d - bore * bore)) / 4;
    expect(found.Cw).toBeLessThan((1e-6 * exact * exact) / area);
  },
);

/** @source Timoshenko & Gere; Cowper 1966 for ν = 0: κ = 5/6 (rectangle), 6/7 (solid circle), 1/2 (thin tube). */
test.each([
  ["rectangle 100 × 200", [rectangleAt(0, 0, 100, 200)], (5 / 6) * 20000, (5 / 6) * 20000, 1e-6],
  ["rectangle 10 × 500", [rectangleAt(0, 0, 10, 500)], (5 / 6) * 5000, (5 / 6) * 5000, 1e-6],
  [
    "solid circle of 100",
    must(profileRegions({ family: "round", dimensions: { diameter: 100 } })),
    ((6 / 7) * Math.PI * 1e4) / 4,
    ((6 / 7) * Math.PI * 1e4) / 4,
    1e-4,
  ],
  [
    "thin tube of 1000 × 2",
    must(
      profileRegions({
        family: "round-hollow",
        dimensions: { diameter: 1000, thickness: 2 },
      }),
    ),
    (Math.PI * (1e6 - 996 ** 2)) / 8,
    (Math.PI * (1e6 - 996 ** 2)) / 8,
    2e-3,
  ],
] as const)("the shear areas of a %s are those of the closed form", (_, regions, Avx, Avy, rel) => {
  const found = connectedTorsion(sectionOfRegions(regions));
  expectRel(found.Avx, Avx, { rel });
  expectRel(found.Avy, Avy, { rel });
});

/**
 * Isosceles right-angled triangle of legs a: J = 0.026090 a⁴.
 * @source Timoshenko & Goodier, Theory of Elasticity, art. 109 (B. Galerkin 1919); five digits, from memory, and checked
 * here by the bounds, which do not depend on it.
 */
test("a right-angled triangle, whose angles of 45° are meshed in shells, has Galerkin's J", () => {
  const region = {
    outer: [
      { x: 0, y: 0 },
      { x: 100, y: 0 },
      { x: 0, y: 100 },
    ],
    holes: [],
  };
  const { J, JBounds } = connectedTorsion(sectionOfRegions([region]));
  expectRel(J, 0.02609e8, { rel: 5e-4 });
  expect((JBounds.upper - JBounds.lower) / J).toBeLessThan(1e-4);
});

/** A wedge of 5°: meshed in shells, it must end, and agree with the thin tapered strip J = ∫t³/3. */
test("a wedge with an angle of 5° is meshed and has the J of a tapered strip", () => {
  const [length, half] = [200, 200 * Math.tan((2.5 / 180) * Math.PI)];
  const region = {
    outer: [
      { x: 0, y: 0 },
      { x: length, y: -half },
      { x: length, y: half },
    ],
    holes: [],
  };
  const { J } = connectedTorsion(sectionOfRegions([region]));
  const thick = 2 * half;
  // The strip tapers: t³ integrates to L·t³/4; the blunt end costs 0.105·t⁴, half of a strip's two ends.
  expectRel(J, (length * thick ** 3) / 12 - 0.105 * thick ** 4, { rel: 1e-2 });
});
