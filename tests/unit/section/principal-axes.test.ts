import { describe, expect, test } from "vitest";
import { everyNumberIsFinite } from "@/lib/section/finite";
import { principalAxes } from "@/lib/section/principal-axes";
import { expectRel } from "@/tests/helpers/expect-rel";

const EXACT = { rel: 1e-14 };

describe("the angle of axis 1", () => {
  test("is 0 or 90 where Ixy vanishes", () => {
    expect(principalAxes({ Ix: 3, Iy: 1, Ixy: 0 }).angle).toBe(0);
    expect(principalAxes({ Ix: 3, Iy: 1, Ixy: -0 }).angle).toBe(0);
    expect(principalAxes({ Ix: 1, Iy: 3, Ixy: 0 }).angle).toBe(90);
    expect(principalAxes({ Ix: 1, Iy: 3, Ixy: 1e-16 }).angle).toBe(90);
    expect(principalAxes({ Ix: 1, Iy: 3, Ixy: -1e-16 }).angle).toBe(90);
  });

  test("is ±45 where Ix = Iy", () => {
    expectRel(principalAxes({ Ix: 2, Iy: 2, Ixy: 1 }).angle, -45, EXACT);
    expectRel(principalAxes({ Ix: 2, Iy: 2, Ixy: -1 }).angle, 45, EXACT);
  });

  test("stays in (−90, 90] all the way round", () => {
    for (let degrees = -89.5; degrees <= 90; degrees += 0.5) {
      const twice = (2 * degrees * Math.PI) / 180;
      const found = principalAxes({
        Ix: 5 + 2 * Math.cos(twice),
        Iy: 5 - 2 * Math.cos(twice),
        Ixy: -2 * Math.sin(twice),
      });
      expectRel(found.angle, degrees, { rel: 1e-13, scale: 90, name: `${degrees}` });
      expectRel(found.I1, 7, EXACT);
      expectRel(found.I2, 3, EXACT);
      expect(found.any).toBe(false);
    }
  });

  test("is 0 and said to be any where I1 − I2 is rounding", () => {
    expect(principalAxes({ Ix: 1, Iy: 1, Ixy: 0 })).toEqual({ I1: 1, I2: 1, angle: 0, any: true });
    expect(principalAxes({ Ix: 1, Iy: 1 + 1e-10, Ixy: 1e-10 }).any).toBe(true);
    expect(principalAxes({ Ix: 1, Iy: 1 + 1e-8, Ixy: 0 }).any).toBe(false);
  });
});

test("finite is looked for to any depth", () => {
  expect(everyNumberIsFinite({ a: [1, { b: null, c: "x" }] })).toBe(true);
  expect(everyNumberIsFinite({ a: [1, { b: Number.NaN }] })).toBe(false);
  expect(everyNumberIsFinite([Number.POSITIVE_INFINITY])).toBe(false);
});
