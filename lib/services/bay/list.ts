import "server-only";
import { and, asc, count, eq } from "drizzle-orm";
import { bays } from "@/db/schema/bays";
import { finder } from "@/db/schema/finder";
import { mayAtAll, rightIn } from "@/lib/permissions";
import type { BayList } from "@/lib/schemas/bay";
import type { Ctx } from "../context";
import { bayColumns } from "./load-bay";

/** The bays in their order, with the number of released shapes and the asker's right in each. */
export const listBays = async ({ ctx }: { ctx: Ctx }): Promise<BayList> => {
  mayAtAll(ctx.actor, "bay.list");
  const { organisationId } = ctx.actor;
  const rows = await ctx.db.read
    .select(bayColumns)
    .from(bays)
    .where(eq(bays.organisationId, organisationId))
    .orderBy(asc(bays.ordinal), asc(bays.id));
  const counted = await ctx.db.read
    .select({ bayId: finder.bayId, shapes: count() })
    .from(finder)
    .where(and(eq(finder.organisationId, organisationId), eq(finder.state, "released")))
    .groupBy(finder.bayId);
  const shapes = new Map(counted.map((row) => [row.bayId, row.shapes]));
  return {
    items: rows.map((row) => ({
      ...row,
      shapes: shapes.get(row.id) ?? 0,
      right: rightIn(ctx.actor, row.id),
    })),
  };
};
