import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { clipToHalfPlane, type HalfPlane } from "@/lib/geometry/clip-half-plane";
import { stripsAlong } from "@/lib/geometry/half-plane-integrals";
import { regionMoments } from "@/lib/geometry/moments";
import type { Region } from "@/lib/geometry/region";
import { profileRegions } from "@/lib/profiles/profile-regions";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";
import { starRegion } from "@/tests/helpers/rings";
import { rectangleAt } from "@/tests/helpers/sections";

const EXACT = { rel: 1e-12 };
const ORIGIN = { x: 0, y: 0 };
const below = (y: number): HalfPlane => ({ normal: { x: 0, y: 1 }, offset: y });
const above = (y: number): HalfPlane => ({ normal: { x: 0, y: -1 }, offset: -y });
const areaOf = (regions: readonly Region[]) => regionMoments(regions, ORIGIN).area;
const lengthsOf = (segments: readonly { from: { x: number; y: number }; to: { x: number; y: number } }[]) =>
  segments.map(({ from, to }) => Math.hypot(to.x - from.x, to.y - from.y)).sort((a, b) => a - b);

describe("a rectangle", () => {
  const plate = [rectangleAt(10, 0, 100, 40)];
  test("is cut where the line passes", () => {
    const { regions, segments } = must(clipToHalfPlane(plate, below(15)));
    expectRel(areaOf(regions), 1500, EXACT);
    expect(lengthsOf(segments)).toEqual([100]);
  });

  test("is kept or dropped whole where the line misses it or runs along an edge, and no cut is told then", () => {
    for (const y of [40, 41]) {
      const { regions, segments } = must(clipToHalfPlane(plate, below(y)));
      expectRel(areaOf(regions), 4000, EXACT);
      expect(segments).toEqual([]);
    }
    for (const y of [0, -1])
      expect(must(clipToHalfPlane(plate, below(y)))).toEqual({ regions: [], segments: [] });
  });
});

test("a hole that is cut becomes part of the outline, one that is not stays a hole", () => {
  const tube = must(profileRegions({ family: "round-hollow", dimensions: { diameter: 100, thickness: 5 } }));
  const half = must(clipToHalfPlane(tube, below(0)));
  expect(half.regions).toHaveLength(1);
  expect(half.regions[0]?.holes).toEqual([]);
  expectRel(areaOf(half.regions), areaOf(tube) / 2, EXACT);
  lengthsOf(half.segments).forEach((length) => expectRel(length, 5, EXACT));
  const most = must(clipToHalfPlane(tube, below(47)));
  expect(most.regions[0]?.holes).toHaveLength(1);
  const touching = must(clipToHalfPlane(tube, below(45)));
  // The line touches the bore: one segment, or two that meet there.
  expectRel(
    lengthsOf(touching.segments).reduce((a, b) => a + b, 0),
    2 * Math.sqrt(50 ** 2 - 45 ** 2),
    { rel: 1e-6 },
  );
});

test("cutting a U across its legs leaves two pieces with a segment each", () => {
  const u: Region = {
    outer: [
      { x: 0, y: 0 },
      { x: 90, y: 0 },
      { x: 90, y: 60 },
      { x: 80, y: 60 },
      { x: 80, y: 10 },
      { x: 10, y: 10 },
      { x: 10, y: 60 },
      { x: 0, y: 60 },
    ],
    holes: [],
  };
  const { regions, segments } = must(clipToHalfPlane([u], above(30)));
  expect(regions).toHaveLength(2);
  expect(lengthsOf(segments)).toEqual([10, 10]);
  // At the inner face the web's own edge lies on the line: cut are the legs alone when they are taken off …
  expect(lengthsOf(must(clipToHalfPlane([u], above(10))).segments)).toEqual([10, 10]);
  // … and when the web is: its free edge between the legs was a boundary already.
  expect(lengthsOf(must(clipToHalfPlane([u], below(10))).segments)).toEqual([10, 10]);
});

describe("any area of lines and arcs", () => {
  const cut = fc.tuple(
    starRegion(true),
    fc.double({ min: -3, max: 3, noNaN: true }),
    fc.double({ min: 0.02, max: 0.98, noNaN: true }),
  );

  test("is the sum of its two sides, each with the area that integration along the line gives", () => {
    fc.assert(
      fc.property(cut, ([region, angle, share]) => {
        const normal = { x: Math.cos(angle), y: Math.sin(angle) };
        const strips = stripsAlong([{ regions: [region], weight: 1 }], normal, ORIGIN);
        const d = strips.sMin + share * (strips.sMax - strips.sMin);
        const low = must(clipToHalfPlane([region], { normal, offset: d }));
        const high = must(clipToHalfPlane([region], { normal: { x: -normal.x, y: -normal.y }, offset: -d }));
        const whole = areaOf([region]);
        expectRel(areaOf(low.regions), strips.below(d).area, { rel: 1e-11, scale: whole });
        expectRel(areaOf(low.regions) + areaOf(high.regions), whole, { rel: 1e-11 });
        // Near a touching arc the crossings lie √ε apart.
        expectRel(
          lengthsOf(low.segments).reduce((a, b) => a + b, 0),
          strips.below(d).width,
          { rel: 1e-7, scale: 100 },
        );
        expectRel(
          lengthsOf(high.segments).reduce((a, b) => a + b, 0),
          strips.below(d).width,
          { rel: 1e-7, scale: 100 },
        );
      }),
      { numRuns: 500 },
    );
  });

  test("is cut through a vertex as well as beside it", () => {
    fc.assert(
      fc.property(starRegion(true), fc.nat({ max: 11 }), (region, index) => {
        const v = region.outer[index % region.outer.length] ?? { x: 0, y: 0 };
        const offset = v.y;
        const low = must(clipToHalfPlane([region], below(offset)));
        const high = must(clipToHalfPlane([region], above(offset)));
        expectRel(areaOf(low.regions) + areaOf(high.regions), areaOf([region]), { rel: 1e-11 });
      }),
      { numRuns: 500 },
    );
  });
});
