import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import { invitations } from "@/db/schema/invitations";
import { memberships } from "@/db/schema/memberships";
import { users } from "@/db/schema/users";
import { giveBackTries, LIMITS, requireTry } from "@/lib/auth/limits";
import { hashPassword, refuseWeakPassword, verifyPassword } from "@/lib/auth/password";
import { AppError } from "@/lib/errors";
import { AcceptInvitationInput } from "@/lib/schemas/invitation";
import { NewPassword } from "@/lib/schemas/session";
import type { Actor } from "@/lib/schemas/access";
import type { OpenCtx, Unparsed } from "../context";
import { logDeed } from "../log-deed";
import { newId } from "../new-id";
import { parseInput } from "../parse-input";
import { openInvitation } from "./load-open";

type Opened = Awaited<ReturnType<typeof openInvitation>>;

/**
 * Accepts an invitation, once. A new person chooses a password; somebody who has an account proves it with the one they
 * have, so that a letter that went astray takes nobody's account over.
 */
export const acceptInvitation = async ({
  ctx,
  input,
}: {
  ctx: OpenCtx;
  input: z.input<typeof AcceptInvitationInput> | Unparsed;
}): Promise<{ email: string }> => {
  const { token, name, password } = parseInput(AcceptInvitationInput, input);
  const opened = await openInvitation(ctx.db.read, token, ctx.now);
  const passwordHash = await proven(ctx, opened, password, name ?? opened.invitation.name);
  return ctx.db.write(async (tx) => {
    const { invitation, user } = await openInvitation(tx, token, ctx.now);
    await tx
      .update(invitations)
      .set({ acceptedAt: ctx.now })
      .where(and(eq(invitations.id, invitation.id), isNull(invitations.acceptedAt)));
    const userId = user?.id ?? newId();
    const called = user?.name ?? name ?? invitation.name;
    if (user === null) {
      await tx.insert(users).values({
        id: userId,
        email: invitation.email,
        name: called,
        passwordHash,
        createdAt: ctx.now,
      });
    } else if (user.passwordHash === null) {
      await tx.update(users).set({ passwordHash }).where(eq(users.id, userId));
    }
    const actor: Actor = {
      userId,
      membershipId: newId(),
      organisationId: invitation.organisationId,
      name: called,
      role: invitation.role,
      rights: {},
      via: "session",
    };
    await tx.insert(memberships).values({
      id: actor.membershipId,
      organisationId: actor.organisationId,
      userId,
      role: actor.role,
      createdAt: ctx.now,
    });
    await logDeed(
      tx,
      { ...ctx, actor },
      {
        verb: "invitation.accept",
        entity: "member",
        entityId: actor.membershipId,
        subject: `${called}, ${actor.role}`,
        after: { invitationId: invitation.id, email: invitation.email, role: actor.role },
      },
    );
    return { email: invitation.email };
  });
};

/** The hash to store for a new person; for a known one the proof that it is them. */
const proven = async (
  ctx: OpenCtx,
  opened: Opened,
  password: string,
  name: string,
): Promise<string | null> => {
  const { invitation, user } = opened;
  if (user?.passwordHash) {
    const keys = [`invitation:${invitation.id}`];
    await requireTry(ctx.db, keys, LIMITS.signIn, ctx.now);
    if (!(await verifyPassword(user.passwordHash, password))) {
      throw new AppError("invalid", {
        user: "You have an account already: give the password you have.",
        issues: [
          { code: "password.wrong", detail: "Not the password of your account.", pointer: "/password" },
        ],
      });
    }
    await giveBackTries(ctx.db, keys);
    return null;
  }
  const chosen = NewPassword.safeParse(password);
  if (!chosen.success) {
    const detail = chosen.error.issues[0]?.message ?? "Choose another password.";
    throw new AppError("invalid", {
      user: `password: ${detail}`,
      issues: [{ code: "password.length", detail, pointer: "/password" }],
    });
  }
  refuseWeakPassword(password, [invitation.email, invitation.email.split("@")[0] ?? "", name]);
  return hashPassword(password);
};
