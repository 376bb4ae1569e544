import "server-only";
import { and, gte, inArray, lte, sql, type SQL } from "drizzle-orm";
import { finder } from "@/db/schema/finder";
import { tags } from "@/db/schema/tags";
import { takes } from "@/db/schema/takes";
import { foldForSearch } from "@/lib/schemas/designation";
import { type FindShapesQuery, RANGES, type RangeName } from "@/lib/schemas/find-shapes";
import { toStored, type UnitName } from "@/lib/units/conversion";
import { tagKeyOf } from "../tag/load-tags";

const COLUMNS = {
  Sx: finder.Sx,
  Sy: finder.Sy,
  Ix: finder.Ix,
  Iy: finder.Iy,
  I2: finder.I2,
  Zx: finder.Zx,
  Zy: finder.Zy,
  area: finder.area,
  rx: finder.rx,
  ry: finder.ry,
  r2: finder.r2,
  J: finder.J,
  Cw: finder.Cw,
  depth: finder.depth,
  width: finder.width,
  mass: finder.mass,
} as const;

/** What a number of the query means in inch units; in metric ones it is as stored. */
const INCH_UNIT: Record<keyof typeof COLUMNS, UnitName> = {
  Sx: "in3",
  Sy: "in3",
  Ix: "in4",
  Iy: "in4",
  I2: "in4",
  Zx: "in3",
  Zy: "in3",
  area: "in2",
  rx: "in",
  ry: "in",
  r2: "in",
  J: "in4",
  Cw: "in6",
  depth: "in",
  width: "in",
  mass: "lb/ft",
};

export const rangesOf = (query: FindShapesQuery): SQL[] =>
  (Object.keys(RANGES) as RangeName[]).flatMap((name) => {
    const given = query[name];
    if (given === undefined) return [];
    const [column, end] = RANGES[name];
    const value = query.unit === "in" ? toStored(given, INCH_UNIT[column]) : given;
    return [end === "min" ? gte(COLUMNS[column], value) : lte(COLUMNS[column], value)];
  });

/** Conditions beside ranges, families and bays: text, job, tag. */
export const wordsOf = (query: FindShapesQuery): SQL[] => {
  const conditions: SQL[] = [];
  const text = query.q === undefined ? "" : foldForSearch(query.q);
  if (text !== "") conditions.push(sql`instr(${finder.folded}, ${text}) > 0`);
  if (query.job !== undefined) {
    conditions.push(
      sql`exists (select 1 from ${takes} where ${takes.organisationId} = ${finder.organisationId} and ${takes.jobNumber} = ${query.job} and ${takes.shapeId} = ${finder.shapeId})`,
    );
  }
  if (query.tag !== undefined) {
    conditions.push(
      sql`exists (select 1 from ${tags} where ${tags.organisationId} = ${finder.organisationId} and ${tags.tagKey} = ${tagKeyOf(query.tag)} and ${tags.shapeId} = ${finder.shapeId})`,
    );
  }
  return conditions;
};

/** Everything the query asks of a row; `facets` leaves family and bay out, so that they can be counted. */
export const conditionsOf = (query: FindShapesQuery, { facets = false } = {}): SQL | undefined =>
  and(
    ...rangesOf(query),
    ...wordsOf(query),
    facets || query.family === undefined ? undefined : inArray(finder.family, query.family),
    facets || query.bay === undefined ? undefined : inArray(finder.bayId, query.bay),
  );
