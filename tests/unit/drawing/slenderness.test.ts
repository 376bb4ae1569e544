import { describe, expect, test } from "vitest";
import type { Drawing } from "@/lib/drawing/schema";
import { sectionOf } from "@/lib/drawing/section-of";
import { slendernessOf } from "@/lib/drawing/slenderness";
import type { Profile } from "@/lib/profiles/families";
import { profileDrawing, steelDrawing } from "@/tests/helpers/steel-drawing";

const factsOf = (drawing: Drawing) => {
  const section = sectionOf(drawing);
  if (!section.ok) throw new Error(JSON.stringify(section.error));
  return slendernessOf(drawing, section.value.contacts).map(
    ({ part, element, kind, width, thickness, ratio }) =>
      [part, element, kind, Number(width.toFixed(6)), thickness, Number(ratio.toFixed(6))] as const,
  );
};
const plate = (width: number, height: number, x: number, y: number) => ({
  shape: { kind: "plate" as const, width, height },
  at: { x, y },
});

test("a girder's flanges stand out from the web's face, its web runs between the flanges", () => {
  const girder = steelDrawing(plate(250, 20, 0, 1240), plate(10, 1200, 0, 630), plate(450, 30, 0, 15));
  expect(factsOf(girder)).toEqual([
    ["p1", "plate", "face to free edge", 120, 20, 6],
    ["p2", "plate", "between faces", 1200, 10, 120],
    ["p3", "plate", "face to free edge", 220, 30, 7.333333],
  ]);
});

test("a box flange has an outstand and a width between the webs", () => {
  const box = steelDrawing(
    plate(400, 20, 0, 410),
    plate(400, 20, 0, -10),
    plate(10, 400, -150, 200),
    plate(10, 400, 150, 200),
  );
  expect(factsOf(box).filter(([part]) => part === "p1")).toEqual([
    ["p1", "plate", "face to free edge", 45, 20, 2.25],
    ["p1", "plate", "between faces", 290, 20, 14.5],
  ]);
});

test("a plate alone is free on all sides, an outline tells nothing", () => {
  expect(factsOf(steelDrawing(plate(100, 8, 0, 0)))).toEqual([
    ["p1", "plate", "free on all sides", 100, 8, 12.5],
  ]);
  const triangle = {
    kind: "outline" as const,
    outer: [
      { x: 0, y: 0 },
      { x: 9, y: 0 },
      { x: 0, y: 9 },
    ],
    holes: [],
  };
  expect(factsOf(steelDrawing({ shape: triangle }))).toEqual([]);
});

describe("profiles, fillets left out", () => {
  const cases: readonly (readonly [Profile, readonly (readonly [string, string, number])[]])[] = [
    [
      {
        family: "i-section",
        dimensions: { depth: 300, flangeWidth: 150, webThickness: 8, flangeThickness: 10, rootRadius: 15 },
      },
      [
        ["flange", "face to free edge", 7.1],
        ["web", "between faces", 35],
      ],
    ],
    [
      {
        family: "angle",
        dimensions: { legLong: 110, legShort: 60, thickness: 10, rootRadius: 12, toeRadius: 6 },
      },
      [
        ["upright leg", "face to free edge", 10],
        ["level leg", "face to free edge", 5],
      ],
    ],
    [
      { family: "zee", dimensions: { depth: 204, flangeWidth: 72, thickness: 2, innerRadius: 4 } },
      [
        ["flange", "face to free edge", 35],
        ["web", "between faces", 100],
      ],
    ],
    [
      {
        family: "lipped-channel",
        dimensions: { depth: 204, flangeWidth: 74, lip: 22, thickness: 2, innerRadius: 4 },
      },
      [
        ["lip", "face to free edge", 10],
        ["flange", "between faces", 35],
        ["web", "between faces", 100],
      ],
    ],
    [
      { family: "round-hollow", dimensions: { diameter: 200, thickness: 8 } },
      [["wall", "diameter over wall", 25]],
    ],
    [{ family: "timber", dimensions: { width: 60, depth: 240 } }, []],
  ];
  test.each(cases.map(([profile, facts]) => [profile.family, profile, facts] as const))(
    "%s",
    (_, profile, facts) => {
      expect(
        factsOf(profileDrawing(profile)).map(([, element, kind, , , ratio]) => [element, kind, ratio]),
      ).toEqual(facts);
    },
  );
});
