import { err, ok, type Result } from "@/lib/result";
import { UNITS, type Dimension, type UnitName } from "@/lib/units/conversion";
import { asMinus, NUMBER_LITERAL, readLiteral } from "@/lib/units/parse-number";
import type { DecimalMark } from "@/lib/units/settings";

export type Token =
  | Readonly<{ kind: "number"; text: string; value: number; joined: boolean }>
  | Readonly<{ kind: "unit"; text: string; unit: UnitName; joined: boolean }>
  | Readonly<{ kind: "sign"; text: "+" | "-" | "*" | "/" | "(" | ")"; joined: boolean }>;

type Options = Readonly<{ dimension: Dimension; decimal: DecimalMark }>;

/** What people type for units, in lower case and with raised figures lowered. */
const SPELLINGS: Readonly<Record<string, UnitName>> = {
  '"': "in",
  "″": "in",
  "”": "in",
  "''": "in",
  inch: "in",
  inches: "in",
  "'": "ft",
  "′": "ft",
  "’": "ft",
  foot: "ft",
  feet: "ft",
  "kg/m": "kg/m",
  "kg/m3": "kg/m3",
  "lb/ft": "lb/ft",
  "lbs/ft": "lb/ft",
  "lb/ft3": "lb/ft3",
  plf: "lb/ft",
  pcf: "lb/ft3",
  kn: "kN",
  n: "N",
  kips: "kip",
  k: "kip",
  mpa: "MPa",
  gpa: "GPa",
  "n/mm2": "MPa",
  "kn.m": "kN.m",
  knm: "kN.m",
  "n.mm": "N.mm",
  nmm: "N.mm",
  "kip.ft": "kip.ft",
  "kip-ft": "kip.ft",
  kipft: "kip.ft",
  "kip.in": "kip.in",
  "kip-in": "kip.in",
  "°": "deg",
  degrees: "deg",
  "%": "%",
};

