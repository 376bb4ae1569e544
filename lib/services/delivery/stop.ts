import "server-only";
import { and, eq, inArray } from "drizzle-orm";
import { jobs } from "@/db/schema/jobs";
import { mayAtAll, requireRight } from "@/lib/permissions";
import type { Delivery } from "@/lib/schemas/delivery";
import type { Ctx } from "../context";
import { logDeed } from "../log-deed";
import { deliveryView } from "./delivery-view";
import { codeOf, deliveryOf } from "./load-delivery";

/** Asks the reading of a delivery to stop; it does so after the rows in hand. Putting away is one deed and is not stopped. */
export const stopDelivery = async ({
  ctx,
  deliveryId,
}: {
  ctx: Ctx;
  deliveryId: string;
}): Promise<Delivery> => {
  mayAtAll(ctx.actor, "delivery.stop");
  return ctx.db.write(async (tx) => {
    const row = await deliveryOf(tx, ctx.actor, deliveryId);
    requireRight(ctx.actor, "revision.release", row.bayId);
    await tx
      .update(jobs)
      .set({ stopAsked: true, updatedAt: ctx.now })
      .where(
        and(
          eq(jobs.subjectId, deliveryId),
          eq(jobs.kind, "delivery.read"),
          inArray(jobs.state, ["waiting", "running"]),
        ),
      );
    await logDeed(tx, ctx, {
      verb: "delivery.stop",
      entity: "delivery",
      entityId: deliveryId,
      subject: `${codeOf(row.number)} ${row.fileName}`,
    });
    return deliveryView(tx, row);
  });
};
