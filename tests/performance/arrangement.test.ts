import { expect, test } from "vitest";
import { arrangementRatios } from "@/tests/performance/arrangement";

test("checking and arranging grow no faster than n log n", () => {
  const ratios = arrangementRatios();
  console.info(ratios.map(({ name, ratio }) => `${name}: ${ratio.toFixed(1)} times`).join("\n"));
  for (const { name, ratio, limit } of ratios)
    if (limit !== null) expect(ratio, name).toBeLessThanOrEqual(limit);
});
