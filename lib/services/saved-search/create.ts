import "server-only";
import { count } from "drizzle-orm";
import type { z } from "zod";
import { savedSearches } from "@/db/schema/saved-searches";
import { AppError } from "@/lib/errors";
import { mayAtAll } from "@/lib/permissions";
import { CreateSavedSearchInput, type SavedSearch } from "@/lib/schemas/saved-search";
import type { VerbArgs } from "../context";
import { logDeed } from "../log-deed";
import { newId } from "../new-id";
import { parseInput } from "../parse-input";
import { ownSearches, refuseTakenSearchName, savedSearchOf } from "./load";

const MOST = 200;

/** Keeps a search of the Rack under a name, for oneself. */
export const createSavedSearch = async ({
  ctx,
  input,
}: VerbArgs<z.input<typeof CreateSavedSearchInput>>): Promise<SavedSearch> => {
  mayAtAll(ctx.actor, "savedSearch.create");
  const { name, query } = parseInput(CreateSavedSearchInput, input);
  const { organisationId, userId } = ctx.actor;
  return ctx.db
    .write(async (tx) => {
      const [kept] = await tx.select({ searches: count() }).from(savedSearches).where(ownSearches(ctx.actor));
      if ((kept?.searches ?? 0) >= MOST) {
        throw new AppError("conflict", { user: `You keep ${MOST} searches already: delete one first.` });
      }
      const id = newId();
      await tx
        .insert(savedSearches)
        .values({ id, organisationId, ownerId: userId, name, query, createdAt: ctx.now });
      await logDeed(tx, ctx, {
        verb: "savedSearch.create",
        entity: "savedSearch",
        entityId: id,
        subject: name,
        after: { name, query },
      });
      return savedSearchOf(tx, ctx.actor, id);
    })
    .catch(refuseTakenSearchName);
};
