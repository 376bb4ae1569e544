import "server-only";
import { mayAtAll } from "@/lib/permissions";
import type { DrawingRecord } from "@/lib/schemas/drawing";
import type { Ctx } from "../context";
import { insertDrawing } from "./create";
import { drawingOf, toRecord } from "./load-drawing";

const MAX_NAME = 120;

/** A copy of one's own drawing, named after it. */
export const duplicateDrawing = async ({
  ctx,
  drawingId,
}: {
  ctx: Ctx;
  drawingId: string;
}): Promise<DrawingRecord> => {
  mayAtAll(ctx.actor, "drawing.duplicate");
  return ctx.db.write(async (tx) => {
    const { name, drawing } = toRecord(await drawingOf(tx, ctx.actor, drawingId));
    return insertDrawing(tx, ctx, { name: `${name.slice(0, MAX_NAME - 7)} (copy)`, drawing });
  });
};
