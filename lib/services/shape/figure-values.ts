import "server-only";
import { UNIT_OF, type PropertyKey } from "@/lib/units/property-units";
import type { FiguresSource } from "@/lib/schemas/bay";
import type { Properties } from "@/lib/schemas/properties";

export type Scalars = Partial<Record<PropertyKey, number | null>>;

export const PROPERTY_KEYS = Object.keys(UNIT_OF) as PropertyKey[];

/** Name of a property's column: a dot becomes an underscore. */
export const columnOf = (key: PropertyKey): string => key.replace(".", "_");

/** The scalar under a property key, nested ones by their dot; null where it could not be computed. */
export const scalarOf = (properties: Properties, key: PropertyKey): number | null => {
  const [first, second] = key.split(".") as [keyof Properties, string?];
  const value: unknown = properties[first];
  if (second === undefined) return typeof value === "number" ? value : null;
  if (typeof value !== "object" || value === null) return null;
  const inner: unknown = Object.entries(value).find(([name]) => name === second)?.[1];
  return typeof inner === "number" ? inner : null;
};

export const scalarsOf = (properties: Properties): Scalars =>
  Object.fromEntries(PROPERTY_KEYS.map((key) => [key, scalarOf(properties, key)]));

/** What of the properties is no scalar, as figures.rest keeps it. */
export const restOf = (properties: Properties): Partial<Properties> => {
  const { estimates, plain, stressFactors, equalForceAxis, unsymmetrical, absent, warnings } = properties;
  return { estimates, plain, stressFactors, equalForceAxis, unsymmetrical, absent, warnings };
};

/** The figures that count: those of the bay's source where it has them, the other's where it has not. */
export const effectiveOf = (
  counts: FiguresSource,
  computed: Scalars,
  tabulated: Scalars | null,
): Readonly<{ source: FiguresSource; value: (key: PropertyKey) => number | null }> => {
  const source: FiguresSource = counts === "tabulated" && tabulated !== null ? "tabulated" : "computed";
  const [first, second] = source === "tabulated" ? [tabulated, computed] : [computed, tabulated];
  return { source, value: (key) => first?.[key] ?? second?.[key] ?? null };
};
