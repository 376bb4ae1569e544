import fc from "fast-check";
import { test } from "vitest";
import { expectWithinEstimates } from "@/tests/helpers/check-estimates";
import { connectedSection } from "@/tests/helpers/random-sections";

test("two hundred random connected sections lie within their own estimates of a much finer solution", () => {
  fc.assert(fc.property(connectedSection, expectWithinEstimates), { numRuns: 200 });
}, 900_000);
