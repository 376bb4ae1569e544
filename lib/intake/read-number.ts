/** Marks of a column or file: the decimal mark and, where the file shows one, the thousands mark. */
export type Marks = Readonly<{ decimal: "," | "."; thousands: "," | "." | "'" | " " | null }>;

export type NumberRead =
  | Readonly<{
      kind: "number";
      value: number;
      /** Half of the last digit written: what the table's own rounding leaves open. */
      halfUnit: number;
      /** Written with the other decimal mark than the file's. */
      otherMark: boolean;
    }>
  | Readonly<{ kind: "blank" }>
  | Readonly<{ kind: "text" }>
  | Readonly<{ kind: "outOfRange" }>
  /** A single mark before three digits: a thousands mark or a decimal mark, and nothing in the file decides. */
  | Readonly<{ kind: "ambiguous"; readings: readonly [number, number] }>;

const BLANK = /^(?:[-\u2013\u2014\u2212.]|n\/?a|#n\/a|nan)?$/i;
const SPACES = /[\u0020\u00a0\u2009\u202f]/g;
const PLAIN = /^[+-]?\d+(?:e[+-]?\d{1,3})?$/i;
const FRACTION = /^([+-]?)(?:(\d+)[ -])?(\d+)\/(\d+)$/;
const ONE_MARK = /^([+-]?)(\d*)([.,])(\d+)(e[+-]?\d{1,3})?$/i;
const GROUPED = /^([+-]?)(\d{1,3})([.,' ])(\d{3}(?:\3\d{3})*)(?:([.,])(\d+))?$/;

const LARGEST = 1e30;

function finite(value: number, halfUnit: number, otherMark = false): NumberRead {
  if (!Number.isFinite(value) || Math.abs(value) > LARGEST) return { kind: "outOfRange" };
  return { kind: "number", value, halfUnit, otherMark };
}

const halfOf = (decimals: number, exponent: string | undefined) =>
  0.5 * 10 ** (-decimals + (exponent === undefined ? 0 : Number(exponent.slice(1))));

/**
 * One cell as a number, by the marks of its file. Never guesses: "1.234" in a file of decimal commas without a shown thousands
 * point is ambiguous. Takes a true minus, spaces as thousands marks, fractions ("12 3/4") and exponents.
 */
export function readNumber(cell: string, marks: Marks | null): NumberRead {
  const text = cell
    .trim()
    .replace(/[\u2212\u2013]/g, "-")
    .replace(SPACES, " ")
    .replace(/[\u2019\u00b4`]/g, "'");
  if (BLANK.test(text)) return { kind: "blank" };
  if (PLAIN.test(text)) {
    const exponent = /e.+$/i.exec(text)?.[0];
    return finite(Number(text), halfOf(0, exponent));
  }
  const fraction = FRACTION.exec(text);
  if (fraction !== null) return readFraction(fraction);
  const single = ONE_MARK.exec(text);
  if (single !== null) return readOneMark(single, marks);
  const grouped = GROUPED.exec(text);
  return grouped === null ? { kind: "text" } : readGrouped(grouped, marks);
}

function readFraction(match: RegExpExecArray): NumberRead {
  const [, sign, whole, over, under] = match;
  if (Number(under) === 0) return { kind: "text" };
  const size = Number(whole ?? 0) + Number(over) / Number(under);
  return finite(sign === "-" ? -size : size, 0);
}

function readOneMark(match: RegExpExecArray, marks: Marks | null): NumberRead {
  const [, sign = "", whole = "", mark = ".", digits = "", exponent] = match;
  const value = Number(`${sign}${whole === "" ? "0" : whole}.${digits}${exponent ?? ""}`);
  const asDecimal = (other: boolean) => finite(value, halfOf(digits.length, exponent), other);
  const couldGroup = exponent === undefined && digits.length === 3 && /^[1-9]\d{0,2}$/.test(whole);
  if (marks?.decimal === mark) return asDecimal(false);
  if (!couldGroup) return asDecimal(marks !== null);
  const joined = Number(`${sign}${whole}${digits}`);
  if (marks?.thousands === mark) return finite(joined, 0.5);
  return { kind: "ambiguous", readings: [value, joined] };
}

function readGrouped(match: RegExpExecArray, marks: Marks | null): NumberRead {
  const [, sign = "", first = "", group = " ", groups = "", mark, digits = ""] = match;
  if (mark === group) return { kind: "text" };
  const value = Number(`${sign}${first}${groups.replace(/\D/g, "")}${digits === "" ? "" : `.${digits}`}`);
  const contradicts =
    marks !== null && ((mark !== undefined && mark !== marks.decimal) || group === marks.decimal);
  return finite(value, halfOf(digits.length, undefined), contradicts);
}

/** Evidence for the marks of a file, from cells that can be read in one way only. */
export type MarksFound = Readonly<{ marks: Marks | null; evidence: string }>;

export function findMarks(cells: Iterable<string>): MarksFound {
  const decimal = { ",": 0, ".": 0 };
  const thousands = new Map<string, number>();
  const shown = { ",": "", ".": "" };
  const vote = (mark: "," | ".", cell: string) => {
    decimal[mark] += 1;
    if (shown[mark] === "") shown[mark] = cell;
  };
  for (const raw of cells) {
    const text = raw
      .trim()
      .replace(SPACES, " ")
      .replace(/\u2212/g, "-")
      .replace(/\u2019/g, "'");
    const single = ONE_MARK.exec(text);
    if (single !== null) {
      const couldGroup = single[4]?.length === 3 && /^[1-9]\d{0,2}$/.test(single[2] ?? "");
      if (!couldGroup) vote(single[3] === "," ? "," : ".", raw);
      continue;
    }
    const grouped = GROUPED.exec(text);
    if (grouped === null) continue;
    const group = grouped[3] ?? " ";
    thousands.set(group, (thousands.get(group) ?? 0) + 1);
    if (grouped[5] !== undefined) vote(grouped[5] === "," ? "," : ".", raw);
    else if (group === ".") vote(",", raw);
    else if (group === ",") vote(".", raw);
  }
  if (decimal[","] === decimal["."])
    return {
      marks: null,
      evidence:
        decimal[","] === 0
          ? "no cell shows a decimal mark"
          : "as many cells show a decimal comma as a decimal point",
    };
  const mark = decimal[","] > decimal["."] ? "," : ".";
  const other = mark === "," ? "." : ",";
  const group = [...thousands.entries()].filter(([m]) => m !== mark).sort((a, b) => b[1] - a[1])[0]?.[0];
  const known = group === "." || group === "," || group === "'" || group === " " ? group : null;
  const against = decimal[other] === 0 ? "" : `, ${decimal[other]} the other mark`;
  return {
    marks: { decimal: mark, thousands: known },
    evidence: `${decimal[mark]} cells show it (${shown[mark]})${against}${known === null ? "; no thousands mark shown" : ""}`,
  };
}
