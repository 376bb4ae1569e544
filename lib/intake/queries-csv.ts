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

export const QUERIES_HEAD = ["Row", "Line", "Verdict", "Cause", "Reason", "Decision"] as const;

/**
 * One line of the file of queries for the supplier: why first, then the row as it was written, or plain cells (the headings).
 * Cells that a spreadsheet would take for a formula get a leading apostrophe, unless they are plain numbers.
 */
export function queryLine(row: QueryRow | readonly string[]): string {
  const cells = "cells" in row ? [...reasonsOf(row), ...row.cells] : row;
  return `${Papa.unparse([cells.map(harmless)], { newline: "\r\n" })}\r\n`;
}

const reasonsOf = (row: QueryRow): readonly string[] => [
  String(row.number),
  String(row.line),
  row.verdict,
  row.reasons.map((r) => CAUSES[r.cause]).join("; "),
  row.reasons.map((r) => r.detail).join(" "),
  row.decision,
];

/** @source OWASP, "CSV Injection": = + - @ tab and CR at the start of a cell, in their wide forms too. */
export const harmless = (cell: string): string =>
  /^[=+\-@\t\r\uff1d\uff0b\uff0d\uff20]/.test(cell) && !/^[+-]?\d+([.,]\d+)?$/.test(cell) ? `'${cell}` : cell;
