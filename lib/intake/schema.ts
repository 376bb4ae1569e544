import { z } from "zod";
import { FAMILY_DIMENSIONS, type Family } from "@/lib/profiles/families";
import { CONVENTION_CODES } from "@/lib/intake/conventions";
import { ENCODINGS } from "@/lib/intake/decode-bytes";
import { FIELD_KEYS } from "@/lib/intake/fields";
import { FILE_UNIT_KEYS } from "@/lib/intake/file-units";
import { MAX_CELL_CHARACTERS, MAX_COLUMNS } from "@/lib/intake/limits";
import { DELIMITERS } from "@/lib/intake/delimiters";

// Safe cast: Object.keys of a literal object gives exactly its keys.
export const FAMILIES = Object.keys(FAMILY_DIMENSIONS) as readonly Family[];

export const ColumnReading = z.strictObject({
  heading: z.string().max(MAX_CELL_CHARACTERS),
  field: z.enum(FIELD_KEYS),
  unit: z.enum(FILE_UNIT_KEYS).nullable(),
});
export type ColumnReading = z.infer<typeof ColumnReading>;

export const Marks = z
  .strictObject({
    decimal: z.enum([",", "."]),
    thousands: z.enum([",", ".", "'", " "]).nullable(),
  })
  .refine((m) => m.decimal !== m.thousands, "The decimal mark and the thousands mark must differ.");

export const STOCK_MATERIALS = ["steel", "timber"] as const;

/** How a supplier's file is read: everything that was recognised or corrected, and the conventions of the table. */
export const Reading = z.strictObject({
  encoding: z.enum(ENCODINGS),
  delimiter: z.enum(DELIMITERS),
  marks: Marks.nullable(),
  /** Line of the headings, counted from 1; the line of units under them, where there is one. */
  headingLine: z.number().int().min(1).max(1000),
  unitLine: z.number().int().min(2).max(1001).nullable(),
  columns: z.array(ColumnReading).min(1).max(MAX_COLUMNS),
  /** Share of the computed value that a tabulated one may be off, beyond the table's rounding. */
  tolerance: z.number().min(0).max(0.1),
  conventions: z.array(z.enum(CONVENTION_CODES)).max(CONVENTION_CODES.length),
  /** Family of rows whose series and designation do not tell it. */
  family: z.enum(FAMILIES).nullable(),
  material: z.enum(STOCK_MATERIALS),
});
export type Reading = z.infer<typeof Reading>;

export const DEFAULT_TOLERANCE = 0.01;
