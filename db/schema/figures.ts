import { sql } from "drizzle-orm";
import { check, primaryKey, real, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { organisations } from "./organisations";
import { revisions } from "./revisions";

/**
 * Scalar properties, one column each, in the units of lib/units/property-units. The TypeScript names are the property
 * keys; in the database a dot becomes an underscore. A test holds them equal to UNIT_OF.
 */
export const propertyColumns = () => ({
  area: real("area"),
  "perimeter.outer": real("perimeter_outer"),
  "perimeter.inner": real("perimeter_inner"),
  mass: real("mass"),
  surface: real("surface"),
  "centroid.x": real("centroid_x"),
  "centroid.y": real("centroid_y"),
  "extents.xMin": real("extents_xMin"),
  "extents.xMax": real("extents_xMax"),
  "extents.yMin": real("extents_yMin"),
  "extents.yMax": real("extents_yMax"),
  Ix: real("Ix"),
  Iy: real("Iy"),
  Ixy: real("Ixy"),
  I1: real("I1"),
  I2: real("I2"),
  angle: real("angle"),
  SxTop: real("SxTop"),
  SxBottom: real("SxBottom"),
  SyLeft: real("SyLeft"),
  SyRight: real("SyRight"),
  Sx: real("Sx"),
  Sy: real("Sy"),
  S1: real("S1"),
  S2: real("S2"),
  Zx: real("Zx"),
  Zy: real("Zy"),
  Z1: real("Z1"),
  Z2: real("Z2"),
  "pna.x": real("pna_x"),
  "pna.y": real("pna_y"),
  "Mp.x": real("Mp_x"),
  "Mp.y": real("Mp_y"),
  squash: real("squash"),
  rx: real("rx"),
  ry: real("ry"),
  r1: real("r1"),
  r2: real("r2"),
  J: real("J"),
  Cw: real("Cw"),
  "shearCentre.x": real("shearCentre_x"),
  "shearCentre.y": real("shearCentre_y"),
  Avx: real("Avx"),
  Avy: real("Avy"),
  betaX: real("betaX"),
  betaY: real("betaY"),
  r0: real("r0"),
});

/** What a revision's properties are: computed by the engine, or as a table printed them. */
export const figures = sqliteTable(
  "figures",
  {
    revisionId: text("revision_id")
      .notNull()
      .references(() => revisions.id, { onDelete: "cascade" }),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    source: text("source", { enum: ["computed", "tabulated"] }).notNull(),
    /** Version of the engine that computed them; empty for tabulated ones. */
    engineVersion: text("engine_version").notNull().default(""),
    ...propertyColumns(),
    /** JSON of what is no scalar: unsymmetrical, plain, estimates, stressFactors, equalForceAxis, absent, warnings. */
    rest: text("rest").notNull().default("{}"),
  },
  (t) => [
    primaryKey({ columns: [t.revisionId, t.source] }),
    check("figures_source", sql`${t.source} in ('computed', 'tabulated')`),
    // 9e999 is how SQL writes Infinity; NaN is stored as null by SQLite.
    check("figures_area", sql`${t.area} is null or (${t.area} > 0 and ${t.area} < 9e999)`),
    check("figures_mass", sql`${t.mass} is null or (${t.mass} > 0 and ${t.mass} < 9e999)`),
    check("figures_Ix", sql`${t.Ix} is null or (${t.Ix} > 0 and ${t.Ix} < 9e999)`),
    check("figures_Iy", sql`${t.Iy} is null or (${t.Iy} > 0 and ${t.Iy} < 9e999)`),
    check(
      "figures_complete",
      sql`${t.source} = 'tabulated' or (${t.area} is not null and ${t.Ix} is not null)`,
    ),
  ],
);
