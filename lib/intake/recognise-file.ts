import type { DecodedText } from "@/lib/intake/decode-bytes";
import type { FileFault } from "@/lib/intake/file-fault";
import { readUnit } from "@/lib/intake/file-units";
import { MAX_COLUMNS, SAMPLE_RECORDS } from "@/lib/intake/limits";
import { findMarks, readNumber, type Marks } from "@/lib/intake/read-number";
import { kindOf, recogniseColumns, type ColumnFound } from "@/lib/intake/recognise-columns";
import type { Delimiter } from "@/lib/intake/delimiters";
import { findDelimiter, firstRecords, type TableRecord } from "@/lib/intake/records";
import { DEFAULT_TOLERANCE, type Reading } from "@/lib/intake/schema";
import { err, ok, type Result } from "@/lib/result";

/** What was recognised in a file, each point with its evidence; `reading` is the part that can be corrected and kept. */
export type Recognition = Readonly<{
  reading: Reading;
  columns: readonly (ColumnFound & Readonly<{ samples: readonly string[] }>)[];
  evidence: Readonly<{
    encoding: string;
    delimiter: string;
    marks: string;
    headings: string;
    axes: string | null;
    reading: string | null;
  }>;
  /** What only a person can say before rows can be read with confidence. */
  questions: readonly string[];
  /** Text from which records are read (without a `sep=` line). */
  text: string;
  /** Lines cut off in front of `text`. */
  lineOffset: number;
}>;

type SavedReading = Readonly<{ name: string; reading: Reading }>;

export type RecogniseOptions = Readonly<{
  /** A person's correction for this delivery: taken as it is. */
  corrected?: Reading | null;
  /** Readings kept from earlier deliveries: the one whose headings are all here is used. */
  saved?: readonly SavedReading[];
}>;

const HEADING_SEARCH = 20;

/** Recognises delimiter, headings, units, axes and marks of a decoded file. Pure; reads only the first records. */
export function recogniseFile(
  decoded: DecodedText,
  options: RecogniseOptions = {},
): Result<Recognition, FileFault> {
  const found = findDelimiter(decoded.text, SAMPLE_RECORDS, knownHeadings);
  const corrected = options.corrected ?? null;
  if (!found.ok && corrected === null) return found;
  const base = found.ok
    ? found.value
    : { text: decoded.text, skippedLines: 0, evidence: "", delimiter: ";" as Delimiter };
  const delimiter = corrected?.delimiter ?? base.delimiter;
  const records = firstRecords(base.text, delimiter, SAMPLE_RECORDS).map((r) => ({
    ...r,
    line: r.line + base.skippedLines,
  }));
  const heading =
    corrected === null ? findHeading(records) : records.find((r) => r.line === corrected.headingLine);
  if (heading === undefined || heading === null)
    return err({
      code: "file.noHeadings",
      detail:
        "No line of headings was found in the first 20 lines: the table needs one line that names its columns.",
      line: records[0]?.line ?? 1,
      column: 1,
    });
  if (heading.fault !== null || heading.cells.length > MAX_COLUMNS)
    return err({
      code: "file.headings",
      detail: `The headings in line ${heading.line} cannot be read. ${heading.fault?.detail ?? ""}`.trim(),
      line: heading.line,
      column: heading.fault?.column ?? 1,
    });
  const units = unitRecord(records, heading, corrected);
  const data = records.filter((r) => r.line > (units?.line ?? heading.line) && r.fault === null);
  const columns = recogniseColumns(heading.cells, units?.cells ?? null);
  const kept = (options.saved ?? []).find((s) => appliesTo(s.reading, heading.cells));
  const marks = findMarks(numericCells(data, columns.columns));
  const fresh = columns.columns.map(({ heading: h, field, unit }) => ({ heading: h, field, unit }));
  const reading: Reading =
    corrected === null
      ? {
          encoding: decoded.encoding,
          delimiter,
          marks: kept?.reading.marks ?? marks.marks ?? marksByDelimiter(delimiter, data, columns.columns),
          headingLine: heading.line,
          unitLine: units?.line ?? null,
          columns: (kept === undefined ? columns.columns : withSaved(columns.columns, kept.reading)).map(
            ({ heading: h, field, unit }) => ({ heading: h, field, unit }),
          ),
          tolerance: kept?.reading.tolerance ?? DEFAULT_TOLERANCE,
          conventions: kept?.reading.conventions ?? [],
          family: kept?.reading.family ?? null,
          material: kept?.reading.material ?? "steel",
        }
      : // Another delimiter, encoding or line of headings makes other columns: those are recognised anew.
        { ...corrected, columns: sameHeadings(corrected, heading.cells) ? corrected.columns : fresh };
  return ok({
    reading,
    columns: columns.columns.map((column, i) => ({
      ...column,
      ...reading.columns[i],
      samples: data.slice(0, 2).map((r) => r.cells[i] ?? ""),
    })),
    evidence: {
      encoding: decoded.evidence,
      delimiter:
        corrected !== null && corrected.delimiter !== base.delimiter ? "chosen by a person" : base.evidence,
      marks: marks.evidence,
      headings: `line ${heading.line}${units === null ? "" : `, units in line ${units.line}`}`,
      axes: columns.axes,
      reading: kept === undefined ? null : kept.name,
    },
    questions: questionsOf(reading, columns.columns),
    text: base.text,
    lineOffset: base.skippedLines,
  });
}

