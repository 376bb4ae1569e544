import "server-only";
import { and, eq } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { bays } from "@/db/schema/bays";
import type { Actor } from "@/lib/schemas/access";
import { found } from "../not-found";

export const bayColumns = {
  id: bays.id,
  name: bays.name,
  ordinal: bays.ordinal,
  counts: bays.counts,
  tolerance: bays.tolerance,
  version: bays.version,
};

/** A bay of the actor's organisation, or not found. */
export const bayOf = async (read: Pick<Reader | Tx, "select">, actor: Actor, bayId: string) =>
  found(
    (
      await read
        .select(bayColumns)
        .from(bays)
        .where(and(eq(bays.id, bayId), eq(bays.organisationId, actor.organisationId)))
    )[0],
  );
