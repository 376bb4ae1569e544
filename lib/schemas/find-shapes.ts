import { z } from "zod";
import { DrawingV1 } from "@/lib/drawing/schema";
import { Id, limitText, numericText } from "./common";
import { FiguresSource } from "./bay";
import { RevisionState, SHAPE_FAMILIES, ShapeFamily } from "./shape";

/** Columns a search may be ordered by; a leading minus turns the order round. */
export const SORT_COLUMNS = [
  "mass",
  "depth",
  "width",
  "area",
  "Ix",
  "Iy",
  "I2",
  "Sx",
  "Sy",
  "Zx",
  "Zy",
  "rx",
  "ry",
  "r2",
  "J",
  "Cw",
  "jobs",
  "designation",
  "family",
  "SxPerMass",
] as const;
export type SortColumn = (typeof SORT_COLUMNS)[number];
const sortText = z
  .string()
  .regex(/^-?[A-Za-z0-9]+$/)
  .refine(
    (text) => (SORT_COLUMNS as readonly string[]).includes(text.replace(/^-/, "")),
    "no such column to sort by",
  );

/** Ranges of a search: name of the parameter, column, and which end it is. */
export const RANGES = {
  minSx: ["Sx", "min"],
  minSy: ["Sy", "min"],
  minIx: ["Ix", "min"],
  minIy: ["Iy", "min"],
  minI2: ["I2", "min"],
  minZx: ["Zx", "min"],
  minZy: ["Zy", "min"],
  minArea: ["area", "min"],
  minRx: ["rx", "min"],
  minRy: ["ry", "min"],
  minR2: ["r2", "min"],
  minJ: ["J", "min"],
  minCw: ["Cw", "min"],
  minDepth: ["depth", "min"],
  maxDepth: ["depth", "max"],
  minWidth: ["width", "min"],
  maxWidth: ["width", "max"],
  minMass: ["mass", "min"],
  maxMass: ["mass", "max"],
  maxArea: ["area", "max"],
  maxSx: ["Sx", "max"],
  maxIx: ["Ix", "max"],
} as const;
export type RangeName = keyof typeof RANGES;

const rangeText = numericText.pipe(z.number().min(0).max(1e30)).optional();

/** One optional number for each range. Safe: the keys are those of RANGES and every value is the same schema. */
const range = Object.fromEntries(Object.keys(RANGES).map((name) => [name, rangeText])) as unknown as Record<
  RangeName,
  typeof rangeText
>;

/** A list in one parameter: "i-section,channel". */
const listOf = <T extends z.ZodType<string, string>>(item: T, max: number) =>
  z
    .string()
    .min(1)
    .max(2000)
    .transform((text) => text.split(",").map((part) => part.trim()))
    .pipe(z.array(item).min(1).max(max));

/**
 * Query of `GET /shapes`. Numbers are in `unit`: mm, mm², mm³, mm⁴, mm⁶ and kg/m, or in, in² … and lb/ft.
 * `state` without a value is released only; drafts and submitted ones answer only where the right allows.
 */
export const FindShapesQuery = z.strictObject({
  ...range,
  family: listOf(z.enum(SHAPE_FAMILIES), SHAPE_FAMILIES.length).optional(),
  bay: listOf(Id, 100).optional(),
  state: listOf(z.enum(["draft", "submitted", "released", "withdrawn"]), 4).optional(),
  /** Text in designation or title; spacing, case and × forgiven. */
  q: z.string().max(120).optional(),
  /** Only shapes taken by this job. */
  job: z.string().min(1).max(60).optional(),
  tag: z.string().min(1).max(40).optional(),
  sort: sortText.optional(),
  cursor: z.string().min(1).max(500).optional(),
  limit: limitText.optional(),
  unit: z.enum(["mm", "in"]).optional(),
  /** `counts` adds the counts by bay and family, `drawing` the drawing of each row. */
  include: listOf(z.enum(["counts", "drawing"]), 2).optional(),
});
export type FindShapesQuery = z.infer<typeof FindShapesQuery>;

/** A row of the Rack, always in mm, mm² … and kg/m. */
export const FinderRow = z.strictObject({
  /** Id of the shape. */
  id: Id,
  revisionId: Id,
  ordinal: z.number().int(),
  letter: z.string(),
  state: RevisionState,
  bayId: Id,
  family: ShapeFamily,
  designation: z.string(),
  title: z.string(),
  source: FiguresSource,
  mass: z.number(),
  depth: z.number(),
  width: z.number(),
  area: z.number(),
  Ix: z.number(),
  Iy: z.number(),
  I2: z.number().nullable(),
  Sx: z.number(),
  Sy: z.number(),
  Zx: z.number().nullable(),
  Zy: z.number().nullable(),
  rx: z.number(),
  ry: z.number(),
  r2: z.number().nullable(),
  J: z.number().nullable(),
  Cw: z.number().nullable(),
  /** x–y are not principal: factors ≥ 1 of true extreme stress over M/S, and the S that holds for free bending. */
  unsymmetrical: z
    .strictObject({ factorX: z.number(), factorY: z.number(), SxFree: z.number(), SyFree: z.number() })
    .nullable(),
  jobs: z.number().int(),
  drawing: DrawingV1.optional(),
});
export type FinderRow = z.infer<typeof FinderRow>;

export const FinderCounts = z.strictObject({
  /** Hits of this search. */
  total: z.number().int(),
  byBay: z.record(z.string(), z.number().int()),
  byFamily: z.record(z.string(), z.number().int()),
  /** Shapes of the organisation in these states, without the ranges. */
  of: z.number().int(),
  ofByBay: z.record(z.string(), z.number().int()),
});
export type FinderCounts = z.infer<typeof FinderCounts>;

export const FinderPage = z.strictObject({
  items: z.array(FinderRow),
  next: z.string().nullable(),
  counts: FinderCounts.optional(),
});
export type FinderPage = z.infer<typeof FinderPage>;
