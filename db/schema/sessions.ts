import { index, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { moment } from "./columns";
import { organisations } from "./organisations";
import { users } from "./users";

/** An open session. The token itself is in the cookie only; here stands its SHA-256. */
export const sessions = sqliteTable(
  "sessions",
  {
    /** SHA-256 of the token, hex. */
    id: text("id").primaryKey(),
    /** What the list of sessions shows and ends it by; says nothing about the token. */
    publicId: text("public_id").notNull(),
    userId: text("user_id")
      .notNull()
      .references(() => users.id),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    createdAt: moment("created_at").notNull(),
    lastSeenAt: moment("last_seen_at").notNull(),
    /** Moves with use. */
    idleUntil: moment("idle_until").notNull(),
    /** Never moves. */
    absoluteUntil: moment("absolute_until").notNull(),
    userAgent: text("user_agent").notNull().default(""),
  },
  (t) => [
    uniqueIndex("sessions_public").on(t.publicId),
    // Ending all sessions of a person.
    index("sessions_of_user").on(t.userId),
    // Sweeping what has run out.
    index("sessions_ended").on(t.absoluteUntil),
  ],
);
