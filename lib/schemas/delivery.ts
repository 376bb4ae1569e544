import { z } from "zod";
import { ColumnReading, Reading } from "@/lib/intake/schema";
import { DECISIONS } from "@/lib/intake/delivery-plan";
import { ENCODINGS } from "@/lib/intake/decode-bytes";
import { COMPARED_KEYS, FIELD_KEYS, FIGURE_KEYS, UNCOMPARED_KEYS } from "@/lib/intake/fields";
import { FILE_UNIT_KEYS } from "@/lib/intake/file-units";
import { MAX_CELL_CHARACTERS, MAX_COLUMNS } from "@/lib/intake/limits";
import { CAUSE_CODES, VERDICTS } from "@/lib/intake/row-reason";
import { DrawingV1 } from "@/lib/drawing/schema";
import { Id, limitText, Moment, pageOf, Person, plainText, Version } from "./common";
import { Properties } from "./properties";

export const DELIVERY_STATES = [
  "announced",
  "received",
  "reading",
  "read",
  "putting-away",
  "put-away",
  "returned",
  "stopped",
  "failed",
] as const;
export const DeliveryState = z.enum(DELIVERY_STATES);
export type DeliveryState = z.infer<typeof DeliveryState>;

export const CreateDeliveryInput = z.strictObject({
  bayId: Id,
  fileName: plainText(200, 1),
});
export type CreateDeliveryInput = z.infer<typeof CreateDeliveryInput>;

/** Why the whole file was given back, with its place. */
export const FileFault = z.strictObject({
  code: z.string(),
  detail: z.string(),
  line: z.number().int().optional(),
  column: z.number().int().optional(),
  byte: z.number().int().optional(),
  samples: z.array(z.string()).readonly().optional(),
});

const cause = z.enum(CAUSE_CODES);
const field = z.enum(FIELD_KEYS);
const key = z.enum(COMPARED_KEYS);
const unit = z.enum(FILE_UNIT_KEYS);

export const RecognisedColumn = z.strictObject({
  ...ColumnReading.shape,
  samples: z.array(z.string()).readonly(),
  evidence: z.string(),
  question: z.string().nullable(),
  /** Largest |off| of the column against what was computed, and how many rows were compared; null when none was. */
  worst: z.number().nullable(),
  compared: z.number().int(),
  /** A unit with which the column as a whole would agree, where its own does not. */
  suggestion: unit.nullable(),
});
export type RecognisedColumn = z.infer<typeof RecognisedColumn>;

export const Recognised = z.strictObject({
  reading: Reading,
  columns: z.array(RecognisedColumn).readonly(),
  evidence: z.strictObject({
    encoding: z.string(),
    delimiter: z.string(),
    marks: z.string(),
    headings: z.string(),
    axes: z.string().nullable(),
    reading: z.string().nullable(),
  }),
  questions: z.array(z.string()).readonly(),
  corrected: z.boolean(),
});
export type Recognised = z.infer<typeof Recognised>;

export const DeliveryCounts = z.strictObject({
  rows: z.number().int(),
  accepted: z.number().int(),
  queried: z.number().int(),
  refused: z.number().int(),
  /** Queried or refused and not decided. */
  undecided: z.number().int(),
  leftOut: z.number().int(),
  new: z.number().int(),
  changed: z.number().int(),
  unchanged: z.number().int(),
  byCause: z.record(z.string(), z.number().int()),
  /** Undecided rows by "verdict cause": how many are like a row. */
  openLike: z.record(z.string(), z.number().int()),
});
export type DeliveryCounts = z.infer<typeof DeliveryCounts>;

export const DeliverySummary = z.strictObject({
  id: Id,
  number: z.number().int(),
  /** "D-0147". */
  code: z.string(),
  fileName: z.string(),
  sizeBytes: z.number().int(),
  state: DeliveryState,
  bay: z.strictObject({ id: Id, name: z.string() }),
  counts: DeliveryCounts.nullable(),
  /** 0 to 1 while a job is at it. */
  progress: z.number().nullable(),
  createdBy: Person,
  createdAt: Moment,
  updatedAt: Moment,
  putAwayBy: Person.nullable(),
  putAwayAt: Moment.nullable(),
  returnedBy: Person.nullable(),
  returnedAt: Moment.nullable(),
  returnReason: z.string(),
  version: Version,
});
export type DeliverySummary = z.infer<typeof DeliverySummary>;

export const Delivery = z.strictObject({
  ...DeliverySummary.shape,
  recognised: Recognised.nullable(),
  fault: FileFault.nullable(),
  /** Earlier deliveries of the very same bytes. */
  sameFile: z.array(z.strictObject({ id: Id, code: z.string(), state: DeliveryState })),
});
export type Delivery = z.infer<typeof Delivery>;

export const DeliveryPage = pageOf(DeliverySummary);
export type DeliveryPage = z.infer<typeof DeliveryPage>;

export const RowReason = z.strictObject({
  verdict: z.enum(["queried", "refused"]),
  cause,
  detail: z.string(),
  field: field.optional(),
  column: z.number().int().optional(),
});

export const RowComparison = z.strictObject({
  key,
  tabulated: z.number(),
  computed: z.number(),
  written: z.string(),
  unit,
  column: z.number().int(),
  off: z.number(),
  allowed: z.number(),
  within: z.boolean(),
  convention: z.string().nullable(),
});
export type RowComparison = z.infer<typeof RowComparison>;

