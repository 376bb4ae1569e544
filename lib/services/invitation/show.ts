import "server-only";
import { eq } from "drizzle-orm";
import type { z } from "zod";
import { users } from "@/db/schema/users";
import { ShowInvitationInput, type ShownInvitation } from "@/lib/schemas/invitation";
import type { OpenCtx, Unparsed } from "../context";
import { parseInput } from "../parse-input";
import { openInvitation } from "./load-open";

/** What an invitation says, for the page with the button; reading it changes nothing. */
export const showInvitation = async ({
  ctx,
  input,
}: {
  ctx: OpenCtx;
  input: z.input<typeof ShowInvitationInput> | Unparsed;
}): Promise<ShownInvitation> => {
  const { token } = parseInput(ShowInvitationInput, input);
  const { invitation, organisation, user } = await openInvitation(ctx.db.read, token, ctx.now);
  const [by] = await ctx.db.read
    .select({ name: users.name })
    .from(users)
    .where(eq(users.id, invitation.invitedBy));
  return {
    organisation,
    email: invitation.email,
    name: user?.name ?? invitation.name,
    role: invitation.role,
    invitedBy: by?.name ?? "",
    known: user?.passwordHash !== null && user !== null,
  };
};
