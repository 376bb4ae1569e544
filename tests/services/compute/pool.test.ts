import { afterAll, beforeAll, expect, test } from "vitest";
import { ComputePool } from "@/lib/services/compute/pool";
import { must } from "@/tests/helpers/must";
import { expectRel } from "@/tests/helpers/expect-rel";
import { rectangleDrawing } from "@/tests/helpers/rectangle-properties";

let pool: ComputePool;
const plate = (depth: number) => ({ kind: "properties", drawing: rectangleDrawing(10, depth) }) as const;
beforeAll(async () => {
  pool = new ComputePool(2);
  await pool.warmUp(rectangleDrawing(10, 20));
});
afterAll(() => pool.close());

test("many drawings at once each get their own answer", async () => {
  const depths = Array.from({ length: 40 }, (_, i) => 100 + i);
  const results = await Promise.all(depths.map((depth) => pool.run(plate(depth))));
  results.forEach((result, i) => {
    const depth = depths[i] ?? 0;
    expectRel(must(result).Ix, (10 * depth ** 3) / 12, { rel: 1e-12 });
  });
});

test("what takes longer than its limit is ended and says so, and the pool goes on", async () => {
  await expect(pool.run(plate(100), { limitMs: 0 })).rejects.toMatchObject({
    code: "invalid",
    issues: [expect.objectContaining({ code: "compute.tooLong" })],
  });
  expect(must(await pool.run(plate(100))).area).toBe(1000);
});

test("what nobody waits for any more is stopped, waiting or running", async () => {
  const stop = new AbortController();
  const asked = Array.from({ length: 6 }, () => pool.run(plate(100), { signal: stop.signal }));
  stop.abort();
  const settled = await Promise.allSettled(asked);
  expect(settled.every((s) => s.status === "rejected")).toBe(true);
  expect(must(await pool.run(plate(100))).area).toBe(1000);
});
