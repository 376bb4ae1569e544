import "server-only";
import type { z } from "zod";
import { AppError } from "@/lib/errors";
import { mayAtAll, requireRight } from "@/lib/permissions";
import { CreateRevisionInput, type RevisionRecord, ShapeFamily } from "@/lib/schemas/shape";
import { computeFigures } from "../compute/compute-figures";
import type { VerbArgs } from "../context";
import { logDeed } from "../log-deed";
import { parseInput } from "../parse-input";
import { revisionOf, shapeOf } from "../shape/load-shape";
import { requireEditable } from "../shape/require-editable";
import { writeShapes } from "../shape/write-shapes";
import { requireSameVersion } from "../stale";
import { recordOf } from "./show";
import { subjectOf } from "./transition";

/** Begins a further revision of a shape as a draft, figures computed here. `version` is the shape's. */
export const createRevision = async ({
  ctx,
  shapeId,
  version,
  input,
}: VerbArgs<
  z.input<typeof CreateRevisionInput>,
  { shapeId: string; version: number }
>): Promise<RevisionRecord> => {
  mayAtAll(ctx.actor, "revision.create");
  const { drawing, note = "" } = parseInput(CreateRevisionInput, input);
  const figures = await computeFigures(drawing);
  return ctx.db.write(async (tx) => {
    const shape = await shapeOf(tx, ctx.actor, shapeId);
    requireRight(ctx.actor, "revision.create", shape.bay.id);
    await requireEditable(tx, ctx.actor, shape);
    requireSameVersion(shape.version, version);
    if (shape.workingOrdinal !== null) {
      throw new AppError("conflict", {
        user: `${subjectOf(shape, shape.workingOrdinal)} is in work already: go on with that one.`,
      });
    }
    const [written] = await writeShapes(tx, ctx, [
      {
        existing: { ...shape, jobs: 0 },
        bayId: shape.bay.id,
        counts: shape.bay.counts,
        family: ShapeFamily.parse(shape.family),
        designation: shape.designation,
        title: shape.title,
        series: shape.series,
        drawing,
        note,
        computed: figures.properties,
        engineVersion: figures.engineVersion,
        tabulated: null,
        state: "draft",
        deliveryId: null,
      },
    ]);
    if (!written) throw new Error("no revision was written");
    await logDeed(tx, ctx, {
      verb: "revision.create",
      entity: "shape",
      entityId: shape.id,
      subject: subjectOf(shape, written.ordinal),
      after: { ordinal: written.ordinal, note },
    });
    const now = await shapeOf(tx, ctx.actor, shape.id);
    return recordOf(tx, ctx, now, await revisionOf(tx, ctx.actor, now, written.ordinal));
  });
};
