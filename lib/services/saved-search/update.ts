import "server-only";
import { eq } from "drizzle-orm";
import type { z } from "zod";
import { savedSearches } from "@/db/schema/saved-searches";
import { mayAtAll } from "@/lib/permissions";
import { type SavedSearch, UpdateSavedSearchInput } from "@/lib/schemas/saved-search";
import type { VerbArgs, Versioned } from "../context";
import { given } from "../given";
import { logDeed } from "../log-deed";
import { parseInput } from "../parse-input";
import { requireSameVersion } from "../stale";
import { refuseTakenSearchName, savedSearchOf } from "./load";

export const updateSavedSearch = async ({
  ctx,
  savedSearchId,
  version,
  input,
}: VerbArgs<
  z.input<typeof UpdateSavedSearchInput>,
  { savedSearchId: string } & Versioned
>): Promise<SavedSearch> => {
  mayAtAll(ctx.actor, "savedSearch.update");
  const changes = given(parseInput(UpdateSavedSearchInput, input));
  return ctx.db
    .write(async (tx) => {
      const before = await savedSearchOf(tx, ctx.actor, savedSearchId);
      requireSameVersion(before.version, version);
      await tx
        .update(savedSearches)
        .set({ ...changes, version: version + 1 })
        .where(eq(savedSearches.id, before.id));
      await logDeed(tx, ctx, {
        verb: "savedSearch.update",
        entity: "savedSearch",
        entityId: before.id,
        subject: changes.name ?? before.name,
        before: { name: before.name, query: before.query },
        after: changes,
      });
      return savedSearchOf(tx, ctx.actor, savedSearchId);
    })
    .catch(refuseTakenSearchName);
};
