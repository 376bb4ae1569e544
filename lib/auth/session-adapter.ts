import "server-only";
import { and, eq, gt, lte, or } from "drizzle-orm";
import type { Adapter, DatabaseSession, DatabaseUser } from "lucia";
import type { Db } from "@/db/client";
import { sessions } from "@/db/schema/sessions";
import type { Actor } from "@/lib/schemas/access";
import { loadActor } from "./load-actor";
import { hashSecret } from "./secret";

export type SessionFacts = Readonly<{
  publicId: string;
  organisationId: string;
  lastSeenAt: number;
  absoluteUntil: number;
  userAgent: string;
}>;

/**
 * Lucia's adapter over our tables. What lucia calls the session id is the token of the cookie; the database sees only
 * its SHA-256. A session past its idle or absolute limit, or of a suspended member, is not there. Reading writes
 * nothing: `updateSessionExpiration` is answered by `touchSession`, once a minute and not waited for.
 */
export const sessionAdapter = (db: Db): Adapter => ({
  async getSessionAndUser(token): Promise<[DatabaseSession | null, DatabaseUser | null]> {
    const now = Date.now();
    const [row] = await db.read
      .select()
      .from(sessions)
      .where(
        and(eq(sessions.id, hashSecret(token)), gt(sessions.idleUntil, now), gt(sessions.absoluteUntil, now)),
      );
    if (!row) return [null, null];
    const actor = await loadActor(db.read, { ...pick(row), via: "session" }, now);
    if (!actor) return [null, null];
    return [toSession(token, row), { id: row.userId, attributes: { actor } }];
  },

  async getUserSessions(userId) {
    const rows = await db.read.select().from(sessions).where(eq(sessions.userId, userId));
    return rows.map((row) => toSession(row.id, row));
  },

  async setSession({ id: token, userId, expiresAt, attributes }) {
    const now = Date.now();
    await db.write(async (tx) => {
      await tx.insert(sessions).values({
        id: hashSecret(token),
        publicId: attributes.publicId,
        userId,
        organisationId: attributes.organisationId,
        createdAt: now,
        lastSeenAt: now,
        idleUntil: Math.min(expiresAt.getTime(), attributes.absoluteUntil),
        absoluteUntil: attributes.absoluteUntil,
        userAgent: attributes.userAgent,
      });
    });
  },

  async updateSessionExpiration() {
    // Reading a session must not write; see touchSession.
  },

  async deleteSession(token) {
    await db.write((tx) => tx.delete(sessions).where(eq(sessions.id, hashSecret(token))));
  },

  async deleteUserSessions(userId) {
    await db.write((tx) => tx.delete(sessions).where(eq(sessions.userId, userId)));
  },

  async deleteExpiredSessions() {
    const now = Date.now();
    await db.write((tx) =>
      tx.delete(sessions).where(or(lte(sessions.idleUntil, now), lte(sessions.absoluteUntil, now))),
    );
  },
});

type SessionRow = typeof sessions.$inferSelect;

const pick = ({ userId, organisationId }: SessionRow): Pick<Actor, "userId" | "organisationId"> => ({
  userId,
  organisationId,
});

const toSession = (token: string, row: SessionRow): DatabaseSession => ({
  id: token,
  userId: row.userId,
  expiresAt: new Date(Math.min(row.idleUntil, row.absoluteUntil)),
  attributes: {
    publicId: row.publicId,
    organisationId: row.organisationId,
    lastSeenAt: row.lastSeenAt,
    absoluteUntil: row.absoluteUntil,
    userAgent: row.userAgent,
  },
});
