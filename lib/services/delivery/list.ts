import "server-only";
import { and, desc, eq, lt } from "drizzle-orm";
import type { z } from "zod";
import { deliveries } from "@/db/schema/deliveries";
import { mayAtAll } from "@/lib/permissions";
import { PageQuery } from "@/lib/schemas/common";
import type { DeliveryPage } from "@/lib/schemas/delivery";
import type { VerbArgs } from "../context";
import { decodeCursor, DEFAULT_PAGE, encodeCursor } from "../cursor";
import { parseInput } from "../parse-input";
import { summariesOf } from "./delivery-view";

/** Deliveries, newest first. */
export const listDeliveries = async ({
  ctx,
  input,
}: VerbArgs<z.input<typeof PageQuery>>): Promise<DeliveryPage> => {
  mayAtAll(ctx.actor, "delivery.list");
  const { cursor, limit = DEFAULT_PAGE } = parseInput(PageQuery, input);
  const before = cursor === undefined ? undefined : Number(decodeCursor(cursor, 1)[0]);
  const rows = await ctx.db.read
    .select()
    .from(deliveries)
    .where(
      and(
        eq(deliveries.organisationId, ctx.actor.organisationId),
        before === undefined ? undefined : lt(deliveries.number, before),
      ),
    )
    .orderBy(desc(deliveries.number))
    .limit(limit + 1);
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  return {
    items: await summariesOf(ctx.db.read, shown),
    next: rows.length > limit && last !== undefined ? encodeCursor([last.number]) : null,
  };
};
