import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { findMarks, readNumber, type Marks } from "@/lib/intake/read-number";

const COMMA: Marks = { decimal: ",", thousands: null };
const POINT: Marks = { decimal: ".", thousands: null };

describe("one cell as a number", () => {
  test.each([
    ["42,2", COMMA, 42.2, 0.05],
    ["1943", COMMA, 1943, 0.5],
    ["11.770", { decimal: ",", thousands: "." } as Marks, 11770, 0.5],
    ["1 234,5", COMMA, 1234.5, 0.05],
    ["1\u202f234.5", POINT, 1234.5, 0.05],
    ["12'345.6", POINT, 12345.6, 0.05],
    ["12 3/4", POINT, 12.75, 0],
    ["3/8", POINT, 0.375, 0],
    ["1e3", POINT, 1000, 500],
    ["\u22127,1", COMMA, -7.1, 0.05],
    ["0,875", COMMA, 0.875, 0.0005],
    [".5", POINT, 0.5, 0.05],
  ])("%s", (cell, marks, value, half) => {
    expect(readNumber(cell, marks)).toEqual({
      kind: "number",
      value,
      halfUnit: expect.any(Number),
      otherMark: false,
    });
    const read = readNumber(cell, marks);
    expect(read.kind === "number" && Math.abs(read.halfUnit - half) <= 1e-12 * Math.max(half, 1)).toBe(true);
  });

  test.each(["1.234", "11.770", "999.000"])("%s in a file of decimal commas is never guessed", (cell) => {
    expect(readNumber(cell, COMMA).kind).toBe("ambiguous");
    expect(readNumber(cell, null).kind).toBe("ambiguous");
  });

  test("a decimal point that cannot be a thousands mark is read and said to differ", () => {
    expect(readNumber("66.3", COMMA)).toMatchObject({ kind: "number", value: 66.3, otherMark: true });
  });

  test.each(["ca. 78,1", "12,3,4", "1.2.3", "0x10", "--5", "1,2.3,4", "78,1*", "1/0", "Infinity"])(
    "%s is text",
    (cell) => {
      expect(readNumber(cell, COMMA).kind).toBe("text");
    },
  );

  test.each(["1e309", "1e99", "9".repeat(31)])("%s is out of range, not infinite", (cell) => {
    expect(readNumber(cell, POINT).kind).toBe("outOfRange");
  });

  test.each(["", " ", "-", "–", "n/a"])("%j is blank", (cell) =>
    expect(readNumber(cell, COMMA).kind).toBe("blank"),
  );

  test("whatever is typed, the answer is finite or a named kind, in linear time", () => {
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.stringMatching(/^[0-9.,' eE+-]{0,40}$/)), (cell) => {
        const read = readNumber(cell, COMMA);
        return read.kind !== "number" || (Number.isFinite(read.value) && Number.isFinite(read.halfUnit));
      }),
    );
  });

  test("a number written with any pair of marks is read back", () => {
    const marks = fc.constantFrom<Marks>(
      { decimal: ",", thousands: "." },
      { decimal: ".", thousands: "," },
      { decimal: ",", thousands: " " },
      { decimal: ".", thousands: "'" },
    );
    fc.assert(
      fc.property(
        fc.integer({ min: -9_999_999, max: 9_999_999 }),
        fc.integer({ min: 0, max: 4 }),
        marks,
        (n, decimals, m) => {
          const value = n / 10 ** decimals;
          const [whole = "", part] = Math.abs(value).toFixed(decimals).split(".");
          const grouped = whole.replace(/\B(?=(\d{3})+(?!\d))/g, m.thousands ?? "");
          const text = `${value < 0 ? "-" : ""}${grouped}${part === undefined ? "" : m.decimal + part}`;
          const read = readNumber(text, m);
          return (
            read.kind === "number" && Math.abs(read.value - value) <= 1e-12 * Math.max(1, Math.abs(value))
          );
        },
      ),
    );
  });
});

describe("the marks of a file", () => {
  test("come from cells that can be read one way only", () => {
    expect(findMarks(["8,1", "1943", "11.770"]).marks).toEqual({ decimal: ",", thousands: null });
    expect(findMarks(["1.234,5", "8,1"]).marks).toEqual({ decimal: ",", thousands: "." });
    expect(findMarks(["4.43", "1,234,567"]).marks).toEqual({ decimal: ".", thousands: "," });
  });
  test("are not known when nothing shows them", () => {
    expect(findMarks(["1.234", "5.678"]).marks).toBeNull();
    expect(findMarks(["1,5", "1.5"]).marks).toBeNull();
  });
});
