import { expect, test } from "vitest";
import { areaMomentRatios } from "@/tests/performance/area-moments";

test("moments take at most 15 times a plain shoelace loop over the same edges", () => {
  const ratios = areaMomentRatios();
  console.info(
    ratios.map(({ name, ratio }) => `${name}: ${ratio.toFixed(1)} times a shoelace loop`).join("\n"),
  );
  for (const { name, ratio, limit } of ratios)
    if (limit !== null) expect(ratio, name).toBeLessThanOrEqual(limit);
});
