import type { UnitKind } from "@/lib/intake/file-units";

type Field = Readonly<{ role: "text" | "dimension" | "property"; label: string; kind: UnitKind | null }>;

const text = (label: string): Field => ({ role: "text", label, kind: null });
const size = (label: string): Field => ({ role: "dimension", label, kind: "length" });
const figure = (label: string, kind: UnitKind): Field => ({ role: "property", label, kind });

/** What a column of a table can go to. Property fields carry the keys of the property record; x is the strong axis of the table. */
export const FIELDS = {
  designation: text("Designation"),
  series: text("Series"),
  standard: text("Standard"),
  note: text("Kept as a note"),
  depth: size("Depth"),
  width: size("Width"),
  webThickness: size("Web thickness"),
  flangeThickness: size("Flange thickness"),
  thickness: size("Thickness"),
  nominalThickness: size("Nominal wall"),
  rootRadius: size("Root radius"),
  toeRadius: size("Toe radius"),
  outerRadius: size("Outer radius"),
  innerRadius: size("Inner radius"),
  kDesign: size("k for design"),
  diameter: size("Diameter"),
  lip: size("Lip"),
  flangeSlope: { role: "dimension", label: "Flange slope", kind: "slope" },
  mass: figure("Mass", "mass"),
  area: figure("Area A", "area"),
  Ix: figure("Second moment Ix", "inertia"),
  Iy: figure("Second moment Iy", "inertia"),
  I1: figure("Principal second moment I1", "inertia"),
  I2: figure("Principal second moment I2", "inertia"),
  Sx: figure("Elastic modulus Sx", "modulus"),
  Sy: figure("Elastic modulus Sy", "modulus"),
  S1: figure("Elastic modulus S1", "modulus"),
  S2: figure("Elastic modulus S2", "modulus"),
  Zx: figure("Plastic modulus Zx", "modulus"),
  Zy: figure("Plastic modulus Zy", "modulus"),
  rx: figure("Radius of gyration rx", "length"),
  ry: figure("Radius of gyration ry", "length"),
  r1: figure("Radius of gyration r1", "length"),
  r2: figure("Radius of gyration r2", "length"),
  J: figure("Torsion constant J", "inertia"),
  Cw: figure("Warping constant Cw", "warping"),
} as const satisfies Record<string, Field>;

export type FieldKey = keyof typeof FIELDS;

// Safe cast: Object.keys of a literal object gives exactly its keys.
export const FIELD_KEYS = Object.keys(FIELDS) as readonly FieldKey[];

export const DIMENSION_KEYS = [
  "depth",
  "width",
  "webThickness",
  "flangeThickness",
  "thickness",
  "nominalThickness",
  "rootRadius",
  "toeRadius",
  "outerRadius",
  "innerRadius",
  "kDesign",
  "diameter",
  "lip",
  "flangeSlope",
] as const satisfies readonly FieldKey[];
export type DimensionKey = (typeof DIMENSION_KEYS)[number];

/** Figures compared with the computed ones. */
export const COMPARED_KEYS = [
  "mass",
  "area",
  "Ix",
  "Sx",
  "Zx",
  "rx",
  "Iy",
  "Sy",
  "Zy",
  "ry",
  "I1",
  "S1",
  "r1",
  "I2",
  "S2",
  "r2",
] as const satisfies readonly FieldKey[];
export type ComparedKey = (typeof COMPARED_KEYS)[number];

/** Figures taken from the table and not compared: printed torsion and warping constants of rolled shapes are formulas. */
export const UNCOMPARED_KEYS = ["J", "Cw"] as const satisfies readonly FieldKey[];
export type UncomparedKey = (typeof UNCOMPARED_KEYS)[number];
export type FigureKey = ComparedKey | UncomparedKey;
export const FIGURE_KEYS: readonly FigureKey[] = [...COMPARED_KEYS, ...UNCOMPARED_KEYS];

const among =
  <T extends string>(keys: readonly T[]) =>
  (key: string): key is T =>
    (keys as readonly string[]).includes(key);

export const isDimension = among(DIMENSION_KEYS);
export const isFigure = among(FIGURE_KEYS);
export const isCompared = among(COMPARED_KEYS);

/** Symbol shown for a field in tables and reasons, in code notation. */
export const SYMBOL: Record<FieldKey, string> = {
  designation: "designation",
  series: "series",
  standard: "standard",
  note: "note",
  depth: "h",
  width: "b",
  webThickness: "tw",
  flangeThickness: "tf",
  thickness: "t",
  nominalThickness: "t nominal",
  rootRadius: "r",
  toeRadius: "r toe",
  outerRadius: "r outer",
  innerRadius: "r inner",
  kDesign: "k",
  diameter: "D",
  lip: "c",
  flangeSlope: "slope",
  mass: "m",
  area: "A",
  Ix: "Ix",
  Iy: "Iy",
  I1: "I1",
  I2: "I2",
  Sx: "Sx",
  Sy: "Sy",
  S1: "S1",
  S2: "S2",
  Zx: "Zx",
  Zy: "Zy",
  rx: "rx",
  ry: "ry",
  r1: "r1",
  r2: "r2",
  J: "J",
  Cw: "Cw",
};
