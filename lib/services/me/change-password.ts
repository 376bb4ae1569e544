import "server-only";
import { and, eq, ne } from "drizzle-orm";
import type { z } from "zod";
import { sessions } from "@/db/schema/sessions";
import { users } from "@/db/schema/users";
import { LIMITS, giveBackTries, requireTry } from "@/lib/auth/limits";
import { hashPassword, refuseWeakPassword, verifyPassword } from "@/lib/auth/password";
import { AppError } from "@/lib/errors";
import { mayAtAll } from "@/lib/permissions";
import { ChangePasswordInput } from "@/lib/schemas/session";
import type { VerbArgs } from "../context";
import { logDeed } from "../log-deed";
import { found } from "../not-found";
import { parseInput } from "../parse-input";

/** Changes one's own password; every other session of this person ends with it. */
export const changePassword = async ({
  ctx,
  input,
  sessionId,
}: VerbArgs<z.input<typeof ChangePasswordInput>, { sessionId: string | null }>): Promise<void> => {
  mayAtAll(ctx.actor, "me.changePassword");
  const { current, next } = parseInput(ChangePasswordInput, input);
  const keys = [`password:${ctx.actor.userId}`];
  await requireTry(ctx.db, keys, LIMITS.signIn, ctx.now);
  const user = found(
    (
      await ctx.db.read
        .select({ email: users.email, name: users.name, passwordHash: users.passwordHash })
        .from(users)
        .where(eq(users.id, ctx.actor.userId))
    )[0],
  );
  if (!(await verifyPassword(user.passwordHash, current))) {
    throw new AppError("invalid", {
      user: "The current password is not right.",
      issues: [{ code: "password.wrong", detail: "Not the current password.", pointer: "/current" }],
    });
  }
  await giveBackTries(ctx.db, keys);
  refuseWeakPassword(next, [user.email, user.email.split("@")[0] ?? "", user.name]);
  const passwordHash = await hashPassword(next);
  await ctx.db.write(async (tx) => {
    await tx.update(users).set({ passwordHash }).where(eq(users.id, ctx.actor.userId));
    await tx
      .delete(sessions)
      .where(and(eq(sessions.userId, ctx.actor.userId), ne(sessions.publicId, sessionId ?? "")));
    await logDeed(tx, ctx, {
      verb: "me.changePassword",
      entity: "user",
      entityId: ctx.actor.userId,
      subject: user.name,
    });
  });
};
