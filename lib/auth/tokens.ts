import "server-only";
import { and, eq, gt, isNull } from "drizzle-orm";
import type { Db } from "@/db/client";
import { memberships } from "@/db/schema/memberships";
import { tokens } from "@/db/schema/tokens";
import { logger } from "@/lib/logger";
import type { Actor } from "@/lib/schemas/access";
import { loadActor } from "./load-actor";
import { hashSecret } from "./secret";

const TOUCH_EVERY_MS = 60_000;

export type TokenActor = Readonly<{ actor: Actor; readOnly: boolean }>;

/** Who a bearer token acts for: its owner with the rights they have now; null when it ended, was revoked or is unknown. */
export const readToken = async (db: Db, secret: string, now: number): Promise<TokenActor | null> => {
  const [row] = await db.read
    .select({
      id: tokens.id,
      may: tokens.may,
      lastUsedAt: tokens.lastUsedAt,
      userId: memberships.userId,
      organisationId: memberships.organisationId,
    })
    .from(tokens)
    .innerJoin(memberships, eq(memberships.id, tokens.membershipId))
    .where(and(eq(tokens.hash, hashSecret(secret)), isNull(tokens.revokedAt), gt(tokens.expiresAt, now)));
  if (!row) return null;
  const { userId, organisationId } = row;
  const actor = await loadActor(db.read, { userId, organisationId, via: "token" }, now);
  if (actor === null) return null;
  if (now - (row.lastUsedAt ?? 0) >= TOUCH_EVERY_MS) {
    db.write((tx) => tx.update(tokens).set({ lastUsedAt: now }).where(eq(tokens.id, row.id))).catch(
      (error: unknown) => logger().warn({ err: String(error) }, "last use of a token could not be written"),
    );
  }
  return { actor, readOnly: row.may === "read" };
};
