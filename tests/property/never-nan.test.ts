import fc from "fast-check";
import { expect, test } from "vitest";
import type { Region, Vertex } from "@/lib/geometry/region";
import { everyNumberIsFinite } from "@/lib/section/finite";
import { jointForces } from "@/lib/section/joint-forces";
import { kern } from "@/lib/section/kern";
import { grossAndNet } from "@/lib/section/net-section";
import { plasticAbout } from "@/lib/section/plastic-about";
import { sectionCut } from "@/lib/section/section-cut";
import { sectionProperties } from "@/lib/section/section-properties";
import { partOf, sectionOfParts } from "@/tests/helpers/sections";

/** Coordinates of every kind that a number can be, most of them ordinary. */
const coordinate = fc.oneof(
  { weight: 6, arbitrary: fc.double({ min: -200, max: 200, noNaN: true }) },
  { weight: 2, arbitrary: fc.constantFrom(0, 10, 10, 20, -10) },
  { weight: 1, arbitrary: fc.double() },
);
const bulge = fc.oneof(
  fc.constant(0),
  fc.double({ min: -1, max: 1, noNaN: true }),
  fc.double({ min: -1e3, max: 1e3, noNaN: true }),
);
const vertex: fc.Arbitrary<Vertex> = fc.record({ x: coordinate, y: coordinate, bulge });
const ring = fc.array(vertex, { maxLength: 8 });
const region: fc.Arbitrary<Region> = fc.record({ outer: ring, holes: fc.array(ring, { maxLength: 1 }) });
const section = fc
  .array(region, { minLength: 1, maxLength: 3 })
  .map((regions) => sectionOfParts(regions.map((one, i) => partOf([one], { id: `p${i}` }))));

/** Rings that cross themselves, have no area, run the wrong way or hold no numbers: what a caller should not send. */
test("whatever the outlines are, no function answers NaN or infinity and none throws", () => {
  fc.assert(
    fc.property(section, fc.double({ min: -360, max: 360, noNaN: true }), (any, angle) => {
      for (const answer of [
        sectionProperties(any),
        kern(any),
        plasticAbout(any, angle),
        jointForces(any),
        sectionCut(any, [{ normal: { x: 0, y: 1 }, offset: 3 }]),
      ])
        expect(everyNumberIsFinite(answer), JSON.stringify(answer)).toBe(true);
    }),
    { numRuns: 3000 },
  );
});

test("ordinary outlines with any hole deducted answer finite figures or faults", () => {
  const ordinary = fc.double({ min: -100, max: 100, noNaN: true });
  const plain = fc
    .record({
      x: ordinary,
      y: ordinary,
      w: fc.double({ min: 1, max: 100, noNaN: true }),
      h: fc.double({ min: 1, max: 100, noNaN: true }),
    })
    .map(({ x, y, w, h }) =>
      sectionOfParts([
        partOf([
          {
            outer: [
              { x, y },
              { x: x + w, y },
              { x: x + w, y: y + h, bulge: 0.4 },
              { x, y: y + h },
            ],
            holes: [],
          },
        ]),
      ]),
    );
  const hole = fc.record({
    at: fc.record({ x: fc.oneof(ordinary, fc.double()), y: ordinary }),
    angle: fc.double({ min: -360, max: 360, noNaN: true }),
    diameter: fc.oneof(fc.double({ min: 0, max: 50, noNaN: true }), fc.double()),
    length: fc.double({ min: 0, max: 300, noNaN: true }),
  });
  fc.assert(
    fc.property(plain, fc.array(hole, { maxLength: 3 }), (any, holes) => {
      expect(everyNumberIsFinite(grossAndNet(any, holes))).toBe(true);
    }),
    { numRuns: 300 },
  );
});
