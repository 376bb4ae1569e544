import "server-only";
import { eq } from "drizzle-orm";
import { savedSearches } from "@/db/schema/saved-searches";
import { mayAtAll } from "@/lib/permissions";
import type { Ctx } from "../context";
import { logDeed } from "../log-deed";
import { requireSameVersion } from "../stale";
import { savedSearchOf } from "./load";

type Address = Readonly<{ ctx: Ctx; savedSearchId: string; version: number }>;

export const deleteSavedSearch = async ({ ctx, savedSearchId, version }: Address): Promise<void> => {
  mayAtAll(ctx.actor, "savedSearch.delete");
  await ctx.db.write(async (tx) => {
    const before = await savedSearchOf(tx, ctx.actor, savedSearchId);
    requireSameVersion(before.version, version);
    await tx.delete(savedSearches).where(eq(savedSearches.id, before.id));
    await logDeed(tx, ctx, {
      verb: "savedSearch.delete",
      entity: "savedSearch",
      entityId: before.id,
      subject: before.name,
      before: { name: before.name, query: before.query },
    });
  });
};
