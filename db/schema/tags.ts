import { sql } from "drizzle-orm";
import { check, index, primaryKey, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { organisations } from "./organisations";
import { shapes } from "./shapes";

export const tags = sqliteTable(
  "tags",
  {
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    shapeId: text("shape_id")
      .notNull()
      .references(() => shapes.id, { onDelete: "cascade" }),
    /** As it was typed; compared in lower case. */
    tag: text("tag").notNull(),
    tagKey: text("tag_key").notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.shapeId, t.tagKey] }),
    // Shapes with a tag, and the tags of an organisation.
    index("tags_of_organisation").on(t.organisationId, t.tagKey, t.shapeId),
    check("tag_length", sql`length(${t.tag}) between 1 and 40`),
  ],
);
