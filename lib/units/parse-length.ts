import { ok, type Result } from "@/lib/result";
import type { UnitName } from "@/lib/units/conversion";
import { parseQuantity } from "@/lib/units/parse-quantity";
import type { DecimalMark } from "@/lib/units/settings";

/** Where lengths are typed without a unit: mm in metric display, inches in inch display. */
export type LengthOptions = Readonly<{ unit?: UnitName; decimal?: DecimalMark }>;

/**
 * A length as typed: "564", "632-36-32", "3/8 in", "12 3/4", "12 ft 6 in", "12,5".
 * @returns the length in mm, finite, of either sign; or what is wrong. `unit` defaults to mm, `decimal` to a point.
 */
export function parseLength(
  text: string,
  { unit = "mm", decimal = "." }: LengthOptions = {},
): Result<{ mm: number }> {
  const length = parseQuantity(text, { dimension: "length", unit, decimal });
  return length.ok ? ok({ mm: length.value }) : length;
}
