import "server-only";
import { and, eq } from "drizzle-orm";
import type { z } from "zod";
import type { Tx } from "@/db/client";
import { figures } from "@/db/schema/figures";
import type { Drawing } from "@/lib/drawing/schema";
import { mayAtAll } from "@/lib/permissions";
import type { Actor } from "@/lib/schemas/access";
import type { ComputedProperties } from "@/lib/schemas/properties";
import { type RevisionRecord, UpdateRevisionInput } from "@/lib/schemas/shape";
import { computeFigures } from "../compute/compute-figures";
import type { VerbArgs } from "../context";
import { parseInput } from "../parse-input";
import { restOf, scalarsOf } from "../shape/figure-values";
import type { LoadedRevision } from "../shape/load-shape";
import { forgetUses, rememberUses } from "../shape/remember-uses";
import { requireEditable } from "../shape/require-editable";
import { contentHashOf, figureRow, insertFigures } from "../shape/write-shapes";
import { editorsOf } from "./describe";
import { transition, type RevisionAddress } from "./transition";

/** Saves a draft: a new drawing brings new figures, computed here and kept in the same transaction. */
export const updateRevision = async ({
  ctx,
  input,
  ...address
}: VerbArgs<z.input<typeof UpdateRevisionInput>, RevisionAddress>): Promise<RevisionRecord> => {
  mayAtAll(ctx.actor, "revision.update");
  const { drawing, note } = parseInput(UpdateRevisionInput, input);
  const computed = drawing && (await computeFigures(drawing));
  return transition({
    ctx,
    address,
    verb: "revision.update",
    from: ["draft"],
    wrongState: "Only a draft can be edited",
    change: async (tx, shape, revision) => {
      await requireEditable(tx, ctx.actor, shape);
      if (drawing && computed) await replaceFigures(tx, ctx.actor, revision, drawing, computed);
      const json = drawing && JSON.stringify(drawing);
      const editors = new Set([...editorsOf(revision), ctx.actor.userId]);
      return {
        revision: {
          editors: JSON.stringify([...editors]),
          ...(json !== undefined && { drawing: json, contentHash: contentHashOf(json) }),
          ...(note !== undefined && { note }),
        },
        after: {
          ...(json !== undefined && { content: contentHashOf(json).slice(0, 16) }),
          ...(note !== undefined && { note }),
        },
      };
    },
  });
};

const replaceFigures = async (
  tx: Tx,
  actor: Actor,
  revision: LoadedRevision,
  drawing: Drawing,
  { properties, engineVersion }: ComputedProperties,
): Promise<void> => {
  const { id, organisationId } = revision;
  await tx.delete(figures).where(and(eq(figures.revisionId, id), eq(figures.organisationId, organisationId)));
  await insertFigures(tx, [
    figureRow(id, organisationId, "computed", engineVersion, scalarsOf(properties), restOf(properties)),
  ]);
  await forgetUses(tx, id);
  await rememberUses(tx, actor, [{ kind: "revision", id, drawing }]);
};
