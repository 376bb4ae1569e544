import "server-only";
import { and, eq, lt } from "drizzle-orm";
import { Lucia, TimeSpan } from "lucia";
import { v7 as uuidv7 } from "uuid";
import type { Db } from "@/db/client";
import { memberships } from "@/db/schema/memberships";
import { sessions } from "@/db/schema/sessions";
import { environment } from "@/lib/env";
import { logger } from "@/lib/logger";
import type { Actor } from "@/lib/schemas/access";
import { newSecret } from "./secret";
import { sessionAdapter, type SessionFacts } from "./session-adapter";

declare module "lucia" {
  interface Register {
    Lucia: ReturnType<typeof luciaOf>;
    DatabaseSessionAttributes: SessionFacts;
    DatabaseUserAttributes: { actor: Actor };
  }
}

const TOUCH_EVERY_MS = 60_000;

const idleMs = () => environment().SESSION_IDLE_MINUTES * 60_000;
const absoluteMs = () => environment().SESSION_HOURS * 3_600_000;

/** Lucia over our adapter; nothing outside lib/auth knows it. */
const luciaOf = (db: Db) =>
  new Lucia(sessionAdapter(db), {
    sessionExpiresIn: new TimeSpan(environment().SESSION_IDLE_MINUTES, "m"),
    getSessionAttributes: (facts: SessionFacts) => facts,
    getUserAttributes: ({ actor }: { actor: Actor }) => ({ actor }),
  });

export type OpenSession = Readonly<{
  actor: Actor;
  publicId: string;
  lastSeenAt: number;
  absoluteUntil: number;
}>;

/** Opens a session for a membership and answers its token, which is nowhere stored. */
export const createSession = async (
  db: Db,
  who: Readonly<{ userId: string; organisationId: string; userAgent: string }>,
  now: number,
): Promise<Readonly<{ token: string; publicId: string; seconds: number }>> => {
  const token = newSecret();
  const publicId = uuidv7();
  await luciaOf(db).createSession(
    who.userId,
    {
      publicId,
      organisationId: who.organisationId,
      lastSeenAt: now,
      absoluteUntil: now + absoluteMs(),
      userAgent: who.userAgent.slice(0, 200),
    },
    { sessionId: token },
  );
  return { token, publicId, seconds: Math.floor(absoluteMs() / 1000) };
};

/** Whose session a token is, as their membership stands now; null when there is none. */
export const readSession = async (db: Db, token: string): Promise<OpenSession | null> => {
  const { session, user } = await luciaOf(db).validateSession(token);
  if (!session || !user) return null;
  const { publicId, lastSeenAt, absoluteUntil } = session;
  return { actor: user.actor, publicId, lastSeenAt, absoluteUntil };
};

export const closeSession = (db: Db, token: string): Promise<void> => luciaOf(db).invalidateSession(token);

/** Moves the idle limit and "last seen", at most once a minute; the request does not wait for it. */
export const touchSession = (db: Db, session: OpenSession, now: number): void => {
  if (now - session.lastSeenAt < TOUCH_EVERY_MS) return;
  const idleUntil = Math.min(now + idleMs(), session.absoluteUntil);
  const touched = db.write(async (tx) => {
    await tx
      .update(sessions)
      .set({ lastSeenAt: now, idleUntil })
      .where(and(eq(sessions.publicId, session.publicId), lt(sessions.lastSeenAt, now)));
    await tx
      .update(memberships)
      .set({ lastSeenAt: now })
      .where(eq(memberships.id, session.actor.membershipId));
  });
  touched.catch((error: unknown) => logger().warn({ err: String(error) }, "last seen could not be written"));
};

/** Removes sessions that ran out. */
export const sweepSessions = (db: Db): Promise<void> => luciaOf(db).deleteExpiredSessions();
