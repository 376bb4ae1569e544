import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { stripsAlong } from "@/lib/geometry/half-plane-integrals";
import { regionMoments } from "@/lib/geometry/moments";
import type { Region } from "@/lib/geometry/region";
import { expectRel } from "@/tests/helpers/expect-rel";
import { chordedRegion, starRegion } from "@/tests/helpers/rings";
import { rectangleAt } from "@/tests/helpers/sections";

const EXACT = { rel: 1e-13 };
const ORIGIN = { x: 0, y: 0 };
const UP = { x: 0, y: 1 };
const only = (...regions: readonly Region[]) => [{ regions, weight: 1 }];

const disc = (r: number): Region => ({
  outer: [
    { x: r, y: 0, bulge: 1 },
    { x: -r, y: 0, bulge: 1 },
  ],
  holes: [],
});

test("below a line through a rectangle lie b·d, b·d²/2 and the width b", () => {
  const { sMin, sMax, below } = stripsAlong(only(rectangleAt(3, 0, 20, 50)), UP, ORIGIN);
  expect([sMin, sMax]).toEqual([0, 50]);
  const at = below(12);
  expectRel(at.area, 240, EXACT);
  expectRel(at.moment, (20 * 12 * 12) / 2, EXACT);
  expectRel(at.width, 20, EXACT);
  expect(below(-1)).toEqual({ area: 0, moment: 0, width: 0 });
});

describe("below a line across a disc", () => {
  const r = 40;
  const { sMin, sMax, below } = stripsAlong(only(disc(r)), { x: 0.6, y: 0.8 }, ORIGIN);
  test("lies the circular segment, at any height", () => {
    expectRel(sMin, -r, EXACT);
    expectRel(sMax, r, EXACT);
    for (const d of [-39.9, -20, -1e-9, 0, 13, 39.99]) {
      const theta = 2 * Math.acos(-d / r);
      expectRel(below(d).area, (r * r * (theta - Math.sin(theta))) / 2, { rel: 1e-12, name: `at ${d}` });
      expectRel(below(d).width, 2 * Math.sqrt(r * r - d * d), { rel: 1e-12, name: `at ${d}` });
    }
    expectRel(below(0).moment, (2 * r ** 3) / 3, EXACT);
    expectRel(below(r).area, Math.PI * r * r, EXACT);
  });
});

test("the whole below is the area, and its moment that of the area about the line", () => {
  fc.assert(
    fc.property(starRegion(true), fc.double({ min: -4, max: 4, noNaN: true }), (region, angle) => {
      const normal = { x: Math.cos(angle), y: Math.sin(angle) };
      const { sMax, below } = stripsAlong(only(region), normal, ORIGIN);
      const m = regionMoments([region], ORIGIN);
      expectRel(below(sMax).area, m.area, { rel: 1e-12 });
      expectRel(below(sMax).moment, sMax * m.area - (m.x * normal.x + m.y * normal.y), { rel: 1e-12 });
      // Where an arc touches the line, rounding e of its height is a chord of √(8·r·e): 1e-6 for r = 1 m, e = 1e-16·100.
      expectRel(below(sMax).width, 0, { rel: 1e-6, scale: 100 });
    }),
  );
});

test("cuts through arcs agree with the cut of 16,384 chords", () => {
  fc.assert(
    fc.property(starRegion(true), fc.double({ min: 0.05, max: 0.95, noNaN: true }), (region, share) => {
      const exact = stripsAlong(only(region), UP, ORIGIN);
      const near = stripsAlong(only(chordedRegion(region, 16_384)), UP, ORIGIN);
      const d = exact.sMin + share * (exact.sMax - exact.sMin);
      const size = exact.below(exact.sMax).area;
      // 1,024 chords or more to an edge of 100 mm: each stands off its arc by less than 1e-6 of the edge.
      expectRel(exact.below(d).area, near.below(d).area, { rel: 1e-6, scale: size });
    }),
    { numRuns: 50 },
  );
});

test("nothing has no strips", () => {
  const { sMin, sMax, below } = stripsAlong([], UP, ORIGIN);
  expect(sMax - sMin).toBe(-Infinity);
  expect(below(0).area).toBe(0);
});
