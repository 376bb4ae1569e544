import {
  createLoader,
  parseAsArrayOf,
  parseAsFloat,
  parseAsString,
  parseAsStringLiteral,
  type inferParserType,
} from "nuqs/server";
import { FAMILIES } from "@/components/rack/family-names";
import { RANGE_NAMES } from "@/components/rack/ranges";
import type { RangeName } from "@/lib/schemas/find-shapes";

export const FINDABLE_STATES = ["draft", "submitted", "released", "withdrawn"] as const;
export const MAX_COMPARED = 6;

/** One parser for each range; safe: the keys are those of RANGE. Numbers in the address are in stored units (mm, kg/m). */
const ranges = Object.fromEntries(RANGE_NAMES.map((name) => [name, parseAsFloat])) as Record<
  RangeName,
  typeof parseAsFloat
>;

/** The state of the Rack in its address, so that a search can be sent to somebody. */
export const rackParsers = {
  ...ranges,
  q: parseAsString,
  family: parseAsArrayOf(parseAsStringLiteral(FAMILIES)),
  bay: parseAsArrayOf(parseAsString),
  state: parseAsArrayOf(parseAsStringLiteral(FINDABLE_STATES)),
  job: parseAsString,
  tag: parseAsString,
  sort: parseAsString.withDefault("mass"),
  /** The shape in the preview. */
  at: parseAsString,
  /** Ids chosen for comparing. */
  with: parseAsArrayOf(parseAsString),
};

export type RackState = inferParserType<typeof rackParsers>;
export const loadRackState = createLoader(rackParsers);

/** What the search itself asks: the state without what is only shown. */
export type RackSearch = Omit<RackState, "at" | "with">;

export const searchOf = ({ at: _at, with: _with, ...search }: RackState): RackSearch => search;

/** A change of the search; null lets a filter go. */
export type SearchChange = Partial<{ [K in keyof RackSearch]: RackSearch[K] | null }>;

/** Query of `GET /shapes` for a search, in stored units; what is not asked is left out. */
export function queryOf(search: RackSearch): Record<string, string> {
  const query: Record<string, string> = {};
  for (const [key, value] of Object.entries(search)) {
    if (value === null || value === undefined || value === "") continue;
    if (Array.isArray(value)) {
      if (value.length > 0) query[key] = value.join(",");
    } else query[key] = String(value);
  }
  return query;
}

/** Whether anything narrows the search beyond "released, lightest first". */
export const isNarrowed = (search: RackSearch): boolean =>
  Object.entries(queryOf(search)).some(([key]) => key !== "sort" && key !== "bay");

/** A search that asks for nothing. */
export const CLEARED: { [K in keyof RackSearch]: null } = {
  ...(Object.fromEntries(RANGE_NAMES.map((name) => [name, null])) as Record<RangeName, null>),
  q: null,
  family: null,
  bay: null,
  state: null,
  job: null,
  tag: null,
  sort: null,
};
