import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { parseLength } from "@/lib/units/parse-length";
import { parseNumber } from "@/lib/units/parse-number";
import { parseQuantity } from "@/lib/units/parse-quantity";
import { expectRel } from "@/tests/helpers/expect-rel";

const mmOf = (text: string, options?: Parameters<typeof parseLength>[1]) => {
  const length = parseLength(text, options);
  if (!length.ok) throw new Error(`${text}: ${length.error.code} ${length.error.detail}`);
  return length.value.mm;
};
const codeOf = (text: string, options?: Parameters<typeof parseLength>[1]) => {
  const length = parseLength(text, options);
  return length.ok ? `read as ${length.value.mm}` : length.error.code;
};

describe("a length in a field of mm", () => {
  test.each<[string, number]>([
    ["564", 564],
    ["632-36-32", 564],
    ["632 - 36 - 32", 564],
    ["632\u221236\u221232", 564],
    ["3/8 in", 9.525],
    ["12 3/4 in", 323.85],
    ["12 ft 6 in", 3810],
    [`12' 6"`, 3810],
    [`12'-6"`, 3810],
    [`12'-6 1/2"`, 3822.7],
    ["12 ft", 3657.6],
    ["12.5", 12.5],
    ["12,5", 12.5],
    [".5", 0.5],
    ["12.", 12],
    ["-7", -7],
    ["2 000", 2000],
    ["12\u202f500", 12500],
    ["1,234,567", 1234567],
    ["1,234.5", 1234.5],
    ["1'234.5", 1234.5],
    ["2*16+8", 40],
    ["2×16", 32],
    ["2x16", 32],
    ["(600-2*16)/2", 284],
    ["632/2", 316],
    ["1.2 m", 1200],
    ["55 cm", 550],
    ["1 in + 5", 30.4],
    ["(1+1/2) in", 38.1],
    ["2 * 3/8 in", 19.05],
    ["1e3", 1000],
    ["5 ft - 6 in", 1371.6],
    ["12 - 3/4", 11.25],
  ])("%s is %d mm", (text, mm) => {
    // two roundings of a double
    expectRel(mmOf(text), mm, { rel: 1e-15 });
  });

  test.each([
    ["", "quantity.missing"],
    ["   ", "quantity.missing"],
    ["abc", "quantity.unreadable"],
    ["12 q", "quantity.unreadable"],
    ["12 34", "quantity.unreadable"],
    ["12-", "quantity.unfinished"],
    ["(12", "quantity.bracket"],
    ["12)", "quantity.unreadable"],
    ["12/0", "quantity.zeroDivision"],
    ["5/(3-3)", "quantity.zeroDivision"],
    ["2 in * 3 in", "quantity.units"],
    ["6 mm / 2 mm", "quantity.units"],
    ["12 mm2", "quantity.wrongUnit"],
    ["12 kip", "quantity.wrongUnit"],
    ["12-3/4", "quantity.ambiguous"],
    ["1,234", "number.ambiguous"],
    ["1.2.3", "number.marks"],
    ["1,23,4", "number.marks"],
    ["1e999", "number.tooLarge"],
    ["9e307*9e307", "quantity.notFinite"],
    ["Infinity", "quantity.unreadable"],
    ["NaN", "quantity.unreadable"],
    ["0x10", "0"],
    ["constructor", "quantity.unreadable"],
    ["1 constructor", "quantity.unreadable"],
    ["-".repeat(300) + "1", "quantity.tooLong"],
    ["(".repeat(5000), "quantity.tooLong"],
  ])("%s is refused: %s", (text, code) => {
    expect(codeOf(text)).toBe(code === "0" ? "read as 0" : code);
  });

  test("an ambiguous number says both readings", () => {
    const read = parseLength("1,234");
    expect(read.ok ? "" : read.error.detail).toBe(
      '"1,234" can be read as 1234 or as 1.234: type it without the comma.',
    );
  });
});

