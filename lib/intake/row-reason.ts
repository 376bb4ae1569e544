import type { FieldKey } from "@/lib/intake/fields";

/** Likely causes, each with its words: what filters, counts and the query file speak of. */
export const CAUSES = {
  quotes: "quotation mark never closed",
  fields: "too many or too few fields",
  cell: "cell too long",
  designation: "designation",
  duplicate: "designation twice in the file",
  "on-rack": "designation held on the Rack",
  blank: "blank figure",
  "not-a-number": "text in a number",
  "out-of-range": "outside the range",
  sign: "sign",
  ambiguous: "thousands or decimal mark",
  "decimal-mark": "other decimal mark",
  family: "family not known",
  "missing-dimension": "dimension missing",
  geometry: "dimensions do not fit",
  "digits-swapped": "digits swapped",
  "one-digit": "one digit",
  "decimal-shifted": "decimal shifted",
  unit: "unit",
  "axes-exchanged": "axes exchanged",
  "figures-exchanged": "figures exchanged",
  "neighbour-row": "neighbour row",
  dimension: "a dimension",
  derived: "made from another figure",
  "no-figures": "nothing tabulated to compare",
  convention: "convention of the table",
  "just-outside": "just outside the gauge",
  unexplained: "no cause found",
} as const;

export type CauseCode = keyof typeof CAUSES;
// Safe cast: Object.keys of a literal object gives exactly its keys.
export const CAUSE_CODES = Object.keys(CAUSES) as readonly CauseCode[];

export const VERDICTS = ["accepted", "queried", "refused"] as const;
export type Verdict = (typeof VERDICTS)[number];

/** Why a row is queried or refused; `column` counts from 1. */
export type RowReason = Readonly<{
  verdict: "queried" | "refused";
  cause: CauseCode;
  detail: string;
  field?: FieldKey;
  column?: number;
}>;

export const verdictOf = (reasons: readonly RowReason[]): Verdict =>
  reasons.some((r) => r.verdict === "refused") ? "refused" : reasons.length > 0 ? "queried" : "accepted";
