import { openDb } from "@/db/client";
import { jobsAtRest, startJobs } from "@/lib/services/delivery/run-jobs";

/** A process of its own that takes up the jobs of a database, as a server does when it starts; it may be killed at any moment. */
const run = async (): Promise<void> => {
  const db = await openDb(`file:${process.argv[2] ?? ""}`);
  process.stdout.write("begun\n");
  await startJobs(db, { atStart: true });
  await jobsAtRest();
  await db.close();
  process.stdout.write("done\n");
};

void run();
