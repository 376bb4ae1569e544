import { inspectRow, blankReason, computedFigures, type Inspection } from "@/lib/intake/inspect-row";
import type { FileFault } from "@/lib/intake/file-fault";
import { FIGURE_KEYS, isCompared, type FigureKey } from "@/lib/intake/fields";
import { MAX_ROWS } from "@/lib/intake/limits";
import { readRow, type TypedRow } from "@/lib/intake/read-row";
import { recordsOf } from "@/lib/intake/records";
import { verdictOf, type RowReason } from "@/lib/intake/row-reason";
import type { Reading } from "@/lib/intake/schema";

export type InspectedRow = Readonly<{ cells: readonly string[]; inspection: Inspection }>;

/** Rows for which slips in dimensions are searched: the search costs hundreds of computations each. */
const DEEP_ROWS = 200;

/** The file's text under its reading, and the cells that people have mended, by row. */
export type FileToInspect = Readonly<{
  text: string;
  lineOffset: number;
  reading: Reading;
  mended?: (row: number, cells: readonly string[]) => readonly string[];
}>;

/** Typed rows of a file under its reading, one after another; ends with a fault when the file must be given back. */
export function* typedRows({
  text,
  lineOffset,
  reading,
  mended = (_, cells) => cells,
}: FileToInspect): Generator<TypedRow, FileFault | null> {
  const records = recordsOf(text, reading.delimiter);
  const lastHead = reading.unitLine ?? reading.headingLine;
  let number = 0;
  for (;;) {
    const next = records.next();
    if (next.done === true) return next.value;
    const record = { ...next.value, line: next.value.line + lineOffset };
    if (record.line <= lastHead || record.cells.every((cell) => cell.trim() === "")) continue;
    number += 1;
    if (number > MAX_ROWS)
      return {
        code: "file.tooManyRows",
        detail: `More than ${MAX_ROWS} rows (line ${record.line}): split the file and bring it in as two deliveries.`,
        line: record.line,
        column: 1,
      };
    const cells = mended(number, record.cells);
    // Who mended a cell has seen the whole row: what was wrong with its quotation marks is settled.
    yield readRow(cells === record.cells ? record : { ...record, cells, fault: null }, number, reading);
  }
}

/**
 * Every row of a file inspected, in order: computed, compared, duplicates inside the file named. The generator yields after
 * each row, so that the caller stores, reports progress and stops as it likes. Memory: one entry for each designation.
 */
export function* inspectFile(file: FileToInspect): Generator<InspectedRow, FileFault | null> {
  const { reading } = file;
  const rows = typedRows(file);
  const seen = new Map<string, number>();
  const habits = new BlankHabits();
  let deep = DEEP_ROWS;
  let before: TypedRow | null = null;
  let current = rows.next();
  while (current.done !== true) {
    const row: TypedRow = current.value;
    const following: IteratorResult<TypedRow, FileFault | null> = rows.next();
    const after = following.done === true ? null : following.value;
    const first = inspectRow(row, reading, { neighbours: { before, after }, deep: deep > 0 });
    if (first.verdict === "queried") deep -= 1;
    yield {
      cells: row.cells,
      inspection: withReasons(first, [...duplicate(row, seen), ...habits.of(row, first, reading)]),
    };
    before = row;
    current = following;
  }
  return current.value;
}

const withReasons = (inspection: Inspection, more: readonly RowReason[]): Inspection => {
  if (more.length === 0) return inspection;
  const reasons = [...inspection.reasons, ...more];
  return { ...inspection, reasons, verdict: verdictOf(reasons) };
};

function duplicate(row: TypedRow, seen: Map<string, number>): readonly RowReason[] {
  if (row.designation === null) return [];
  const first = seen.get(row.designation.key);
  if (first === undefined) {
    seen.set(row.designation.key, row.number);
    return [];
  }
  return [
    {
      verdict: "queried",
      cause: "duplicate",
      detail: `Row ${first} has the same designation: refuse one of the two.`,
      field: "designation",
    },
  ];
}

/** Figures that rows of a family usually carry: a blank among them is a query; a column blank for the whole family is not. */
class BlankHabits {
  private readonly filled = new Map<string, number>();

  of(row: TypedRow, inspection: Inspection, reading: Reading): readonly RowReason[] {
    const { family, properties } = inspection;
    if (family === null || properties === null) return [];
    const figures = computedFigures(properties);
    return FIGURE_KEYS.flatMap((key): RowReason[] => {
      const name = `${family} ${row.series} ${key}`;
      if (row.figures[key] !== undefined) this.filled.set(name, (this.filled.get(name) ?? 0) + 1);
      const usual = (this.filled.get(name) ?? 0) >= 2;
      return key !== "area" && usual && isCompared(key) && this.blank(row, key)
        ? [blankReason(key, figures, reading)]
        : [];
    });
  }

  private blank(row: TypedRow, key: FigureKey): boolean {
    return row.blanks.includes(key);
  }
}
