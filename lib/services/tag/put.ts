import "server-only";
import { and, eq } from "drizzle-orm";
import type { z } from "zod";
import { shapes } from "@/db/schema/shapes";
import { tags } from "@/db/schema/tags";
import { mayAtAll, requireRight } from "@/lib/permissions";
import type { ShapeSheet } from "@/lib/schemas/shape";
import { PutTagsInput } from "@/lib/schemas/tag";
import type { VerbArgs, Versioned } from "../context";
import { logDeed } from "../log-deed";
import { parseInput } from "../parse-input";
import { shapeOf } from "../shape/load-shape";
import { sheetOf } from "../shape/show";
import { requireSameVersion } from "../stale";
import { tagKeyOf, tagsOf } from "./load-tags";

/** Puts these tags on a shape in place of those it has; the same word in other case counts once. */
export const putTags = async ({
  ctx,
  shapeId,
  version,
  input,
}: VerbArgs<z.input<typeof PutTagsInput>, { shapeId: string } & Versioned>): Promise<ShapeSheet> => {
  mayAtAll(ctx.actor, "shape.tag");
  const parsed = parseInput(PutTagsInput, input);
  const wanted = new Map(parsed.tags.map((tag) => [tagKeyOf(tag), tag]));
  const { organisationId } = ctx.actor;
  return ctx.db.write(async (tx) => {
    const shape = await shapeOf(tx, ctx.actor, shapeId);
    requireRight(ctx.actor, "shape.tag", shape.bay.id);
    requireSameVersion(shape.version, version);
    const before = await tagsOf(tx, ctx.actor, shape.id);
    await tx.delete(tags).where(and(eq(tags.shapeId, shape.id), eq(tags.organisationId, organisationId)));
    for (const [tagKey, tag] of wanted)
      await tx.insert(tags).values({ organisationId, shapeId: shape.id, tag, tagKey });
    await tx
      .update(shapes)
      .set({ version: version + 1, updatedAt: ctx.now })
      .where(eq(shapes.id, shape.id));
    await logDeed(tx, ctx, {
      verb: "shape.tag",
      entity: "shape",
      entityId: shape.id,
      subject: shape.designation,
      before: { tags: before },
      after: { tags: [...wanted.values()] },
    });
    return sheetOf(tx, ctx, shape.id);
  });
};
