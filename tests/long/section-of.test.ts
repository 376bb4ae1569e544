import fc from "fast-check";
import { test } from "vitest";
import { drawnParts, half, staysWhenCut, staysWhenMixed, staysWhenMoved } from "@/tests/helpers/drawing-laws";

const MINUTES = 10 * 60_000;
const angle = fc.double({ min: -180, max: 180, noNaN: true });

test(
  "300 drawings moved by up to 1e6 mm have the same properties",
  () => {
    const law = fc.property(drawnParts, half(-4e5, 4e5), half(-4e5, 4e5), staysWhenMoved);
    fc.assert(law, { numRuns: 300, endOnFailure: true });
  },
  MINUTES,
);

test(
  "300 drawings in another order have the same properties and parts",
  () => {
    fc.assert(fc.property(drawnParts, fc.integer(), staysWhenMixed), { numRuns: 300, endOnFailure: true });
  },
  MINUTES,
);

test("2,000 plates cut in two along any line across are the same section, in one body", () => {
  const law = fc.property(half(20, 600), half(4, 80), angle, fc.integer({ min: 1, max: 19 }), staysWhenCut);
  fc.assert(law, { numRuns: 2_000, endOnFailure: true });
});
