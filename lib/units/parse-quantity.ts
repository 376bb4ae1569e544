import { err, ok, type Result } from "@/lib/result";
import { toStored, type Dimension, type UnitName } from "@/lib/units/conversion";
import { lexQuantity, type Token } from "@/lib/units/lex-quantity";
import type { DecimalMark } from "@/lib/units/settings";

export type QuantityOptions = Readonly<{
  dimension: Dimension;
  /** Unit of a number typed without one: the unit that stands beside the field. */
  unit: UnitName;
  decimal: DecimalMark;
}>;

/** A sum's running value: a plain number until a unit makes it a quantity (then in the stored unit). */
type Value = Readonly<{ value: number; quantity: boolean }>;

/** Sums longer than this are not typed by people. */
const MAX_TOKENS = 200;

/**
 * Reads what a person types for a quantity: a number, a sum ("632-36-32", "0.9*345", "(2*16+8)/2"), a unit ("3/8 in",
 * "2000 cm3"), a fraction ("12 3/4"), feet and inches ("12 ft 6 in", `12'-6 1/2"`). A plain number takes the field's unit, in
 * a sum too ("1 in + 5" is 1 in + 5 mm in a field of mm).
 * @returns the value in the stored unit of the dimension, finite; or what is wrong, with the place or the word that was not understood.
 */
export function parseQuantity(text: string, options: QuantityOptions): Result<number> {
  if (!text.trim()) return err({ code: "quantity.missing", detail: "A number is needed here." });
  const tokens = lexQuantity(text, options);
  if (!tokens.ok) return tokens;
  if (tokens.value.length > MAX_TOKENS)
    return err({ code: "quantity.tooLong", detail: "This sum is too long." });
  const reader = new SumReader(tokens.value, options);
  const sum = reader.sum();
  if (!sum.ok) return sum;
  const rest = reader.rest();
  if (rest) return err({ code: "quantity.unreadable", detail: `"${rest.text}" is not expected there.` });
  const value = reader.stored(sum.value);
  if (!Number.isFinite(value))
    return err({ code: "quantity.notFinite", detail: "This sum has no finite result." });
  return ok(value);
}

/** Recursive descent over sum → product → factor; a class because the place in the tokens is the only state. */
class SumReader {
  private at = 0;
  private depth = 0;
  constructor(
    private readonly tokens: readonly Token[],
    private readonly options: QuantityOptions,
  ) {}

  rest(): Token | undefined {
    return this.tokens[this.at];
  }

  stored({ value, quantity }: Value): number {
    return quantity ? value : toStored(value, this.options.unit);
  }

  sum(): Result<Value> {
    let left = this.product();
    while (left.ok && (this.isSign("+") || this.isSign("-"))) {
      const sign = this.take()?.text === "-" ? -1 : 1;
      const right = this.product();
      if (!right.ok) return right;
      const both = left.value.quantity === right.value.quantity;
      left = both
        ? ok({ value: left.value.value + sign * right.value.value, quantity: left.value.quantity })
        : ok({ value: this.stored(left.value) + sign * this.stored(right.value), quantity: true });
    }
    return left;
  }

  private product(): Result<Value> {
    let left = this.factor();
    while (left.ok && (this.isSign("*") || this.isSign("/"))) {
      const divides = this.take()?.text === "/";
      const right = this.factor();
      if (!right.ok) return right;
      if (right.value.quantity && (divides || left.value.quantity))
        return err({
          code: "quantity.units",
          detail: divides
            ? "A number cannot be divided by one with a unit."
            : "Two numbers with units cannot be multiplied.",
        });
      if (divides && right.value.value === 0)
        return err({ code: "quantity.zeroDivision", detail: "This divides by 0." });
      left = ok({
        value: divides ? left.value.value / right.value.value : left.value.value * right.value.value,
        quantity: left.value.quantity || right.value.quantity,
      });
    }
    return left;
  }

  private factor(): Result<Value> {
    const token = this.take();
    if (!token) return err({ code: "quantity.unfinished", detail: "The sum is not finished." });
    if (token.kind === "sign" && (token.text === "-" || token.text === "+")) {
      if (++this.depth > MAX_TOKENS)
        return err({ code: "quantity.tooLong", detail: "This sum is too long." });
      const inner = this.factor();
      return inner.ok && token.text === "-" ? ok({ ...inner.value, value: -inner.value.value }) : inner;
    }
    if (token.kind === "sign" && token.text === "(") {
      const inner = this.sum();
      if (!inner.ok) return inner;
      if (!this.isSign(")")) return err({ code: "quantity.bracket", detail: "A bracket is not closed." });
      this.take();
      return this.withUnit(inner.value);
    }
    if (token.kind === "number") return this.withUnit({ value: token.value, quantity: false });
    return err({ code: "quantity.unreadable", detail: `"${token.text}" is not expected there.` });
  }

  /** A unit behind a number, and inches behind feet: "12 ft 6 in" is one quantity. */
  private withUnit(bare: Value): Result<Value> {
    const token = this.rest();
    if (token?.kind !== "unit") return ok(bare);
    if (bare.quantity)
      return err({ code: "quantity.units", detail: `"${token.text}" follows a number that has a unit.` });
    this.take();
    const value = toStored(bare.value, token.unit);
    if (token.unit !== "ft") return ok({ value, quantity: true });
    const dash = this.isSign("-") && this.rest()?.joined ? 1 : 0;
    const inches = this.tokens[this.at + dash];
    const unit = this.tokens[this.at + dash + 1];
    if (dash === 1 && !inches?.joined) return ok({ value, quantity: true });
    if (inches?.kind !== "number" || unit?.kind !== "unit" || unit.unit !== "in")
      return ok({ value, quantity: true });
    this.at += dash + 2;
    return ok({ value: value + toStored(inches.value, "in"), quantity: true });
  }

  private isSign(text: string): boolean {
    const token = this.rest();
    return token?.kind === "sign" && token.text === text;
  }

  private take(): Token | undefined {
    return this.tokens[this.at++];
  }
}
