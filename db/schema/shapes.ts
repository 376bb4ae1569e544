import { sql } from "drizzle-orm";
import { check, index, integer, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { bays } from "./bays";
import { key, moment, version } from "./columns";
import { organisations } from "./organisations";
import { users } from "./users";

export const shapes = sqliteTable(
  "shapes",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    bayId: text("bay_id")
      .notNull()
      .references(() => bays.id),
    family: text("family").notNull(),
    designation: text("designation").notNull(),
    /** The designation folded for comparison: NFC, lower case. Unique in the organisation. */
    designationKey: text("designation_key").notNull(),
    title: text("title").notNull().default(""),
    /** Series of a supplier's table, else empty. */
    series: text("series").notNull().default(""),
    /** Ordinal of the revision that is released (or was, when withdrawn); null before the first release. */
    releasedOrdinal: integer("released_ordinal"),
    /** Ordinal of the revision in work (draft or submitted); null when nothing is. */
    workingOrdinal: integer("working_ordinal"),
    lastOrdinal: integer("last_ordinal").notNull().default(1),
    createdBy: text("created_by")
      .notNull()
      .references(() => users.id),
    version: version(),
    createdAt: moment("created_at").notNull(),
    updatedAt: moment("updated_at").notNull(),
  },
  (t) => [
    uniqueIndex("shapes_designation").on(t.organisationId, t.designationKey),
    // Counting and emptying a bay.
    index("shapes_of_bay").on(t.bayId),
    check("shape_designation", sql`length(${t.designation}) between 1 and 120`),
    check("shape_ordinals", sql`${t.lastOrdinal} >= 1`),
  ],
);