describe("a person who writes the decimal comma", () => {
  test.each<[string, number]>([
    ["1,234", 1.234],
    ["12,5", 12.5],
    ["12.5", 12.5],
    ["1.234,5", 1234.5],
    ["0.125", 0.125],
  ])("%s is %d mm", (text, mm) => {
    expectRel(mmOf(text, { decimal: "," }), mm, { rel: 1e-15 });
  });
  test("1.234 could be grouped and is refused", () => {
    expect(codeOf("1.234", { decimal: "," })).toBe("number.ambiguous");
  });
});

describe("a length in a field of inches", () => {
  test.each<[string, number]>([
    ["12 3/4", 323.85],
    ["3/8", 9.525],
    ["10 mm", 10],
    ["1 ft", 304.8],
    ["1 + 10 mm", 35.4],
  ])("%s is %d mm", (text, mm) => {
    expectRel(mmOf(text, { unit: "in" }), mm, { rel: 1e-15 });
  });
});

describe("other quantities", () => {
  const read = (
    text: string,
    dimension: Parameters<typeof parseQuantity>[1]["dimension"],
    unit: Parameters<typeof parseQuantity>[1]["unit"],
  ) => {
    const value = parseQuantity(text, { dimension, unit, decimal: "." });
    return value.ok ? value.value : NaN;
  };
  test("a plain number takes the unit beside the field", () => {
    expectRel(read("2 000", "modulus", "E3 mm3"), 2e6, { rel: 1e-15 });
    expectRel(read("547", "inertia", "E6 mm4"), 547e6, { rel: 1e-15 });
  });
  test("a unit typed with the number counts", () => {
    expectRel(read("2000 cm3", "modulus", "E3 mm3"), 2e6, { rel: 1e-15 });
    expectRel(read("2000 cm³", "modulus", "E3 mm3"), 2e6, { rel: 1e-15 });
    expectRel(read("120 in^3", "modulus", "E3 mm3"), 120 * 16387.064, { rel: 1e-14 });
    expectRel(read("50 in4", "inertia", "E6 mm4"), 50 * 416231.4256, { rel: 1e-14 });
    expectRel(read("50 lb/ft", "linearMass", "kg/m"), 50 * 1.4881639435695537, { rel: 1e-14 });
    expectRel(read("0.9*345", "stress", "MPa"), 310.5, { rel: 1e-15 });
    expectRel(read("50 ksi", "stress", "MPa"), 344.73786465841547, { rel: 1e-12 });
    expectRel(read("10 kN·m", "moment", "kN.m"), 1e7, { rel: 1e-15 });
    expectRel(read("10 kip-ft", "moment", "kip.ft"), 10 * 1.3558179483314004e6, { rel: 1e-12 });
    expectRel(read("30%", "ratio", "1"), 0.3, { rel: 1e-15 });
  });
});

describe("a plain number", () => {
  test.each<[string, number]>([
    ["−12.5", -12.5],
    ["+3", 3],
    ["12 500.25", 12500.25],
    ["1e-3", 0.001],
  ])("%s is %d", (text, value) => {
    const read = parseNumber(text, ".");
    expect(read.ok && read.value).toBe(value);
  });
  test.each(["", " ", "12 mm", "0x1f", "1 2", "--1", "e5", "."])("%j is refused", (text) => {
    expect(parseNumber(text, ".").ok).toBe(false);
  });
});

test("any text gives a finite number or a sentence, never a throw", () => {
  fc.assert(
    fc.property(
      fc.oneof(fc.string(), fc.stringMatching(/^[0-9 .,+\-*/()'"xftinmc²³]{0,40}$/)),
      fc.constantFrom("." as const, "," as const),
      (text, decimal) => {
        const read = parseLength(text, { decimal });
        if (read.ok) expect(Number.isFinite(read.value.mm)).toBe(true);
        else expect(read.error.detail.length).toBeGreaterThan(5);
      },
    ),
    { numRuns: 3000 },
  );
});

test("a sum of whole numbers is their sum", () => {
  fc.assert(
    fc.property(fc.array(fc.integer({ min: 0, max: 9999 }), { minLength: 1, maxLength: 20 }), (terms) => {
      expect(mmOf(terms.join(" + "))).toBe(terms.reduce((a, b) => a + b, 0));
    }),
  );
});
