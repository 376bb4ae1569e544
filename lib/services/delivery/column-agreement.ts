import "server-only";
import { isCompared, type FieldKey } from "@/lib/intake/fields";
import { FILE_UNITS, unitsOfKind, type FileUnitKey } from "@/lib/intake/file-units";
import type { Inspection } from "@/lib/intake/inspect-row";

/** Rows whose agreement is shown beside each column. */
const ROWS = 50;
/** A column whose rows are all this near to one factor was written in another unit. */
const SPREAD = 0.03;

type Found = Readonly<{ worst: number | null; compared: number; suggestion: FileUnitKey | null }>;

/** How the first fifty rows of each column agree with what was computed, and the unit in which they would. */
export class ColumnAgreement {
  private readonly ratios = new Map<FieldKey, number[]>();

  add(inspection: Inspection): void {
    for (const { key, tabulated, computed } of inspection.comparisons) {
      const known = this.ratios.get(key) ?? [];
      if (known.length >= ROWS) continue;
      known.push(tabulated / computed);
      this.ratios.set(key, known);
    }
  }

  of(field: FieldKey, unit: FileUnitKey | null): Found {
    const ratios = isCompared(field) ? (this.ratios.get(field) ?? []) : [];
    if (ratios.length === 0 || unit === null) return { worst: null, compared: 0, suggestion: null };
    const worst = Math.max(...ratios.map((r) => Math.abs(r - 1)));
    const median = [...ratios].sort((a, b) => a - b)[ratios.length >> 1] ?? 1;
    const own = FILE_UNITS[unit];
    const suggestion =
      Math.abs(median - 1) <= SPREAD
        ? undefined
        : unitsOfKind(own.kind).find(
            (other) => Math.abs((median * FILE_UNITS[other].factor) / own.factor - 1) <= SPREAD,
          );
    return { worst, compared: ratios.length, suggestion: suggestion ?? null };
  }
}