const PROPER_FRACTION = /^(\d{1,4}) *\/ *(\d{1,3})(?![\d.,])/;
const MIXED_FRACTION = /^(\d{1,6})( +|-)(\d{1,2})\/(\d{1,2})(?![\d.,/])/;
// Unit words: letters with an exponent, with "/", "." or "-" between two of them; marks for feet, inches, degrees, per cent.
const UNIT_WORD = /^(?:[a-z]+\^?\d?(?:[/.·-][a-z]+\^?\d?)?|''|["'″′”’°%])/i;
const SIGN = /^[+\-*/()×·x]/;
const RAISED: Readonly<Record<string, string>> = { "²": "2", "³": "3", "⁴": "4", "⁵": "5", "⁶": "6" };

/** Cuts a typed quantity into numbers, units and signs. `joined` tells whether no space stands before the token. */
export function lexQuantity(text: string, options: Options): Result<readonly Token[]> {
  let rest = asMinus(text).replace(/[²³⁴⁵⁶]/g, (c) => RAISED[c] ?? c);
  const tokens: Token[] = [];
  for (;;) {
    const trimmed = rest.trimStart();
    const joined = trimmed.length === rest.length;
    rest = trimmed;
    if (!rest) return ok(tokens);
    const last = tokens.at(-1);
    const token = /^[\d.,]/.test(rest)
      ? lexNumber(rest, options, joined)
      : lexOther(rest, options, joined, last);
    if (!token.ok) return token;
    tokens.push(token.value.token);
    rest = rest.slice(token.value.length);
  }
}

type Cut = Readonly<{ token: Token; length: number }>;

function lexNumber(rest: string, { decimal }: Options, joined: boolean): Result<Cut> {
  const mixed = MIXED_FRACTION.exec(rest);
  if (mixed) {
    const [whole, above, below] = [Number(mixed[1]), Number(mixed[3]), Number(mixed[4])];
    const value = whole + above / below;
    if (mixed[2] === "-" && above < below && isInchDenominator(below)) return dashedFraction(mixed);
    if (mixed[2] !== "-" && above < below)
      return ok({ token: { kind: "number", text: mixed[0], value, joined }, length: mixed[0].length });
  }
  const proper = PROPER_FRACTION.exec(rest);
  if (proper && Number(proper[2]) > 0) {
    const value = Number(proper[1]) / Number(proper[2]);
    return ok({ token: { kind: "number", text: proper[0], value, joined }, length: proper[0].length });
  }
  const literal = withoutFeetMark(NUMBER_LITERAL.exec(rest)?.[0] ?? "");
  if (!/\d/.test(literal)) return unknown(rest);
  const value = readLiteral(literal, decimal);
  if (!value.ok) return value;
  return ok({ token: { kind: "number", text: literal, value: value.value, joined }, length: literal.length });
}

/** "12-3/4" is 12 3/4 to one reader and 11 1/4 to another. */
const dashedFraction = ([text, whole, , above, below]: RegExpExecArray): Result<never> =>
  err({
    code: "quantity.ambiguous",
    detail: `"${text}" can be ${whole} ${above}/${below} or ${whole} less ${above}/${below}: type "${whole} ${above}/${below}" or "${whole} - ${above}/${below}".`,
  });

const isInchDenominator = (n: number): boolean => [2, 4, 8, 16, 32, 64].includes(n);
/** An apostrophe groups thousands only where nothing but groups follow; the literal's pattern has seen to the rest. */
const withoutFeetMark = (literal: string): string => literal.replace(/['’]$/, "");

function lexOther(rest: string, options: Options, joined: boolean, last: Token | undefined): Result<Cut> {
  const afterValue = last?.kind === "number" || (last?.kind === "sign" && last.text === ")");
  const word = UNIT_WORD.exec(rest)?.[0];
  const isTimes = /^[x×·]/i.test(rest) && !/^x[a-z]/i.test(rest);
  if (word && afterValue && !isTimes) {
    const unit = unitNamed(word);
    if (!unit) return unknown(word);
    if (UNITS[unit].dimension !== options.dimension)
      return err({
        code: "quantity.wrongUnit",
        detail: `"${word}" is not a unit of ${NAMES[options.dimension]}.`,
      });
    return ok({ token: { kind: "unit", text: word, unit, joined }, length: word.length });
  }
  const sign = SIGN.exec(rest)?.[0];
  if (!sign) return unknown(word ?? rest);
  const text = /[x×·]/.test(sign) ? "*" : sign;
  if (text === "+" || text === "-" || text === "*" || text === "/" || text === "(" || text === ")")
    return ok({ token: { kind: "sign", text, joined }, length: 1 });
  return unknown(rest);
}

function unitNamed(word: string): UnitName | undefined {
  const plain = word.replace("^", "").replace("·", ".");
  const lower = plain.toLowerCase();
  return (Object.hasOwn(UNITS, plain) ? (plain as UnitName) : undefined) ?? spelling(lower) ?? own(lower);
}
const spelling = (lower: string): UnitName | undefined =>
  Object.hasOwn(SPELLINGS, lower) ? SPELLINGS[lower] : undefined;
const own = (lower: string): UnitName | undefined =>
  (Object.keys(UNITS) as UnitName[]).find((name) => name.toLowerCase() === lower);

const unknown = (text: string): Result<never> =>
  err({ code: "quantity.unreadable", detail: `"${text.slice(0, 24)}" is not understood here.` });

const NAMES: Record<Dimension, string> = {
  length: "length",
  area: "area",
  modulus: "section modulus",
  inertia: "second moment of area",
  asymmetry: "this quantity",
  warping: "warping constant",
  linearMass: "mass per length",
  paintedSurface: "painted surface",
  angle: "angle",
  force: "force",
  moment: "moment",
  stress: "stress",
  density: "density",
  ratio: "ratio",
};
