import "server-only";
import { asc, desc, sql, type Column, type SQL } from "drizzle-orm";
import { finder } from "@/db/schema/finder";
import type { SortColumn } from "@/lib/schemas/find-shapes";
import { decodeCursor, unknownPlace, type CursorValue } from "../cursor";

type Place = SQL<number | string>;

/** Beyond every value: a shape without this figure stands at the end, whichever way the list runs. */
const NOWHERE = 1e308;
const orLast = (column: Column, down: boolean): Place =>
  sql<number>`coalesce(${column}, ${down ? -NOWHERE : NOWHERE})`;

const expressionOf = (column: SortColumn, down: boolean): Place => {
  switch (column) {
    case "I2":
    case "Zx":
    case "Zy":
    case "r2":
    case "J":
    case "Cw":
      return orLast(finder[column], down);
    case "designation":
      return sql<string>`${finder.folded}`;
    case "SxPerMass":
      return sql<number>`${finder.Sx} / ${finder.mass}`;
    default:
      return sql<number | string>`${finder[column]}`;
  }
};

export type FindOrder = Readonly<{
  by: Place;
  orderBy: readonly [SQL, SQL];
  /** Rows after the cursor, as a row value: never an OR, which could not walk an index. */
  after: SQL | undefined;
}>;

/** Order of a search: any column, either way, the revision's id as the last word. */
export const findOrder = (sort: string, cursor: string | undefined): FindOrder => {
  const down = sort.startsWith("-");
  const by = expressionOf(sort.replace(/^-/, "") as SortColumn, down);
  const turn = down ? desc : asc;
  const place = cursor === undefined ? undefined : decodeCursor(cursor, 3);
  return {
    by,
    orderBy: [turn(by), turn(finder.id)],
    after: place && afterPlace(by, down, sort, place),
  };
};

const afterPlace = (by: Place, down: boolean, sort: string, place: readonly CursorValue[]): SQL => {
  const [ordered, value, id] = place;
  // A cursor of another order would skip rows silently.
  if (ordered !== sort) throw unknownPlace();
  return down
    ? sql`(${by}, ${finder.id}) < (${value}, ${id})`
    : sql`(${by}, ${finder.id}) > (${value}, ${id})`;
};
