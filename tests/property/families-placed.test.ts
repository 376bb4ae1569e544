import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { computeProperties } from "@/lib/drawing/compute-properties";
import type { Drawing } from "@/lib/drawing/schema";
import type { Profile } from "@/lib/profiles/families";
import { profileDrawing } from "@/tests/helpers/steel-drawing";
import { expectRel } from "@/tests/helpers/expect-rel";

const PROFILES: readonly Profile[] = [
  {
    family: "i-section",
    dimensions: {
      depth: 300,
      flangeWidth: 125,
      webThickness: 10.8,
      flangeThickness: 16.2,
      rootRadius: 10.8,
      toeRadius: 6.5,
      flangeSlope: 0.14,
    },
  },
  {
    family: "i-section-unequal",
    dimensions: {
      depth: 600,
      topWidth: 200,
      topThickness: 15,
      bottomWidth: 300,
      bottomThickness: 25,
      webThickness: 10,
      rootRadius: 6,
    },
  },
  {
    family: "channel",
    dimensions: {
      depth: 300,
      flangeWidth: 100,
      webThickness: 10,
      flangeThickness: 16,
      rootRadius: 16,
      toeRadius: 8,
      flangeSlope: 0.08,
    },
  },
  {
    family: "angle",
    dimensions: { legLong: 150, legShort: 90, thickness: 10, rootRadius: 12, toeRadius: 6 },
  },
  {
    family: "tee",
    dimensions: { depth: 150, flangeWidth: 150, webThickness: 7.1, flangeThickness: 10.7, rootRadius: 15 },
  },
  { family: "zee", dimensions: { depth: 200, flangeWidth: 75, thickness: 2, innerRadius: 4 } },
  {
    family: "lipped-channel",
    dimensions: { depth: 200, flangeWidth: 75, lip: 20, thickness: 1.5, innerRadius: 3 },
  },
  {
    family: "rectangular-hollow",
    dimensions: { depth: 200, width: 100, thickness: 8, outerRadius: 20, innerRadius: 12 },
  },
  { family: "flat", dimensions: { width: 150, thickness: 12 } },
  { family: "timber", dimensions: { width: 60, depth: 240 } },
];

const propertiesOf = (drawing: Drawing) => {
  const found = computeProperties(drawing);
  if (!found.ok) throw new Error(JSON.stringify(found.error));
  return found.value;
};

const placed = (
  profile: Profile,
  place: { x: number; y: number; angle: number; mirror: boolean },
): Drawing => {
  const drawing = profileDrawing(profile);
  return {
    ...drawing,
    parts: drawing.parts.map((part) => ({
      ...part,
      at: { x: place.x, y: place.y },
      angle: place.angle,
      mirror: place.mirror,
    })),
  };
};

const place = fc.record({
  x: fc.double({ min: -1e4, max: 1e4, noNaN: true }),
  y: fc.double({ min: -1e4, max: 1e4, noNaN: true }),
  angle: fc.oneof(fc.constantFrom(0, 90, 180, 270, -90, 45), fc.double({ min: -360, max: 360, noNaN: true })),
  mirror: fc.boolean(),
});

describe.each(PROFILES.map((p) => [p.family, p] as const))("a placed %s", (_, profile) => {
  const plain = propertiesOf(profileDrawing(profile));

  test("keeps what does not depend on axes, and turns its principal axes with it", () => {
    fc.assert(
      fc.property(place, (at) => {
        const p = propertiesOf(placed(profile, at));
        // A coordinate near 1e4 mm is rounded by 1e-12 mm: 1e-12 of a wall of 1.5 mm, and 1e-14 of a depth, in sums.
        const rel = 1e-10;
        expectRel(p.area, plain.area, { rel });
        expectRel(p.perimeter.outer, plain.perimeter.outer, { rel });
        for (const key of ["I1", "I2", "S1", "S2", "Z1", "Z2", "r1", "r2"] as const)
          expectRel(p[key], plain[key] ?? Number.NaN, { rel, name: key });
        const own = at.mirror ? -plain.angle : plain.angle;
        const turns = (p.angle - own - at.angle) / 180;
        expectRel(turns - Math.round(turns), 0, { rel: 1e-10, scale: 1 });
      }),
      { numRuns: 50 },
    );
  });

  test("exchanges left and right when it is mirrored", () => {
    const p = propertiesOf(placed(profile, { x: 0, y: 0, angle: 0, mirror: true }));
    expectRel(p.SyLeft, plain.SyRight, { rel: 1e-12 });
    expectRel(p.SyRight, plain.SyLeft, { rel: 1e-12 });
    expectRel(p.SxTop, plain.SxTop, { rel: 1e-12 });
    expectRel(p.Ixy, -plain.Ixy, { rel: 1e-12, scale: plain.I1 });
  });

  test("exchanges x and y exactly when it is turned by a quarter", () => {
    const p = propertiesOf(placed(profile, { x: 0, y: 0, angle: 90, mirror: false }));
    expectRel(p.Ix, plain.Iy, { rel: 1e-13 });
    expectRel(p.Iy, plain.Ix, { rel: 1e-13 });
    expectRel(p.SxTop, plain.SyRight, { rel: 1e-13 });
    expectRel(p.Zx, plain.Zy ?? Number.NaN, { rel: 1e-13 });
    expect(p.unsymmetrical === null).toBe(plain.unsymmetrical === null);
  });
});
