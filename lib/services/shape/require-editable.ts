import "server-only";
import { and, eq } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { figures } from "@/db/schema/figures";
import { revisions } from "@/db/schema/revisions";
import { mayAtAll } from "@/lib/permissions";
import type { Actor } from "@/lib/schemas/access";
import type { LoadedShape } from "./load-shape";

/** Shapes whose newest revision came from a table are edited only by those who keep the tables. */
export const requireEditable = async (tx: Tx, actor: Actor, shape: LoadedShape): Promise<void> => {
  const [row] = await tx
    .select({ source: figures.source })
    .from(revisions)
    .innerJoin(figures, and(eq(figures.revisionId, revisions.id), eq(figures.source, "tabulated")))
    .where(and(eq(revisions.shapeId, shape.id), eq(revisions.ordinal, shape.lastOrdinal)));
  if (row) mayAtAll(actor, "shape.editTabulated");
};
