import { sql } from "drizzle-orm";
import { blob, check, index, integer, primaryKey, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { bays } from "./bays";
import { key, moment, version } from "./columns";
import { organisations } from "./organisations";
import { users } from "./users";

/** One import of a supplier's table. */
export const deliveries = sqliteTable(
  "deliveries",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    bayId: text("bay_id")
      .notNull()
      .references(() => bays.id),
    /** Number shown to people ("D-0147"), counted in the organisation. */
    number: integer("number").notNull(),
    fileName: text("file_name").notNull(),
    sizeBytes: integer("size_bytes").notNull().default(0),
    /** SHA-256 of the file, hex: the same file twice is noticed. */
    contentHash: text("content_hash"),
    state: text("state", {
      enum: [
        "announced",
        "received",
        "reading",
        "read",
        "putting-away",
        "put-away",
        "returned",
        "stopped",
        "failed",
      ],
    }).notNull(),
    readingId: text("reading_id"),
    /** JSON of what was recognised and corrected: encoding, delimiter, decimal sign, headings, units, columns. */
    layout: text("layout").notNull().default("{}"),
    /** JSON of counts by verdict and cause. */
    counts: text("counts").notNull().default("{}"),
    failure: text("failure").notNull().default(""),
    createdBy: text("created_by")
      .notNull()
      .references(() => users.id),
    putAwayBy: text("put_away_by").references(() => users.id),
    putAwayAt: moment("put_away_at"),
    returnedBy: text("returned_by").references(() => users.id),
    returnedAt: moment("returned_at"),
    returnReason: text("return_reason").notNull().default(""),
    version: version(),
    createdAt: moment("created_at").notNull(),
    updatedAt: moment("updated_at").notNull(),
  },
  (t) => [
    // The list of deliveries, newest first, and the number that is unique in the organisation.
    index("deliveries_newest").on(t.organisationId, t.createdAt),
    index("deliveries_number").on(t.organisationId, t.number),
    index("deliveries_content").on(t.organisationId, t.contentHash),
    check("delivery_size", sql`${t.sizeBytes} between 0 and 26214400`),
  ],
);

/** The raw file in pieces, so that no value of the database is large. */
export const deliveryFiles = sqliteTable(
  "delivery_files",
  {
    deliveryId: text("delivery_id")
      .notNull()
      .references(() => deliveries.id, { onDelete: "cascade" }),
    ordinal: integer("ordinal").notNull(),
    bytes: blob("bytes", { mode: "buffer" }).notNull(),
  },
  (t) => [primaryKey({ columns: [t.deliveryId, t.ordinal] })],
);

export const deliveryRows = sqliteTable(
  "delivery_rows",
  {
    deliveryId: text("delivery_id")
      .notNull()
      .references(() => deliveries.id, { onDelete: "cascade" }),
    /** Row of the table, from 1; `line` is where it begins in the file. */
    ordinal: integer("ordinal").notNull(),
    line: integer("line").notNull(),
    verdict: text("verdict", { enum: ["accepted", "queried", "refused"] }).notNull(),
    cause: text("cause").notNull().default(""),
    designation: text("designation").notNull().default(""),
    /** New, unchanged or changed against the Rack; empty when refused. */
    against: text("against", { enum: ["", "new", "unchanged", "changed"] })
      .notNull()
      .default(""),
    /** JSON array of the row's cells as text. */
    cells: text("cells").notNull(),
    /** JSON of what was understood: family, dimensions, tabulated and computed values, gaps, findings. */
    plan: text("plan").notNull().default("{}"),
    /** JSON array of mended cells: column, before, after, by, at. */
    mends: text("mends").notNull().default("[]"),
    decision: text("decision", { enum: ["tabulated", "computed", "leave-out"] }),
    decisionReason: text("decision_reason").notNull().default(""),
    decidedBy: text("decided_by").references(() => users.id),
    decidedAt: moment("decided_at"),
    shapeId: text("shape_id"),
    revisionOrdinal: integer("revision_ordinal"),
    version: version(),
  },
  (t) => [
    primaryKey({ columns: [t.deliveryId, t.ordinal] }),
    // Inspection filtered by verdict and cause, in the file's order.
    index("delivery_rows_verdict").on(t.deliveryId, t.verdict, t.cause, t.ordinal),
    // Counts by verdict, cause and decision without touching the wide rows.
    index("delivery_rows_counts").on(t.deliveryId, t.verdict, t.cause, t.decision, t.against),
    check("delivery_row_verdict", sql`${t.verdict} in ('accepted', 'queried', 'refused')`),
  ],
);
