import { fromStored } from "@/lib/units/conversion";
import type { DisplayRule } from "@/lib/units/display-units";
import type { DecimalMark } from "@/lib/units/settings";

/**
 * A number as it is set: the thousands gap is drawn with padding between `groups` and the minus is drawn as a true minus, so
 * that the text, when copied, is a bare number. `fraction` has no mark and is "" where there are no decimals.
 */
export type SetNumber = Readonly<{
  negative: boolean;
  groups: readonly string[];
  fraction: string;
  mark: DecimalMark;
}>;

/** U+2212, for text that is read and not copied as a number. */
export const TRUE_MINUS = "\u2212";

const digitsBeforePoint = (magnitude: number): number => Math.floor(Math.log10(magnitude)) + 1;

/** Decimals one value needs so that it shows the rule's significant digits. @param value in the rule's unit; 0 needs the least. */
export function decimalsFor(value: number, rule: DisplayRule): number {
  if (value === 0 || !Number.isFinite(value)) return rule.decimals;
  const needed = rule.significant - digitsBeforePoint(Math.abs(value));
  return Math.min(rule.maxDecimals, Math.max(rule.decimals, needed));
}

/** Decimals a column needs so that its smallest figure keeps the rule's significant digits: equal decimals all the way down. */
export function columnDecimals(storedValues: Iterable<number | null>, rule: DisplayRule): number {
  let decimals = rule.decimals;
  for (const stored of storedValues)
    if (stored !== null) decimals = Math.max(decimals, decimalsFor(fromStored(stored, rule.unit), rule));
  return decimals;
}

/**
 * Sets a finite number with a fixed count of decimals, half away from zero on its shortest decimal form. A value that rounds to
 * zero carries no minus. Throws RangeError on NaN and infinities: they never reach a screen.
 */
export function setNumber(value: number, decimals: number, mark: DecimalMark): SetNumber {
  if (!Number.isFinite(value)) throw new RangeError("setNumber: the value is not finite");
  const text = roundedText(Math.abs(value), decimals);
  const [whole = "0", fraction = ""] = text.split(".");
  const groups: string[] = [];
  for (let end = whole.length; end > 0; end -= 3) groups.unshift(whole.slice(Math.max(0, end - 3), end));
  return { negative: value < 0 && /[1-9]/.test(text), groups, fraction, mark };
}

// Intl rounds the shortest decimal form (1.005 to 1.01 as a person expects); toFixed rounds the binary value.
const ROUNDERS = new Map<number, Intl.NumberFormat>();
function roundedText(magnitude: number, decimals: number): string {
  let rounder = ROUNDERS.get(decimals);
  if (!rounder) {
    rounder = new Intl.NumberFormat("en-US", {
      minimumFractionDigits: decimals,
      maximumFractionDigits: decimals,
      useGrouping: false,
    });
    ROUNDERS.set(decimals, rounder);
  }
  return rounder.format(magnitude);
}

/** The bare text of a set number, as it is copied: "-12345.6" or "-12345,6". */
export const bareText = ({ negative, groups, fraction, mark }: SetNumber): string =>
  `${negative ? "-" : ""}${groups.join("")}${fraction && mark + fraction}`;

/** The text of a set number for reading: true minus, narrow no-break spaces between the thousands. */
export const readText = ({ negative, groups, fraction, mark }: SetNumber): string =>
  `${negative ? TRUE_MINUS : ""}${groups.join("\u202f")}${fraction && mark + fraction}`;

/** Sets a stored value by a rule, with the decimals the value itself needs or those given for its column. */
export function setStored(
  stored: number,
  rule: DisplayRule,
  mark: DecimalMark,
  decimals?: number,
): SetNumber {
  const value = fromStored(stored, rule.unit);
  return setNumber(value, decimals ?? decimalsFor(value, rule), mark);
}

/**
 * The shortest text that types back to the same value to `maxDecimals`: what stands in a field at rest ("12.5", not "12.500").
 * @param value in the unit of the field, finite.
 */
export function fieldText(value: number, maxDecimals: number, mark: DecimalMark): string {
  const fixed = bareText(setNumber(value, maxDecimals, mark));
  return maxDecimals === 0 ? fixed : fixed.replace(new RegExp(`\\${mark}?0+$`), "");
}
