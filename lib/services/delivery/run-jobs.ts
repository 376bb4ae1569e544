import "server-only";
import { Worker } from "node:worker_threads";
import { and, eq, inArray, lt, or, sql } from "drizzle-orm";
import type { Db } from "@/db/client";
import { deliveries } from "@/db/schema/deliveries";
import { jobs } from "@/db/schema/jobs";
import { environment } from "@/lib/env";
import { logger } from "@/lib/logger";
import { newId } from "../new-id";
import { JOB_KINDS, LEASE_MS, MAX_ATTEMPTS } from "./job";
import type { JobReply, JobRequest, JobStart } from "./job-messages";

type Host = { holder: string; running: Map<string, Promise<void>> };
const store = globalThis as typeof globalThis & { flitchbookJobs?: Host };
const host = (): Host => (store.flitchbookJobs ??= { holder: newId(), running: new Map() });

/**
 * Starts every job that nobody is at: new ones, and those whose process ended (their lease ran out, or, with a file database
 * that this process owns alone, at once when `atStart`). Answers when they are started, not when they are done.
 */
export const startJobs = async (db: Db, { atStart = false } = {}): Promise<void> => {
  const now = Date.now();
  const stale = atStart && db.reader.protocol === "file" ? sql`1` : lt(jobs.leaseUntil, now);
  const open = and(
    inArray(jobs.kind, [...JOB_KINDS]),
    or(eq(jobs.state, "waiting"), and(eq(jobs.state, "running"), stale)),
  );
  const waiting = await db.read.select({ id: jobs.id }).from(jobs).where(open).orderBy(jobs.createdAt);
  const { holder, running } = host();
  for (const { id } of waiting) {
    if (running.has(id)) continue;
    const claimed = await claim(db, id, holder, atStart);
    if (claimed === "given up") await giveUp(db, id, "It was begun several times and never finished.");
    if (claimed === "ours")
      running.set(
        id,
        runJob(db, id).finally(() => running.delete(id)),
      );
  }
};

/** Resolves when the jobs of this process that are running now have ended. */
export const jobsAtRest = async (): Promise<void> => {
  await Promise.all([...host().running.values()]);
};

const claim = (
  db: Db,
  id: string,
  holder: string,
  atStart: boolean,
): Promise<"ours" | "taken" | "given up"> =>
  db.write(async (tx) => {
    const [row] = await tx.select().from(jobs).where(eq(jobs.id, id));
    const now = Date.now();
    const free =
      row?.state === "waiting" || (row?.state === "running" && (atStart || (row.leaseUntil ?? 0) < now));
    if (row === undefined || !free) return "taken";
    if (row.attempts >= MAX_ATTEMPTS) return "given up";
    await tx
      .update(jobs)
      .set({
        state: "running",
        leaseUntil: now + LEASE_MS,
        leaseHolder: holder,
        attempts: row.attempts + 1,
        updatedAt: now,
      })
      .where(eq(jobs.id, id));
    return "ours";
  });

const startWorker = (start: JobStart): Worker =>
  process.env.NEXT_RUNTIME === "nodejs"
    ? new Worker(new URL("./job-worker.ts", import.meta.url), { workerData: start })
    : new Worker(new URL("./job-worker-source.mjs", import.meta.url), {
        workerData: start,
        execArgv: ["--conditions=react-server"],
      });

async function runJob(db: Db, jobId: string): Promise<void> {
  const authToken = environment().DATABASE_AUTH_TOKEN ?? null;
  const worker = startWorker({ jobId, url: db.url, authToken });
  const go: JobRequest = "go";
  let free: () => void = () => undefined;
  let failure: string | null = null;
  worker.on("message", (reply: JobReply) => {
    if (reply.kind === "slot") {
      const held = new Promise<void>((resolve) => {
        free = resolve;
      });
      db.exclusive(reply.label, () => {
        worker.postMessage(go);
        return held;
      }).catch(() => worker.postMessage(go)); // the queue was full for its whole limit: the thread's own retries take over
    } else if (reply.kind === "free") free();
    else if (reply.kind === "failed") failure = reply.message;
  });
  const code = await new Promise<number>((resolve) => {
    worker.on("error", (error) => {
      failure = error instanceof Error ? (error.stack ?? error.message) : String(error);
    });
    worker.on("exit", resolve);
  });
  free();
  if (failure === null && code === 0) return;
  logger().error({ jobId, err: failure ?? `thread ended with ${code}` }, "job failed");
  await giveUp(db, jobId, "The program failed at this delivery; it has been logged.");
}

/** Ends a job that cannot be done and gives its delivery back, with the reason. */
const giveUp = (db: Db, jobId: string, detail: string): Promise<void> =>
  db.write(async (tx) => {
    const [job] = await tx.select().from(jobs).where(eq(jobs.id, jobId));
    if (job === undefined || job.state === "done" || job.state === "stopped" || job.state === "failed")
      return;
    const now = Date.now();
    await tx
      .update(jobs)
      .set({ state: "failed", failure: detail, leaseUntil: null, updatedAt: now })
      .where(eq(jobs.id, jobId));
    await tx
      .update(deliveries)
      .set({
        state: job.kind === "delivery.putAway" ? "read" : "failed",
        failure: JSON.stringify({ code: "job.failed", detail }),
        version: sql`${deliveries.version} + 1`,
        updatedAt: now,
      })
      .where(eq(deliveries.id, job.subjectId));
  });
