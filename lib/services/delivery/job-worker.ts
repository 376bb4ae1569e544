import { parentPort, workerData } from "node:worker_threads";
import { openDb, type Db } from "@/db/client";
import type { JobReply, JobRequest, JobStart } from "./job-messages";
import { performJob } from "./perform-job";

const port = parentPort;
if (port === null) throw new Error("job-worker runs in a thread only");
// Safe cast: the one that starts this thread is run-jobs.ts.
const start = workerData as JobStart;

let granted: (() => void) | null = null;
port.on("message", (message: JobRequest) => {
  if (message === "go") granted?.();
});
const say = (reply: JobReply) => port.postMessage(reply);

/** Every write of the thread waits for the slot of the process's one write queue, so the two connections never meet. */
const inTurn = (db: Db): Db => ({
  ...db,
  write: async (work, label) => {
    const turn = new Promise<void>((resolve) => {
      granted = resolve;
    });
    say({ kind: "slot", label: label ?? "" });
    await turn;
    try {
      return await db.write(work, label);
    } finally {
      say({ kind: "free" });
    }
  },
});

const run = async (): Promise<void> => {
  const db = await openDb(start.url, { authToken: start.authToken ?? undefined, readerCacheKib: 8192 });
  try {
    await performJob(inTurn(db), start.jobId);
    say({ kind: "done" });
  } finally {
    await db.close();
  }
};

run()
  .catch((error: unknown) =>
    say({ kind: "failed", message: error instanceof Error ? (error.stack ?? error.message) : String(error) }),
  )
  .finally(() => port.close());
