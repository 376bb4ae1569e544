import { sql } from "drizzle-orm";
import { check, index, integer, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { key, moment, version } from "./columns";
import { organisations } from "./organisations";
import { shapes } from "./shapes";
import { users } from "./users";

/** One state of a shape. From submitted on, geometry and figures never change; a trigger of the migrations holds that too. */
export const revisions = sqliteTable(
  "revisions",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    shapeId: text("shape_id")
      .notNull()
      .references(() => shapes.id),
    /** From 1; shown as A, B, C … */
    ordinal: integer("ordinal").notNull(),
    state: text("state", { enum: ["draft", "submitted", "released", "superseded", "withdrawn"] }).notNull(),
    /** The drawing document as JSON. */
    drawing: text("drawing").notNull(),
    /** SHA-256 of the drawing, hex: what a printed sheet names. */
    contentHash: text("content_hash").notNull(),
    note: text("note").notNull().default(""),
    authorId: text("author_id")
      .notNull()
      .references(() => users.id),
    /** Ids of everybody who saved this revision, as a JSON array. */
    editors: text("editors").notNull(),
    submittedAt: moment("submitted_at"),
    submittedBy: text("submitted_by").references(() => users.id),
    checkedAt: moment("checked_at"),
    checkedBy: text("checked_by").references(() => users.id),
    checkedHow: text("checked_how", {
      enum: ["independent calculation", "hand check", "review", "computation"],
    }),
    checkNote: text("check_note").notNull().default(""),
    sentBackAt: moment("sent_back_at"),
    sentBackBy: text("sent_back_by").references(() => users.id),
    sentBackReason: text("sent_back_reason").notNull().default(""),
    releasedAt: moment("released_at"),
    releasedBy: text("released_by").references(() => users.id),
    supersededAt: moment("superseded_at"),
    withdrawnAt: moment("withdrawn_at"),
    withdrawnBy: text("withdrawn_by").references(() => users.id),
    withdrawnReason: text("withdrawn_reason").notNull().default(""),
    replacementShapeId: text("replacement_shape_id").references(() => shapes.id),
    /** The delivery that brought it, else null; no foreign key, since a delivery's rows may be swept. */
    deliveryId: text("delivery_id"),
    version: version(),
    createdAt: moment("created_at").notNull(),
    updatedAt: moment("updated_at").notNull(),
  },
  (t) => [
    uniqueIndex("revisions_ordinal").on(t.shapeId, t.ordinal),
    // The checker's list: submitted ones of the organisation, oldest first.
    index("revisions_submitted")
      .on(t.organisationId, t.submittedAt)
      .where(sql`state = 'submitted'`),
    // Returning a delivery whole.
    index("revisions_of_delivery")
      .on(t.deliveryId)
      .where(sql`delivery_id is not null`),
    check("revision_ordinal", sql`${t.ordinal} >= 1`),
    check("revision_state", sql`${t.state} in ('draft', 'submitted', 'released', 'superseded', 'withdrawn')`),
    check("revision_released", sql`${t.state} in ('draft', 'submitted') or ${t.releasedAt} is not null`),
  ],
);
