import { sql } from "drizzle-orm";
import { check, index, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { key, moment } from "./columns";
import { memberships } from "./memberships";
import { organisations } from "./organisations";

/** API tokens: shown once, stored as a hash, with their owner's rights at the time of use. */
export const tokens = sqliteTable(
  "tokens",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    membershipId: text("membership_id")
      .notNull()
      .references(() => memberships.id),
    name: text("name").notNull(),
    /** SHA-256 of the token, hex. */
    hash: text("hash").notNull(),
    may: text("may", { enum: ["read", "change"] }).notNull(),
    expiresAt: moment("expires_at").notNull(),
    lastUsedAt: moment("last_used_at"),
    revokedAt: moment("revoked_at"),
    createdAt: moment("created_at").notNull(),
  },
  (t) => [
    // Every request of a program looks its token up.
    uniqueIndex("tokens_hash").on(t.hash),
    index("tokens_of_member").on(t.membershipId),
    check("token_may", sql`${t.may} in ('read', 'change')`),
  ],
);
