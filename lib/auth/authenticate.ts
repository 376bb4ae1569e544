import "server-only";
import type { Db } from "@/db/client";
import type { Actor } from "@/lib/schemas/access";
import { readCookie, sessionCookieName } from "./cookies";
import { readSession, touchSession } from "./sessions";

export type Authenticated = Readonly<{ actor: Actor; sessionId: string | null }>;

/** Who a request's headers say is acting: a bearer token, else the session of the cookie; null when neither holds. */
export const authenticate = async (
  db: Db,
  headers: Readonly<{ get: (name: string) => string | null }>,
  now: number,
): Promise<Authenticated | null> => {
  const token = readCookie(headers.get("cookie"), sessionCookieName());
  if (token === null) return null;
  const session = await readSession(db, token);
  if (session === null) return null;
  touchSession(db, session, now);
  return { actor: session.actor, sessionId: session.publicId };
};
