import { err, ok, type Result } from "@/lib/result";
import type { DecimalMark } from "@/lib/units/settings";

/** Every sign people type or paste for minus, made one. */
export const asMinus = (text: string): string => text.replace(/[\u2212\u2010-\u2013\uFE63\uFF0D]/g, "-");

// A gap groups thousands only between runs of three digits; thin and no-break spaces and apostrophes are gaps too.
const GAP = "[ \\u00a0\\u2009\\u202f'\\u2019]";
export const NUMBER_LITERAL = new RegExp(
  `^(?:\\d{1,3}(?:${GAP}\\d{3})+(?![\\d])|\\d+)?(?:[.,]\\d+)*(?:[.,](?!\\d))?(?:[eE][+-]?\\d{1,3})?`,
);
const ANY_GAP = new RegExp(GAP, "g");

/**
 * An unsigned number as typed: digits, thousands gaps, one decimal mark, an exponent. The person's own mark is always the
 * decimal one. The other mark is taken as decimal where it cannot group thousands ("12,5"), as grouping where it repeats
 * ("1,234,567"), and refused where it could be either ("1,234"): nothing is guessed.
 */
export function readLiteral(literal: string, mark: DecimalMark): Result<number> {
  const fault = (code: string, detail: string) => err({ code: `number.${code}`, detail });
  const bare = literal.replace(ANY_GAP, "");
  const [mantissa = "", exponent = ""] = bare.split(/(?=[eE])/);
  const other = mark === "." ? "," : ".";
  const marks = mantissa.split(mark).length - 1;
  const others = mantissa.split(other).length - 1;
  let plain = mantissa;
  if (marks > 1 && others === 0 && isGrouped(mantissa, mark))
    return fault("ambiguous", `"${literal}" has more than one decimal mark: type it without gaps.`);
  if (marks > 1) return fault("marks", `"${literal}" has more than one decimal mark.`);
  if (others === 1 && marks === 0) {
    if (isGrouped(mantissa, other) && !mantissa.startsWith("0"))
      return fault(
        "ambiguous",
        `"${literal}" can be read as ${mantissa.replace(other, "")} or as ${mantissa.replace(other, mark)}: type it without the ${other === "," ? "comma" : "point"}.`,
      );
    plain = mantissa.replace(other, mark);
  } else if (others > 0) {
    const whole = mantissa.split(mark)[0] ?? "";
    if (!isGrouped(whole, other) || (mantissa.split(mark)[1] ?? "").includes(other))
      return fault("marks", `"${literal}" has marks that do not group thousands.`);
    plain = mantissa.replaceAll(other, "");
  }
  const value = Number(plain.replace(mark, ".") + exponent);
  if (!Number.isFinite(value)) return fault("tooLarge", `"${literal}" is too large to count with.`);
  return ok(value);
}

const isGrouped = (text: string, mark: string): boolean =>
  new RegExp(`^\\d{1,3}(?:\\${mark}\\d{3})+$`).test(text);

/** A whole text that must be one signed number ("−12,5"). Blank is an error, never 0. */
export function parseNumber(text: string, mark: DecimalMark): Result<number> {
  const trimmed = asMinus(text).trim();
  if (!trimmed) return err({ code: "number.missing", detail: "A number is needed here." });
  const negative = trimmed.startsWith("-");
  const body = negative || trimmed.startsWith("+") ? trimmed.slice(1).trimStart() : trimmed;
  const literal = NUMBER_LITERAL.exec(body)?.[0] ?? "";
  if (!/\d/.test(literal) || literal.length !== body.length)
    return err({ code: "number.unreadable", detail: `"${trimmed}" is not a number.` });
  const value = readLiteral(literal, mark);
  return value.ok && negative ? ok(-value.value) : value;
}
