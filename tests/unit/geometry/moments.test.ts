import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { bulgeOfSweep } from "@/lib/geometry/arc";
import { segmentIntegrals } from "@/lib/geometry/circular-segment";
import {
  addMoments,
  centralMoments,
  momentsInAxes,
  moveMoments,
  NO_MOMENTS,
  regionMoments,
  ringMoments,
  type Moments,
} from "@/lib/geometry/moments";
import { expectRel } from "@/tests/helpers/expect-rel";
import { starRegion, turned } from "@/tests/helpers/rings";
import { rectangleAt } from "@/tests/helpers/sections";

/** Rounding over a handful of edges. */
const EXACT = { rel: 1e-13 };
const ORIGIN = { x: 0, y: 0 };
const KEYS = Object.keys(NO_MOMENTS) as (keyof Moments)[];

/** Largest size each moment could have for a body within this radius: what a moment near 0 is judged against. */
const scaleOf = (key: keyof Moments, area: number, radius: number) =>
  area * radius ** (key === "area" ? 0 : key.length);

test("a rectangle at a corner has ∫xᵖy^q = bᵖ⁺¹h^q⁺¹/((p+1)(q+1)) to third order", () => {
  const [b, h] = [30, 70];
  const m = regionMoments([rectangleAt(0, 0, b, h)], ORIGIN);
  const powers: readonly [keyof Moments, number, number][] = [
    ["area", 0, 0],
    ["x", 1, 0],
    ["y", 0, 1],
    ["xx", 2, 0],
    ["xy", 1, 1],
    ["yy", 0, 2],
    ["xxx", 3, 0],
    ["xxy", 2, 1],
    ["xyy", 1, 2],
    ["yyy", 0, 3],
  ];
  for (const [key, p, q] of powers)
    expectRel(m[key], (b ** (p + 1) * h ** (q + 1)) / ((p + 1) * (q + 1)), { ...EXACT, name: key });
});

describe("a half disc of radius r on the x axis", () => {
  const r = 50;
  const m = ringMoments(
    [
      { x: r, y: 0, bulge: 1 },
      { x: -r, y: 0 },
    ],
    ORIGIN,
  );
  // ∫∫ ρ^(p+q+1) cosᵖ sin^q over 0..r, 0..π.
  test.each([
    ["area", (Math.PI * r ** 2) / 2],
    ["x", 0],
    ["y", (2 * r ** 3) / 3],
    ["xx", (Math.PI * r ** 4) / 8],
    ["xy", 0],
    ["yy", (Math.PI * r ** 4) / 8],
    ["xxx", 0],
    ["xxy", (r ** 5 * 2) / 15],
    ["xyy", 0],
    ["yyy", (r ** 5 * 4) / 15],
  ] as const)("has the closed form of %s", (key, expected) => {
    expectRel(m[key], expected, { ...EXACT, scale: scaleOf(key, m.area, r) });
  });
});

describe("a circular segment", () => {
  test("is the same by the series and by the closed form where they meet", () => {
    // Just below and above the half angle 0.3 at which the series ends; the functions change by the slope only.
    const [below, above] = [
      segmentIntegrals(1, Math.tan(0.15 - 1e-12)),
      segmentIntegrals(1, Math.tan(0.15 + 1e-12)),
    ];
    for (const key of Object.keys(below) as (keyof typeof below)[])
      // 1e-11 of relative slope and the 1e-16/α⁴ that the closed form loses here.
      expectRel(below[key], above[key], { rel: 1e-9, name: key });
  });

  test("tends to a parabolic one when it is flat: A = ⅔·chord·height", () => {
    // The segment differs from the parabola by a share of the order of height²/chord² = 1e-16.
    expectRel(segmentIntegrals(100, 2e-8).area, (2 / 3) * 100 * (100 / 2) * 2e-8, { rel: 1e-14 });
  });

  test("of more than a half circle completes the disc with the other one", () => {
    const [bulge, chord] = [0.4, 80];
    const r = (chord * (1 + bulge ** 2)) / (4 * bulge);
    const small = segmentIntegrals(chord, bulge).area;
    const large = segmentIntegrals(chord, 1 / bulge).area;
    expectRel(small + large, Math.PI * r * r, { rel: 1e-14 });
  });
});

test("a bulge of rounding size leaves the polygon's moments", () => {
  const straight = rectangleAt(0, 0, 100, 10).outer;
  const bent = straight.map((v) => ({ ...v, bulge: 1e-15 }));
  const [a, b] = [ringMoments(straight, ORIGIN), ringMoments(bent, ORIGIN)];
  for (const key of KEYS) expectRel(b[key], a[key], EXACT);
});

test("rings without vertices or without area have no moments", () => {
  expect(ringMoments([], ORIGIN)).toEqual(NO_MOMENTS);
  expect(regionMoments([], ORIGIN)).toEqual(NO_MOMENTS);
  expect(centralMoments([])).toBeNull();
  expect(centralMoments([{ regions: [{ outer: [{ x: 1, y: 1 }], holes: [] }], weight: 1 }])).toBeNull();
});

test("an arc between coincident points adds nothing", () => {
  const ring = [...rectangleAt(0, 0, 4, 4).outer, { x: 0, y: 4, bulge: 1 }, { x: 0, y: 4 }];
  expectRel(ringMoments(ring, ORIGIN).area, 16, EXACT);
});

test("moving and turning moments is moving and turning the area, to third order", () => {
  fc.assert(
    fc.property(
      starRegion(true),
      fc.double({ min: -200, max: 200, noNaN: true }),
      fc.double({ min: -4, max: 4, noNaN: true }),
      (region, d, angle) => {
        const m = regionMoments([region], ORIGIN);
        const direct = regionMoments([region], { x: -d, y: d / 2 });
        const shifted = moveMoments(m, d, -d / 2);
        const spun = momentsInAxes(m, angle);
        const seen = regionMoments([turned(region, -angle)], ORIGIN);
        for (const key of KEYS) {
          expectRel(shifted[key], direct[key], { ...EXACT, scale: scaleOf(key, m.area, 400), name: key });
          expectRel(spun[key], seen[key], { ...EXACT, scale: scaleOf(key, m.area, 120), name: key });
        }
      },
    ),
  );
});

test("weights multiply what a region adds", () => {
  const [a, b] = [rectangleAt(0, 0, 10, 10), rectangleAt(10, 0, 10, 10)];
  const both = centralMoments([
    { regions: [a], weight: 1 },
    { regions: [b], weight: 3 },
  ]);
  expectRel(both?.moments.area ?? null, 400, EXACT);
  expectRel(both?.centroid.x ?? null, (5 + 3 * 15) / 4, EXACT);
  const sum = addMoments(regionMoments([a], ORIGIN), regionMoments([b], ORIGIN), 3);
  expectRel(sum.xx, 10_000 / 3 + 3 * (70_000 / 3), { rel: 1e-12 });
});

test("a sweep of a full turn less a little still closes on its circle", () => {
  const sweep = 2 * Math.PI - 1e-6;
  const ring = [
    { x: 10, y: 0, bulge: bulgeOfSweep(sweep) },
    { x: 10 * Math.cos(sweep), y: 10 * Math.sin(sweep) },
  ];
  // The missing sliver has an area of 1e-6·r²/2, and rounding of the end point is magnified by r/chord = 1e6.
  expectRel(ringMoments(ring, ORIGIN).area, 100 * Math.PI, { rel: 1e-8 });
});
