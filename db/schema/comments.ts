import { sql } from "drizzle-orm";
import { check, index, integer, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { key, moment } from "./columns";
import { organisations } from "./organisations";
import { shapes } from "./shapes";
import { users } from "./users";

export const comments = sqliteTable(
  "comments",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    shapeId: text("shape_id")
      .notNull()
      .references(() => shapes.id),
    ordinal: integer("ordinal").notNull(),
    body: text("body").notNull(),
    authorId: text("author_id")
      .notNull()
      .references(() => users.id),
    createdAt: moment("created_at").notNull(),
    deletedAt: moment("deleted_at"),
  },
  (t) => [
    index("comments_of_shape").on(t.shapeId, t.id),
    check("comment_body", sql`length(${t.body}) between 1 and 4000`),
  ],
);
