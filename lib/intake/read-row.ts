import { readDesignation, type Designation } from "@/lib/intake/designation";
import {
  FIELDS,
  SYMBOL,
  isDimension,
  isFigure,
  type DimensionKey,
  type FieldKey,
  type FigureKey,
} from "@/lib/intake/fields";
import { FILE_UNITS, type FileUnitKey } from "@/lib/intake/file-units";
import { readNumber, type NumberRead } from "@/lib/intake/read-number";
import type { TableRecord } from "@/lib/intake/records";
import type { CauseCode, RowReason } from "@/lib/intake/row-reason";
import type { Reading } from "@/lib/intake/schema";

/** A number of the table in stored units (mm, mm², …, kg/m) with half the last digit written. */
export type Measure = Readonly<{
  value: number;
  half: number;
  written: string;
  unit: FileUnitKey;
  column: number;
}>;

export type AmbiguousMeasure = Readonly<{ field: FieldKey; readings: readonly [Measure, Measure] }>;

export type TypedRow = Readonly<{
  /** Number of the data row, counted from 1, and its line in the file. */
  number: number;
  line: number;
  cells: readonly string[];
  designation: Designation | null;
  series: string;
  standard: string;
  dimensions: Readonly<Partial<Record<DimensionKey, Measure>>>;
  figures: Readonly<Partial<Record<FigureKey, Measure>>>;
  blanks: readonly FieldKey[];
  ambiguous: readonly AmbiguousMeasure[];
  reasons: readonly RowReason[];
}>;

/** Largest size, mm, and largest figure in its stored unit that a row may carry. */
const LARGEST = {
  length: 1e5,
  area: 1e10,
  modulus: 1e15,
  inertia: 1e20,
  warping: 1e30,
  mass: 1e6,
  slope: 1,
  angle: 360,
  surface: 1e3,
} as const;
const MAY_BE_ZERO: readonly FieldKey[] = [
  "rootRadius",
  "toeRadius",
  "innerRadius",
  "outerRadius",
  "flangeSlope",
  "Cw",
];

type Draft = {
  dimensions: Partial<Record<DimensionKey, Measure>>;
  figures: Partial<Record<FigureKey, Measure>>;
  blanks: FieldKey[];
  ambiguous: AmbiguousMeasure[];
  reasons: RowReason[];
  otherMarks: string[];
};

/** One record typed by its reading. Never throws and never guesses: what cannot be read is a reason that names the column. */
export function readRow(record: TableRecord, number: number, reading: Reading): TypedRow {
  const draft: Draft = {
    dimensions: {},
    figures: {},
    blanks: [],
    ambiguous: [],
    reasons: [],
    otherMarks: [],
  };
  const { columns } = reading;
  let series = "";
  let standard = "";
  let designation: Designation | null = null;
  fieldCount(record, reading, draft);
  columns.forEach((column, i) => {
    const cell = record.cells[i] ?? "";
    if (column.field === "series") series = cell.trim();
    else if (column.field === "standard") standard = cell.trim();
    else if (column.field === "designation") {
      const read = readDesignation(cell);
      if (read.ok) designation = read.value;
      else
        draft.reasons.push({
          verdict: "refused",
          cause: "designation",
          detail: read.error,
          field: "designation",
          column: i + 1,
        });
    } else if (column.unit !== null && i < record.cells.length)
      readFigure(cell, column.field, column.unit, i, reading, draft);
  });
  if (draft.otherMarks.length > 0)
    draft.reasons.push({
      verdict: "queried",
      cause: "decimal-mark",
      detail: `${draft.otherMarks.slice(0, 4).join(", ")}${draft.otherMarks.length > 4 ? " and others are" : draft.otherMarks.length === 1 ? " is" : " are"} written with a decimal ${reading.marks?.decimal === "," ? "point" : "comma"} where the file writes a decimal ${reading.marks?.decimal === "," ? "comma" : "point"}; read so.`,
    });
  const { dimensions, figures, blanks, ambiguous, reasons } = draft;
  return {
    number,
    line: record.line,
    cells: record.cells,
    designation,
    series,
    standard,
    dimensions,
    figures,
    blanks,
    ambiguous,
    reasons,
  };
}

