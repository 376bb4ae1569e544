import { index, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { key, moment } from "./columns";
import { organisations } from "./organisations";

/** The log of deeds: append-only, by triggers of the migrations too. Written in the deed's transaction. */
export const log = sqliteTable(
  "log",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    at: moment("at").notNull(),
    /** Who: the user's id and, since people are renamed, the name of that day. */
    actorId: text("actor_id").notNull(),
    actorName: text("actor_name").notNull(),
    /** The verb, as in lib/permissions. */
    verb: text("verb").notNull(),
    entity: text("entity").notNull(),
    entityId: text("entity_id").notNull(),
    /** What people call it: a designation with its revision, a bay, a member. */
    subject: text("subject").notNull().default(""),
    /** JSON, or null. */
    before: text("before"),
    after: text("after"),
    requestId: text("request_id").notNull(),
  },
  (t) => [
    // The log newest first; ids are UUIDv7, so they sort by time.
    index("log_newest").on(t.organisationId, t.id),
    // The deeds of one shape, bay or member.
    index("log_of_entity").on(t.organisationId, t.entityId, t.id),
  ],
);
