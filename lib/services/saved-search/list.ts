import "server-only";
import { asc } from "drizzle-orm";
import { savedSearches } from "@/db/schema/saved-searches";
import { mayAtAll } from "@/lib/permissions";
import type { SavedSearchList } from "@/lib/schemas/saved-search";
import type { Ctx } from "../context";
import { ownSearches, savedColumns } from "./load";

export const listSavedSearches = async ({ ctx }: { ctx: Ctx }): Promise<SavedSearchList> => {
  mayAtAll(ctx.actor, "savedSearch.list");
  const items = await ctx.db.read
    .select(savedColumns)
    .from(savedSearches)
    .where(ownSearches(ctx.actor))
    .orderBy(asc(savedSearches.name))
    .limit(200);
  return { items };
};
