import "server-only";
import { and, eq, gt, isNull, or } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { rights } from "@/db/schema/rights";
import type { Ctx } from "../context";
import { iso, isoOrNull } from "../moments";
import { peopleOf } from "../people";
import type { Grant } from "@/lib/schemas/member";

export type GrantOf = Grant & Readonly<{ memberId: string }>;

/** Grants of the organisation that hold now; those past their end date are gone for everybody. */
export const grantsOf = async (
  read: Pick<Reader | Tx, "select">,
  { actor, now }: Pick<Ctx, "actor" | "now">,
): Promise<GrantOf[]> => {
  const rows = await read
    .select({
      memberId: rights.membershipId,
      bayId: rights.bayId,
      right: rights.right,
      until: rights.until,
      grantedBy: rights.grantedBy,
      createdAt: rights.createdAt,
    })
    .from(rights)
    .where(
      and(eq(rights.organisationId, actor.organisationId), or(isNull(rights.until), gt(rights.until, now))),
    );
  const person = await peopleOf(
    read,
    rows.map((row) => row.grantedBy),
  );
  return rows.map(({ createdAt, until, grantedBy, ...row }) => ({
    ...row,
    until: isoOrNull(until),
    grantedBy: person(grantedBy),
    at: iso(createdAt),
  }));
};
