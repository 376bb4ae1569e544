import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import type { Tx } from "@/db/client";
import { uniqueViolation } from "@/db/retry";
import { invitations } from "@/db/schema/invitations";
import { memberships } from "@/db/schema/memberships";
import { organisations } from "@/db/schema/organisations";
import { users } from "@/db/schema/users";
import { LIMITS, requireTry } from "@/lib/auth/limits";
import { hashSecret, newSecret } from "@/lib/auth/secret";
import { AppError } from "@/lib/errors";
import { enqueueLetter } from "@/lib/mail/enqueue";
import { invitationLetter } from "@/lib/mail/letters";
import { mayAtAll } from "@/lib/permissions";
import { CreateInvitationInput, type Invitation } from "@/lib/schemas/invitation";
import type { Ctx, VerbArgs } from "../context";
import { logDeed } from "../log-deed";
import { newId } from "../new-id";
import { found } from "../not-found";
import { parseInput } from "../parse-input";
import { invitationsOf } from "./list";

const HOLDS_MS = 72 * 3_600_000;

const conflict = (detail: string) =>
  new AppError("conflict", {
    user: detail,
    issues: [{ code: "invitation.known", detail, pointer: "/email" }],
  });

const refuseMember = async (tx: Tx, { actor }: Ctx, email: string): Promise<void> => {
  const [member] = await tx
    .select({ id: memberships.id })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(users.email, email), eq(memberships.organisationId, actor.organisationId)));
  if (member) throw conflict("Somebody with this address is a member already.");
};

/** Invites somebody by letter; an open invitation of the same address is replaced, so that its old link no longer holds. */
export const createInvitation = async ({
  ctx,
  input,
}: VerbArgs<z.input<typeof CreateInvitationInput>>): Promise<Invitation> => {
  mayAtAll(ctx.actor, "invitation.create");
  const { email, name, role } = parseInput(CreateInvitationInput, input);
  const { organisationId, userId } = ctx.actor;
  await requireTry(ctx.db, [`invitation:${organisationId}`], LIMITS.invitation, ctx.now);
  const secret = newSecret();
  return ctx.db
    .write(async (tx) => {
      await refuseMember(tx, ctx, email);
      await tx
        .update(invitations)
        .set({ revokedAt: ctx.now })
        .where(
          and(
            eq(invitations.organisationId, organisationId),
            eq(invitations.email, email),
            isNull(invitations.acceptedAt),
            isNull(invitations.revokedAt),
          ),
        );
      const id = newId();
      await tx.insert(invitations).values({
        id,
        organisationId,
        email,
        name,
        role,
        hash: hashSecret(secret),
        expiresAt: ctx.now + HOLDS_MS,
        invitedBy: userId,
        createdAt: ctx.now,
      });
      const [firm] = await tx
        .select({ name: organisations.name })
        .from(organisations)
        .where(eq(organisations.id, organisationId));
      const words = invitationLetter({
        firm: firm?.name ?? "",
        invitedBy: ctx.actor.name,
        role,
        secret,
        name,
      });
      await enqueueLetter(tx, { organisationId, to: email, ...words }, ctx.now);
      await logDeed(tx, ctx, {
        verb: "invitation.create",
        entity: "invitation",
        entityId: id,
        subject: `${name}, ${role}`,
        after: { email, name, role },
      });
      return found((await invitationsOf(tx, ctx)).find((row) => row.id === id));
    })
    .catch((error: unknown) => {
      if (uniqueViolation(error) === null) throw error;
      throw conflict("Somebody invited this address at the same moment.");
    });
};
