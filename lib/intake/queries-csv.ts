import Papa from "papaparse";
import { CAUSES, type RowReason, type Verdict } from "@/lib/intake/row-reason";

export type QueryRow = Readonly<{
  number: number;
  line: number;
  verdict: Verdict;
  decision: string;
  reasons: readonly RowReason[];
  cells: readonly string[];
}>;

const HEAD = ["Row", "Line", "Verdict", "Cause", "Reason", "Decision"] as const;

/**
 * Queried and refused rows for the supplier, as CSV: why first, then the row as it was written. Cells that a spreadsheet would
 * take for a formula get a leading apostrophe, unless they are plain numbers.
 */
export function queriesCsv(headings: readonly string[], rows: Iterable<QueryRow>): string {
  const lines = [...rows].map((row) => [
    String(row.number),
    String(row.line),
    row.verdict,
    row.reasons.map((r) => CAUSES[r.cause]).join("; "),
    row.reasons.map((r) => r.detail).join(" "),
    row.decision,
    ...row.cells,
  ]);
  return Papa.unparse(
    [[...HEAD, ...headings], ...lines].map((line) => line.map(harmless)),
    { newline: "\r\n" },
  );
}

/** @source OWASP, "CSV Injection": = + - @ tab and CR at the start of a cell, in their wide forms too. */
export const harmless = (cell: string): string =>
  /^[=+\-@\t\r\uff1d\uff0b\uff0d\uff20]/.test(cell) && !/^[+-]?\d+([.,]\d+)?$/.test(cell) ? `'${cell}` : cell;
