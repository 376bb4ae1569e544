import { sql } from "drizzle-orm";
import { check, index, integer, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { key, moment, version } from "./columns";
import { organisations } from "./organisations";
import { users } from "./users";

/** Private drawings of one person in one organisation; deleted ones stay a while for undo. */
export const drawings = sqliteTable(
  "drawings",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    ownerId: text("owner_id")
      .notNull()
      .references(() => users.id),
    name: text("name").notNull(),
    drawing: text("drawing").notNull(),
    /** The shape this drawing revises, with the revision it started from; null for a new section. */
    shapeId: text("shape_id"),
    shapeOrdinal: integer("shape_ordinal"),
    deletedAt: moment("deleted_at"),
    version: version(),
    createdAt: moment("created_at").notNull(),
    updatedAt: moment("updated_at").notNull(),
  },
  (t) => [
    // A person's drawings, newest first.
    index("drawings_of_owner").on(t.organisationId, t.ownerId, t.updatedAt),
    check("drawing_name", sql`length(${t.name}) between 1 and 120`),
  ],
);
