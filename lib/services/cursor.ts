import "server-only";
import { AppError } from "@/lib/errors";

export type CursorValue = string | number | null;

/** A place in a list: the sort values of the last row, as opaque text. */
export const encodeCursor = (values: readonly CursorValue[]): string =>
  Buffer.from(JSON.stringify(values)).toString("base64url");

export const unknownPlace = (cause?: unknown): AppError =>
  new AppError("invalid", {
    user: "cursor: this is not a place in this list; begin at its start.",
    issues: [
      { code: "cursor.unknown", detail: "Not a place in this list; begin at its start.", pointer: "/cursor" },
    ],
    cause,
  });

/** Reads a cursor of `length` values; anything else is refused by name. */
export const decodeCursor = (text: string, length: number): readonly CursorValue[] => {
  let read: unknown;
  try {
    read = JSON.parse(Buffer.from(text, "base64url").toString("utf8"));
  } catch (cause) {
    throw unknownPlace(cause);
  }
  const fits = (value: unknown): value is CursorValue =>
    value === null || typeof value === "string" || (typeof value === "number" && Number.isFinite(value));
  if (!Array.isArray(read) || read.length !== length || !read.every(fits)) throw unknownPlace();
  return read;
};

/** Cuts one row too many off a page and says where the next one begins. */
export const pageFrom = <Row, Item>(
  rows: readonly Row[],
  limit: number,
  toItem: (row: Row) => Item,
  cursorOf: (row: Row) => readonly CursorValue[],
): { items: Item[]; next: string | null } => {
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  const next = rows.length > limit && last !== undefined ? encodeCursor(cursorOf(last)) : null;
  return { items: shown.map(toItem), next };
};

export const DEFAULT_PAGE = 50;
