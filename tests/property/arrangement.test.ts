import fc from "fast-check";
import { test } from "vitest";
import { addsUp, fillsItsOutline, holdsTogether, sameInAnyOrder } from "@/tests/helpers/arrangement-laws";
import { assembly, touchingPlates } from "@/tests/helpers/assemblies";

test.each(["tee", "lap", "corner"] as const)(
  "plates that touch as a %s at any angle are one body, uncracked",
  (kind) => {
    fc.assert(fc.property(touchingPlates(kind), holdsTogether), { numRuns: 200, endOnFailure: true });
  },
);

test("|A∪B| + |A∩B| = |A| + |B| for parts thrown together", () => {
  fc.assert(
    fc.property(assembly(2, 2), ([a, b]) => {
      if (a !== undefined && b !== undefined) addsUp(a, b);
    }),
    { numRuns: 60, endOnFailure: true },
  );
});

test("assemblies of up to six parts fill their outline without overlap", () => {
  fc.assert(fc.property(assembly(2, 6), fillsItsOutline), { numRuns: 25, endOnFailure: true });
});

test("assemblies of up to six parts come out alike in another order", () => {
  fc.assert(fc.property(assembly(2, 6), sameInAnyOrder), { numRuns: 25, endOnFailure: true });
});
