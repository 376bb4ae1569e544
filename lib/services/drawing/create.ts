import "server-only";
import type { z } from "zod";
import type { Tx } from "@/db/client";
import { drawings } from "@/db/schema/drawings";
import { mayAtAll } from "@/lib/permissions";
import { CreateDrawingInput, type DrawingRecord } from "@/lib/schemas/drawing";
import type { Ctx, VerbArgs } from "../context";
import { logDeed } from "../log-deed";
import { newId } from "../new-id";
import { parseInput } from "../parse-input";
import { revisionOf, shapeOf } from "../shape/load-shape";
import { rememberUses } from "../shape/remember-uses";
import { drawingOf, toRecord } from "./load-drawing";

/** Keeps a private drawing; it may be of a section that cannot be computed yet. */
export const createDrawing = async ({
  ctx,
  input,
}: VerbArgs<z.input<typeof CreateDrawingInput>>): Promise<DrawingRecord> => {
  mayAtAll(ctx.actor, "drawing.create");
  const parsed = parseInput(CreateDrawingInput, input);
  return ctx.db.write((tx) => insertDrawing(tx, ctx, parsed));
};

export const insertDrawing = async (
  tx: Tx,
  ctx: Ctx,
  { name, drawing, of = null }: z.output<typeof CreateDrawingInput>,
): Promise<DrawingRecord> => {
  if (of) await revisionOf(tx, ctx.actor, await shapeOf(tx, ctx.actor, of.shapeId), of.ordinal);
  const id = newId();
  await tx.insert(drawings).values({
    id,
    organisationId: ctx.actor.organisationId,
    ownerId: ctx.actor.userId,
    name,
    drawing: JSON.stringify(drawing),
    shapeId: of?.shapeId ?? null,
    shapeOrdinal: of?.ordinal ?? null,
    createdAt: ctx.now,
    updatedAt: ctx.now,
  });
  await rememberUses(tx, ctx.actor, [{ kind: "drawing", id, drawing }]);
  await logDeed(tx, ctx, { verb: "drawing.create", entity: "drawing", entityId: id, subject: name });
  return toRecord(await drawingOf(tx, ctx.actor, id));
};
