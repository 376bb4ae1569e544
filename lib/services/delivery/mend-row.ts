import "server-only";
import { and, eq, inArray } from "drizzle-orm";
import type { Reader } from "@/db/client";
import { deliveryRows } from "@/db/schema/deliveries";
import { AppError } from "@/lib/errors";
import type { InspectedRow } from "@/lib/intake/inspect-file";
import { inspectRow } from "@/lib/intake/inspect-row";
import { readRow, type TypedRow } from "@/lib/intake/read-row";
import type { Reading } from "@/lib/intake/schema";
import type { DecideRowInput } from "@/lib/schemas/delivery";
import { cellsOf, type RowRecord } from "./stored-row";

type Cell = NonNullable<DecideRowInput["mend"]>;

export type Mended = Readonly<{ before: string; row: InspectedRow }>;

/** A row inspected again with one cell changed; nothing is stored. */
export const mendedRow = async (
  read: Pick<Reader, "select">,
  record: RowRecord,
  reading: Reading,
  { column, value }: Cell,
): Promise<Mended> => {
  if (column > reading.columns.length)
    throw new AppError("invalid", {
      user: `There is no column ${column} in this table.`,
      issues: [
        {
          code: "mend.column",
          detail: `The table has ${reading.columns.length} columns.`,
          pointer: "/mend/column",
        },
      ],
    });
  const cells = [...cellsOf(record)];
  const before = cells[column - 1] ?? "";
  while (cells.length < reading.columns.length) cells.push("");
  cells[column - 1] = value;
  const typed = readRow({ line: record.line, cells, fault: null }, record.ordinal, reading);
  const beside = await read
    .select({ ordinal: deliveryRows.ordinal, line: deliveryRows.line, cells: deliveryRows.cells })
    .from(deliveryRows)
    .where(
      and(
        eq(deliveryRows.deliveryId, record.deliveryId),
        inArray(deliveryRows.ordinal, [record.ordinal - 1, record.ordinal + 1]),
      ),
    );
  const neighbour = (ordinal: number): TypedRow | null => {
    const row = beside.find((r) => r.ordinal === ordinal);
    return row === undefined
      ? null
      : readRow({ line: row.line, cells: cellsOf(row), fault: null }, ordinal, reading);
  };
  const neighbours = { before: neighbour(record.ordinal - 1), after: neighbour(record.ordinal + 1) };
  return { before, row: { cells, inspection: inspectRow(typed, reading, { neighbours, deep: true }) } };
};
