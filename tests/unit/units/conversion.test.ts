import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  fromStored,
  STORED_UNIT,
  toStored,
  UNITS,
  type Dimension,
  type UnitName,
} from "@/lib/units/conversion";
import { displayRule, propertyRule } from "@/lib/units/display-units";
import { UNIT_OF, type PropertyKey } from "@/lib/units/property-units";
import { expectRel } from "@/tests/helpers/expect-rel";

const names = Object.keys(UNITS) as UnitName[];

describe("conversion factors", () => {
  // NIST SP 811 (2008), appendix B.8/B.9; the last digit printed there bounds the relative error.
  test.each<[UnitName, number, number]>([
    ["in", 25.4, 1e-15],
    ["ft", 304.8, 1e-15],
    ["in2", 645.16, 1e-15],
    ["in3", 16387.064, 1e-15],
    ["in4", 416231.4256, 1e-15],
    ["in6", 2.6853586654e8, 1e-10],
    ["lb/ft", 1.488163944, 1e-9],
    ["lb/ft3", 16.01846337, 1e-9],
    ["kip", 4448.2216152605, 1e-15],
    ["kip.ft", 1.355817948e6, 1e-9],
    ["psi", 6894.757293e-6, 1e-9],
    ["ksi", 6.894757293, 1e-9],
  ])("%s is %d in the stored unit (NIST SP 811)", (unit, factor, tolerance) => {
    expectRel(toStored(1, unit), factor, { rel: tolerance });
  });

  test("there and back is the same value to one part in 1e15", () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...names),
        fc.double({ min: -1e12, max: 1e12, noNaN: true }),
        (unit, value) => {
          expectRel(fromStored(toStored(value, unit), unit), value, { rel: 1e-15, scale: 1e-290 });
        },
      ),
    );
  });

  test("the stored unit of every dimension has the factor 1", () => {
    for (const dimension of Object.keys(STORED_UNIT) as Dimension[]) {
      expect(UNITS[STORED_UNIT[dimension]]).toEqual({ dimension, toStored: 1 });
    }
  });
});

describe("display units", () => {
  test.each(Object.keys(UNIT_OF) as PropertyKey[])(
    "%s is shown in a unit of its own dimension in both systems",
    (key) => {
      for (const system of ["metric", "inch"] as const)
        expect(UNITS[propertyRule(key, system).unit].dimension).toBe(UNITS[UNIT_OF[key]].dimension);
    },
  );

  test("a second moment of area stands in 10^6 mm^4 or in^4, a torsion constant in 10^3 mm^4", () => {
    expect(propertyRule("Ix", "metric").unit).toBe("E6 mm4");
    expect(propertyRule("Ix", "inch").unit).toBe("in4");
    expect(propertyRule("J", "metric").unit).toBe("E3 mm4");
    expect(displayRule("stress", "inch").unit).toBe("ksi");
  });
});
