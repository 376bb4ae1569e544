import { sql } from "drizzle-orm";
import { check, integer, real, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { key, moment, version } from "./columns";
import { organisations } from "./organisations";

export const bays = sqliteTable(
  "bays",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    name: text("name").notNull(),
    /** Place in the strip, from 1. */
    ordinal: integer("ordinal").notNull(),
    /** Which figures count where a revision has both. */
    counts: text("counts", { enum: ["computed", "tabulated"] })
      .notNull()
      .default("computed"),
    /** Relative difference between tabulated and computed that a delivery lets pass. */
    tolerance: real("tolerance").notNull().default(0.01),
    version: version(),
    createdAt: moment("created_at").notNull(),
  },
  (t) => [
    uniqueIndex("bays_name").on(t.organisationId, sql`lower(${t.name})`),
    check("bay_name", sql`length(${t.name}) between 1 and 60`),
    check("bay_counts", sql`${t.counts} in ('computed', 'tabulated')`),
    check("bay_tolerance", sql`${t.tolerance} >= 0 and ${t.tolerance} <= 0.5`),
  ],
);
