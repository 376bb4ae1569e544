import { FIELDS, type FieldKey } from "@/lib/intake/fields";
import { FILE_UNITS, readUnit, unitsOfKind, type FileUnitKey, type UnitKind } from "@/lib/intake/file-units";
import { meaningOf, splitHeading, type Axis, type Meaning, type Quantity } from "@/lib/intake/headings";

export type ColumnFound = Readonly<{
  heading: string;
  field: FieldKey;
  unit: FileUnitKey | null;
  /** Why it goes there, and what its axis letter means; "" for a column kept as a note. */
  evidence: string;
  /** Set where a unit or an axis could not be told: a person has to. */
  question: string | null;
}>;

export type ColumnsFound = Readonly<{ columns: readonly ColumnFound[]; axes: string | null }>;

export const kindOf = (field: FieldKey): UnitKind | null => FIELDS[field].kind;

type AxisMap = Readonly<Partial<Record<Axis, "x" | "y" | "1" | "2">>>;
type Axes = Readonly<{ map: AxisMap; says: string | null }>;

/** Which axis letters the table uses decides what they mean: y with z is the notation y–z, x with y the notation x–y. */
function axesOf(letters: ReadonlySet<Axis>): Axes {
  const words = { strong: "x", weak: "y", u: "1", v: "2" } as const;
  if (letters.has("y") && letters.has("z") && !letters.has("x"))
    return { map: { ...words, y: "x", z: "y" }, says: "the file's y–y is our x–x, its z–z our y–y" };
  if (letters.has("x"))
    return { map: { ...words, x: "x", y: "y", z: "2" }, says: "the file writes x–x and y–y as we do" };
  return { map: words, says: null };
}

const fieldAbout = (quantity: Quantity, axis: "x" | "y" | "1" | "2"): FieldKey | null => {
  const key = `${quantity}${axis}`;
  return key in FIELDS ? (key as FieldKey) : null;
};

/**
 * Headings (and a line of units under them, where there is one) to fields. The first column that claims a field has it; a later
 * one is kept as a note and says so. Units not written are taken from the table's own system when other columns show it.
 */
export function recogniseColumns(headings: readonly string[], units: readonly string[] | null): ColumnsFound {
  const parts = headings.map((heading, i) => {
    const split = splitHeading(heading);
    const below = units === null ? null : readUnit(units[i] ?? "");
    return { name: split.name, unit: split.unit ?? below };
  });
  const meanings = parts.map((part) => meaningOf(part, kindOf));
  const letters = new Set(meanings.flatMap((m) => (m.kind === "about" && m.axis !== "" ? [m.axis] : [])));
  const axes = axesOf(letters);
  const moduliByW = parts.some((part, i) => /^W/i.test(part.name) && aboutModulus(meanings[i]));
  const principal = meanings.some(
    (m) => m.kind === "about" && m.quantity === "I" && (m.axis === "u" || m.axis === "v"),
  );
  const named = meanings.map((m, i) => settle(m, parts[i]?.name ?? "", axes, { moduliByW, principal }));
  const system = systemOf(parts.map((p) => p.unit));
  const taken = new Map<FieldKey, number>();
  preferences(named, parts).forEach((i) => {
    const field = named[i]?.field;
    if (field !== undefined && field !== "note" && !taken.has(field)) taken.set(field, i);
  });
  const columns = headings.map((heading, i): ColumnFound => {
    const found = named[i] ?? { field: "note" as const, evidence: "", question: null };
    if (found.field !== "note" && taken.get(found.field) !== i) {
      const first = headings[taken.get(found.field) ?? 0] ?? "";
      return {
        heading,
        field: "note",
        unit: null,
        evidence: `${FIELDS[found.field].label} is taken from ${first}`,
        question: null,
      };
    }
    return { heading, ...withUnit(found, parts[i]?.unit ?? null, system) };
  });
  return { columns, axes: letters.size === 0 ? null : axes.says };
}

const aboutModulus = (m: Meaning | undefined) =>
  m?.kind === "about" && (m.quantity === "S" || m.quantity === "Z");

type Settled = Readonly<{ field: FieldKey; evidence: string; question: string | null }>;
const NOTE: Settled = { field: "note", evidence: "", question: null };

function settle(
  meaning: Meaning,
  name: string,
  axes: Axes,
  table: Readonly<{ moduliByW: boolean; principal: boolean }>,
): Settled {
  if (meaning.kind === "unknown") return NOTE;
  const radius = /^r([12])$/.exec(name.trim());
  if (radius !== null && table.principal)
    return {
      field: radius[1] === "1" ? "r1" : "r2",
      evidence: "beside I1 and I2 it is a radius of gyration",
      question: null,
    };
  if (meaning.kind === "field") return { field: meaning.field, evidence: meaning.evidence, question: null };
  if (meaning.quantity === "S" && table.moduliByW && /^S/.test(name))
    return { ...NOTE, evidence: "beside W, S is the first moment of half the section" };
  const axis = axes.map[meaning.axis];
  if (axis === undefined)
    return {
      ...NOTE,
      question: `${name}: the axis is not clear from the headings, choose strong (x–x) or weak (y–y)`,
    };
  const field = fieldAbout(meaning.quantity, axis);
  if (field === null) return NOTE;
  const renamed =
    meaning.axis === axis || meaning.axis === ""
      ? ""
      : `; the file's ${meaning.axis}–${meaning.axis} is our ${axis}–${axis}`;
  return { field, evidence: `${meaning.evidence}${renamed}`, question: null };
}

/** Order in which columns claim fields: "h" before "d" (which is then the straight part of the web), else from left to right. */
function preferences(
  named: readonly Settled[],
  parts: readonly Readonly<{ name: string }>[],
): readonly number[] {
  const rank = (i: number) => (named[i]?.field === "depth" && /^d$/.test(parts[i]?.name ?? "") ? 1 : 0);
  return named.map((_, i) => i).sort((a, b) => rank(a) - rank(b) || a - b);
}

type System = "metric" | "inch" | null;

function systemOf(units: readonly (FileUnitKey | null)[]): System {
  const systems = new Set(
    units.flatMap((u) => (u === null ? [] : [FILE_UNITS[u].system])).filter((s) => s !== "any"),
  );
  if (systems.size !== 1) return null;
  return systems.has("metric") ? "metric" : "inch";
}

/** What tables of one system usually print; used only when other columns of the file show the system. */
const USUAL: Record<"metric" | "inch", Partial<Record<UnitKind, FileUnitKey>>> = {
  metric: {
    length: "mm",
    area: "cm2",
    modulus: "cm3",
    inertia: "cm4",
    warping: "cm6",
    mass: "kg/m",
    slope: "ratio",
  },
  inch: {
    length: "in",
    area: "in2",
    modulus: "in3",
    inertia: "in4",
    warping: "in6",
    mass: "lb/ft",
    slope: "ratio",
  },
};

function withUnit(found: Settled, written: FileUnitKey | null, system: System) {
  const kind = kindOf(found.field);
  if (kind === null) return { ...found, unit: null };
  if (written !== null && FILE_UNITS[written].kind === kind) return { ...found, unit: written };
  const radius = /^r[xy12]$/.test(found.field);
  const usual =
    system === null ? undefined : radius && system === "metric" ? ("cm" as const) : USUAL[system][kind];
  if (usual !== undefined && unitsOfKind(kind).includes(usual))
    return {
      ...found,
      unit: usual,
      evidence: `${found.evidence}; no unit written, ${FILE_UNITS[usual].label} as the other columns suggest`,
    };
  return { ...found, unit: null, question: found.question ?? `${found.field}: no unit is written` };
}
