import "server-only";
import { mayAtAll } from "@/lib/permissions";
import type { Delivery } from "@/lib/schemas/delivery";
import type { Ctx } from "../context";
import { deliveryView } from "./delivery-view";
import { deliveryOf } from "./load-delivery";
import { startJobs } from "./run-jobs";

/** One delivery: what was recognised, counted, and how far its job is. Takes up a job whose process has ended. */
export const showDelivery = async ({
  ctx,
  deliveryId,
}: {
  ctx: Ctx;
  deliveryId: string;
}): Promise<Delivery> => {
  mayAtAll(ctx.actor, "delivery.show");
  const row = await deliveryOf(ctx.db.read, ctx.actor, deliveryId);
  if (row.state === "received" || row.state === "reading" || row.state === "putting-away")
    await startJobs(ctx.db);
  return deliveryView(ctx.db.read, row);
};
