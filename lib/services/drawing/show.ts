import "server-only";
import { mayAtAll } from "@/lib/permissions";
import type { DrawingRecord } from "@/lib/schemas/drawing";
import type { Ctx } from "../context";
import { drawingOf, toRecord } from "./load-drawing";

export const showDrawing = async ({
  ctx,
  drawingId,
}: {
  ctx: Ctx;
  drawingId: string;
}): Promise<DrawingRecord> => {
  mayAtAll(ctx.actor, "drawing.show");
  return toRecord(await drawingOf(ctx.db.read, ctx.actor, drawingId));
};
