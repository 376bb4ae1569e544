import "server-only";
import { eq } from "drizzle-orm";
import { drawings } from "@/db/schema/drawings";
import { mayAtAll } from "@/lib/permissions";
import type { Ctx } from "../context";
import { logDeed } from "../log-deed";
import { requireSameVersion } from "../stale";
import { drawingOf } from "./load-drawing";

/** Takes a private drawing out of the list; `restoreDrawing` brings it back. */
export const deleteDrawing = async ({
  ctx,
  drawingId,
  version,
}: {
  ctx: Ctx;
  drawingId: string;
  version: number;
}): Promise<void> => {
  mayAtAll(ctx.actor, "drawing.delete");
  await ctx.db.write(async (tx) => {
    const before = await drawingOf(tx, ctx.actor, drawingId);
    requireSameVersion(before.version, version);
    await tx
      .update(drawings)
      .set({ deletedAt: ctx.now, version: version + 1 })
      .where(eq(drawings.id, drawingId));
    await logDeed(tx, ctx, {
      verb: "drawing.delete",
      entity: "drawing",
      entityId: drawingId,
      subject: before.name,
    });
  });
};
