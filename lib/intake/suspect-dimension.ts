import { computeProperties } from "@/lib/drawing/compute-properties";
import { compareFigures, type Comparison } from "@/lib/intake/compare-figures";
import { oneDigitOff, SHIFTS, swappedDigits } from "@/lib/intake/digit-slips";
import type { FamilyFound } from "@/lib/intake/family-of-row";
import { COMPARED_KEYS, DIMENSION_KEYS, FIELDS, type DimensionKey } from "@/lib/intake/fields";
import { FILE_UNITS } from "@/lib/intake/file-units";
import type { Neighbours } from "@/lib/intake/likely-cause";
import { profileOfRow } from "@/lib/intake/profile-of-row";
import { readNumber } from "@/lib/intake/read-number";
import type { Measure, TypedRow } from "@/lib/intake/read-row";
import type { RowReason } from "@/lib/intake/row-reason";
import type { Reading } from "@/lib/intake/schema";
import { stockDrawing } from "@/lib/intake/stock-drawing";

type Trial = Readonly<{ written: string; value: number; how: string }>;

/**
 * When most figures disagree, the figures are right and a dimension is wrong: searches the slips of each dimension (digits
 * swapped, decimal shifted, a neighbour row's, one digit) for the first with which every figure agrees. Costs up to a few
 * hundred computations; @returns null when fewer than three figures disagree or nothing fits.
 */
export function suspectDimension(
  row: TypedRow,
  found: FamilyFound,
  comparisons: readonly Comparison[],
  reading: Reading,
  neighbours: Neighbours,
): RowReason | null {
  const outside = comparisons.filter((c) => !c.within && c.convention === null).length;
  if (outside < 3 || outside * 2 < comparisons.length) return null;
  for (const key of DIMENSION_KEYS) {
    const measure = row.dimensions[key];
    if (measure === undefined) continue;
    for (const trial of trialsOf(key, measure, reading, neighbours)) {
      if (!agreesWith(row, found, key, { ...measure, value: trial.value }, reading)) continue;
      return {
        verdict: "queried",
        cause: "dimension",
        detail: `${outside} figures disagree with the dimensions. With ${FIELDS[key].label.toLowerCase()} ${trial.written} instead of ${measure.written} all agree: ${trial.how}?`,
        field: key,
        column: measure.column,
      };
    }
  }
  return null;
}

function trialsOf(
  key: DimensionKey,
  measure: Measure,
  reading: Reading,
  neighbours: Neighbours,
): readonly Trial[] {
  const factor = FILE_UNITS[measure.unit].factor;
  const typed = (written: string, how: string): Trial[] => {
    const read = readNumber(written, reading.marks);
    return read.kind === "number" && read.value > 0 ? [{ written, value: read.value * factor, how }] : [];
  };
  const beside = [neighbours.before, neighbours.after].flatMap((row): Trial[] => {
    const other = row?.dimensions[key];
    return other === undefined || other.value === measure.value
      ? []
      : [{ written: other.written, value: other.value, how: "a neighbour row" }];
  });
  return [
    ...swappedDigits(measure.written).flatMap((w) => typed(w, "digits swapped")),
    ...SHIFTS.map((s) => ({
      written: String((measure.value * s) / factor),
      value: measure.value * s,
      how: "decimal shifted",
    })),
    ...beside,
    ...oneDigitOff(measure.written).flatMap((w) => typed(w, "one digit")),
  ];
}

function agreesWith(
  row: TypedRow,
  found: FamilyFound,
  key: DimensionKey,
  measure: Measure,
  reading: Reading,
): boolean {
  const mended: TypedRow = { ...row, dimensions: { ...row.dimensions, [key]: measure } };
  const built = profileOfRow(mended, found);
  if (!built.ok) return false;
  const result = computeProperties(stockDrawing(built.value.profile, "trial", reading.material));
  if (!result.ok) return false;
  const properties = result.value;
  const computed = Object.fromEntries(COMPARED_KEYS.map((k) => [k, properties[k]]));
  const comparisons = compareFigures(mended, computed as Parameters<typeof compareFigures>[1], {
    ...reading,
    applicable: built.value.applicable,
  });
  return comparisons.length >= 3 && comparisons.every((c) => c.within);
}
