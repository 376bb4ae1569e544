import "server-only";
import { desc, eq } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { invitations } from "@/db/schema/invitations";
import { mayAtAll } from "@/lib/permissions";
import type { Invitation, InvitationList } from "@/lib/schemas/invitation";
import type { Ctx } from "../context";
import { iso } from "../moments";
import { peopleOf } from "../people";

const MOST = 500;

/** Invitations of the organisation, the newest first; never their secrets. */
export const listInvitations = async ({ ctx }: { ctx: Ctx }): Promise<InvitationList> => {
  mayAtAll(ctx.actor, "invitation.list");
  return { items: await invitationsOf(ctx.db.read, ctx) };
};

export const invitationsOf = async (
  read: Pick<Reader | Tx, "select">,
  { actor, now }: Pick<Ctx, "actor" | "now">,
): Promise<Invitation[]> => {
  const rows = await read
    .select()
    .from(invitations)
    .where(eq(invitations.organisationId, actor.organisationId))
    .orderBy(desc(invitations.createdAt), desc(invitations.id))
    .limit(MOST);
  const person = await peopleOf(
    read,
    rows.map((row) => row.invitedBy),
  );
  return rows.map((row) => ({
    id: row.id,
    email: row.email,
    name: row.name,
    role: row.role,
    invitedBy: person(row.invitedBy),
    createdAt: iso(row.createdAt),
    expiresAt: iso(row.expiresAt),
    state: stateOf(row, now),
  }));
};

type Row = typeof invitations.$inferSelect;
const stateOf = ({ acceptedAt, revokedAt, expiresAt }: Row, now: number): Invitation["state"] => {
  if (acceptedAt !== null) return "accepted";
  if (revokedAt !== null) return "revoked";
  return expiresAt <= now ? "expired" : "open";
};
