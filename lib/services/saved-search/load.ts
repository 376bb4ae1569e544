import "server-only";
import { and, eq } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { uniqueViolation } from "@/db/retry";
import { savedSearches } from "@/db/schema/saved-searches";
import { AppError } from "@/lib/errors";
import type { Actor } from "@/lib/schemas/access";
import { found } from "../not-found";

export const savedColumns = {
  id: savedSearches.id,
  name: savedSearches.name,
  query: savedSearches.query,
  version: savedSearches.version,
};

export const ownSearches = (actor: Actor) =>
  and(eq(savedSearches.organisationId, actor.organisationId), eq(savedSearches.ownerId, actor.userId));

/** A search of one's own, or not found. */
export const savedSearchOf = async (read: Pick<Reader | Tx, "select">, actor: Actor, id: string) =>
  found(
    (
      await read
        .select(savedColumns)
        .from(savedSearches)
        .where(and(ownSearches(actor), eq(savedSearches.id, id)))
    )[0],
  );

export const refuseTakenSearchName = (error: unknown): never => {
  if (uniqueViolation(error) === null) throw error;
  const detail = "You have a search of that name already.";
  throw new AppError("conflict", {
    user: detail,
    issues: [{ code: "savedSearch.nameTaken", detail, pointer: "/name" }],
    cause: error,
  });
};
