import "server-only";
import type { z } from "zod";
import { comments } from "@/db/schema/comments";
import { mayAtAll, requireRight } from "@/lib/permissions";
import { type Comment, CreateCommentInput } from "@/lib/schemas/comment";
import type { VerbArgs } from "../context";
import { logDeed } from "../log-deed";
import { newId } from "../new-id";
import { found } from "../not-found";
import { parseInput } from "../parse-input";
import { subjectOf } from "../revision/transition";
import { revisionOf, shapeOf } from "../shape/load-shape";
import { commentsOf } from "./list";

/** Says something about a revision of a shape. */
export const createComment = async ({
  ctx,
  shapeId,
  input,
}: VerbArgs<z.input<typeof CreateCommentInput>, { shapeId: string }>): Promise<Comment> => {
  mayAtAll(ctx.actor, "comment.create");
  const { text, ordinal } = parseInput(CreateCommentInput, input);
  return ctx.db.write(async (tx) => {
    const shape = await shapeOf(tx, ctx.actor, shapeId);
    requireRight(ctx.actor, "comment.create", shape.bay.id);
    const about = found(ordinal ?? shape.releasedOrdinal ?? shape.workingOrdinal ?? undefined);
    await revisionOf(tx, ctx.actor, shape, about);
    const id = newId();
    await tx.insert(comments).values({
      id,
      organisationId: ctx.actor.organisationId,
      shapeId: shape.id,
      ordinal: about,
      body: text,
      authorId: ctx.actor.userId,
      createdAt: ctx.now,
    });
    await logDeed(tx, ctx, {
      verb: "comment.create",
      entity: "shape",
      entityId: shape.id,
      subject: subjectOf(shape, about),
      after: { commentId: id, ordinal: about, text },
    });
    return found((await commentsOf(tx, ctx.actor, shape)).find((row) => row.id === id));
  });
};
