import "server-only";
import { and, asc, eq, isNull } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { comments } from "@/db/schema/comments";
import { mayAtAll } from "@/lib/permissions";
import type { Actor } from "@/lib/schemas/access";
import type { Comment, CommentList } from "@/lib/schemas/comment";
import type { Ctx } from "../context";
import { iso } from "../moments";
import { peopleOf } from "../people";
import { letterOf } from "../shape/letter";
import { type LoadedShape, seesWork, shapeOf } from "../shape/load-shape";

const MOST = 500;

/** What was said about a shape, the oldest first; about work in progress only to who may see it. */
export const listComments = async ({ ctx, shapeId }: { ctx: Ctx; shapeId: string }): Promise<CommentList> => {
  mayAtAll(ctx.actor, "comment.list");
  const shape = await shapeOf(ctx.db.read, ctx.actor, shapeId);
  return { items: await commentsOf(ctx.db.read, ctx.actor, shape) };
};

export const commentsOf = async (
  read: Pick<Reader | Tx, "select">,
  actor: Actor,
  shape: LoadedShape,
): Promise<Comment[]> => {
  const rows = await read
    .select()
    .from(comments)
    .where(
      and(
        eq(comments.shapeId, shape.id),
        eq(comments.organisationId, actor.organisationId),
        isNull(comments.deletedAt),
      ),
    )
    .orderBy(asc(comments.id))
    .limit(MOST);
  const person = await peopleOf(
    read,
    rows.map((row) => row.authorId),
  );
  return rows
    .filter((row) => row.ordinal !== shape.workingOrdinal || seesWork(actor, shape.bay.id))
    .map((row) => ({
      id: row.id,
      ordinal: row.ordinal,
      letter: letterOf(row.ordinal),
      text: row.body,
      by: person(row.authorId),
      at: iso(row.createdAt),
    }));
};
