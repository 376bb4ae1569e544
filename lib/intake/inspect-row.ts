import { computeProperties } from "@/lib/drawing/compute-properties";
import type { Drawing } from "@/lib/drawing/schema";
import type { Family, Profile } from "@/lib/profiles/families";
import {
  compareFigures,
  consistencyOf,
  inFileUnit,
  worstOf,
  type Comparison,
  type ComputedFigures,
  type Consistency,
} from "@/lib/intake/compare-figures";
import {
  COMPARED_KEYS,
  SYMBOL,
  UNCOMPARED_KEYS,
  isCompared,
  type FieldKey,
  type UncomparedKey,
} from "@/lib/intake/fields";
import { FILE_UNITS, type FileUnitKey } from "@/lib/intake/file-units";
import { familyOfRow, type FamilyFound } from "@/lib/intake/family-of-row";
import { likelyCauses, type Neighbours } from "@/lib/intake/likely-cause";
import { profileOfRow, type ProfileBuilt } from "@/lib/intake/profile-of-row";
import type { AmbiguousMeasure, TypedRow } from "@/lib/intake/read-row";
import { verdictOf, type RowReason, type Verdict } from "@/lib/intake/row-reason";
import type { Reading } from "@/lib/intake/schema";
import { STOCK_MATERIAL, stockDrawing } from "@/lib/intake/stock-drawing";
import { suspectDimension } from "@/lib/intake/suspect-dimension";
import type { SectionProperties } from "@/lib/section/properties";

/** One row inspected: what it says, what was computed from it, how the two agree, and why it is queried or refused. */
export type Inspection = Readonly<{
  number: number;
  line: number;
  designation: string;
  designationKey: string;
  series: string;
  standard: string;
  family: Family | null;
  profile: Profile | null;
  /** What was taken from a standard because the table does not print it. */
  built: readonly string[];
  nominalWallMm: number | null;
  properties: SectionProperties | null;
  comparisons: readonly Comparison[];
  /** Taken from the table and not compared (J, Cw): printed values are formulas, not solutions. */
  uncompared: readonly Readonly<{
    key: UncomparedKey;
    tabulated: number;
    written: string;
    unit: FileUnitKey;
  }>[];
  consistency: readonly Consistency[];
  /** Key of the figure farthest from its gauge. */
  worst: Comparison | null;
  reasons: readonly RowReason[];
  verdict: Verdict;
}>;

export type InspectOptions = Readonly<{
  neighbours: Neighbours;
  /** Whether slips in dimensions are searched for (costs many computations). */ deep: boolean;
}>;

/** Computes a typed row from its dimensions and compares. Pure; never throws on what a row says. */
export function inspectRow(row: TypedRow, reading: Reading, options: InspectOptions): Inspection {
  const reasons: RowReason[] = [...row.reasons];
  const designation = row.designation?.text ?? "";
  const found = familyOfRow(row.series, designation, reading.family);
  if (found === null && !broken(row))
    reasons.push({
      verdict: "refused",
      cause: "family",
      detail: "Neither the series nor the designation tells the family: choose one for this table.",
      field: "series",
    });
  const built = found === null || broken(row) ? null : build(row, found, reasons);
  const properties = built === null ? null : compute(built, designation, reading, reasons);
  const computed = properties === null ? null : computedFigures(properties);
  const comparisons =
    computed === null || built === null
      ? []
      : compareFigures(row, computed, { ...reading, applicable: built.applicable });
  if (computed !== null && built !== null && found !== null) {
    row.ambiguous.forEach((a) => reasons.push(ambiguousReason(a, computed, reading)));
    const slip = options.deep ? suspectDimension(row, found, comparisons, reading, options.neighbours) : null;
    const marks = reading.marks ?? { decimal: ".", thousands: null };
    reasons.push(
      ...(slip === null
        ? likelyCauses({ row, computed, comparisons, neighbours: options.neighbours, marks })
        : [slip]),
    );
    if (comparisons.length === 0 && reasons.length === 0) reasons.push(NOTHING_COMPARED);
    if (row.blanks.includes("area")) reasons.push(blankReason("area", computed, reading));
  } else row.ambiguous.forEach((a) => reasons.push(ambiguousReason(a, null, reading)));
  return {
    number: row.number,
    line: row.line,
    designation,
    designationKey: row.designation?.key ?? "",
    series: row.series,
    standard: row.standard,
    family: found?.family ?? null,
    profile: built?.profile ?? null,
    built: built?.built ?? [],
    nominalWallMm: built?.nominalWallMm ?? null,
    properties,
    comparisons,
    uncompared: UNCOMPARED_KEYS.flatMap((key) => {
      const measure = row.figures[key];
      return measure === undefined
        ? []
        : [{ key, tabulated: measure.value, written: measure.written, unit: measure.unit }];
    }),
    consistency:
      computed === null ? [] : consistencyOf(row, computed, STOCK_MATERIAL[reading.material].density),
    worst: worstOf(comparisons),
    reasons,
    verdict: verdictOf(reasons),
  };
}

