import fc from "fast-check";
import { test } from "vitest";
import { addsUp, fillsItsOutline, holdsTogether, sameInAnyOrder } from "@/tests/helpers/arrangement-laws";
import { assembly, touchingPlates } from "@/tests/helpers/assemblies";

const MINUTES = 10 * 60_000;

test.each(["tee", "lap", "corner"] as const)(
  "2,000 pairs of plates that touch as a %s are one body, uncracked",
  (kind) => {
    fc.assert(fc.property(touchingPlates(kind), holdsTogether), { numRuns: 2_000, endOnFailure: true });
  },
  MINUTES,
);

test(
  "|A∪B| + |A∩B| = |A| + |B| for 2,000 pairs thrown together",
  () => {
    fc.assert(
      fc.property(assembly(2, 2), ([a, b]) => {
        if (a !== undefined && b !== undefined) addsUp(a, b);
      }),
      { numRuns: 2_000, endOnFailure: true },
    );
  },
  MINUTES,
);

test(
  "2,000 assemblies of up to six parts fill their outline without overlap",
  () => {
    fc.assert(fc.property(assembly(2, 6), fillsItsOutline), { numRuns: 2_000, endOnFailure: true });
  },
  MINUTES,
);

test(
  "200 assemblies of up to six parts come out alike in another order",
  () => {
    fc.assert(fc.property(assembly(2, 6), sameInAnyOrder), { numRuns: 200, endOnFailure: true });
  },
  MINUTES,
);
