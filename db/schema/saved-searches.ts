import { sql } from "drizzle-orm";
import { sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { key, moment, version } from "./columns";
import { organisations } from "./organisations";
import { users } from "./users";

export const savedSearches = sqliteTable(
  "saved_searches",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    ownerId: text("owner_id")
      .notNull()
      .references(() => users.id),
    name: text("name").notNull(),
    /** The query string of the Rack. */
    query: text("query").notNull(),
    version: version(),
    createdAt: moment("created_at").notNull(),
  },
  (t) => [uniqueIndex("saved_searches_name").on(t.organisationId, t.ownerId, sql`lower(${t.name})`)],
);
