import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import { tokens } from "@/db/schema/tokens";
import { couldEver, mayAtAll } from "@/lib/permissions";
import type { Ctx } from "../context";
import { logDeed } from "../log-deed";
import { found } from "../not-found";

/** Ends a token at once: one's own, for an admin anybody's in the organisation. */
export const revokeToken = async ({ ctx, tokenId }: { ctx: Ctx; tokenId: string }): Promise<void> => {
  mayAtAll(ctx.actor, "token.revoke");
  await ctx.db.write(async (tx) => {
    const holding = and(
      eq(tokens.id, tokenId),
      eq(tokens.organisationId, ctx.actor.organisationId),
      isNull(tokens.revokedAt),
      couldEver(ctx.actor, "token.manageAll") ? undefined : eq(tokens.membershipId, ctx.actor.membershipId),
    );
    const row = found((await tx.select({ id: tokens.id, name: tokens.name }).from(tokens).where(holding))[0]);
    await tx.update(tokens).set({ revokedAt: ctx.now }).where(holding);
    await logDeed(tx, ctx, { verb: "token.revoke", entity: "token", entityId: row.id, subject: row.name });
  });
};
