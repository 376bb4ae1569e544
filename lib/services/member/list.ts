import "server-only";
import { and, asc, count, eq, gt, isNull } from "drizzle-orm";
import { memberships } from "@/db/schema/memberships";
import { sessions } from "@/db/schema/sessions";
import { tokens } from "@/db/schema/tokens";
import { users } from "@/db/schema/users";
import { mayAtAll } from "@/lib/permissions";
import type { MemberList } from "@/lib/schemas/member";
import type { Ctx } from "../context";
import { iso, isoOrNull } from "../moments";
import { grantsOf, type GrantOf } from "../right/grants";
import { memberColumns } from "./load-member";

export const grantsFor = (grants: readonly GrantOf[], memberId: string) =>
  grants.filter((grant) => grant.memberId === memberId).map(({ memberId: _of, ...grant }) => grant);

/** Members with their role, grants beside it, open sessions and tokens, by name. */
export const listMembers = async ({ ctx }: { ctx: Ctx }): Promise<MemberList> => {
  mayAtAll(ctx.actor, "member.list");
  const { organisationId } = ctx.actor;
  const rows = await ctx.db.read
    .select(memberColumns)
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(eq(memberships.organisationId, organisationId))
    .orderBy(asc(users.name), asc(memberships.id));
  const open = await ctx.db.read
    .select({ userId: sessions.userId, sessions: count() })
    .from(sessions)
    .where(
      and(
        eq(sessions.organisationId, organisationId),
        gt(sessions.idleUntil, ctx.now),
        gt(sessions.absoluteUntil, ctx.now),
      ),
    )
    .groupBy(sessions.userId);
  const openOf = new Map(open.map((row) => [row.userId, row.sessions]));
  const held = await ctx.db.read
    .select({ memberId: tokens.membershipId, tokens: count() })
    .from(tokens)
    .where(
      and(eq(tokens.organisationId, organisationId), isNull(tokens.revokedAt), gt(tokens.expiresAt, ctx.now)),
    )
    .groupBy(tokens.membershipId);
  const tokensOf = new Map(held.map((row) => [row.memberId, row.tokens]));
  const grants = await grantsOf(ctx.db.read, ctx);
  return {
    items: rows.map((row) => ({
      ...row,
      suspendedAt: isoOrNull(row.suspendedAt),
      lastSeenAt: isoOrNull(row.lastSeenAt),
      createdAt: iso(row.createdAt),
      openSessions: openOf.get(row.userId) ?? 0,
      tokens: tokensOf.get(row.id) ?? 0,
      grants: grantsFor(grants, row.id),
    })),
  };
};
