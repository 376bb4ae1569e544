import "server-only";
import { and, eq } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { deliveries } from "@/db/schema/deliveries";
import type { Actor } from "@/lib/schemas/access";
import { found } from "../not-found";

export type DeliveryRecord = typeof deliveries.$inferSelect;
type Select = Pick<Reader | Tx, "select">;

/** A delivery of the actor's organisation, or not found. */
export const deliveryOf = async (
  read: Select,
  actor: Pick<Actor, "organisationId">,
  id: string,
): Promise<DeliveryRecord> =>
  found(
    (
      await read
        .select()
        .from(deliveries)
        .where(and(eq(deliveries.id, id), eq(deliveries.organisationId, actor.organisationId)))
    )[0],
  );

export const codeOf = (number: number): string => `D-${String(number).padStart(4, "0")}`;
