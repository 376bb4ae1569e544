import "server-only";
import { and, eq, inArray } from "drizzle-orm";
import { bulkInsert } from "@/db/bulk-insert";
import type { Tx } from "@/db/client";
import { drawingUses } from "@/db/schema/drawing-uses";
import { shapes } from "@/db/schema/shapes";
import type { Drawing } from "@/lib/drawing/schema";
import type { Actor } from "@/lib/schemas/access";

/** A private drawing or a revision, and what is drawn in it. */
export type UserOfShapes = Readonly<{ kind: "drawing" | "revision"; id: string; drawing: Drawing }>;

const COLUMNS = ["organisation_id", "shape_id", "ordinal", "user_kind", "user_of"];

/** Shapes a drawing was built from, each revision once. */
const usesOf = (drawing: Drawing): readonly { shape: string; revision: number }[] => {
  const found = new Map<string, { shape: string; revision: number }>();
  for (const part of drawing.parts) {
    if ("from" in part && part.from) found.set(`${part.from.shape} ${part.from.revision}`, part.from);
  }
  return [...found.values()];
};

/**
 * Notes which shapes of the actor's organisation drawings and revisions are built from, so that their authors can be told
 * when one is superseded. What a drawing says is not trusted: ids the organisation does not have are passed over.
 */
export const rememberUses = async (tx: Tx, actor: Actor, users: readonly UserOfShapes[]): Promise<void> => {
  const uses = users.flatMap((user) => usesOf(user.drawing).map((use) => ({ user, use })));
  if (uses.length === 0) return;
  const asked = [...new Set(uses.map(({ use }) => use.shape))];
  const own = await tx
    .select({ id: shapes.id })
    .from(shapes)
    .where(and(eq(shapes.organisationId, actor.organisationId), inArray(shapes.id, asked)));
  const known = new Set(own.map((row) => row.id));
  await bulkInsert(
    tx,
    "drawing_uses",
    COLUMNS,
    uses
      .filter(({ use }) => known.has(use.shape))
      .map(({ user, use }) => [actor.organisationId, use.shape, use.revision, user.kind, user.id]),
  );
};

export const forgetUses = async (tx: Tx, userOf: string): Promise<void> => {
  await tx.delete(drawingUses).where(eq(drawingUses.userOf, userOf));
};
