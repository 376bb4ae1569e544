import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { propertyRule } from "@/lib/units/display-units";
import {
  bareText,
  columnDecimals,
  decimalsFor,
  fieldText,
  readText,
  setNumber,
  setStored,
} from "@/lib/units/format";
import { feetInchesText, fractionText } from "@/lib/units/inches";
import { parseNumber } from "@/lib/units/parse-number";
import { unitText } from "@/lib/units/unit-text";

describe("a set number", () => {
  test.each<[number, number, ".", string] | [number, number, ",", string]>([
    [14350, 0, ".", "14350"],
    [1234567.891, 1, ".", "1234567.9"],
    [-12.345, 2, ",", "-12,35"],
    [1.005, 2, ".", "1.01"],
    [0, 1, ".", "0.0"],
    [-0.04, 1, ".", "0.0"],
    [1e21, 0, ".", "1000000000000000000000"],
  ])("%d with %i decimals and %s copies as %s", (value, decimals, mark, text) => {
    expect(bareText(setNumber(value, decimals, mark))).toBe(text);
  });

  test("reads with gaps between thousands and a true minus", () => {
    expect(readText(setNumber(-14350.5, 1, "."))).toBe("\u221214\u202f350.5");
    expect(setNumber(999, 0, ".").groups).toEqual(["999"]);
    expect(setNumber(1000, 0, ".").groups).toEqual(["1", "000"]);
  });

  test("refuses what is not finite", () => {
    for (const bad of [NaN, Infinity, -Infinity]) expect(() => setNumber(bad, 1, ".")).toThrow(RangeError);
  });

  test("types back to the value it shows, with either mark", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -1e9, max: 1e9, noNaN: true }),
        fc.integer({ min: 0, max: 4 }),
        fc.constantFrom("." as const, "," as const),
        (value, decimals, mark) => {
          for (const text of [
            bareText(setNumber(value, decimals, mark)),
            readText(setNumber(value, decimals, mark)),
          ]) {
            const back = parseNumber(text, mark);
            expect(back.ok && Math.abs(back.value - value)).toBeLessThanOrEqual(
              0.5 * 10 ** -decimals * (1 + 1e-6) + 1e-6,
            );
          }
        },
      ),
    );
  });
});

describe("decimals", () => {
  const Ix = propertyRule("Ix", "metric");
  test("a small angle beside a girder keeps three significant digits", () => {
    expect(decimalsFor(0.177, Ix)).toBe(3);
    expect(decimalsFor(1622, Ix)).toBe(1);
    expect(columnDecimals([1.622e9, 1.77e5, null], Ix)).toBe(3);
  });
  test("zero and an empty column need the least", () => {
    expect(decimalsFor(0, Ix)).toBe(1);
    expect(columnDecimals([], Ix)).toBe(1);
  });
  test("810.6e6 mm4 stands as 810.6 in metric and 1947 in inch display", () => {
    expect(bareText(setStored(810.6e6, Ix, "."))).toBe("810.6");
    // 810.6e6 / 416231.4256 = 1947.5
    expect(bareText(setStored(810.6e6, propertyRule("Ix", "inch"), "."))).toBe("1947");
  });
});

describe("text of a field at rest", () => {
  test.each<[number, number, ".", string] | [number, number, ",", string]>([
    [12.5, 3, ".", "12.5"],
    [12, 3, ",", "12"],
    [100, 0, ".", "100"],
    [0.1234, 3, ",", "0,123"],
  ])("%d to at most %i decimals is %s%s", (value, decimals, mark, text) => {
    expect(fieldText(value, decimals, mark)).toBe(text);
  });
});

describe("inches", () => {
  test.each([
    [323.85, "12 3/4"],
    [9.525, "3/8"],
    [25.4, "1"],
    [0, "0"],
    [-12.7, "\u22121/2"],
    [25.4 * (7 + 15.4 / 16), "7 15/16"],
    [25.4 * 7.999, "8"],
  ])("%d mm is %s", (mm, text) => {
    expect(fractionText(mm, 16)).toBe(text);
  });
  test.each([
    [3810, "12 ft 6 in"],
    [304.8, "1 ft"],
    [304.7, "1 ft"],
    [76.2, "3 in"],
    [-3810, "\u221212 ft 6 in"],
    [304.8 * 5 + 25.4 * 6.5, "5 ft 6 1/2 in"],
  ])("%d mm is %s", (mm, text) => {
    expect(feetInchesText(mm, 16)).toBe(text);
  });
  test("a fraction is never further off than half its step", () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1e5, noNaN: true }), (mm) => {
        const terms = fractionText(mm, 32).split(" ");
        const read = terms.reduce((sum, term) => {
          const [above, below = 1] = term.split("/").map(Number);
          return sum + (above ?? NaN) / below;
        }, 0);
        expect(Math.abs(read - mm / 25.4)).toBeLessThanOrEqual(1 / 64 + 1e-9);
      }),
    );
  });
});

test("units are written once, with their powers", () => {
  expect(unitText("E6 mm4")).toBe("10^6 mm^4");
  expect(unitText("kN.m")).toBe("kN·m");
  expect(unitText("ft2/ft")).toBe("ft^2/ft");
  expect(unitText("kg/m3")).toBe("kg/m^3");
  expect(unitText("lb/ft")).toBe("lb/ft");
  expect(unitText("1")).toBe("");
});
