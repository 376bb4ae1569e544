import "server-only";
import { eq } from "drizzle-orm";
import { bays } from "@/db/schema/bays";
import { deliveries } from "@/db/schema/deliveries";
import { rightRequests } from "@/db/schema/right-requests";
import { rights } from "@/db/schema/rights";
import { shapes } from "@/db/schema/shapes";
import { AppError } from "@/lib/errors";
import { mayAtAll } from "@/lib/permissions";
import type { Ctx } from "../context";
import { logDeed } from "../log-deed";
import { requireSameVersion } from "../stale";
import { bayOf } from "./load-bay";

/** Removes an empty bay with the rights granted in it; one that holds or held shapes or deliveries stays. */
export const deleteBay = async ({
  ctx,
  bayId,
  version,
}: {
  ctx: Ctx;
  bayId: string;
  version: number;
}): Promise<void> => {
  mayAtAll(ctx.actor, "bay.delete");
  await ctx.db.write(async (tx) => {
    const before = await bayOf(tx, ctx.actor, bayId);
    requireSameVersion(before.version, version);
    const [shape] = await tx.select({ id: shapes.id }).from(shapes).where(eq(shapes.bayId, bayId)).limit(1);
    const [delivery] = await tx
      .select({ id: deliveries.id })
      .from(deliveries)
      .where(eq(deliveries.bayId, bayId))
      .limit(1);
    if (shape || delivery) {
      throw new AppError("conflict", {
        user: `"${before.name}" holds ${shape ? "shapes" : "deliveries"}: move them to another bay first.`,
      });
    }
    await tx.delete(rights).where(eq(rights.bayId, bayId));
    await tx.delete(rightRequests).where(eq(rightRequests.bayId, bayId));
    await tx.delete(bays).where(eq(bays.id, bayId));
    await logDeed(tx, ctx, {
      verb: "bay.delete",
      entity: "bay",
      entityId: bayId,
      subject: before.name,
      before,
    });
  });
};