const knownHeadings = (record: TableRecord): number =>
  recogniseColumns(record.cells.slice(0, MAX_COLUMNS), null).columns.filter((c) => c.field !== "note").length;

function findHeading(records: readonly TableRecord[]): TableRecord | null {
  let best: TableRecord | null = null;
  let most = 0;
  for (const record of records.slice(0, HEADING_SEARCH)) {
    const known = knownHeadings(record);
    if (known > most) {
      best = record;
      most = known;
    }
  }
  return most >= 2 || (best !== null && records.length > 0 && most >= 1 && best === records[0]) ? best : null;
}

/** The record under the headings is a line of units when most of its filled cells are units and none is a number. */
function unitRecord(
  records: readonly TableRecord[],
  heading: TableRecord,
  corrected: Reading | null,
): TableRecord | null {
  const next = records.find((r) => r.line > heading.line) ?? null;
  if (corrected !== null) return records.find((r) => r.line === corrected.unitLine) ?? null;
  if (next === null) return null;
  const filled = next.cells.filter((cell) => !/^[\s\-\u2013\u2014]*$/.test(cell));
  const units = filled.filter((cell) => readUnit(cell) !== null).length;
  return units >= 2 && units * 2 > filled.length && filled.every((c) => readNumber(c, null).kind !== "number")
    ? next
    : null;
}

function* numericCells(data: readonly TableRecord[], columns: readonly ColumnFound[]): Generator<string> {
  for (const record of data)
    for (let i = 0; i < columns.length; i += 1) {
      const column = columns[i];
      if (column !== undefined && kindOf(column.field) !== null) yield record.cells[i] ?? "";
    }
}

/** Whole numbers only: the marks cannot matter, so the usual pair for the delimiter is taken. */
function marksByDelimiter(
  delimiter: Delimiter,
  data: readonly TableRecord[],
  columns: readonly ColumnFound[],
): Marks | null {
  for (const cell of numericCells(data, columns)) {
    const read = readNumber(cell, null);
    if (read.kind === "ambiguous") return null;
  }
  return { decimal: delimiter === ";" ? "," : ".", thousands: null };
}

const sameHeadings = (reading: Reading, headings: readonly string[]) =>
  reading.columns.length === headings.length && reading.columns.every((c, i) => c.heading === headings[i]);

/** Same headings, in any order: the reading was kept for such a file. */
const appliesTo = (reading: Reading, headings: readonly string[]) =>
  reading.columns.length === headings.length && reading.columns.every((c) => headings.includes(c.heading));

const withSaved = (columns: readonly ColumnFound[], reading: Reading) =>
  columns.map((column) => ({ ...column, ...reading.columns.find((c) => c.heading === column.heading) }));

function questionsOf(reading: Reading, columns: readonly ColumnFound[]): readonly string[] {
  const open: string[] = [];
  if (reading.marks === null)
    open.push("Decimal mark: no cell decides between decimal comma and decimal point.");
  if (!reading.columns.some((c) => c.field === "designation"))
    open.push("Designation: no column holds the designations.");
  reading.columns.forEach((column, i) => {
    const question = columns[i]?.question ?? null;
    if (kindOf(column.field) !== null && column.unit === null)
      open.push(`${column.heading}: choose its unit.`);
    else if (column.field === "note" && question !== null) open.push(question);
  });
  return open;
}
