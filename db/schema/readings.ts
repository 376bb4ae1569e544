import { sql } from "drizzle-orm";
import { sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { key, moment, version } from "./columns";
import { organisations } from "./organisations";
import { users } from "./users";

/** What was learned about a supplier's columns, by name. */
export const readings = sqliteTable(
  "readings",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    name: text("name").notNull(),
    /** JSON: the corrected layout and the table's conventions. */
    layout: text("layout").notNull(),
    /** Folded headings this reading fits, to find it again. */
    headingKey: text("heading_key").notNull().default(""),
    createdBy: text("created_by")
      .notNull()
      .references(() => users.id),
    version: version(),
    createdAt: moment("created_at").notNull(),
    updatedAt: moment("updated_at").notNull(),
  },
  (t) => [uniqueIndex("readings_name").on(t.organisationId, sql`lower(${t.name})`)],
);
