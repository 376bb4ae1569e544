import { inFileUnit, type Comparison, type ComputedFigures } from "@/lib/intake/compare-figures";
import { CONVENTIONS } from "@/lib/intake/conventions";
import { oneDigitOff, SHIFTS, swappedDigits } from "@/lib/intake/digit-slips";
import { COMPARED_KEYS, SYMBOL, type ComparedKey } from "@/lib/intake/fields";
import { FILE_UNITS, unitsOfKind } from "@/lib/intake/file-units";
import { readNumber, type Marks } from "@/lib/intake/read-number";
import type { TypedRow } from "@/lib/intake/read-row";
import type { CauseCode, RowReason } from "@/lib/intake/row-reason";

export type Neighbours = Readonly<{ before: TypedRow | null; after: TypedRow | null }>;

type Scene = Readonly<{
  row: TypedRow;
  computed: ComputedFigures;
  comparisons: readonly Comparison[];
  neighbours: Neighbours;
  marks: Marks;
}>;
type Found = Readonly<{ cause: CauseCode; detail: string }>;

/** Values nearer than this share are the same figure written twice: half a digit in 200, finer than the gauge. */
const SAME = 0.005;
const near = (a: number, b: number, slack = SAME) => Math.abs(a - b) <= slack * Math.abs(b);

/** Why each figure outside the gauge may be so, most telling cause first; at least one reason for every such figure. */
export function likelyCauses(scene: Scene): readonly RowReason[] {
  const outside = scene.comparisons.filter((c) => !c.within);
  const found = outside.map((c) => ({ c, why: causeOf(c, scene) }));
  return found.map(({ c, why }): RowReason => {
    const root = derivedFrom(c, why, found);
    const { cause, detail } =
      root === null
        ? why
        : {
            cause: "derived" as const,
            detail: `${SYMBOL[c.key]} is off by the same share as ${SYMBOL[root]}: made from it.`,
          };
    return { verdict: "queried", cause, detail, field: c.key, column: c.column };
  });
}

/** S or r whose own slip is not found but that is off exactly as a wrong I (or A) would make it. */
function derivedFrom(
  c: Comparison,
  why: Found,
  all: readonly Readonly<{ c: Comparison; why: Found }>[],
): ComparedKey | null {
  if (why.cause !== "unexplained" && why.cause !== "just-outside") return null;
  const axis = c.key.slice(1);
  const source = all.find((o) => o.c.key === `I${axis}` || (c.key === "mass" && o.c.key === "area"));
  if (source === undefined || source.c.key === c.key) return null;
  const expected = c.key.startsWith("r") ? Math.sqrt(1 + source.c.off) - 1 : source.c.off;
  return Math.abs(expected - c.off) <= Math.max(0.005, 0.05 * Math.abs(c.off)) ? source.c.key : null;
}

function causeOf(c: Comparison, scene: Scene): Found {
  const convention = c.convention;
  if (convention !== null)
    return {
      cause: "convention",
      detail: `${CONVENTIONS[convention].label}: ${percent(c.off)} off, as such tables are.`,
    };
  return (
    unitOrShift(c, scene) ??
    digits(c, scene) ??
    exchanged(c, scene) ??
    neighbour(c, scene) ??
    (Math.abs(c.off) <= 2 * c.allowed
      ? {
          cause: "just-outside",
          detail: `${SYMBOL[c.key]} is ${percent(c.off)} off computed, just outside the gauge.`,
        }
      : {
          cause: "unexplained",
          detail: `${SYMBOL[c.key]} reads ${c.written} where ${shown(c, scene)} is computed (${percent(c.off)}).`,
        })
  );
}

const percent = (share: number) =>
  `${share >= 0 ? "+" : "\u2212"}${(Math.abs(share) * 100).toPrecision(Math.abs(share) >= 0.1 ? 3 : 2)} %`;
const shown = (c: Comparison, scene: Scene) => inFileUnit(c.computed, c.unit, c.written, scene.marks.decimal);
const slack = (c: Comparison) => Math.max(SAME, c.allowed);

