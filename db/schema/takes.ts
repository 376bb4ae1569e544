import { sql } from "drizzle-orm";
import { check, index, integer, real, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { key, moment } from "./columns";
import { organisations } from "./organisations";
import { shapes } from "./shapes";
import { users } from "./users";

/** A job took a revision. */
export const takes = sqliteTable(
  "takes",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    shapeId: text("shape_id")
      .notNull()
      .references(() => shapes.id),
    ordinal: integer("ordinal").notNull(),
    jobNumber: text("job_number").notNull(),
    jobName: text("job_name").notNull().default(""),
    pieceMark: text("piece_mark").notNull().default(""),
    quantity: integer("quantity").notNull(),
    lengthMm: real("length_mm"),
    takenBy: text("taken_by")
      .notNull()
      .references(() => users.id),
    createdAt: moment("created_at").notNull(),
  },
  (t) => [
    index("takes_of_shape").on(t.shapeId, t.id),
    // Shapes of one job.
    index("takes_of_job").on(t.organisationId, t.jobNumber, t.shapeId),
    check("take_quantity", sql`${t.quantity} between 1 and 100000`),
    check("take_length", sql`${t.lengthMm} is null or (${t.lengthMm} > 0 and ${t.lengthMm} <= 1000000)`),
  ],
);
