import "server-only";
import { mayAtAll, rightIn } from "@/lib/permissions";
import { ShapeFamily, type ShapeSheet } from "@/lib/schemas/shape";
import type { Reader, Tx } from "@/db/client";
import type { Ctx } from "../context";
import { iso } from "../moments";
import { found } from "../not-found";
import { revisionsOf } from "../revision/list";
import { recordOf } from "../revision/show";
import { tagsOf } from "../tag/load-tags";
import { revisionOf, shapeOf } from "./load-shape";

/** A shape's sheet at one revision: the one asked for, else the released one, else the one in work. */
export const showShape = async ({
  ctx,
  shapeId,
  ordinal,
}: {
  ctx: Ctx;
  shapeId: string;
  ordinal?: number | undefined;
}): Promise<ShapeSheet> => {
  mayAtAll(ctx.actor, "shape.show");
  return sheetOf(ctx.db.read, ctx, shapeId, ordinal);
};

export const sheetOf = async (
  read: Pick<Reader | Tx, "select">,
  ctx: Pick<Ctx, "actor">,
  shapeId: string,
  ordinal?: number,
): Promise<ShapeSheet> => {
  const shape = await shapeOf(read, ctx.actor, shapeId);
  const shown = found(ordinal ?? shape.releasedOrdinal ?? shape.workingOrdinal ?? undefined);
  const revision = await recordOf(read, ctx, shape, await revisionOf(read, ctx.actor, shape, shown));
  const revisions = await revisionsOf(read, ctx, shape);
  const seesWorking = revisions.some((r) => r.ordinal === shape.workingOrdinal);
  return {
    id: shape.id,
    designation: shape.designation,
    title: shape.title,
    family: ShapeFamily.parse(shape.family),
    series: shape.series,
    tags: await tagsOf(read, ctx.actor, shape.id),
    bay: shape.bay,
    right: rightIn(ctx.actor, shape.bay.id),
    releasedOrdinal: shape.releasedOrdinal,
    workingOrdinal: seesWorking ? shape.workingOrdinal : null,
    revision,
    counts: shape.bay.counts === "tabulated" && revision.tabulated !== null ? "tabulated" : "computed",
    revisions,
    version: shape.version,
    createdAt: iso(shape.createdAt),
    updatedAt: iso(shape.updatedAt),
  };
};
