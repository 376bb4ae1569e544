import { sql } from "drizzle-orm";
import { check, integer, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { key, moment, version } from "./columns";

export const organisations = sqliteTable(
  "organisations",
  {
    id: key(),
    name: text("name").notNull(),
    address: text("address").notNull().default(""),
    notation: text("notation", { enum: ["S-Z-r", "Wel-Wpl-i"] })
      .notNull()
      .default("S-Z-r"),
    units: text("units", { enum: ["mm", "in"] })
      .notNull()
      .default("mm"),
    decimal: text("decimal", { enum: ["point", "comma"] })
      .notNull()
      .default("point"),
    fourEyes: integer("four_eyes", { mode: "boolean" }).notNull().default(true),
    version: version(),
    createdAt: moment("created_at").notNull(),
  },
  (t) => [
    check("organisation_name", sql`length(${t.name}) between 1 and 120`),
    check("organisation_notation", sql`${t.notation} in ('S-Z-r', 'Wel-Wpl-i')`),
    check("organisation_units", sql`${t.units} in ('mm', 'in')`),
    check("organisation_decimal", sql`${t.decimal} in ('point', 'comma')`),
  ],
);
