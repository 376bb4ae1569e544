import { CONVENTIONS, type ConventionCode } from "@/lib/intake/conventions";
import { COMPARED_KEYS, type ComparedKey } from "@/lib/intake/fields";
import { FILE_UNITS, type FileUnitKey } from "@/lib/intake/file-units";
import type { TypedRow } from "@/lib/intake/read-row";

/** One figure held against its computed value. Values in stored units; `off` and `allowed` are shares of the computed value. */
export type Comparison = Readonly<{
  key: ComparedKey;
  tabulated: number;
  computed: number;
  written: string;
  unit: FileUnitKey;
  column: number;
  /** (tabulated − computed) / computed. */
  off: number;
  /** The reading's tolerance plus the table's own rounding. */
  allowed: number;
  within: boolean;
  /** The convention that explains a value outside the gauge: of the reading (then it is within) or only likely. */
  convention: ConventionCode | null;
}>;

export type ComputedFigures = Readonly<Record<ComparedKey, number | null>>;

type Terms = Readonly<{
  tolerance: number;
  /** Conventions the reading names, and those that can apply to how this row's profile was built. */
  conventions: readonly ConventionCode[];
  applicable: readonly ConventionCode[];
}>;

/** Tabulated against computed, within the table's rounding plus the tolerance, or within the gap of a convention. */
export function compareFigures(
  row: TypedRow,
  computed: ComputedFigures,
  terms: Terms,
): readonly Comparison[] {
  return COMPARED_KEYS.flatMap((key): Comparison[] => {
    const measure = row.figures[key];
    const value = computed[key];
    if (measure === undefined || value === null || !(value > 0)) return [];
    const off = (measure.value - value) / value;
    const rounding = measure.half / value;
    const allowed = terms.tolerance + rounding;
    const plain = Math.abs(off) <= allowed;
    const convention = plain ? null : conventionFor(key, off, rounding, terms);
    const within = plain || (convention !== null && terms.conventions.includes(convention));
    const { written, unit, column } = measure;
    return [
      {
        key,
        tabulated: measure.value,
        computed: value,
        written,
        unit,
        column,
        off,
        allowed,
        within,
        convention,
      },
    ];
  });
}

function conventionFor(key: ComparedKey, off: number, rounding: number, terms: Terms): ConventionCode | null {
  const slack = terms.tolerance + rounding;
  const fitting = terms.applicable.filter((code) => {
    const { keys, gap } = CONVENTIONS[code];
    return keys.includes(key) && off >= gap[0] - slack && off <= gap[1] + slack;
  });
  return fitting.find((code) => terms.conventions.includes(code)) ?? fitting[0] ?? null;
}

/** The figure that is farthest beyond its gauge (as a multiple of what is allowed), or null when nothing was compared. */
export function worstOf(comparisons: readonly Comparison[]): Comparison | null {
  let worst: Comparison | null = null;
  for (const c of comparisons) {
    const rank = (x: Comparison) => (x.within ? 0 : 1e6) + Math.abs(x.off) / x.allowed;
    if (worst === null || rank(c) > rank(worst)) worst = c;
  }
  return worst;
}

export type Consistency = Readonly<{
  law: string;
  key: ComparedKey;
  /** The value the row's other figures give, stored unit. */ expected: number;
  off: number;
}>;

/** S = I/c with c of the outline, r = √(I/A), mass = A·density, from the tabulated figures alone. */
export function consistencyOf(
  row: TypedRow,
  computed: ComputedFigures,
  densityKgPerM3: number,
): readonly Consistency[] {
  const f = row.figures;
  const found: Consistency[] = [];
  const put = (law: string, key: ComparedKey, expected: number | undefined) => {
    const own = f[key]?.value;
    if (own !== undefined && expected !== undefined && expected > 0)
      found.push({ law, key, expected, off: (own - expected) / expected });
  };
  for (const axis of ["x", "y"] as const) {
    const [I, S, r] = [f[`I${axis}`]?.value, f[`S${axis}`]?.value, f[`r${axis}`]?.value];
    const [cI, cS] = [computed[`I${axis}`], computed[`S${axis}`]];
    const c = cI !== null && cS !== null && cS > 0 ? cI / cS : undefined;
    put(`S${axis}·c`, `I${axis}`, S !== undefined && c !== undefined ? S * c : undefined);
    put(
      `A·r${axis}²`,
      `I${axis}`,
      f.area !== undefined && r !== undefined ? f.area.value * r * r : undefined,
    );
    put(`I${axis}/c`, `S${axis}`, I !== undefined && c !== undefined ? I / c : undefined);
  }
  put("A·density", "mass", f.area === undefined ? undefined : f.area.value * densityKgPerM3 * 1e-6);
  return found;
}

/** A stored value in the file's unit, with the decimals the table writes and its decimal mark. */
export function inFileUnit(value: number, unit: FileUnitKey, like: string, decimalMark: "," | "."): string {
  const decimals = /[.,](\d+)$/.exec(like.trim())?.[1]?.length ?? 0;
  const scaled = value / FILE_UNITS[unit].factor;
  const shown = scaled.toFixed(Math.min(decimals === 3 && Math.abs(scaled) > 1000 ? 0 : decimals, 6));
  return decimalMark === "," ? shown.replace(".", ",") : shown;
}
