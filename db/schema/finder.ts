import { sql } from "drizzle-orm";
import { check, index, integer, real, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { bays } from "./bays";
import { organisations } from "./organisations";
import { revisions } from "./revisions";
import { shapes } from "./shapes";

/** One row for each shape and lane, with the values that count there: what a search reads. Kept in the transaction that changes a revision. */
export const finder = sqliteTable(
  "finder",
  {
    /** The id of the revision shown; ends every keyset. */
    id: text("id")
      .primaryKey()
      .references(() => revisions.id, { onDelete: "cascade" }),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    bayId: text("bay_id")
      .notNull()
      .references(() => bays.id),
    shapeId: text("shape_id")
      .notNull()
      .references(() => shapes.id),
    lane: text("lane", { enum: ["released", "working"] }).notNull(),
    state: text("state", { enum: ["draft", "submitted", "released", "withdrawn"] }).notNull(),
    ordinal: integer("ordinal").notNull(),
    family: text("family").notNull(),
    designation: text("designation").notNull(),
    title: text("title").notNull().default(""),
    /** Designation and title folded for the text search: lower case, × as x, no spaces. */
    folded: text("folded").notNull(),
    /** Which figures stand here. */
    source: text("source", { enum: ["computed", "tabulated"] }).notNull(),
    mass: real("mass").notNull(),
    depth: real("depth").notNull(),
    width: real("width").notNull(),
    area: real("area").notNull(),
    Ix: real("Ix").notNull(),
    Iy: real("Iy").notNull(),
    I1: real("I1"),
    I2: real("I2"),
    Sx: real("Sx").notNull(),
    Sy: real("Sy").notNull(),
    S1: real("S1"),
    S2: real("S2"),
    Zx: real("Zx"),
    Zy: real("Zy"),
    rx: real("rx").notNull(),
    ry: real("ry").notNull(),
    r1: real("r1"),
    r2: real("r2"),
    J: real("J"),
    Cw: real("Cw"),
    /** 1 where x–y are not principal; then factorX, factorY ≥ 1 are true extreme stress over M/S. */
    unsymmetrical: integer("unsymmetrical", { mode: "boolean" }).notNull().default(false),
    factorX: real("factorX"),
    factorY: real("factorY"),
    SxFree: real("SxFree"),
    SyFree: real("SyFree"),
    /** How many jobs took the shape. */
    jobs: integer("jobs").notNull().default(0),
  },
  (t) => [
    uniqueIndex("finder_lane").on(t.shapeId, t.lane),
    // The search by minimum S and I, lightest first, walks this index and reads no row it does not show.
    index("finder_walk").on(t.organisationId, t.state, t.mass, t.id, t.Sx, t.Ix, t.depth, t.family),
    // Counts by family (family IN …) and, with the bay in it, by bay, without touching a row.
    index("finder_facets").on(t.organisationId, t.state, t.family, t.Sx, t.Ix, t.depth, t.mass, t.bayId),
    // Text search is a scan of this one: a trigram index would cost five times its worth on import.
    index("finder_text").on(t.organisationId, t.folded),
    check("finder_lane_kind", sql`${t.lane} in ('released', 'working')`),
    check("finder_state", sql`${t.state} in ('draft', 'submitted', 'released', 'withdrawn')`),
    check("finder_mass", sql`${t.mass} > 0 and ${t.mass} < 9e999`),
    check(
      "finder_values",
      sql`${t.area} > 0 and ${t.Ix} > 0 and ${t.Iy} > 0 and ${t.Sx} > 0 and ${t.Sy} > 0`,
    ),
  ],
);
