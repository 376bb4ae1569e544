import fc from "fast-check";
import { test } from "vitest";
import { drawnParts, half, staysWhenCut, staysWhenMixed, staysWhenMoved } from "@/tests/helpers/drawing-laws";

const angle = fc.double({ min: -180, max: 180, noNaN: true });

test("a drawing moved by up to 1e6 mm has the same properties", () => {
  const law = fc.property(drawnParts, half(-4e5, 4e5), half(-4e5, 4e5), staysWhenMoved);
  fc.assert(law, { numRuns: 20, endOnFailure: true });
});

test("the order of parts changes no property, and no part", () => {
  fc.assert(fc.property(drawnParts, fc.integer(), staysWhenMixed), { numRuns: 20, endOnFailure: true });
});

test("a plate cut in two along any line across gives the same section, in one body", () => {
  const law = fc.property(half(20, 600), half(4, 80), angle, fc.integer({ min: 1, max: 19 }), staysWhenCut);
  fc.assert(law, { numRuns: 100, endOnFailure: true });
});
