import { UNITS } from "@/lib/units/conversion";

export type UnitKind =
  "length" | "area" | "modulus" | "inertia" | "warping" | "mass" | "slope" | "angle" | "surface";

type FileUnit = Readonly<{
  kind: UnitKind;
  label: string;
  factor: number;
  system: "metric" | "inch" | "any";
}>;

/** Units as tables write them, each with its dimension. */
export const FILE_UNITS = {
  mm: { kind: "length", label: "mm", factor: UNITS.mm.toStored, system: "metric" },
  cm: { kind: "length", label: "cm", factor: UNITS.cm.toStored, system: "metric" },
  m: { kind: "length", label: "m", factor: UNITS.m.toStored, system: "metric" },
  in: { kind: "length", label: "in", factor: UNITS.in.toStored, system: "inch" },
  mm2: { kind: "area", label: "mm²", factor: UNITS.mm2.toStored, system: "metric" },
  cm2: { kind: "area", label: "cm²", factor: UNITS.cm2.toStored, system: "metric" },
  in2: { kind: "area", label: "in²", factor: UNITS.in2.toStored, system: "inch" },
  mm3: { kind: "modulus", label: "mm³", factor: UNITS.mm3.toStored, system: "metric" },
  "10^3mm3": { kind: "modulus", label: "10³ mm³", factor: UNITS["E3 mm3"].toStored, system: "metric" },
  cm3: { kind: "modulus", label: "cm³", factor: UNITS.cm3.toStored, system: "metric" },
  in3: { kind: "modulus", label: "in³", factor: UNITS.in3.toStored, system: "inch" },
  mm4: { kind: "inertia", label: "mm⁴", factor: UNITS.mm4.toStored, system: "metric" },
  "10^4mm4": { kind: "inertia", label: "10⁴ mm⁴", factor: 1e4 * UNITS.mm4.toStored, system: "metric" },
  "10^6mm4": { kind: "inertia", label: "10⁶ mm⁴", factor: UNITS["E6 mm4"].toStored, system: "metric" },
  cm4: { kind: "inertia", label: "cm⁴", factor: UNITS.cm4.toStored, system: "metric" },
  in4: { kind: "inertia", label: "in⁴", factor: UNITS.in4.toStored, system: "inch" },
  mm6: { kind: "warping", label: "mm⁶", factor: UNITS.mm6.toStored, system: "metric" },
  "10^9mm6": { kind: "warping", label: "10⁹ mm⁶", factor: UNITS["E9 mm6"].toStored, system: "metric" },
  cm6: { kind: "warping", label: "cm⁶", factor: UNITS.cm6.toStored, system: "metric" },
  "10^3cm6": { kind: "warping", label: "10³ cm⁶", factor: 1e3 * UNITS.cm6.toStored, system: "metric" },
  dm6: { kind: "warping", label: "dm⁶", factor: 1e6 * UNITS.cm6.toStored, system: "metric" },
  in6: { kind: "warping", label: "in⁶", factor: UNITS.in6.toStored, system: "inch" },
  "kg/m": { kind: "mass", label: "kg/m", factor: UNITS["kg/m"].toStored, system: "metric" },
  "lb/ft": { kind: "mass", label: "lb/ft", factor: UNITS["lb/ft"].toStored, system: "inch" },
  ratio: { kind: "slope", label: "rise/run", factor: 1, system: "any" },
  "%": { kind: "slope", label: "%", factor: UNITS["%"].toStored, system: "any" },
  deg: { kind: "angle", label: "°", factor: UNITS.deg.toStored, system: "any" },
  "m2/m": { kind: "surface", label: "m²/m", factor: UNITS["m2/m"].toStored, system: "metric" },
} as const satisfies Record<string, FileUnit>;

export type FileUnitKey = keyof typeof FILE_UNITS;

// Safe cast: Object.keys of a literal object gives exactly its keys.
export const FILE_UNIT_KEYS = Object.keys(FILE_UNITS) as readonly FileUnitKey[];

export const unitsOfKind = (kind: UnitKind): readonly FileUnitKey[] =>
  FILE_UNIT_KEYS.filter((key) => FILE_UNITS[key].kind === kind);

const SUPERSCRIPTS: Record<string, string> = { "²": "2", "³": "3", "⁴": "4", "⁵": "5", "⁶": "6", "⁹": "9" };

const SPELLINGS = new Map<string, FileUnitKey>(
  Object.entries<FileUnitKey>({
    ...Object.fromEntries(FILE_UNIT_KEYS.map((key) => [key.replace("^", ""), key])),
    inch: "in",
    inches: "in",
    '"': "in",
    zoll: "in",
    pouce: "in",
    kgm: "kg/m",
    kgperm: "kg/m",
    "kgm-1": "kg/m",
    "kg/ml": "kg/m",
    "kg/lfm": "kg/m",
    lbft: "lb/ft",
    "lbs/ft": "lb/ft",
    "lb/lf": "lb/ft",
    plf: "lb/ft",
    "#/ft": "lb/ft",
    sqin: "in2",
    cuin: "in3",
    "cm6/1000": "10^3cm6",
    "1000cm6": "10^3cm6",
    "103cm6": "10^3cm6",
    "109mm6": "10^9mm6",
    "106mm4": "10^6mm4",
    "104mm4": "10^4mm4",
    "103mm3": "10^3mm3",
    "°": "deg",
  }),
);

/** "cm⁴", "[in.^4]", "10³ cm⁶", "kg / m": the unit it is, or null. */
export function readUnit(text: string): FileUnitKey | null {
  const plain = text
    .toLowerCase()
    .replace(/[²³⁴⁵⁶⁹]/g, (c) => SUPERSCRIPTS[c] ?? c)
    .replace(/\*\*/g, "^")
    .replace(/[\s[\](){}^.×x*·_]/g, "");
  return SPELLINGS.get(plain) ?? null;
}
