import "server-only";
import { and, eq } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { memberships } from "@/db/schema/memberships";
import { users } from "@/db/schema/users";
import type { Actor } from "@/lib/schemas/access";
import { found } from "../not-found";

export const memberColumns = {
  id: memberships.id,
  userId: memberships.userId,
  name: users.name,
  email: users.email,
  role: memberships.role,
  suspendedAt: memberships.suspendedAt,
  lastSeenAt: memberships.lastSeenAt,
  createdAt: memberships.createdAt,
  version: memberships.version,
};

/** A member of the actor's organisation by the id of the membership, or not found. */
export const memberOf = async (read: Pick<Reader | Tx, "select">, actor: Actor, memberId: string) =>
  found(
    (
      await read
        .select(memberColumns)
        .from(memberships)
        .innerJoin(users, eq(users.id, memberships.userId))
        .where(and(eq(memberships.id, memberId), eq(memberships.organisationId, actor.organisationId)))
    )[0],
  );
