import { readFileSync } from "node:fs";
import { z } from "zod";

const Row = z.object({
  id: z.string(),
  shape: z.string(),
  designation: z.string(),
  dims: z.record(z.string(), z.union([z.number(), z.string()])),
  dimUnit: z.string(),
  property: z.string(),
  value: z.number(),
  unit: z.string(),
  tol: z.number().positive(),
  tolFormula: z.number().positive().nullish(),
  feRef: z.number().nullish(),
  source: z.string().min(1),
  provenance: z.string().min(1),
  note: z.string().optional(),
});

/** One published or closed-form value, with its source and how far it was corroborated. */
export type CheckRow = z.infer<typeof Row>;

/** Every row of the check values. */
export const CHECK_ROWS: readonly CheckRow[] = z
  .array(Row)
  .parse(
    JSON.parse(readFileSync(new URL("../../fixtures/reference/check-values.json", import.meta.url), "utf8")),
  );

/** What one of the file's unit words is worth in mm, kg/m or 1. 1 in = 25.4 mm and 1 lb = 0.45359237 kg exactly (NIST SP 811). */
const IN = 25.4;
export const UNIT_VALUE: Readonly<Record<string, number>> = {
  "1": 1,
  mm: 1,
  mm2: 1,
  mm3: 1,
  mm4: 1,
  cm: 10,
  cm2: 100,
  cm3: 1000,
  cm4: 10_000,
  cm6: 1e6,
  "10^3 cm6": 1e9,
  mm6: 1,
  in: IN,
  in2: IN ** 2,
  in3: IN ** 3,
  in4: IN ** 4,
  in6: IN ** 6,
  "kg/m": 1,
};

/** A dimension of the row in mm. */
export const dimension = (row: CheckRow, key: string): number => {
  const value = row.dims[key];
  if (typeof value !== "number") throw new Error(`${row.id} has no dimension ${key}`);
  return row.dimUnit === "in" ? value * IN : value;
};
