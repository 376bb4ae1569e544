import "server-only";
import { and, desc, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import { attempts } from "@/db/schema/attempts";
import { memberships } from "@/db/schema/memberships";
import { users } from "@/db/schema/users";
import { giveBackTries, LIMITS, requireTry } from "@/lib/auth/limits";
import { loadActor } from "@/lib/auth/load-actor";
import { verifyPassword } from "@/lib/auth/password";
import { hashSecret, newSecret } from "@/lib/auth/secret";
import { closeSession, createSession } from "@/lib/auth/sessions";
import { AppError } from "@/lib/errors";
import { SignInInput } from "@/lib/schemas/session";
import type { Actor } from "@/lib/schemas/access";
import type { OpenCtx, Unparsed } from "../context";
import { logDeed } from "../log-deed";
import { parseInput } from "../parse-input";

const DEVICE_DAYS = 180;
export const DEVICE_SECONDS = DEVICE_DAYS * 86_400;

type From = Readonly<{
  address: string;
  userAgent: string;
  /** Token of the session that was open in this browser, to be closed. */
  oldToken: string | null;
  /** Secret of the device cookie, if this browser has one. */
  device: string | null;
}>;

export type SignedIn = Readonly<{ actor: Actor; token: string; seconds: number; device: string }>;

const refusal = () =>
  new AppError("signedOut", {
    user: "Address and password do not fit together, or the account may not sign in.",
  });

const deviceKey = (device: string, email: string) => `device:${hashSecret(`${device} ${email}`)}`;

/**
 * Opens a session. The answer and its time are the same whether or not the account exists. Tries are counted for a
 * browser that signed in here before by itself, for all others by account and by address, so that a stranger's tries
 * lock nobody out of their own browser; what succeeds does not count.
 */
export const openSession = async ({
  ctx,
  input,
  from,
}: {
  ctx: OpenCtx;
  input: z.input<typeof SignInInput> | Unparsed;
  from: From;
}): Promise<SignedIn> => {
  const { email: typed, password, organisation } = parseInput(SignInInput, input);
  const email = typed.toLowerCase();
  const known = from.device !== null && (await isKnownDevice(ctx, deviceKey(from.device, email)));
  const keys =
    known && from.device !== null
      ? [`signin:device:${hashSecret(`${from.device} ${email}`)}`]
      : [`signin:account:${hashSecret(email)}`, `signin:address:${from.address}`];
  await requireTry(ctx.db, keys, LIMITS.signIn, ctx.now);

  const [person] = await ctx.db.read
    .select({ id: users.id, passwordHash: users.passwordHash })
    .from(users)
    .where(eq(users.email, email));
  const fits = await verifyPassword(person?.passwordHash ?? null, password);
  const actor = person && fits ? await actorFor(ctx, person.id, organisation) : null;
  if (actor === null) throw refusal();

  const device = known && from.device !== null ? from.device : newSecret();
  const session = await createSession(ctx.db, { ...actor, userAgent: from.userAgent }, ctx.now);
  if (from.oldToken !== null) await closeSession(ctx.db, from.oldToken);
  await giveBackTries(ctx.db, keys);
  await ctx.db.write(async (tx) => {
    const seen = { key: deviceKey(device, email), points: 0, expiresAt: ctx.now + DEVICE_SECONDS * 1000 };
    await tx
      .insert(attempts)
      .values(seen)
      .onConflictDoUpdate({ target: attempts.key, set: { expiresAt: seen.expiresAt } });
    await logDeed(
      tx,
      { ...ctx, actor },
      {
        verb: "session.open",
        entity: "session",
        entityId: session.publicId,
        subject: actor.name,
      },
    );
  });
  return { actor, token: session.token, seconds: session.seconds, device };
};

const isKnownDevice = async ({ db, now }: OpenCtx, key: string): Promise<boolean> => {
  const [row] = await db.read
    .select({ expiresAt: attempts.expiresAt })
    .from(attempts)
    .where(eq(attempts.key, key));
  return row !== undefined && (row.expiresAt ?? 0) > now;
};

/** The membership to act with: the organisation asked for, else the one last used. */
const actorFor = async (
  { db, now }: OpenCtx,
  userId: string,
  organisation: string | undefined,
): Promise<Actor | null> => {
  const [row] = await db.read
    .select({ organisationId: memberships.organisationId })
    .from(memberships)
    .where(
      and(
        eq(memberships.userId, userId),
        isNull(memberships.suspendedAt),
        organisation === undefined ? undefined : eq(memberships.organisationId, organisation),
      ),
    )
    .orderBy(desc(memberships.lastSeenAt), memberships.id)
    .limit(1);
  return row ? loadActor(db.read, { userId, organisationId: row.organisationId, via: "session" }, now) : null;
};
