import { expect, test } from "vitest";
import { thicknessOf } from "@/lib/drawing/part-thickness";

test("the thickness of a profile is that of its thickest element, of a tube its wall, of a bar its lesser size", () => {
  const i = { depth: 300, flangeWidth: 150, webThickness: 7.1, flangeThickness: 10.7, rootRadius: 15 };
  expect(thicknessOf({ kind: "profile", family: "i-section", dimensions: i })).toBe(10.7);
  const unequal = {
    depth: 300,
    topWidth: 150,
    topThickness: 10,
    bottomWidth: 200,
    bottomThickness: 12,
    webThickness: 14,
    rootRadius: 0,
  };
  expect(thicknessOf({ kind: "profile", family: "i-section-unequal", dimensions: unequal })).toBe(14);
  expect(
    thicknessOf({ kind: "profile", family: "round-hollow", dimensions: { diameter: 100, thickness: 5 } }),
  ).toBe(5);
  expect(thicknessOf({ kind: "profile", family: "flat", dimensions: { width: 8, thickness: 100 } })).toBe(8);
  expect(thicknessOf({ kind: "profile", family: "timber", dimensions: { width: 90, depth: 45 } })).toBe(45);
  expect(thicknessOf({ kind: "profile", family: "round", dimensions: { diameter: 30 } })).toBe(30);
  expect(thicknessOf({ kind: "round", diameter: 30, wall: 4 })).toBe(4);
  expect(thicknessOf({ kind: "round", diameter: 30 })).toBe(30);
  expect(thicknessOf({ kind: "outline", outer: [], holes: [] })).toBeNull();
});
