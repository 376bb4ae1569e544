import "server-only";
import { eq } from "drizzle-orm";
import { drawings } from "@/db/schema/drawings";
import { mayAtAll } from "@/lib/permissions";
import type { DrawingRecord } from "@/lib/schemas/drawing";
import type { Ctx } from "../context";
import { logDeed } from "../log-deed";
import { drawingOf, toRecord } from "./load-drawing";

/** Undoes a deletion; for a drawing that was not deleted there is nothing to do. */
export const restoreDrawing = async ({
  ctx,
  drawingId,
}: {
  ctx: Ctx;
  drawingId: string;
}): Promise<DrawingRecord> => {
  mayAtAll(ctx.actor, "drawing.restore");
  return ctx.db.write(async (tx) => {
    const before = await drawingOf(tx, ctx.actor, drawingId, { deleted: true });
    if (before.deletedAt !== null) {
      await tx
        .update(drawings)
        .set({ deletedAt: null, version: before.version + 1 })
        .where(eq(drawings.id, drawingId));
      await logDeed(tx, ctx, {
        verb: "drawing.restore",
        entity: "drawing",
        entityId: drawingId,
        subject: before.name,
      });
    }
    return toRecord(await drawingOf(tx, ctx.actor, drawingId));
  });
};
