import "server-only";
import { asc, eq } from "drizzle-orm";
import { readings } from "@/db/schema/readings";
import { mayAtAll } from "@/lib/permissions";
import type { ReadingList } from "@/lib/schemas/reading";
import type { Ctx } from "../context";
import { readingViews } from "./load-reading";

/** The readings the firm has kept, by name. */
export const listReadings = async ({ ctx }: { ctx: Ctx }): Promise<ReadingList> => {
  mayAtAll(ctx.actor, "reading.list");
  const rows = await ctx.db.read
    .select()
    .from(readings)
    .where(eq(readings.organisationId, ctx.actor.organisationId))
    .orderBy(asc(readings.name));
  return { items: await readingViews(ctx.db.read, rows) };
};
