import { afterAll, beforeAll, expect, test } from "vitest";
import { eq } from "drizzle-orm";
import { jobs } from "@/db/schema/jobs";
import { createDelivery } from "@/lib/services/delivery/create";
import { decideRow } from "@/lib/services/delivery/decide";
import { putDeliveryFile } from "@/lib/services/delivery/put-file";
import { putReading } from "@/lib/services/delivery/put-reading";
import { jobsAtRest, startJobs } from "@/lib/services/delivery/run-jobs";
import { showDelivery } from "@/lib/services/delivery/show";
import { showDeliveryRow } from "@/lib/services/delivery/rows";
import { stopDelivery } from "@/lib/services/delivery/stop";
import { longTable } from "@/tests/helpers/delivery-crash";
import { testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";

let org: TestOrganisation;
beforeAll(async () => {
  org = await testOrganisation();
});
afterAll(async () => {
  await jobsAtRest();
  await org.close();
});

async function begun(rows: number) {
  const ctx = org.as("librarian");
  const made = await createDelivery({ ctx, input: { bayId: org.bayIds[1], fileName: "long.csv" } });
  await putDeliveryFile({ ctx, deliveryId: made.id, version: made.version, bytes: longTable(rows) });
  return { ctx, deliveryId: made.id };
}

test("reading stops when asked to, keeps the file, and begins again by a reading", async () => {
  const { ctx, deliveryId } = await begun(1_500);
  await stopDelivery({ ctx, deliveryId });
  await jobsAtRest();
  const stopped = await showDelivery({ ctx, deliveryId });
  expect(stopped).toMatchObject({ state: "stopped", progress: null });
  await putReading({ ctx, deliveryId, version: stopped.version, input: { encoding: "utf-8" } });
  await jobsAtRest();
  expect(await showDelivery({ ctx, deliveryId })).toMatchObject({
    state: "read",
    counts: { rows: 1_500, accepted: 1_500 },
  });
});

test("a job whose process ended is taken up at the next start; one that fails three times is given up with a word", async () => {
  const { ctx, deliveryId } = await begun(10);
  await jobsAtRest();
  const again = async (attempts: number) => {
    await org.db.write((tx) =>
      tx
        .update(jobs)
        .set({ state: "running", attempts, leaseUntil: Date.now() + 60_000 })
        .where(eq(jobs.subjectId, deliveryId)),
    );
    await startJobs(org.db, { atStart: true });
    await jobsAtRest();
    return showDelivery({ ctx, deliveryId });
  };
  expect(await again(1)).toMatchObject({ state: "read", counts: { rows: 10 } });
  expect(await again(3)).toMatchObject({ state: "failed", fault: { code: "job.failed" } });
});

test("the event loop goes on while a delivery is read", async () => {
  let worst = 0;
  const started = performance.now();
  let last = started;
  const timer = setInterval(() => {
    const now = performance.now();
    worst = Math.max(worst, now - last);
    last = now;
  }, 5);
  await begun(600);
  await jobsAtRest();
  clearInterval(timer);
  // On this thread the computing would be one gap of nearly the whole time.
  expect(worst / (performance.now() - started)).toBeLessThan(0.25);
});

test("sixteen who decide one row at once: one wins, the others are told it has changed", async () => {
  const { ctx, deliveryId } = await begun(3);
  await jobsAtRest();
  const { version } = await showDeliveryRow({ ctx, deliveryId, row: 2 });
  const all = await Promise.allSettled(
    Array.from({ length: 16 }, () =>
      decideRow({ ctx, deliveryId, row: 2, version, input: { decision: "leave-out" } }),
    ),
  );
  expect(all.filter((a) => a.status === "fulfilled")).toHaveLength(1);
  for (const one of all) if (one.status === "rejected") expect(one.reason).toMatchObject({ code: "stale" });
});
