import "server-only";
import { eq } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { revisions } from "@/db/schema/revisions";
import { shapes } from "@/db/schema/shapes";
import { AppError } from "@/lib/errors";
import { mayAtAll, requireRight, type Verb } from "@/lib/permissions";
import type { RevisionRecord, RevisionState } from "@/lib/schemas/shape";
import type { Ctx } from "../context";
import { logDeed } from "../log-deed";
import { letterOf } from "../shape/letter";
import { type LoadedRevision, type LoadedShape, revisionOf, shapeOf } from "../shape/load-shape";
import { rewriteFinder } from "../shape/rewrite-finder";
import { requireSameVersion } from "../stale";
import { recordOf } from "./show";

export type RevisionAddress = Readonly<{ shapeId: string; ordinal: number; version: number }>;

export const subjectOf = (shape: Pick<LoadedShape, "designation">, ordinal: number): string =>
  `${shape.designation} ${letterOf(ordinal)}`;

type Change = Readonly<{
  revision: Partial<typeof revisions.$inferInsert>;
  shape?: Partial<typeof shapes.$inferInsert>;
  /** For the log. */
  after?: Readonly<Record<string, unknown>>;
}>;

type Step = Readonly<{
  ctx: Ctx;
  address: RevisionAddress;
  verb: Verb;
  /** States it may be in, and the sentence when it is in another. */
  from: readonly RevisionState[];
  wrongState: string;
  change: (tx: Tx, shape: LoadedShape, revision: LoadedRevision) => Promise<Change>;
}>;

/**
 * One step in the life of a revision, the same way each time: may at all; in one transaction the scoped load, the right
 * in the bay, the version, the state, the change, the finder, the log.
 */
export const transition = async ({
  ctx,
  address,
  verb,
  from,
  wrongState,
  change,
}: Step): Promise<RevisionRecord> => {
  mayAtAll(ctx.actor, verb);
  return ctx.db.write(async (tx) => {
    const shape = await shapeOf(tx, ctx.actor, address.shapeId);
    const revision = await revisionOf(tx, ctx.actor, shape, address.ordinal);
    requireRight(ctx.actor, verb, shape.bay.id);
    requireSameVersion(revision.version, address.version);
    if (!from.includes(revision.state)) {
      throw new AppError("conflict", { user: `${wrongState} (it is ${revision.state})` });
    }
    const made = await change(tx, shape, revision);
    await tx
      .update(revisions)
      .set({ ...made.revision, version: revision.version + 1, updatedAt: ctx.now })
      .where(eq(revisions.id, revision.id));
    await tx
      .update(shapes)
      .set({ ...made.shape, version: shape.version + 1, updatedAt: ctx.now })
      .where(eq(shapes.id, shape.id));
    await rewriteFinder(tx, ctx.actor, { shapeId: shape.id });
    await logDeed(tx, ctx, {
      verb,
      entity: "shape",
      entityId: shape.id,
      subject: subjectOf(shape, revision.ordinal),
      before: { state: revision.state },
      after: {
        ordinal: revision.ordinal,
        ...(made.revision.state && { state: made.revision.state }),
        ...made.after,
      },
    });
    const now = await shapeOf(tx, ctx.actor, shape.id);
    return recordOf(tx, ctx, now, await revisionOf(tx, ctx.actor, now, revision.ordinal));
  });
};
