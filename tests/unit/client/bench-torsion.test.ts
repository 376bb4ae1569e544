import { expect, test } from "vitest";
import { benchFigures } from "@/lib/client/compute/bench-figures";
import { benchTorsion } from "@/lib/client/compute/bench-torsion";
import { runInSlices } from "@/lib/client/compute/run-in-slices";
import { expectRel } from "@/tests/helpers/expect-rel";
import { rectangleDrawing } from "@/tests/helpers/rectangle-properties";

const areas = async () => {
  const answer = await runInSlices(
    benchFigures({ drawing: rectangleDrawing(100, 10), picked: [] }),
    () => true,
  );
  if (answer === null || !answer.ok) throw new Error("no figures");
  return answer.value;
};

test("the first answer has the areas, the second has torsion in them and nothing else changed", async () => {
  const first = await areas();
  expect(first.properties.J).toBeNull();
  const second = await runInSlices(benchTorsion(first), () => true);
  expectRel(second!.properties.J, 31232.50375, { rel: 1e-4 });
  expect(second!.properties.absent).toEqual([]);
  expect(second!.properties.area).toBe(first.properties.area);
  expect(second!.section).toBe(first.section);
});

test("torsion stops when a later drawing came", async () => {
  const long = await runInSlices(
    benchFigures({ drawing: rectangleDrawing(20_000, 1), picked: [] }),
    () => true,
  );
  if (long === null || !long.ok) throw new Error("no figures");
  expect(await runInSlices(benchTorsion(long.value), () => false)).toBeNull();
});
