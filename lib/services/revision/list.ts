import "server-only";
import { and, desc, eq, getTableColumns, notInArray } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { revisions } from "@/db/schema/revisions";
import { mayAtAll } from "@/lib/permissions";
import type { RevisionItem, RevisionList } from "@/lib/schemas/shape";
import type { Ctx } from "../context";
import { type LoadedShape, seesWork, shapeOf } from "../shape/load-shape";
import { describeRevisions } from "./describe";

const { drawing: _drawing, ...inShort } = getTableColumns(revisions);

/** The revisions of a shape in short, newest first; work in progress only for who may see it. */
export const listRevisions = async ({
  ctx,
  shapeId,
}: {
  ctx: Ctx;
  shapeId: string;
}): Promise<RevisionList> => {
  mayAtAll(ctx.actor, "revision.list");
  const shape = await shapeOf(ctx.db.read, ctx.actor, shapeId);
  return { items: await revisionsOf(ctx.db.read, ctx, shape) };
};

export const revisionsOf = async (
  read: Pick<Reader | Tx, "select">,
  { actor }: Pick<Ctx, "actor">,
  shape: LoadedShape,
): Promise<RevisionItem[]> => {
  const rows = await read
    .select(inShort)
    .from(revisions)
    .where(
      and(
        eq(revisions.shapeId, shape.id),
        eq(revisions.organisationId, actor.organisationId),
        seesWork(actor, shape.bay.id) ? undefined : notInArray(revisions.state, ["draft", "submitted"]),
      ),
    )
    .orderBy(desc(revisions.ordinal));
  return describeRevisions(read, actor, rows);
};
