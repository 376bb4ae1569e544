import "server-only";
import { and, desc, eq, gt, isNull } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { memberships } from "@/db/schema/memberships";
import { tokens } from "@/db/schema/tokens";
import { users } from "@/db/schema/users";
import { couldEver, mayAtAll } from "@/lib/permissions";
import type { Token, TokenList } from "@/lib/schemas/token";
import type { Ctx } from "../context";
import { iso, isoOrNull } from "../moments";

/** Tokens that hold: one's own, and for an admin everybody's; never the token itself. */
export const listTokens = async ({ ctx }: { ctx: Ctx }): Promise<TokenList> => {
  mayAtAll(ctx.actor, "token.list");
  return { items: await tokensOf(ctx.db.read, ctx) };
};

export const tokensOf = async (
  read: Pick<Reader | Tx, "select">,
  { actor, now }: Pick<Ctx, "actor" | "now">,
): Promise<Token[]> => {
  const rows = await read
    .select({
      id: tokens.id,
      name: tokens.name,
      may: tokens.may,
      owner: { id: users.id, name: users.name },
      createdAt: tokens.createdAt,
      expiresAt: tokens.expiresAt,
      lastUsedAt: tokens.lastUsedAt,
    })
    .from(tokens)
    .innerJoin(memberships, eq(memberships.id, tokens.membershipId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(
      and(
        eq(tokens.organisationId, actor.organisationId),
        isNull(tokens.revokedAt),
        gt(tokens.expiresAt, now),
        couldEver(actor, "token.manageAll") ? undefined : eq(tokens.membershipId, actor.membershipId),
      ),
    )
    .orderBy(desc(tokens.createdAt), desc(tokens.id))
    .limit(1000);
  return rows.map((row) => ({
    ...row,
    createdAt: iso(row.createdAt),
    expiresAt: iso(row.expiresAt),
    lastUsedAt: isoOrNull(row.lastUsedAt),
  }));
};
