import { index, integer, primaryKey, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { organisations } from "./organisations";
import { shapes } from "./shapes";

/** Which revisions of shapes a drawing or a revision is built from: whom to tell when one is superseded. */
export const drawingUses = sqliteTable(
  "drawing_uses",
  {
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    shapeId: text("shape_id")
      .notNull()
      .references(() => shapes.id),
    ordinal: integer("ordinal").notNull(),
    /** Kind and id of what uses it: a private drawing or a revision. */
    userKind: text("user_kind", { enum: ["drawing", "revision"] }).notNull(),
    userOf: text("user_of").notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.userOf, t.shapeId, t.ordinal] }),
    // Who is built on this shape.
    index("drawing_uses_of_shape").on(t.organisationId, t.shapeId),
  ],
);
