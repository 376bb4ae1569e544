import { expect, test } from "vitest";
import { torsionRatios } from "@/tests/performance/torsion";

test("torsion of everyday sections takes no longer than promised, in factorisations of a full 400 × 400 matrix", () => {
  const ratios = torsionRatios();
  console.info(ratios.map(({ name, ratio }) => `${name}: ${ratio.toFixed(1)} times the loop`).join("\n"));
  for (const { name, ratio, limit } of ratios)
    if (limit !== null) expect(ratio, name).toBeLessThanOrEqual(limit);
});
