import type { RangeName } from "@/lib/schemas/find-shapes";
import type { PropertyKey } from "@/lib/units/property-units";
import type { Dimension } from "@/lib/units/conversion";

/** What a range of the search is about: a property (its symbol, its unit) or a plain size. */
export type RangeFacts = Readonly<{ end: "min" | "max" }> &
  (Readonly<{ property: PropertyKey }> | Readonly<{ dimension: Dimension; name: string }>);

/** Every range of the search, in the order of the screen; the first three stand in the bar, the others behind "More". */
export const RANGE: Record<RangeName, RangeFacts> = {
  minSx: { end: "min", property: "Sx" },
  minIx: { end: "min", property: "Ix" },
  maxDepth: { end: "max", dimension: "length", name: "depth" },
  minSy: { end: "min", property: "Sy" },
  minIy: { end: "min", property: "Iy" },
  minI2: { end: "min", property: "I2" },
  minZx: { end: "min", property: "Zx" },
  minZy: { end: "min", property: "Zy" },
  minArea: { end: "min", property: "area" },
  maxArea: { end: "max", property: "area" },
  minRx: { end: "min", property: "rx" },
  minRy: { end: "min", property: "ry" },
  minR2: { end: "min", property: "r2" },
  minJ: { end: "min", property: "J" },
  minCw: { end: "min", property: "Cw" },
  maxSx: { end: "max", property: "Sx" },
  maxIx: { end: "max", property: "Ix" },
  minDepth: { end: "min", dimension: "length", name: "depth" },
  minWidth: { end: "min", dimension: "length", name: "width" },
  maxWidth: { end: "max", dimension: "length", name: "width" },
  minMass: { end: "min", property: "mass" },
  maxMass: { end: "max", property: "mass" },
};

export const RANGE_NAMES = Object.keys(RANGE) as RangeName[];
export const BAR_RANGES = ["minSx", "minIx", "maxDepth"] as const satisfies readonly RangeName[];
export const MORE_RANGES = RANGE_NAMES.filter((name) => !(BAR_RANGES as readonly string[]).includes(name));
