/** Units in which properties are stored and computed (design: mm, N, N·mm, MPa, kg/m, m²/m). */
export type Unit =
  | "mm"
  | "mm2"
  | "mm3"
  | "mm4"
  | "mm5"
  | "mm6"
  | "kg/m"
  | "m2/m"
  | "deg"
  | "N"
  | "N.mm"
  | "MPa"
  | "kg/m3"
  | "1";

/** The unit of every scalar property key; nested keys are written with a dot. The same keys stand in code, JSON and columns. */
export const UNIT_OF = {
  area: "mm2",
  "perimeter.outer": "mm",
  "perimeter.inner": "mm",
  mass: "kg/m",
  surface: "m2/m",
  "centroid.x": "mm",
  "centroid.y": "mm",
  "extents.xMin": "mm",
  "extents.xMax": "mm",
  "extents.yMin": "mm",
  "extents.yMax": "mm",
  Ix: "mm4",
  Iy: "mm4",
  Ixy: "mm4",
  I1: "mm4",
  I2: "mm4",
  angle: "deg",
  SxTop: "mm3",
  SxBottom: "mm3",
  SyLeft: "mm3",
  SyRight: "mm3",
  Sx: "mm3",
  Sy: "mm3",
  S1: "mm3",
  S2: "mm3",
  Zx: "mm3",
  Zy: "mm3",
  Z1: "mm3",
  Z2: "mm3",
  "pna.x": "mm",
  "pna.y": "mm",
  "Mp.x": "N.mm",
  "Mp.y": "N.mm",
  squash: "N",
  rx: "mm",
  ry: "mm",
  r1: "mm",
  r2: "mm",
  J: "mm4",
  Cw: "mm6",
  "shearCentre.x": "mm",
  "shearCentre.y": "mm",
  Avx: "mm2",
  Avy: "mm2",
  betaX: "mm",
  betaY: "mm",
  r0: "mm",
} as const satisfies Record<string, Unit>;

export type PropertyKey = keyof typeof UNIT_OF;