const NOTHING_COMPARED: RowReason = {
  verdict: "queried",
  cause: "no-figures",
  detail:
    "No figure is printed beside the dimensions: it was drawn and computed, but nothing could be checked.",
};

/** A row whose fields cannot be told apart: computing it would only add noise to the one reason that matters. */
const broken = (row: TypedRow) =>
  row.reasons.some(
    (r) => r.verdict === "refused" && (r.cause === "quotes" || r.cause === "fields" || r.cause === "cell"),
  );

function build(row: TypedRow, found: FamilyFound, reasons: RowReason[]): ProfileBuilt | null {
  const built = profileOfRow(row, found);
  if (built.ok) return built.value;
  const known =
    built.error.field !== undefined &&
    (reasons.some((r) => r.field === built.error.field) ||
      row.ambiguous.some((a) => a.field === built.error.field));
  if (!known) reasons.push(built.error);
  return null;
}

export const drawingOf = (
  profile: Profile,
  designation: string,
  reading: Pick<Reading, "material">,
): Drawing => stockDrawing(profile, designation === "" ? "Unnamed" : designation, reading.material);

function compute(
  built: ProfileBuilt,
  designation: string,
  reading: Reading,
  reasons: RowReason[],
): SectionProperties | null {
  const result = computeProperties(drawingOf(built.profile, designation, reading));
  if (result.ok) return result.value;
  reasons.push({
    verdict: "refused",
    cause: "geometry",
    detail: `The dimensions do not fit: ${result.error.map((f) => f.detail).join(" ")}`,
  });
  return null;
}

export function computedFigures(properties: SectionProperties): ComputedFigures {
  return Object.fromEntries(COMPARED_KEYS.map((key) => [key, properties[key]])) as ComputedFigures; // safe: every compared key is a scalar key of the properties
}

function ambiguousReason(a: AmbiguousMeasure, computed: ComputedFigures | null, reading: Reading): RowReason {
  const [small, large] = a.readings;
  const label = FILE_UNITS[small.unit].label;
  const factor = FILE_UNITS[small.unit].factor;
  const value = computed !== null && isCompared(a.field) ? computed[a.field] : null;
  const agrees =
    value === null
      ? undefined
      : a.readings.find((m) => Math.abs(m.value - value) <= reading.tolerance * value + m.half);
  const says = agrees === undefined ? "" : ` ${agrees.value / factor} agrees with what is computed.`;
  return {
    verdict: "queried",
    cause: "ambiguous",
    detail: `${SYMBOL[a.field]} reads ${small.written}: ${small.value / factor} or ${large.value / factor} ${label}?${says}`,
    field: a.field,
    column: small.column,
  };
}

export function blankReason(field: FieldKey, computed: ComputedFigures, reading: Reading): RowReason {
  const column = reading.columns.findIndex((c) => c.field === field);
  const unit = reading.columns[column]?.unit ?? null;
  const value = isCompared(field) ? computed[field] : null;
  const says =
    value === null || unit === null
      ? ""
      : `; ${inFileUnit(value, unit, "0.00", reading.marks?.decimal ?? ".")} ${FILE_UNITS[unit].label} is computed`;
  return {
    verdict: "queried",
    cause: "blank",
    detail: `${SYMBOL[field]} is blank, where other rows have it${says}.`,
    field,
    column: column + 1,
  };
}
