import "server-only";
import type { Db } from "@/db/client";
import { loadJob } from "./job";
import { putAwayDelivery } from "./put-away-delivery";
import { readDelivery } from "./read-delivery";

/** Does one job that has been claimed, in whatever thread this is. */
export const performJob = async (db: Db, jobId: string): Promise<void> => {
  const job = await loadJob(db, jobId);
  switch (job.kind) {
    case "delivery.read":
      return readDelivery(db, job);
    case "delivery.putAway":
      return putAwayDelivery(db, job);
    default:
      job.kind satisfies never;
  }
};