function fieldCount(record: TableRecord, reading: Reading, draft: Draft): void {
  const { fault, cells } = record;
  const expected = reading.columns.length;
  if (fault !== null) {
    const cause: CauseCode =
      fault.code === "quotes" ? "quotes" : fault.code === "cellTooLong" ? "cell" : "fields";
    draft.reasons.push({
      verdict: "refused",
      cause,
      detail: fault.detail,
      ...(fault.column === undefined ? {} : { column: fault.column }),
    });
    return;
  }
  const surplus = cells.slice(expected).filter((cell) => cell.trim() !== "");
  if (surplus.length > 0)
    draft.reasons.push({
      verdict: "queried",
      cause: "fields",
      detail: `${cells.length} fields instead of ${expected}; beyond the last heading stand ${surplus
        .slice(0, 3)
        .map((c) => `"${c.trim().slice(0, 40)}"`)
        .join(", ")}.`,
      column: expected + 1,
    });
  const missing = reading.columns.slice(cells.length).filter((c) => c.field !== "note");
  if (missing.length > 0)
    draft.reasons.push({
      verdict: "refused",
      cause: "fields",
      detail: `${cells.length} fields instead of ${expected}: the row ends after ${reading.columns[cells.length - 1]?.heading ?? "nothing"}.`,
      column: cells.length + 1,
    });
}

function readFigure(
  cell: string,
  field: FieldKey,
  unit: FileUnitKey,
  index: number,
  reading: Reading,
  draft: Draft,
): void {
  const column = index + 1;
  const read = readNumber(cell, reading.marks);
  const measure = (value: number, halfUnit: number): Measure => ({
    value: value * FILE_UNITS[unit].factor,
    half: halfUnit * FILE_UNITS[unit].factor,
    written: cell.trim(),
    unit,
    column,
  });
  switch (read.kind) {
    case "blank":
      draft.blanks.push(field);
      return;
    case "text":
      draft.reasons.push({
        verdict: "refused",
        cause: "not-a-number",
        detail: `${SYMBOL[field]} reads "${cell.trim().slice(0, 60)}", which is not a number.`,
        field,
        column,
      });
      return;
    case "outOfRange":
      draft.reasons.push({
        verdict: "refused",
        cause: "out-of-range",
        detail: `${SYMBOL[field]} reads ${cell.trim().slice(0, 60)}, larger than any number that can be kept.`,
        field,
        column,
      });
      return;
    case "ambiguous": {
      const [a, b] = read.readings;
      draft.ambiguous.push({ field, readings: [measure(a, 0.0005), measure(b, 0.5)] });
      return;
    }
    case "number":
      keep(read, measure(read.value, read.halfUnit), field, draft);
  }
}

function keep(
  read: Extract<NumberRead, { kind: "number" }>,
  measure: Measure,
  field: FieldKey,
  draft: Draft,
): void {
  const { column, written } = measure;
  const kind = FIELDS[field].kind;
  if (measure.value < 0 || (measure.value === 0 && !MAY_BE_ZERO.includes(field))) {
    const what = measure.value < 0 ? "is negative" : "is 0";
    draft.reasons.push({
      verdict: "refused",
      cause: "sign",
      detail: `${FIELDS[field].label} ${what} (${written}); it must be above 0.`,
      field,
      column,
    });
    return;
  }
  if (kind !== null && measure.value > LARGEST[kind]) {
    draft.reasons.push({
      verdict: "refused",
      cause: "out-of-range",
      detail: `${FIELDS[field].label} reads ${written} ${FILE_UNITS[measure.unit].label}: beyond any section.`,
      field,
      column,
    });
    return;
  }
  if (read.otherMark) draft.otherMarks.push(written);
  if (isDimension(field)) draft.dimensions[field] = measure;
  else if (isFigure(field)) draft.figures[field] = measure;
}
