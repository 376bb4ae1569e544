import "server-only";
import { and, eq, inArray } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { drawingUses } from "@/db/schema/drawing-uses";
import { shapes } from "@/db/schema/shapes";
import type { Drawing } from "@/lib/drawing/schema";
import type { Actor } from "@/lib/schemas/access";
import { insertUses, usesOf } from "../shape/write-shapes";

/** Notes which shapes of this organisation a private drawing is built from; ids it does not have are passed over. */
export const rememberUses = async (
  tx: Tx,
  actor: Actor,
  drawingId: string,
  drawing: Drawing,
): Promise<void> => {
  await tx.delete(drawingUses).where(eq(drawingUses.userOf, drawingId));
  const uses = usesOf(drawing);
  if (uses.length === 0) return;
  const own = await tx
    .select({ id: shapes.id })
    .from(shapes)
    .where(
      and(
        eq(shapes.organisationId, actor.organisationId),
        inArray(
          shapes.id,
          uses.map((use) => use.shape),
        ),
      ),
    );
  const known = new Set(own.map((row) => row.id));
  await insertUses(
    tx,
    uses
      .filter((use) => known.has(use.shape))
      .map((use) => [actor.organisationId, use.shape, use.revision, "drawing", drawingId]),
  );
};
