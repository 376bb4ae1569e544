import "server-only";
import { and, desc, eq } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { bays } from "@/db/schema/bays";
import { memberships } from "@/db/schema/memberships";
import { rightRequests } from "@/db/schema/right-requests";
import { users } from "@/db/schema/users";
import { couldEver, mayAtAll } from "@/lib/permissions";
import type { RightRequest, RightRequestList } from "@/lib/schemas/right-request";
import type { Ctx } from "../context";
import { iso } from "../moments";
import { peopleOf } from "../people";

/** Requests for rights: one's own, for an admin everybody's; open ones first, then the newest. */
export const listRightRequests = async ({ ctx }: { ctx: Ctx }): Promise<RightRequestList> => {
  mayAtAll(ctx.actor, "rightRequest.list");
  return { items: await rightRequestsOf(ctx.db.read, ctx) };
};

export const rightRequestsOf = async (
  read: Pick<Reader | Tx, "select">,
  { actor }: Pick<Ctx, "actor">,
): Promise<RightRequest[]> => {
  const all = couldEver(actor, "rightRequest.listAll");
  const rows = await read
    .select({ request: rightRequests, name: users.name, bay: { id: bays.id, name: bays.name } })
    .from(rightRequests)
    .innerJoin(memberships, eq(memberships.id, rightRequests.membershipId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .leftJoin(bays, eq(bays.id, rightRequests.bayId))
    .where(
      and(
        eq(rightRequests.organisationId, actor.organisationId),
        all ? undefined : eq(rightRequests.membershipId, actor.membershipId),
      ),
    )
    .orderBy(desc(rightRequests.createdAt), desc(rightRequests.id))
    .limit(500);
  const person = await peopleOf(
    read,
    rows.map((row) => row.request.decidedBy),
  );
  return rows
    .map(({ request, name, bay }) => ({
      id: request.id,
      member: { id: request.membershipId, name },
      bay,
      right: request.right,
      reason: request.reason,
      state: request.state,
      answer: request.answer,
      decidedBy: request.decidedBy === null ? null : person(request.decidedBy),
      createdAt: iso(request.createdAt),
      version: request.version,
    }))
    .sort((a, b) => Number(b.state === "open") - Number(a.state === "open"));
};
