import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import { invitations } from "@/db/schema/invitations";
import { mayAtAll } from "@/lib/permissions";
import type { Ctx } from "../context";
import { logDeed } from "../log-deed";
import { found } from "../not-found";

/** Takes an open invitation back: its link no longer holds. */
export const revokeInvitation = async ({
  ctx,
  invitationId,
}: {
  ctx: Ctx;
  invitationId: string;
}): Promise<void> => {
  mayAtAll(ctx.actor, "invitation.revoke");
  await ctx.db.write(async (tx) => {
    const open = and(
      eq(invitations.id, invitationId),
      eq(invitations.organisationId, ctx.actor.organisationId),
      isNull(invitations.acceptedAt),
      isNull(invitations.revokedAt),
    );
    const row = found((await tx.select().from(invitations).where(open))[0]);
    await tx.update(invitations).set({ revokedAt: ctx.now }).where(open);
    await logDeed(tx, ctx, {
      verb: "invitation.revoke",
      entity: "invitation",
      entityId: row.id,
      subject: `${row.name}, ${row.role}`,
      before: { email: row.email, role: row.role },
    });
  });
};
