import Papa from "papaparse";
import { DELIMITER_NAME, DELIMITERS, type Delimiter } from "@/lib/intake/delimiters";
import type { FileFault } from "@/lib/intake/file-fault";
import { MAX_BROKEN_QUOTES, MAX_CELL_CHARACTERS, MAX_COLUMNS } from "@/lib/intake/limits";
import { err, ok, type Result } from "@/lib/result";

export type RecordFault = Readonly<{
  code: "quotes" | "tooManyColumns" | "cellTooLong";
  detail: string;
  column?: number;
}>;

/** One record of the file; `line` is the line it starts on, counted from 1. A faulty record keeps what could be read. */
export type TableRecord = Readonly<{ line: number; cells: readonly string[]; fault: RecordFault | null }>;

const CHUNK_CHARACTERS = 256 * 1024;
/** No honest record is longer: 200 columns of 10,000 characters. */
const LONGEST_RECORD = MAX_COLUMNS * MAX_CELL_CHARACTERS;

type Parsed = Readonly<{
  data: string[][];
  errors: readonly Readonly<{ code?: string; row?: number }>[];
  meta: Readonly<{ cursor: number }>;
}>;

function parseSlice(slice: string, delimiter: Delimiter, keepsLast: boolean): Parsed {
  // Safe cast: the parser returns ParseResult, whose declaration in @types/papaparse is `any`.
  return new Papa.Parser({ delimiter, newline: "\n" }).parse(slice, 0, !keepsLast) as Parsed;
}

/**
 * Records of a text whose line ends are all \n, one after another, chunk by chunk. Blank lines are passed over. A record whose
 * quotation mark never closes (or closes in the middle of a cell) is given as faulty, and reading goes on with its next line,
 * so that one stray mark cannot swallow the rest. Linear in the text.
 */
export function* recordsOf(text: string, delimiter: Delimiter): Generator<TableRecord, FileFault | null> {
  let offset = 0;
  let line = 1;
  let size = CHUNK_CHARACTERS;
  let broken = 0;
  while (offset < text.length) {
    const slice = text.slice(offset, offset + size);
    const last = offset + size >= text.length;
    const parsed = parseSlice(slice, delimiter, last);
    const nothing = parsed.data.length === 0 && !last;
    if (nothing && size <= LONGEST_RECORD) {
      size *= 4;
      continue;
    }
    const faulty = parsed.errors.find((e) => e.code === "MissingQuotes" || e.code === "InvalidQuotes");
    const good = faulty === undefined ? parsed.data.length : Math.min(faulty.row ?? 0, parsed.data.length);
    const startLine = line;
    for (let i = 0; i < good; i += 1) {
      const cells = parsed.data[i] ?? [];
      if (!(cells.length === 1 && cells[0] === "")) yield checked({ line, cells, fault: null });
      line += 1 + newlinesIn(cells);
    }
    if (faulty === undefined && !nothing) {
      offset += last ? slice.length : parsed.meta.cursor;
      size = CHUNK_CHARACTERS;
      continue;
    }
    broken += 1;
    if (broken > MAX_BROKEN_QUOTES)
      return {
        code: "quotes.tooMany",
        detail: `More than ${MAX_BROKEN_QUOTES} lines have quotation marks that do not close, the last in line ${line}: check the delimiter, or export the table again.`,
        line,
        column: 1,
      };
    const from = offsetOfLine(text, offset, line - startLine);
    const end = text.indexOf("\n", from);
    const lineText = text.slice(from, end === -1 ? text.length : end);
    yield brokenRecord(lineText, line, delimiter);
    offset = end === -1 ? text.length : end + 1;
    line += 1;
    size = CHUNK_CHARACTERS;
  }
  return null;
}

function brokenRecord(lineText: string, line: number, delimiter: Delimiter): TableRecord {
  const cells = lineText.split(delimiter).map((cell) => cell.replaceAll('"', ""));
  if (!lineText.includes('"')) return checked({ line, cells, fault: null });
  const column = 1 + lineText.split(delimiter).findIndex((cell) => (cell.split('"').length - 1) % 2 === 1);
  const fault: RecordFault = {
    code: "quotes",
    detail: `The quotation mark in field ${Math.max(column, 1)} is never closed: remove it or close it.`,
    column: Math.max(column, 1),
  };
  return checked({ line, cells, fault });
}

