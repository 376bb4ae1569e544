import "server-only";
import type { Db } from "@/db/client";
import type { Actor } from "@/lib/schemas/access";
import { readCookie, sessionCookieName } from "./cookies";
import { readSession, touchSession } from "./sessions";
import { readToken } from "./tokens";

export type Authenticated = Readonly<{
  actor: Actor;
  /** Public id of the session; null for tokens. */
  sessionId: string | null;
  /** A token that may only read. */
  readOnly: boolean;
}>;

type Headers = Readonly<{ get: (name: string) => string | null }>;

/**
 * Who a request's headers say is acting: the bearer token when there is an Authorization header (and then nothing else:
 * such a request is not asked for its origin), else the session of the cookie; null when it does not hold.
 */
export const authenticate = async (db: Db, headers: Headers, now: number): Promise<Authenticated | null> => {
  const authorization = headers.get("authorization");
  if (authorization !== null) {
    const secret = /^Bearer ([\w-]{20,100})$/i.exec(authorization.trim())?.[1];
    const found = secret === undefined ? null : await readToken(db, secret, now);
    return found && { ...found, sessionId: null };
  }
  const token = readCookie(headers.get("cookie"), sessionCookieName());
  if (token === null) return null;
  const session = await readSession(db, token);
  if (session === null) return null;
  touchSession(db, session, now);
  return { actor: session.actor, sessionId: session.publicId, readOnly: false };
};
