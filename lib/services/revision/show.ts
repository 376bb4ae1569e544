import "server-only";
import type { Reader, Tx } from "@/db/client";
import type { Drawing } from "@/lib/drawing/schema";
import { couldEver, may, mayAtAll, type Verb } from "@/lib/permissions";
import type { RevisionRecord } from "@/lib/schemas/shape";
import type { Ctx } from "../context";
import { type LoadedRevision, type LoadedShape, revisionOf, shapeOf } from "../shape/load-shape";
import { describeRevisions } from "./describe";
import { edited, fourEyesOf, isCheckedByAnother } from "./four-eyes";
import { storedFigures } from "./stored-properties";
import { found } from "../not-found";

/** One revision in full: drawing, figures of both kinds, people, and what the asker may do with it now. */
export const showRevision = async ({
  ctx,
  shapeId,
  ordinal,
}: {
  ctx: Ctx;
  shapeId: string;
  ordinal: number;
}): Promise<RevisionRecord> => {
  mayAtAll(ctx.actor, "revision.show");
  const shape = await shapeOf(ctx.db.read, ctx.actor, shapeId);
  const revision = await revisionOf(ctx.db.read, ctx.actor, shape, ordinal);
  return recordOf(ctx.db.read, ctx, shape, revision);
};

export const recordOf = async (
  read: Pick<Reader | Tx, "select">,
  { actor }: Pick<Ctx, "actor">,
  shape: LoadedShape,
  revision: LoadedRevision,
): Promise<RevisionRecord> => {
  const [item] = await describeRevisions(read, actor, [revision]);
  const stored = await storedFigures(read, actor.organisationId, revision.id);
  const fourEyes = await fourEyesOf(read, actor);
  const right = (verb: Verb) => may(actor, verb, shape.bay.id);
  const { state } = revision;
  const tabulatedOk = stored.tabulated === null || couldEver(actor, "shape.editTabulated");
  return {
    ...found(item),
    drawing: JSON.parse(revision.drawing) as Drawing,
    ...stored,
    may: {
      edit: state === "draft" && right("revision.update") && tabulatedOk,
      submit: state === "draft" && right("revision.submit"),
      check:
        state === "submitted" && right("revision.check") && !(fourEyes && edited(revision, actor.userId)),
      sendBack: state === "submitted" && right("revision.sendBack"),
      release:
        state === "submitted" && right("revision.release") && (!fourEyes || isCheckedByAnother(revision)),
      withdraw: state === "released" && right("revision.withdraw"),
      revise: shape.workingOrdinal === null && right("revision.create") && tabulatedOk,
    },
  };
};
