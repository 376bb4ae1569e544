import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import { comments } from "@/db/schema/comments";
import { AppError } from "@/lib/errors";
import { mayAtAll, requireRight } from "@/lib/permissions";
import type { Ctx } from "../context";
import { logDeed } from "../log-deed";
import { found } from "../not-found";
import { subjectOf } from "../revision/transition";
import { shapeOf } from "../shape/load-shape";

type Address = Readonly<{ ctx: Ctx; shapeId: string; commentId: string }>;

/** Takes one's own comment back; the log keeps that it was there. */
export const deleteComment = async ({ ctx, shapeId, commentId }: Address): Promise<void> => {
  mayAtAll(ctx.actor, "comment.delete");
  await ctx.db.write(async (tx) => {
    const shape = await shapeOf(tx, ctx.actor, shapeId);
    requireRight(ctx.actor, "comment.delete", shape.bay.id);
    const own = and(
      eq(comments.id, commentId),
      eq(comments.shapeId, shape.id),
      eq(comments.organisationId, ctx.actor.organisationId),
      isNull(comments.deletedAt),
    );
    const comment = found((await tx.select().from(comments).where(own))[0]);
    if (comment.authorId !== ctx.actor.userId) {
      throw new AppError("forbidden", { user: "A comment is taken back by who wrote it." });
    }
    await tx.update(comments).set({ deletedAt: ctx.now }).where(own);
    await logDeed(tx, ctx, {
      verb: "comment.delete",
      entity: "shape",
      entityId: shape.id,
      subject: subjectOf(shape, comment.ordinal),
      before: { commentId, ordinal: comment.ordinal },
    });
  });
};
