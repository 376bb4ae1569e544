import "server-only";
import { and, eq } from "drizzle-orm";
import { comments } from "@/db/schema/comments";
import { drawingUses } from "@/db/schema/drawing-uses";
import { revisions } from "@/db/schema/revisions";
import { shapes } from "@/db/schema/shapes";
import { AppError } from "@/lib/errors";
import { mayAtAll, requireRight } from "@/lib/permissions";
import type { Ctx } from "../context";
import { logDeed } from "../log-deed";
import { revisionOf, shapeOf } from "../shape/load-shape";
import { forgetUses } from "../shape/remember-uses";
import { rewriteFinder } from "../shape/rewrite-finder";
import { requireSameVersion } from "../stale";
import { subjectOf, type RevisionAddress } from "./transition";

/** Throws a draft away; a shape that never was anything else goes with it. */
export const discardRevision = async ({ ctx, ...address }: { ctx: Ctx } & RevisionAddress): Promise<void> => {
  mayAtAll(ctx.actor, "revision.discard");
  await ctx.db.write(async (tx) => {
    const shape = await shapeOf(tx, ctx.actor, address.shapeId);
    const revision = await revisionOf(tx, ctx.actor, shape, address.ordinal);
    requireRight(ctx.actor, "revision.discard", shape.bay.id);
    requireSameVersion(revision.version, address.version);
    if (revision.state !== "draft") {
      throw new AppError("conflict", { user: `Only a draft can be thrown away (it is ${revision.state})` });
    }
    await forgetUses(tx, revision.id);
    await tx.delete(revisions).where(eq(revisions.id, revision.id));
    await tx
      .delete(comments)
      .where(and(eq(comments.shapeId, shape.id), eq(comments.ordinal, revision.ordinal)));
    if (revision.ordinal === 1) {
      await tx.delete(drawingUses).where(eq(drawingUses.shapeId, shape.id));
      await tx.delete(shapes).where(eq(shapes.id, shape.id));
    } else {
      await tx
        .update(shapes)
        .set({
          workingOrdinal: null,
          lastOrdinal: revision.ordinal - 1,
          version: shape.version + 1,
          updatedAt: ctx.now,
        })
        .where(eq(shapes.id, shape.id));
      await rewriteFinder(tx, ctx.actor, { shapeId: shape.id });
    }
    await logDeed(tx, ctx, {
      verb: "revision.discard",
      entity: "shape",
      entityId: shape.id,
      subject: subjectOf(shape, revision.ordinal),
      before: { ordinal: revision.ordinal, content: revision.contentHash.slice(0, 16), note: revision.note },
    });
  });
};
