import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { drawings } from "@/db/schema/drawings";
import type { Drawing } from "@/lib/drawing/schema";
import type { Actor } from "@/lib/schemas/access";
import type { DrawingItem, DrawingRecord } from "@/lib/schemas/drawing";
import { iso } from "../moments";
import { found } from "../not-found";

/** A drawing of one's own in this organisation, or not found: nobody else's, not even for an admin. */
export const drawingOf = async (
  read: Pick<Reader | Tx, "select">,
  actor: Actor,
  drawingId: string,
  { deleted = false } = {},
) =>
  found(
    (
      await read
        .select()
        .from(drawings)
        .where(
          and(
            eq(drawings.id, drawingId),
            eq(drawings.organisationId, actor.organisationId),
            eq(drawings.ownerId, actor.userId),
            deleted ? undefined : isNull(drawings.deletedAt),
          ),
        )
    )[0],
  );

export type LoadedDrawing = typeof drawings.$inferSelect;

export const toItem = (row: Omit<LoadedDrawing, "drawing"> & { parts: number }): DrawingItem => ({
  id: row.id,
  name: row.name,
  of:
    row.shapeId !== null && row.shapeOrdinal !== null
      ? { shapeId: row.shapeId, ordinal: row.shapeOrdinal }
      : null,
  parts: row.parts,
  version: row.version,
  createdAt: iso(row.createdAt),
  updatedAt: iso(row.updatedAt),
});

export const toRecord = (row: LoadedDrawing): DrawingRecord => {
  const drawing = JSON.parse(row.drawing) as Drawing;
  return { ...toItem({ ...row, parts: drawing.parts.length }), drawing };
};
