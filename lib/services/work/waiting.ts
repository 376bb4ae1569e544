import "server-only";
import { and, count, eq, inArray } from "drizzle-orm";
import { deliveries } from "@/db/schema/deliveries";
import { finder } from "@/db/schema/finder";
import { couldEver, mayAtAll } from "@/lib/permissions";
import type { Waiting } from "@/lib/schemas/work";
import type { Ctx } from "../context";
import { visibleRows } from "../shape/visible";

/** How many submitted revisions and open deliveries wait for the asker. */
export const showWaiting = async ({ ctx }: { ctx: Ctx }): Promise<Waiting> => {
  mayAtAll(ctx.actor, "work.waiting");
  const [submitted] = await ctx.db.read
    .select({ waiting: count() })
    .from(finder)
    .where(visibleRows(ctx.actor, ["submitted"]));
  const [open] = couldEver(ctx.actor, "delivery.list")
    ? await ctx.db.read
        .select({ waiting: count() })
        .from(deliveries)
        .where(
          and(
            eq(deliveries.organisationId, ctx.actor.organisationId),
            inArray(deliveries.state, ["received", "reading", "read"]),
          ),
        )
    : [];
  return { toCheck: submitted?.waiting ?? 0, deliveries: open?.waiting ?? 0 };
};