function unitOrShift(c: Comparison, scene: Scene): Found | null {
  const ratio = c.tabulated / c.computed;
  const own = FILE_UNITS[c.unit];
  for (const key of unitsOfKind(own.kind)) {
    const other = FILE_UNITS[key];
    const isTen = own.kind === "length" || other.factor === own.factor;
    if (isTen || !near(c.tabulated * (other.factor / own.factor), c.computed, slack(c))) continue;
    return {
      cause: "unit",
      detail: `${SYMBOL[c.key]} reads ${c.written}: in ${other.label} it agrees (${shown(c, scene)} ${own.label} computed), but the heading says ${own.label}.`,
    };
  }
  const shift = SHIFTS.find((s) => near(ratio, s, slack(c)));
  if (shift === undefined) return null;
  const times = shift > 1 ? `${shift} times too large` : `${Math.round(1 / shift)} times too small`;
  return {
    cause: "decimal-shifted",
    detail: `${SYMBOL[c.key]} is ${times} (${shown(c, scene)} computed): the decimal mark slipped.`,
  };
}

function digits(c: Comparison, scene: Scene): Found | null {
  const agrees = (text: string, within: number) => {
    const read = readNumber(text, scene.marks);
    return read.kind === "number" && near(read.value * FILE_UNITS[c.unit].factor, c.computed, within);
  };
  const swapped = swappedDigits(c.written).find((text) => agrees(text, slack(c)));
  if (swapped !== undefined)
    return {
      cause: "digits-swapped",
      detail: `${SYMBOL[c.key]} reads ${c.written} where ${shown(c, scene)} is computed: digits swapped, ${swapped}?`,
    };
  const best = oneDigitOff(c.written)
    .filter((text) => agrees(text, SAME))
    .sort((a, b) => distance(a, c, scene) - distance(b, c, scene))[0];
  if (best === undefined || Math.abs(c.off) <= 2 * c.allowed) return null;
  return {
    cause: "one-digit",
    detail: `${SYMBOL[c.key]} reads ${c.written} where ${shown(c, scene)} is computed: one digit, ${best}?`,
  };
}

function distance(text: string, c: Comparison, scene: Scene): number {
  const read = readNumber(text, scene.marks);
  return read.kind === "number"
    ? Math.abs(read.value * FILE_UNITS[c.unit].factor - c.computed)
    : Number.POSITIVE_INFINITY;
}

const OTHER_AXIS: Record<string, string> = { x: "y", y: "x", "1": "2", "2": "1" };

function exchanged(c: Comparison, scene: Scene): Found | null {
  const partner = `${c.key.slice(0, 1)}${OTHER_AXIS[c.key.slice(1)] ?? ""}`;
  const other = COMPARED_KEYS.find((k) => k === partner);
  const otherValue = other === undefined ? null : scene.computed[other];
  if (other !== undefined && otherValue !== null && near(c.tabulated, otherValue, slack(c))) {
    const mutual = scene.comparisons.find((o) => o.key === other);
    const both = mutual !== undefined && near(mutual.tabulated, c.computed, slack(c));
    return {
      cause: "axes-exchanged",
      detail: both
        ? `${SYMBOL[c.key]} and ${SYMBOL[other]} are exchanged: the axes in this row.`
        : `${SYMBOL[c.key]} equals computed ${SYMBOL[other]}: the axes exchanged.`,
    };
  }
  const twin = COMPARED_KEYS.find(
    (k) =>
      k !== c.key &&
      sameKind(k, c.key) &&
      scene.computed[k] !== null &&
      near(c.tabulated, scene.computed[k] ?? 0, slack(c)),
  );
  if (twin === undefined) return null;
  return {
    cause: "figures-exchanged",
    detail: `${SYMBOL[c.key]} equals computed ${SYMBOL[twin]}: the two are exchanged in this row.`,
  };
}

const KIND: Record<string, string> = { I: "inertia", S: "modulus", Z: "modulus", r: "length" };
const sameKind = (a: ComparedKey, b: ComparedKey) =>
  a.length === 2 && b.length === 2 && KIND[a[0] ?? ""] === KIND[b[0] ?? ""];

function neighbour(c: Comparison, scene: Scene): Found | null {
  for (const [row, where] of [
    [scene.neighbours.before, "above"],
    [scene.neighbours.after, "below"],
  ] as const) {
    const figure = row?.figures[c.key];
    if (row === null || figure === undefined || figure.value !== c.tabulated) continue;
    return {
      cause: "neighbour-row",
      detail: `${SYMBOL[c.key]} reads ${c.written}, the figure of the row ${where} (${row.designation?.text ?? `row ${row.number}`}).`,
    };
  }
  return null;
}
