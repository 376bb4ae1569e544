import "server-only";
import { eq } from "drizzle-orm";
import type { z } from "zod";
import { passwordResets } from "@/db/schema/password-resets";
import { users } from "@/db/schema/users";
import { LIMITS, requireTry } from "@/lib/auth/limits";
import { hashSecret, newSecret } from "@/lib/auth/secret";
import { enqueueLetter } from "@/lib/mail/enqueue";
import { resetLetter } from "@/lib/mail/letters";
import { RequestResetInput } from "@/lib/schemas/invitation";
import type { OpenCtx, Unparsed } from "../context";
import { newId } from "../new-id";
import { parseInput } from "../parse-input";

const HOLDS_MS = 3_600_000;

/** Asks for a letter with a link to choose a new password. The answer is the same whether or not there is such an account. */
export const requestReset = async ({
  ctx,
  input,
  address,
}: {
  ctx: OpenCtx;
  input: z.input<typeof RequestResetInput> | Unparsed;
  address: string;
}): Promise<void> => {
  const { email } = parseInput(RequestResetInput, input);
  await requireTry(
    ctx.db,
    [`reset:account:${hashSecret(email)}`, `reset:address:${address}`],
    LIMITS.passwordReset,
    ctx.now,
  );
  const secret = newSecret();
  await ctx.db.write(async (tx) => {
    const [user] = await tx
      .select({ id: users.id, name: users.name, passwordHash: users.passwordHash })
      .from(users)
      .where(eq(users.email, email));
    if (!user) return;
    await tx.insert(passwordResets).values({
      id: newId(),
      userId: user.id,
      hash: hashSecret(secret),
      expiresAt: ctx.now + HOLDS_MS,
      createdAt: ctx.now,
    });
    const words = resetLetter({ name: user.name, secret });
    await enqueueLetter(tx, { organisationId: null, to: email, ...words }, ctx.now);
  });
};
