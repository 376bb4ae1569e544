import "server-only";
import { and, eq, gt, isNull } from "drizzle-orm";
import type { z } from "zod";
import type { Reader, Tx } from "@/db/client";
import { memberships } from "@/db/schema/memberships";
import { passwordResets } from "@/db/schema/password-resets";
import { sessions } from "@/db/schema/sessions";
import { users } from "@/db/schema/users";
import { loadActor } from "@/lib/auth/load-actor";
import { hashPassword, refuseWeakPassword } from "@/lib/auth/password";
import { hashSecret } from "@/lib/auth/secret";
import { AppError } from "@/lib/errors";
import { CompleteResetInput } from "@/lib/schemas/invitation";
import type { OpenCtx, Unparsed } from "../context";
import { logDeed } from "../log-deed";
import { parseInput } from "../parse-input";

const openReset = async (read: Pick<Reader | Tx, "select">, token: string, now: number) => {
  const [row] = await read
    .select({ id: passwordResets.id, userId: users.id, email: users.email, name: users.name })
    .from(passwordResets)
    .innerJoin(users, eq(users.id, passwordResets.userId))
    .where(
      and(
        eq(passwordResets.hash, hashSecret(token)),
        isNull(passwordResets.usedAt),
        gt(passwordResets.expiresAt, now),
      ),
    );
  if (!row) {
    throw new AppError("notFound", {
      user: "This link no longer holds: it was used or is older than an hour. Ask for a new one.",
    });
  }
  return row;
};

/** Sets a new password with the secret of a letter, once; every session of the person ends and older links no longer hold. */
export const completeReset = async ({
  ctx,
  input,
}: {
  ctx: OpenCtx;
  input: z.input<typeof CompleteResetInput> | Unparsed;
}): Promise<void> => {
  const { token, password } = parseInput(CompleteResetInput, input);
  const { email, name } = await openReset(ctx.db.read, token, ctx.now);
  refuseWeakPassword(password, [email, email.split("@")[0] ?? "", name]);
  const passwordHash = await hashPassword(password);
  await ctx.db.write(async (tx) => {
    const { userId } = await openReset(tx, token, ctx.now);
    await tx
      .update(passwordResets)
      .set({ usedAt: ctx.now })
      .where(and(eq(passwordResets.userId, userId), isNull(passwordResets.usedAt)));
    await tx.update(users).set({ passwordHash }).where(eq(users.id, userId));
    await tx.delete(sessions).where(eq(sessions.userId, userId));
    const firms = await tx
      .select({ organisationId: memberships.organisationId })
      .from(memberships)
      .where(eq(memberships.userId, userId));
    for (const { organisationId } of firms) {
      const actor = await loadActor(tx, { userId, organisationId, via: "session" }, ctx.now);
      if (actor === null) continue;
      await logDeed(
        tx,
        { ...ctx, actor },
        {
          verb: "passwordReset.complete",
          entity: "user",
          entityId: userId,
          subject: name,
        },
      );
    }
  });
};
