import "server-only";
import { mayAtAll } from "@/lib/permissions";
import type { RevisionComparison } from "@/lib/schemas/compare";
import type { Ctx } from "../context";
import { PROPERTY_KEYS, scalarOf } from "../shape/figure-values";
import { revisionOf, shapeOf } from "../shape/load-shape";
import { recordOf } from "./show";

type Address = Readonly<{ ctx: Ctx; shapeId: string; from: number; to: number }>;

/** Every computed property of two revisions side by side, with the change relative to the first. */
export const compareRevisions = async ({ ctx, shapeId, from, to }: Address): Promise<RevisionComparison> => {
  mayAtAll(ctx.actor, "revision.compare");
  const { read } = ctx.db;
  const shape = await shapeOf(read, ctx.actor, shapeId);
  const first = await recordOf(read, ctx, shape, await revisionOf(read, ctx.actor, shape, from));
  const second = await recordOf(read, ctx, shape, await revisionOf(read, ctx.actor, shape, to));
  return {
    from: first,
    to: second,
    changes: PROPERTY_KEYS.map((property) => {
      const [a, b] = [scalarOf(first.computed, property), scalarOf(second.computed, property)];
      const relative = a === null || b === null || a === 0 ? null : (b - a) / Math.abs(a);
      return { property, from: a, to: b, relative };
    }),
  };
};
