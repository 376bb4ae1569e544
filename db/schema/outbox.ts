import { sql } from "drizzle-orm";
import { check, index, integer, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { key, moment } from "./columns";
import { organisations } from "./organisations";

/** Letters to be sent; no request waits for a mail server. A letter's text is emptied once it has left, since it may hold a secret link. */
export const outbox = sqliteTable(
  "outbox",
  {
    id: key(),
    /** Null for letters that belong to a person rather than to a firm (password resets). */
    organisationId: text("organisation_id").references(() => organisations.id),
    to: text("to").notNull(),
    subject: text("subject").notNull(),
    text: text("text").notNull(),
    state: text("state", { enum: ["waiting", "sent", "failed"] })
      .notNull()
      .default("waiting"),
    attempts: integer("attempts").notNull().default(0),
    nextAt: moment("next_at").notNull(),
    sentAt: moment("sent_at"),
    failure: text("failure").notNull().default(""),
    createdAt: moment("created_at").notNull(),
  },
  (t) => [
    // What is to be sent next.
    index("outbox_next").on(t.state, t.nextAt),
    index("outbox_of_organisation").on(t.organisationId, t.createdAt),
    check("outbox_state", sql`${t.state} in ('waiting', 'sent', 'failed')`),
  ],
);
