import type { Point, Region } from "@/lib/geometry/region";

/** A material with its yield strength resolved for one part. E, G, fy in MPa; density in kg/m³. */
export type Material = Readonly<{
  id: string;
  name: string;
  E: number;
  G: number;
  fy: number;
  density: number;
}>;

export type Counts = "stiffness and mass" | "mass";

/**
 * One part after arrangement: what it alone occupies (cut-outs removed, overlaps counted once).
 * `thickness` in mm where the part is a plate or has one governing thickness, else null.
 */
export type SectionPart = Readonly<{
  id: string;
  name: string;
  material: Material;
  counts: Counts;
  regions: readonly Region[];
  thickness: number | null;
}>;

/** A stretch of boundary that two parts share. `bulge` as in `Vertex`, for contact along an arc. */
export type ContactLine = Readonly<{ from: Point; to: Point; bulge?: number }>;
export type Contact = Readonly<{ parts: readonly [string, string]; lines: readonly ContactLine[] }>;

export type SectionWarning = Readonly<{ code: string; detail: string; parts: readonly string[] }>;

/**
 * A cross-section ready for computation: disjoint parts in drawing axes (mm).
 * `outline` is the union of all parts (for perimeter and painted surface); `bodies` groups ids of parts connected along
 * edges (one entry when all hang together); `contacts` are the lines along which parts touch.
 */
export type Section = Readonly<{
  reference: Material;
  parts: readonly SectionPart[];
  outline: readonly Region[];
  contacts: readonly Contact[];
  bodies: readonly (readonly string[])[];
  warnings: readonly SectionWarning[];
}>;
