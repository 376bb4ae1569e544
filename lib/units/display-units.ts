import { UNITS, type Dimension, type UnitName } from "@/lib/units/conversion";
import { UNIT_OF, type PropertyKey } from "@/lib/units/property-units";
import type { UnitSystem } from "@/lib/units/settings";

/**
 * How a figure is written: the unit it stands in, the least decimals, and the significant digits it never falls below
 * (a small angle beside a girder must not read 0). `maxDecimals` bounds both.
 */
export type DisplayRule = Readonly<{
  unit: UnitName;
  decimals: number;
  significant: number;
  maxDecimals: number;
}>;

const rule = (unit: UnitName, decimals: number, significant = 3, maxDecimals = 4): DisplayRule => ({
  unit,
  decimals,
  significant,
  maxDecimals,
});

const METRIC: Record<Dimension, DisplayRule> = {
  length: rule("mm", 1, 3, 3),
  area: rule("mm2", 0),
  modulus: rule("E3 mm3", 0),
  inertia: rule("E6 mm4", 1),
  asymmetry: rule("mm5", 0),
  warping: rule("E9 mm6", 0),
  linearMass: rule("kg/m", 1),
  paintedSurface: rule("m2/m", 2),
  angle: rule("deg", 1, 1, 2),
  force: rule("kN", 0),
  moment: rule("kN.m", 0),
  stress: rule("MPa", 0, 3, 2),
  density: rule("kg/m3", 0, 3, 1),
  ratio: rule("1", 2, 3, 3),
};

const INCH: Record<Dimension, DisplayRule> = {
  length: rule("in", 2, 3, 4),
  area: rule("in2", 2),
  modulus: rule("in3", 1),
  inertia: rule("in4", 0),
  asymmetry: rule("in5", 0),
  warping: rule("in6", 0),
  linearMass: rule("lb/ft", 1),
  paintedSurface: rule("ft2/ft", 2),
  angle: rule("deg", 1, 1, 2),
  force: rule("kip", 0),
  moment: rule("kip.ft", 0),
  stress: rule("ksi", 1, 3, 2),
  density: rule("lb/ft3", 1, 3, 2),
  ratio: rule("1", 2, 3, 3),
};

/** Torsion constants are a thousandth of second moments: they stand in 10³ mm⁴ and with more decimals in in⁴. */
const TORSION = { metric: rule("E3 mm4", 0), inch: rule("in4", 2) } as const;
const TORSION_KEYS: ReadonlySet<PropertyKey> = new Set(["J"]);

/** The rule of a dimension in a system of display. */
export const displayRule = (dimension: Dimension, system: UnitSystem): DisplayRule =>
  (system === "metric" ? METRIC : INCH)[dimension];

/** The rule of a property key in a system of display. */
export const propertyRule = (key: PropertyKey, system: UnitSystem): DisplayRule =>
  TORSION_KEYS.has(key) ? TORSION[system] : displayRule(UNITS[UNIT_OF[key]].dimension, system);
