import "server-only";
import { eq } from "drizzle-orm";
import type { z } from "zod";
import { drawings } from "@/db/schema/drawings";
import { mayAtAll } from "@/lib/permissions";
import { type DrawingRecord, UpdateDrawingInput } from "@/lib/schemas/drawing";
import type { VerbArgs, Versioned } from "../context";
import { logDeed } from "../log-deed";
import { parseInput } from "../parse-input";
import { revisionOf, shapeOf } from "../shape/load-shape";
import { forgetUses, rememberUses } from "../shape/remember-uses";
import { requireSameVersion } from "../stale";
import { drawingOf, toRecord } from "./load-drawing";

/** Saves or renames a private drawing; the window that saves second is told, and neither state is lost. */
export const updateDrawing = async ({
  ctx,
  drawingId,
  version,
  input,
}: VerbArgs<
  z.input<typeof UpdateDrawingInput>,
  { drawingId: string } & Versioned
>): Promise<DrawingRecord> => {
  mayAtAll(ctx.actor, "drawing.update");
  const { name, drawing, of } = parseInput(UpdateDrawingInput, input);
  return ctx.db.write(async (tx) => {
    const before = await drawingOf(tx, ctx.actor, drawingId);
    requireSameVersion(before.version, version);
    if (of) await revisionOf(tx, ctx.actor, await shapeOf(tx, ctx.actor, of.shapeId), of.ordinal);
    await tx
      .update(drawings)
      .set({
        ...(name !== undefined && { name }),
        ...(drawing !== undefined && { drawing: JSON.stringify(drawing) }),
        ...(of !== undefined && { shapeId: of?.shapeId ?? null, shapeOrdinal: of?.ordinal ?? null }),
        version: version + 1,
        updatedAt: ctx.now,
      })
      .where(eq(drawings.id, drawingId));
    if (drawing) {
      await forgetUses(tx, drawingId);
      await rememberUses(tx, ctx.actor, [{ kind: "drawing", id: drawingId, drawing }]);
    }
    await logDeed(tx, ctx, {
      verb: "drawing.update",
      entity: "drawing",
      entityId: drawingId,
      subject: name ?? before.name,
      before: { name: before.name, version: before.version },
      after: { ...(name !== undefined && { name }), version: version + 1 },
    });
    return toRecord(await drawingOf(tx, ctx.actor, drawingId));
  });
};
