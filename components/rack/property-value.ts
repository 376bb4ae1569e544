import type { Properties } from "@/lib/schemas/properties";
import type { FiguresSource } from "@/lib/schemas/bay";
import type { PropertyKey } from "@/lib/units/property-units";

/** A property by its key, nested keys with a dot; null where it was not computed. */
export function propertyValue(properties: Properties, key: PropertyKey): number | null {
  let value: unknown = properties;
  for (const step of key.split("."))
    value = typeof value === "object" && value !== null ? (value as Record<string, unknown>)[step] : null;
  return typeof value === "number" ? value : null;
}

/** Why a property is missing, in the engine's words. */
export const absentReason = (properties: Properties, key: PropertyKey): string | null =>
  properties.absent.find((absent) => absent.property === key || key.startsWith(`${absent.property}.`))
    ?.detail ?? null;

export type Figures = Readonly<{
  computed: Properties;
  tabulated: Readonly<Record<string, number>> | null;
  /** Which of the two counts where both exist. */
  counts: FiguresSource;
}>;

/** The figure that counts, and which of the two it is. */
export function countingValue(
  figures: Figures,
  key: PropertyKey,
): Readonly<{ value: number | null; source: FiguresSource }> {
  const tabulated = figures.counts === "tabulated" ? figures.tabulated?.[key] : undefined;
  if (tabulated !== undefined) return { value: tabulated, source: "tabulated" };
  return { value: propertyValue(figures.computed, key), source: "computed" };
}

/** Change in per cent from one figure to another; null where either is missing or the first is 0. */
export const percentChange = (from: number | null, to: number | null): number | null =>
  from === null || to === null || from === 0 ? null : ((to - from) / Math.abs(from)) * 100;
