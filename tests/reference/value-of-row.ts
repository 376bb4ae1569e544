import type { SectionProperties } from "@/lib/section/properties";
import type { CheckRow } from "@/tests/reference/check-rows";

type Getter = (p: SectionProperties) => number | null;

const tanOf = (degrees: number) => Math.tan((Math.abs(degrees) * Math.PI) / 180);

/** Angles: a = long leg along y, so the European y is x here; c, cy from the heel along y, cz along x. */
const fromLeft: Getter = (p) => p.centroid.x - p.extents.xMin;
const fromBottom: Getter = (p) => p.centroid.y - p.extents.yMin;

/** European tables: y strong, z weak. */
const EUROPEAN: Readonly<Record<string, Getter>> = {
  A: (p) => p.area,
  mass: (p) => p.mass,
  Iy: (p) => p.Ix,
  Iz: (p) => p.Iy,
  Wely: (p) => p.Sx,
  Welz: (p) => p.Sy,
  Wply: (p) => p.Zx,
  Wplz: (p) => p.Zy,
  iy: (p) => p.rx,
  iz: (p) => p.ry,
  ys: fromLeft,
  c: fromBottom,
  cy: fromBottom,
  cz: fromLeft,
  Wy: (p) => p.Sx,
  Iu: (p) => p.I1,
  Iv: (p) => p.I2,
  tanAlpha: (p) => tanOf(p.angle),
  I: (p) => p.Ix,
  Wel: (p) => p.Sx,
  Wpl: (p) => p.Zx,
};

/** US tables: x strong, y weak. */
const AMERICAN: Readonly<Record<string, Getter>> = {
  A: (p) => p.area,
  Ix: (p) => p.Ix,
  Iy: (p) => p.Iy,
  Sx: (p) => p.Sx,
  Sy: (p) => p.Sy,
  Zx: (p) => p.Zx,
  Zy: (p) => p.Zy,
  rx: (p) => p.rx,
  ry: (p) => p.ry,
  xbar: fromLeft,
  ybar: fromBottom,
  "Iz(min principal)": (p) => p.I2,
  tanAlpha: (p) => tanOf(p.angle),
  Sxx: (p) => p.Sx,
  Ixx: (p) => p.Ix,
};

const CLOSED_FORM: Readonly<Record<string, Getter>> = {
  A: (p) => p.area,
  I: (p) => p.Ix,
  I1: (p) => p.I1,
  I2: (p) => p.I2,
  Ic: (p) => p.Ix,
  Imax: (p) => p.I1,
  Ix: (p) => p.Ix,
  Iy: (p) => p.Iy,
  "|Ixy|": (p) => Math.abs(p.Ixy),
  Wel: (p) => p.Sx,
  Wpl: (p) => p.Zx,
  Zx: (p) => p.Zx,
  cy: fromBottom,
  yc: fromBottom,
  shapeFactor: (p) => (p.Zx === null ? null : p.Zx / p.Sx),
};

const US_SHAPES = ["W shape", "C shape", "L shape", "HSS rect", "HSS round/pipe", "dressed lumber (S4S)"];
const EU_SHAPES = /^(I rolled|channel|angle|SHS|RHS|CHS)/;

/** Reads the row's property off computed properties; null where the row tells no area property. */
export const getterOfRow = (row: CheckRow): Getter | null => {
  const table = US_SHAPES.includes(row.shape) ? AMERICAN : EU_SHAPES.test(row.shape) ? EUROPEAN : CLOSED_FORM;
  return table[row.property] ?? null;
};
