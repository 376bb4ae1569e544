import type { PropertyKey } from "@/lib/units/property-units";
import type { Notation } from "@/lib/units/settings";

/** A symbol: the letter in italics, the index lowered. */
export type PropertySymbol = Readonly<{ letter: string; index: string }>;

const s = (letter: string, index = ""): PropertySymbol => ({ letter, index });

/** Symbols with axes x–x (strong, horizontal) and y–y: S elastic, Z plastic, r radius of gyration. */
const S_Z_R: Record<PropertyKey, PropertySymbol> = {
  area: s("A"),
  "perimeter.outer": s("u"),
  "perimeter.inner": s("u", "in"),
  mass: s("m"),
  surface: s("U"),
  "centroid.x": s("x\u0304"),
  "centroid.y": s("y\u0304"),
  "extents.xMin": s("x", "min"),
  "extents.xMax": s("x", "max"),
  "extents.yMin": s("y", "min"),
  "extents.yMax": s("y", "max"),
  Ix: s("I", "x"),
  Iy: s("I", "y"),
  Ixy: s("I", "xy"),
  I1: s("I", "1"),
  I2: s("I", "2"),
  angle: s("α"),
  SxTop: s("S", "x,top"),
  SxBottom: s("S", "x,bot"),
  SyLeft: s("S", "y,left"),
  SyRight: s("S", "y,right"),
  Sx: s("S", "x"),
  Sy: s("S", "y"),
  S1: s("S", "1"),
  S2: s("S", "2"),
  Zx: s("Z", "x"),
  Zy: s("Z", "y"),
  Z1: s("Z", "1"),
  Z2: s("Z", "2"),
  "pna.x": s("x", "p"),
  "pna.y": s("y", "p"),
  "Mp.x": s("M", "px"),
  "Mp.y": s("M", "py"),
  squash: s("N", "p"),
  rx: s("r", "x"),
  ry: s("r", "y"),
  r1: s("r", "1"),
  r2: s("r", "2"),
  J: s("J"),
  Cw: s("C", "w"),
  "shearCentre.x": s("x", "s"),
  "shearCentre.y": s("y", "s"),
  Avx: s("A", "vx"),
  Avy: s("A", "vy"),
  betaX: s("β", "x"),
  betaY: s("β", "y"),
  r0: s("r", "0"),
};

/**
 * Symbols with axes y–y (strong, horizontal) and z–z, principal u–u and v–v: Wel elastic, Wpl plastic, i radius of gyration,
 * It and Iw for torsion and warping. The axis letters are those of EN 1993-1-1, 1.7 (from memory).
 */
const WEL_WPL_I: Record<PropertyKey, PropertySymbol> = {
  ...S_Z_R,
  "centroid.x": s("y\u0304"),
  "centroid.y": s("z\u0304"),
  "extents.xMin": s("y", "min"),
  "extents.xMax": s("y", "max"),
  "extents.yMin": s("z", "min"),
  "extents.yMax": s("z", "max"),
  Ix: s("I", "y"),
  Iy: s("I", "z"),
  Ixy: s("I", "yz"),
  I1: s("I", "u"),
  I2: s("I", "v"),
  SxTop: s("W", "el,y,top"),
  SxBottom: s("W", "el,y,bot"),
  SyLeft: s("W", "el,z,left"),
  SyRight: s("W", "el,z,right"),
  Sx: s("W", "el,y"),
  Sy: s("W", "el,z"),
  S1: s("W", "el,u"),
  S2: s("W", "el,v"),
  Zx: s("W", "pl,y"),
  Zy: s("W", "pl,z"),
  Z1: s("W", "pl,u"),
  Z2: s("W", "pl,v"),
  "pna.x": s("y", "p"),
  "pna.y": s("z", "p"),
  "Mp.x": s("M", "pl,y"),
  "Mp.y": s("M", "pl,z"),
  squash: s("N", "pl"),
  rx: s("i", "y"),
  ry: s("i", "z"),
  r1: s("i", "u"),
  r2: s("i", "v"),
  J: s("I", "t"),
  Cw: s("I", "w"),
  "shearCentre.x": s("y", "s"),
  "shearCentre.y": s("z", "s"),
  Avx: s("A", "vy"),
  Avy: s("A", "vz"),
  betaX: s("β", "y"),
  betaY: s("β", "z"),
  r0: s("i", "0"),
};

/** The symbol of a property in the notation of the firm. Code, JSON and CSV keep the keys themselves. */
export const symbolOf = (key: PropertyKey, notation: Notation): PropertySymbol =>
  (notation === "S-Z-r" ? S_Z_R : WEL_WPL_I)[key];

/** A symbol in plain text, for spoken labels: "S x", "W el,y". */
export const symbolText = ({ letter, index }: PropertySymbol): string =>
  index ? `${letter} ${index}` : letter;

export type AxisName = "x" | "y" | "1" | "2";
const AXES: Record<Notation, Record<AxisName, string>> = {
  "S-Z-r": { x: "x", y: "y", "1": "1", "2": "2" },
  "Wel-Wpl-i": { x: "y", y: "z", "1": "u", "2": "v" },
};
/** The letter of an axis: the horizontal one is x–x or y–y. */
export const axisLetter = (axis: AxisName, notation: Notation): string => AXES[notation][axis];

/** Words that go with a notation. */
export const WORDS = {
  "S-Z-r": {
    mass: "Weight",
    fullPenetration: "CJP",
    partPenetration: "PJP",
    restrained: "Unbraced length",
  },
  "Wel-Wpl-i": {
    mass: "Mass",
    fullPenetration: "full-penetration butt weld",
    partPenetration: "partial-penetration butt weld",
    restrained: "Restrained every",
  },
} as const satisfies Record<Notation, Record<string, string>>;