function checked(record: TableRecord): TableRecord {
  const { cells } = record;
  const long = cells.findIndex((cell) => cell.length > MAX_CELL_CHARACTERS);
  if (cells.length <= MAX_COLUMNS && long === -1) return record;
  const kept = cells.slice(0, MAX_COLUMNS).map((cell) => cell.slice(0, MAX_CELL_CHARACTERS));
  const fault: RecordFault =
    cells.length > MAX_COLUMNS
      ? {
          code: "tooManyColumns",
          detail: `${cells.length} fields; at most ${MAX_COLUMNS} are read.`,
          column: MAX_COLUMNS + 1,
        }
      : {
          code: "cellTooLong",
          detail: `Field ${long + 1} has ${cells[long]?.length ?? 0} characters; at most ${MAX_CELL_CHARACTERS} are read.`,
          column: long + 1,
        };
  return { line: record.line, cells: kept, fault: record.fault ?? fault };
}

const countNewlines = (text: string) => {
  let count = 0;
  for (let at = text.indexOf("\n"); at !== -1; at = text.indexOf("\n", at + 1)) count += 1;
  return count;
};

const newlinesIn = (cells: readonly string[]) => {
  let count = 0;
  for (const cell of cells) if (cell.includes("\n")) count += countNewlines(cell);
  return count;
};

function offsetOfLine(text: string, from: number, lines: number): number {
  let at = from;
  for (let i = 0; i < lines; i += 1) at = text.indexOf("\n", at) + 1;
  return at;
}

export function firstRecords(text: string, delimiter: Delimiter, count: number): readonly TableRecord[] {
  const records: TableRecord[] = [];
  for (const record of recordsOf(text, delimiter)) {
    records.push(record);
    if (records.length >= count) break;
  }
  return records;
}

export type DelimiterFound = Readonly<{
  delimiter: Delimiter;
  evidence: string;
  /** Text without a leading `sep=` line. */ text: string;
  skippedLines: number;
}>;

/**
 * The delimiter that gives the most fields in the most equal number of lines; a first line `sep=;` is believed.
 * `known` says how many headings a record holds: a delimiter under which headings are recognised goes before a tidier one.
 */
export function findDelimiter(
  text: string,
  sample: number,
  known: (record: TableRecord) => number = () => 0,
): Result<DelimiterFound, FileFault> {
  const stated = /^sep=([;,\t|])\n/.exec(text);
  if (stated !== null) {
    const delimiter = DELIMITERS.find((d) => d === stated[1]) ?? ";";
    const rest = text.slice(stated[0].length);
    return ok({
      delimiter,
      evidence: `the first line says sep=${stated[1] === "\t" ? "tab" : stated[1]}`,
      text: rest,
      skippedLines: 1,
    });
  }
  const head = text.length > 400_000 ? text.slice(0, text.indexOf("\n", 400_000) + 1 || 400_000) : text;
  const scored = DELIMITERS.map((delimiter) => ({ delimiter, ...scoreOf(head, delimiter, sample, known) }));
  const best = scored.reduce((a, b) => (b.score > a.score ? b : a));
  if (best.score === 0)
    return err({
      code: "file.noDelimiter",
      detail: "No line is divided by semicolon, comma, tab or pipe: check that this is a table in CSV.",
      line: 1,
      column: 1,
    });
  return ok({
    delimiter: best.delimiter,
    evidence: `${DELIMITER_NAME[best.delimiter]}: ${best.fields} fields in ${best.agree} of the first ${best.lines} lines`,
    text,
    skippedLines: 0,
  });
}

const HEADING_SEARCH = 20;

function scoreOf(text: string, delimiter: Delimiter, sample: number, known: (record: TableRecord) => number) {
  const records = firstRecords(text, delimiter, sample);
  const counts = records.map((r) => r.cells.length);
  const headings = Math.max(
    0,
    ...records.slice(0, HEADING_SEARCH).map((r) => (r.cells.length > 1 ? known(r) : 0)),
  );
  const tally = new Map<number, number>();
  for (const n of counts) if (n > 1) tally.set(n, (tally.get(n) ?? 0) + 1);
  const [fields, agree] = [...tally.entries()].reduce(
    (a, b) => (b[1] > a[1] || (b[1] === a[1] && b[0] > a[0]) ? b : a),
    [1, 0],
  );
  const share = counts.length === 0 ? 0 : agree / counts.length;
  return {
    score: fields > 1 ? share * share * Math.sqrt(fields) * (1 + headings) : 0,
    fields,
    agree,
    lines: counts.length,
  };
}
