import type { Unit } from "@/lib/units/property-units";

/** What is measured; units of one dimension convert into each other and into nothing else. */
export type Dimension =
  | "length"
  | "area"
  | "modulus"
  | "inertia"
  | "asymmetry"
  | "warping"
  | "linearMass"
  | "paintedSurface"
  | "angle"
  | "force"
  | "moment"
  | "stress"
  | "density"
  | "ratio";

/** 1 in = 25.4 mm exactly. NIST SP 811 (2008), appendix B. */
const IN = 25.4;
const FT = 12 * IN;
/** 1 lb = 0.45359237 kg exactly. NIST SP 811 (2008), appendix B. */
const LB_KG = 0.45359237;
/** Standard acceleration of free fall, m/s², exact. NIST SP 811 (2008), appendix B. */
export const STANDARD_GRAVITY = 9.80665;
/** 1 lbf = 0.45359237 kg × 9.80665 m/s², exact: 4.4482216152605 N. */
const LBF_N = LB_KG * STANDARD_GRAVITY;
const KIP_N = 1000 * LBF_N;

type UnitFacts = Readonly<{
  dimension: Dimension;
  /** Multiplies a value in this unit into the stored unit of its dimension. */
  toStored: number;
}>;

/**
 * Every unit the program reads or shows, with the factor into the stored unit (mm, mm², mm³, mm⁴, mm⁵, mm⁶, kg/m, m²/m, degree, N,
 * N·mm, MPa, kg/m³, 1). Names are ASCII; "E3 mm3" is 10³ mm³. The only conversion factors of the program.
 * @source NIST SP 811 (2008), appendix B; factors not defined there follow from the inch, the pound and g.
 */
export const UNITS = {
  mm: { dimension: "length", toStored: 1 },
  cm: { dimension: "length", toStored: 10 },
  m: { dimension: "length", toStored: 1000 },
  in: { dimension: "length", toStored: IN },
  ft: { dimension: "length", toStored: FT },
  mm2: { dimension: "area", toStored: 1 },
  cm2: { dimension: "area", toStored: 1e2 },
  m2: { dimension: "area", toStored: 1e6 },
  in2: { dimension: "area", toStored: IN ** 2 },
  mm3: { dimension: "modulus", toStored: 1 },
  "E3 mm3": { dimension: "modulus", toStored: 1e3 },
  cm3: { dimension: "modulus", toStored: 1e3 },
  in3: { dimension: "modulus", toStored: IN ** 3 },
  mm4: { dimension: "inertia", toStored: 1 },
  "E3 mm4": { dimension: "inertia", toStored: 1e3 },
  "E6 mm4": { dimension: "inertia", toStored: 1e6 },
  cm4: { dimension: "inertia", toStored: 1e4 },
  in4: { dimension: "inertia", toStored: IN ** 4 },
  mm5: { dimension: "asymmetry", toStored: 1 },
  in5: { dimension: "asymmetry", toStored: IN ** 5 },
  mm6: { dimension: "warping", toStored: 1 },
  "E9 mm6": { dimension: "warping", toStored: 1e9 },
  cm6: { dimension: "warping", toStored: 1e6 },
  in6: { dimension: "warping", toStored: IN ** 6 },
  "kg/m": { dimension: "linearMass", toStored: 1 },
  "lb/ft": { dimension: "linearMass", toStored: LB_KG / (FT / 1000) },
  "m2/m": { dimension: "paintedSurface", toStored: 1 },
  "ft2/ft": { dimension: "paintedSurface", toStored: FT / 1000 },
  deg: { dimension: "angle", toStored: 1 },
  N: { dimension: "force", toStored: 1 },
  kN: { dimension: "force", toStored: 1e3 },
  kip: { dimension: "force", toStored: KIP_N },
  "N.mm": { dimension: "moment", toStored: 1 },
  "kN.m": { dimension: "moment", toStored: 1e6 },
  "kip.ft": { dimension: "moment", toStored: KIP_N * FT },
  "kip.in": { dimension: "moment", toStored: KIP_N * IN },
  MPa: { dimension: "stress", toStored: 1 },
  GPa: { dimension: "stress", toStored: 1e3 },
  ksi: { dimension: "stress", toStored: KIP_N / IN ** 2 },
  psi: { dimension: "stress", toStored: LBF_N / IN ** 2 },
  "kg/m3": { dimension: "density", toStored: 1 },
  "lb/ft3": { dimension: "density", toStored: LB_KG / (FT / 1000) ** 3 },
  "1": { dimension: "ratio", toStored: 1 },
  "%": { dimension: "ratio", toStored: 0.01 },
} as const satisfies Record<string, UnitFacts>;

export type UnitName = keyof typeof UNITS;

/** The stored unit of each dimension. */
export const STORED_UNIT = {
  length: "mm",
  area: "mm2",
  modulus: "mm3",
  inertia: "mm4",
  asymmetry: "mm5",
  warping: "mm6",
  linearMass: "kg/m",
  paintedSurface: "m2/m",
  angle: "deg",
  force: "N",
  moment: "N.mm",
  stress: "MPa",
  density: "kg/m3",
  ratio: "1",
} as const satisfies Record<Dimension, Unit>;

/** Value in `unit` to the stored unit of its dimension. Linear, so sign and zero are kept; finite in, finite out below 1e300. */
export const toStored = (value: number, unit: UnitName): number => value * UNITS[unit].toStored;

/** Value in the stored unit of its dimension to `unit`; inverse of `toStored` to within one rounding. */
export const fromStored = (value: number, unit: UnitName): number => value / UNITS[unit].toStored;
