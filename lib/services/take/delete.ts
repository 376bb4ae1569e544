import "server-only";
import { and, eq } from "drizzle-orm";
import { takes } from "@/db/schema/takes";
import { AppError } from "@/lib/errors";
import { may, mayAtAll, requireRight } from "@/lib/permissions";
import type { Ctx } from "../context";
import { logDeed } from "../log-deed";
import { found } from "../not-found";
import { subjectOf } from "../revision/transition";
import { shapeOf } from "../shape/load-shape";
import { rewriteFinder } from "../shape/rewrite-finder";

type Address = Readonly<{ ctx: Ctx; shapeId: string; takeId: string }>;

/** Takes a wrong entry off: one's own, or anybody's for who may release in the bay. The log keeps what it said. */
export const deleteTake = async ({ ctx, shapeId, takeId }: Address): Promise<void> => {
  mayAtAll(ctx.actor, "take.delete");
  await ctx.db.write(async (tx) => {
    const shape = await shapeOf(tx, ctx.actor, shapeId);
    requireRight(ctx.actor, "take.delete", shape.bay.id);
    const [row] = await tx
      .select()
      .from(takes)
      .where(
        and(
          eq(takes.id, takeId),
          eq(takes.shapeId, shape.id),
          eq(takes.organisationId, ctx.actor.organisationId),
        ),
      );
    const take = found(row);
    if (take.takenBy !== ctx.actor.userId && !may(ctx.actor, "revision.release", shape.bay.id)) {
      throw new AppError("forbidden", {
        user: "Only who recorded a take, or who may release here, takes it off.",
      });
    }
    await tx.delete(takes).where(eq(takes.id, takeId));
    await rewriteFinder(tx, ctx.actor, { shapeId: shape.id });
    const { ordinal, jobNumber, jobName, pieceMark, quantity, lengthMm } = take;
    await logDeed(tx, ctx, {
      verb: "take.delete",
      entity: "shape",
      entityId: shape.id,
      subject: subjectOf(shape, ordinal),
      before: { takeId, ordinal, jobNumber, jobName, pieceMark, quantity, lengthMm },
    });
  });
};
