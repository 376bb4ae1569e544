import "server-only";
import type { z } from "zod";
import { takes } from "@/db/schema/takes";
import { AppError } from "@/lib/errors";
import { mayAtAll, requireRight } from "@/lib/permissions";
import { CreateTakeInput, type Take } from "@/lib/schemas/take";
import type { VerbArgs } from "../context";
import { logDeed } from "../log-deed";
import { newId } from "../new-id";
import { found } from "../not-found";
import { parseInput } from "../parse-input";
import { subjectOf } from "../revision/transition";
import { revisionOf, shapeOf } from "../shape/load-shape";
import { rewriteFinder } from "../shape/rewrite-finder";
import { takesOf } from "./list";

/** Records that a job took the released revision of a shape. */
export const createTake = async ({
  ctx,
  shapeId,
  input,
}: VerbArgs<z.input<typeof CreateTakeInput>, { shapeId: string }>): Promise<Take> => {
  mayAtAll(ctx.actor, "take.create");
  const {
    ordinal,
    jobNumber,
    jobName = "",
    pieceMark = "",
    quantity,
    lengthMm = null,
  } = parseInput(CreateTakeInput, input);
  return ctx.db.write(async (tx) => {
    const shape = await shapeOf(tx, ctx.actor, shapeId);
    requireRight(ctx.actor, "take.create", shape.bay.id);
    const revision = await revisionOf(tx, ctx.actor, shape, ordinal);
    if (revision.state !== "released") {
      throw new AppError("conflict", {
        user: `${subjectOf(shape, ordinal)} is ${revision.state}: only what is released can be taken.`,
      });
    }
    const id = newId();
    const take = { ordinal, jobNumber, jobName, pieceMark, quantity, lengthMm };
    await tx.insert(takes).values({
      ...take,
      id,
      organisationId: ctx.actor.organisationId,
      shapeId: shape.id,
      takenBy: ctx.actor.userId,
      createdAt: ctx.now,
    });
    await rewriteFinder(tx, ctx.actor, { shapeId: shape.id });
    await logDeed(tx, ctx, {
      verb: "take.create",
      entity: "shape",
      entityId: shape.id,
      subject: subjectOf(shape, ordinal),
      after: { takeId: id, ...take },
    });
    return found((await takesOf(tx, ctx.actor, shape.id)).find((row) => row.id === id));
  });
};
