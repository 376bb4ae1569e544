import { index, integer, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { moment } from "./columns";

/** Counters of the limits (sign-in, invitations, tokens, deliveries), shared by all instances. */
export const attempts = sqliteTable(
  "attempts",
  {
    key: text("key").primaryKey(),
    points: integer("points").notNull(),
    expiresAt: moment("expires_at"),
  },
  (t) => [index("attempts_expired").on(t.expiresAt)],
);
