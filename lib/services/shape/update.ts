import "server-only";
import { eq } from "drizzle-orm";
import type { z } from "zod";
import { shapes } from "@/db/schema/shapes";
import { mayAtAll, requireRight } from "@/lib/permissions";
import { designationKey } from "@/lib/schemas/designation";
import { type ShapeSheet, UpdateShapeInput } from "@/lib/schemas/shape";
import { bayOf } from "../bay/load-bay";
import type { VerbArgs, Versioned } from "../context";
import { given } from "../given";
import { logDeed } from "../log-deed";
import { parseInput } from "../parse-input";
import { requireSameVersion } from "../stale";
import { shapeOf } from "./load-shape";
import { refuseTakenDesignation } from "./refuse-taken-designation";
import { requireEditable } from "./require-editable";
import { rewriteFinder } from "./rewrite-finder";
import { sheetOf } from "./show";

/** Changes what a shape is called, its family or its bay; a move needs the right in both bays. What is released needs the right to release. */
export const updateShape = async ({
  ctx,
  shapeId,
  version,
  input,
}: VerbArgs<z.input<typeof UpdateShapeInput>, { shapeId: string } & Versioned>): Promise<ShapeSheet> => {
  mayAtAll(ctx.actor, "shape.update");
  const changes = given(parseInput(UpdateShapeInput, input));
  return ctx.db
    .write(async (tx) => {
      const shape = await shapeOf(tx, ctx.actor, shapeId);
      const verb = shape.releasedOrdinal === null ? "shape.update" : "revision.release";
      requireRight(ctx.actor, verb, shape.bay.id);
      await requireEditable(tx, ctx.actor, shape);
      requireSameVersion(shape.version, version);
      const bay = changes.bayId === undefined ? null : await bayOf(tx, ctx.actor, changes.bayId);
      if (bay) requireRight(ctx.actor, verb, bay.id);
      await tx
        .update(shapes)
        .set({
          ...changes,
          ...(changes.designation !== undefined && { designationKey: designationKey(changes.designation) }),
          version: version + 1,
          updatedAt: ctx.now,
        })
        .where(eq(shapes.id, shape.id));
      await rewriteFinder(tx, ctx.actor, { shapeId });
      await logDeed(tx, ctx, {
        verb: "shape.update",
        entity: "shape",
        entityId: shape.id,
        subject: changes.designation ?? shape.designation,
        before: {
          designation: shape.designation,
          title: shape.title,
          family: shape.family,
          bay: shape.bay.name,
        },
        after: { ...changes, ...(bay && { bay: bay.name }) },
      });
      return sheetOf(tx, ctx, shapeId);
    })
    .catch(refuseTakenDesignation);
};