export const Mend = z.strictObject({
  column: z.number().int(),
  before: z.string(),
  after: z.string(),
  by: z.string(),
  at: Moment,
});
export type Mend = z.infer<typeof Mend>;

export const RowSummary = z.strictObject({
  number: z.number().int(),
  line: z.number().int(),
  verdict: z.enum(VERDICTS),
  cause: z.string(),
  designation: z.string(),
  reasons: z.array(RowReason).readonly(),
  worst: RowComparison.nullable(),
  against: z.enum(["", "new", "unchanged", "changed"]),
  /** What the Rack holds under the designation, in words. */
  standing: z.string(),
  decision: z.enum(DECISIONS).nullable(),
  decisionReason: z.string(),
  decidedBy: Person.nullable(),
  decidedAt: Moment.nullable(),
  /** What may be decided; mending is possible wherever there are cells. */
  choices: z.array(z.enum(DECISIONS)).readonly(),
  /** Why it is not put away as it stands; null when it is. */
  open: z.string().nullable(),
  version: Version,
});
export type RowSummary = z.infer<typeof RowSummary>;

export const RowDetail = z.strictObject({
  ...RowSummary.shape,
  series: z.string(),
  family: z.string().nullable(),
  /** What was computed, as a drawing of one part; null when the row cannot be drawn. */
  drawing: DrawingV1.nullable(),
  properties: Properties.nullable(),
  built: z.array(z.string()).readonly(),
  nominalWallMm: z.number().nullable(),
  comparisons: z.array(RowComparison).readonly(),
  uncompared: z
    .array(
      z.strictObject({
        key: z.enum(UNCOMPARED_KEYS),
        tabulated: z.number(),
        written: z.string(),
        unit,
      }),
    )
    .readonly(),
  consistency: z
    .array(z.strictObject({ law: z.string(), key, expected: z.number(), off: z.number() }))
    .readonly(),
  differences: z
    .array(
      z.strictObject({
        key: z.enum(FIGURE_KEYS as [string, ...string[]]),
        before: z.number().nullable(),
        after: z.number().nullable(),
      }),
    )
    .readonly(),
  cells: z.array(z.string()).readonly(),
  mends: z.array(Mend).readonly(),
  shapeId: Id.nullable(),
});
export type RowDetail = z.infer<typeof RowDetail>;

export const RowPage = pageOf(RowSummary);
export type RowPage = z.infer<typeof RowPage>;

export const FindRowsQuery = z.strictObject({
  verdict: z.enum(VERDICTS).optional(),
  cause: cause.optional(),
  /** "yes": only rows that still ask for a decision. */
  open: z.enum(["yes"]).optional(),
  /** As in the file, or refused first, then queried, then accepted. */
  order: z.enum(["file", "worst"]).optional(),
  cursor: z.string().min(1).max(500).optional(),
  limit: limitText.optional(),
});
export type FindRowsQuery = z.infer<typeof FindRowsQuery>;

/** One of: a decision (with a reason where the table is kept), null to take one back, or a mended cell. */
export const DecideRowInput = z
  .strictObject({
    decision: z.enum(DECISIONS).nullable().optional(),
    reason: plainText(500).optional(),
    /** Do so for every undecided row of the same verdict and cause. */
    alike: z.boolean().optional(),
    mend: z
      .strictObject({
        column: z.number().int().min(1).max(MAX_COLUMNS),
        value: z.string().max(MAX_CELL_CHARACTERS),
      })
      .optional(),
  })
  .refine(
    (d) => (d.decision === undefined) !== (d.mend === undefined),
    "Send a decision or a mended cell, one of the two.",
  )
  .refine((d) => d.decision !== "tabulated" || (d.reason ?? "").trim() !== "", {
    path: ["reason"],
    message: "Keeping the tabulated figure needs a reason.",
  })
  .refine((d) => !(d.alike === true && d.mend !== undefined), "A cell is mended in one row at a time.");
export type DecideRowInput = z.infer<typeof DecideRowInput>;

export const DecidedRows = z.strictObject({
  row: RowDetail,
  changed: z.number().int(),
  counts: DeliveryCounts,
  deliveryVersion: Version,
});
export type DecidedRows = z.infer<typeof DecidedRows>;

/** A correction: the whole reading, or the encoding that a person confirms, or a kept reading to be used. */
export const PutReadingInput = z
  .strictObject({
    reading: Reading.optional(),
    encoding: z.enum(ENCODINGS).optional(),
    readingId: Id.optional(),
  })
  .refine(
    (r) => [r.reading, r.encoding, r.readingId].filter((x) => x !== undefined).length === 1,
    "Send one of reading, encoding and readingId.",
  );
export type PutReadingInput = z.infer<typeof PutReadingInput>;

export const PutAwayInput = z.strictObject({
  /** Leaves out the rows that are not decided; without it they are an error that lists them. */
  leaveOutUndecided: z.boolean().optional(),
});
export type PutAwayInput = z.infer<typeof PutAwayInput>;

export const ReturnDeliveryInput = z.strictObject({ reason: plainText(500, 1) });
export type ReturnDeliveryInput = z.infer<typeof ReturnDeliveryInput>;
