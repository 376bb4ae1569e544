import "server-only";
import { eq } from "drizzle-orm";
import { deliveries } from "@/db/schema/deliveries";
import { AppError } from "@/lib/errors";
import { mayAtAll, requireRight } from "@/lib/permissions";
import type { DeliveryState } from "@/lib/schemas/delivery";
import type { Ctx, Versioned } from "../context";
import { logDeed } from "../log-deed";
import { requireSameVersion } from "../stale";
import { codeOf, deliveryOf } from "./load-delivery";

const BUSY: readonly DeliveryState[] = ["received", "reading", "putting-away"];

/** Discards a delivery that brought nothing to the Rack; its rows and file go with it, the log keeps that it was there. */
export const deleteDelivery = async ({
  ctx,
  deliveryId,
  version,
}: { ctx: Ctx; deliveryId: string } & Versioned): Promise<void> => {
  mayAtAll(ctx.actor, "delivery.delete");
  await ctx.db.write(async (tx) => {
    const before = await deliveryOf(tx, ctx.actor, deliveryId);
    requireRight(ctx.actor, "revision.release", before.bayId);
    requireSameVersion(before.version, version);
    if (before.putAwayAt !== null)
      throw new AppError("conflict", {
        user: `${codeOf(before.number)} was put away: it stays in the book, and can be returned.`,
      });
    if (BUSY.includes(before.state))
      throw new AppError("conflict", { user: `${codeOf(before.number)} is ${before.state}: stop it first.` });
    await tx.delete(deliveries).where(eq(deliveries.id, deliveryId));
    await logDeed(tx, ctx, {
      verb: "delivery.delete",
      entity: "delivery",
      entityId: deliveryId,
      subject: `${codeOf(before.number)} ${before.fileName}`,
      before: { state: before.state, fileName: before.fileName },
    });
  });
};
