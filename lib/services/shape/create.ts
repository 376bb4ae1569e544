import "server-only";
import type { z } from "zod";
import { mayAtAll, requireRight } from "@/lib/permissions";
import { CreateShapeInput, type ShapeSheet } from "@/lib/schemas/shape";
import { bayOf } from "../bay/load-bay";
import { computeFigures } from "../compute/compute-figures";
import type { VerbArgs } from "../context";
import { logDeed } from "../log-deed";
import { parseInput } from "../parse-input";
import { subjectOf } from "../revision/transition";
import { refuseTakenDesignation } from "./refuse-taken-designation";
import { sheetOf } from "./show";
import { writeShapes } from "./write-shapes";

/** Saves a drawing as a new shape: revision A as a draft, figures computed here. */
export const createShape = async ({
  ctx,
  input,
}: VerbArgs<z.input<typeof CreateShapeInput>>): Promise<ShapeSheet> => {
  mayAtAll(ctx.actor, "shape.create");
  const { bayId, drawing, family, designation, title = "", note = "" } = parseInput(CreateShapeInput, input);
  const figures = await computeFigures(drawing);
  return ctx.db
    .write(async (tx) => {
      const bay = await bayOf(tx, ctx.actor, bayId);
      requireRight(ctx.actor, "shape.create", bay.id);
      const [written] = await writeShapes(tx, ctx, [
        {
          existing: null,
          bayId: bay.id,
          counts: bay.counts,
          family,
          designation,
          title,
          series: "",
          drawing,
          note,
          computed: figures.properties,
          engineVersion: figures.engineVersion,
          tabulated: null,
          state: "draft",
          deliveryId: null,
        },
      ]);
      if (!written) throw new Error("no shape was written");
      await logDeed(tx, ctx, {
        verb: "shape.create",
        entity: "shape",
        entityId: written.shapeId,
        subject: subjectOf({ designation }, 1),
        after: { bay: bay.name, family, designation, title, note },
      });
      return sheetOf(tx, ctx, written.shapeId);
    })
    .catch(refuseTakenDesignation);
};
