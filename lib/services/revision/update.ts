import "server-only";
import { and, eq } from "drizzle-orm";
import type { z } from "zod";
import type { Tx } from "@/db/client";
import { drawingUses } from "@/db/schema/drawing-uses";
import { figures } from "@/db/schema/figures";
import type { Drawing } from "@/lib/drawing/schema";
import { mayAtAll } from "@/lib/permissions";
import type { ComputedProperties } from "@/lib/schemas/properties";
import { type RevisionRecord, UpdateRevisionInput } from "@/lib/schemas/shape";
import { computeFigures } from "../compute/compute-figures";
import type { VerbArgs } from "../context";
import { parseInput } from "../parse-input";
import { restOf, scalarsOf } from "../shape/figure-values";
import type { LoadedRevision } from "../shape/load-shape";
import { requireEditable } from "../shape/require-editable";
import { contentHashOf, figureRow, insertFigures, insertUses, usesOf } from "../shape/write-shapes";
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
      if (drawing && computed) await replaceFigures(tx, revision, drawing, computed);
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
  revision: LoadedRevision,
  drawing: Drawing,
  { properties, engineVersion }: ComputedProperties,
): Promise<void> => {
  const { id, organisationId } = revision;
  await tx.delete(figures).where(and(eq(figures.revisionId, id), eq(figures.organisationId, organisationId)));
  await insertFigures(tx, [
    figureRow(id, organisationId, "computed", engineVersion, scalarsOf(properties), restOf(properties)),
  ]);
  await tx.delete(drawingUses).where(eq(drawingUses.userOf, id));
  await insertUses(
    tx,
    usesOf(drawing).map((use) => [organisationId, use.shape, use.revision, "revision", id]),
  );
};
