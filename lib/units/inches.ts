import { fromStored } from "@/lib/units/conversion";
import { TRUE_MINUS } from "@/lib/units/format";

const gcd = (a: number, b: number): number => (b === 0 ? a : gcd(b, a % b));

/** Inches as a whole number and a fraction in lowest terms, rounded to 1/denominator: 323.85 mm is "12 3/4". */
export function fractionText(lengthMm: number, denominator: 2 | 4 | 8 | 16 | 32 | 64): string {
  const parts = Math.round(Math.abs(fromStored(lengthMm, "in")) * denominator);
  const whole = Math.floor(parts / denominator);
  const rest = parts % denominator;
  const common = gcd(rest, denominator);
  const fraction = rest === 0 ? "" : `${rest / common}/${denominator / common}`;
  const sign = lengthMm < 0 && parts > 0 ? TRUE_MINUS : "";
  return sign + ([whole > 0 || !fraction ? String(whole) : "", fraction].filter(Boolean).join(" ") || "0");
}

/** Feet, inches and a fraction, rounded to 1/denominator in: 3810 mm is "12 ft 6 in". Inches never reach 12. */
export function feetInchesText(lengthMm: number, denominator: 2 | 4 | 8 | 16 | 32 | 64): string {
  const parts = Math.round(Math.abs(fromStored(lengthMm, "in")) * denominator);
  const feet = Math.floor(parts / (12 * denominator));
  const inches = parts - feet * 12 * denominator;
  const sign = lengthMm < 0 && parts > 0 ? TRUE_MINUS : "";
  const inchText = `${fractionText((inches / denominator) * 25.4, denominator)} in`;
  if (feet === 0) return sign + inchText;
  return sign + (inches === 0 ? `${feet} ft` : `${feet} ft ${inchText}`);
}
