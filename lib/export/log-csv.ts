import Papa from "papaparse";
import { harmless } from "@/lib/intake/queries-csv";

/** A deed as it is exported; before and after as JSON. */
export type ExportedDeed = Readonly<{
  at: string;
  actor: string;
  verb: string;
  subject: string;
  before: string;
  after: string;
  requestId: string;
}>;

const HEADINGS = ["Time (UTC)", "Who", "Deed", "What", "Before", "After", "Request"];

const written = (rows: readonly (readonly string[])[]): string =>
  `${Papa.unparse(
    rows.map((row) => row.map(harmless)),
    { newline: "\r\n" },
  )}\r\n`;

export const logCsvHead = (): string => written([HEADINGS]);

/** Rows of an export of the log (RFC 4180), no cell of which a spreadsheet would run. */
export const logCsvRows = (deeds: readonly ExportedDeed[]): string =>
  deeds.length === 0
    ? ""
    : written(
        deeds.map(({ at, actor, verb, subject, before, after, requestId }) => [
          at,
          actor,
          verb,
          subject,
          before,
          after,
          requestId,
        ]),
      );
