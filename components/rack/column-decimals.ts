import type { FinderRow } from "@/lib/schemas/find-shapes";
import { fromStored } from "@/lib/units/conversion";
import { displayRule, propertyRule } from "@/lib/units/display-units";
import { columnDecimals } from "@/lib/units/format";
import type { UnitSystem } from "@/lib/units/settings";

type Key = "mass" | "area" | "Ix" | "Iy" | "Sx" | "Sy" | "Zx" | "Zy" | "rx" | "ry" | "J";

/** A size in mm that is whole everywhere is written without decimals; one that is not makes its column show a tenth. */
const sizeDecimals = (sizes: readonly number[], system: UnitSystem): number => {
  const rule = displayRule("length", system);
  if (system === "inch") return columnDecimals(sizes, rule);
  return sizes.every((mm) => Math.abs(fromStored(mm, "mm") - Math.round(mm)) < 0.05) ? 0 : 1;
};

/** Decimals of each column of the Rack from the rows in it: equal all the way down. */
export function columnDecimalsOf(
  rows: readonly FinderRow[],
  system: UnitSystem,
): Readonly<Record<Key | "depth" | "width", number>> {
  const of = (key: Key) =>
    columnDecimals(
      rows.map((row) => row[key]),
      propertyRule(key, system),
    );
  return {
    mass: of("mass"),
    area: of("area"),
    Ix: of("Ix"),
    Iy: of("Iy"),
    Sx: of("Sx"),
    Sy: of("Sy"),
    Zx: of("Zx"),
    Zy: of("Zy"),
    rx: of("rx"),
    ry: of("ry"),
    J: of("J"),
    depth: sizeDecimals(
      rows.map((row) => row.depth),
      system,
    ),
    width: sizeDecimals(
      rows.map((row) => row.width),
      system,
    ),
  };
}
