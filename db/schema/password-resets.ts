import { index, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { key, moment } from "./columns";
import { users } from "./users";

export const passwordResets = sqliteTable(
  "password_resets",
  {
    id: key(),
    userId: text("user_id")
      .notNull()
      .references(() => users.id),
    /** SHA-256 of the secret in the link, hex. */
    hash: text("hash").notNull(),
    expiresAt: moment("expires_at").notNull(),
    usedAt: moment("used_at"),
    createdAt: moment("created_at").notNull(),
  },
  (t) => [uniqueIndex("password_resets_hash").on(t.hash), index("password_resets_of_user").on(t.userId)],
);
