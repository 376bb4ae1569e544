import "server-only";
import { and, eq, gt, isNull, or } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { memberships } from "@/db/schema/memberships";
import { rights } from "@/db/schema/rights";
import { users } from "@/db/schema/users";
import type { Actor, Right } from "@/lib/schemas/access";

/** Rights granted beside the role that hold now, by bay; `all` for the whole Rack. */
const rightsOf = async (
  read: Pick<Reader | Tx, "select">,
  membershipId: string,
  now: number,
): Promise<Record<string, Right>> => {
  const rows = await read
    .select({ bayId: rights.bayId, right: rights.right })
    .from(rights)
    .where(and(eq(rights.membershipId, membershipId), or(isNull(rights.until), gt(rights.until, now))));
  return Object.fromEntries(rows.map((row) => [row.bayId ?? "all", row.right]));
};

/** The membership of a person in an organisation as it stands now; null when there is none or it is suspended. */
export const loadActor = async (
  read: Pick<Reader | Tx, "select">,
  who: Readonly<{ userId: string; organisationId: string; via: Actor["via"] }>,
  now: number,
): Promise<Actor | null> => {
  const [row] = await read
    .select({ membershipId: memberships.id, role: memberships.role, name: users.name })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(
      and(
        eq(memberships.userId, who.userId),
        eq(memberships.organisationId, who.organisationId),
        isNull(memberships.suspendedAt),
      ),
    );
  if (!row) return null;
  return { ...who, ...row, rights: await rightsOf(read, row.membershipId, now) };
};
