import { describe, expect, test } from "vitest";
import { profileRegions } from "@/lib/profiles/profile-regions";
import { plasticAbout } from "@/lib/section/plastic-about";
import { sectionProperties } from "@/lib/section/section-properties";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";
import { partOf, rectangleAt, sectionOfParts, sectionOfRegions, STEEL } from "@/tests/helpers/sections";

const EXACT = { rel: 1e-12 };

test("a solid round has Z = d³/6 about any direction", () => {
  const round = sectionOfRegions(must(profileRegions({ family: "round", dimensions: { diameter: 80 } })));
  for (const angle of [0, 17, 45, 90, 133, -60])
    expectRel(plasticAbout(round, angle)?.Z ?? null, 80 ** 3 / 6, EXACT);
});

test("a square on its diagonal has the shape factor 2", () => {
  const square = sectionOfRegions([rectangleAt(-50, -50, 100, 100)]);
  const S = 100 ** 3 / (6 * Math.SQRT2);
  expectRel(plasticAbout(square, 45)?.Z ?? null, 2 * S, EXACT);
});

test("a triangle has Z = 8 − 4√2 times the S of its apex", () => {
  const [b, h] = [120, 90];
  const triangle = {
    outer: [
      { x: 0, y: 0 },
      { x: b, y: 0 },
      { x: b / 2, y: h },
    ],
    holes: [],
  };
  const p = must(sectionProperties(sectionOfRegions([triangle])));
  expectRel(p.Zx, (8 - 4 * Math.SQRT2) * ((b * h * h) / 24), EXACT);
  expectRel(p.pna?.y ?? null, h * (1 - Math.SQRT1_2), EXACT);
});

test("turning the axis by half a turn changes nothing", () => {
  const regions = must(
    profileRegions({
      family: "angle",
      dimensions: { legLong: 150, legShort: 90, thickness: 10, rootRadius: 12, toeRadius: 6 },
    }),
  );
  const section = sectionOfRegions(regions);
  for (const angle of [0, 31, 90, 160]) {
    const [a, b] = [plasticAbout(section, angle), plasticAbout(section, angle + 180)];
    expectRel(a?.Z ?? null, b?.Z ?? Number.NaN, EXACT);
    expectRel(a?.at.x ?? null, b?.at.x ?? Number.NaN, { ...EXACT, scale: 100 });
    expectRel(a?.Mp ?? null, (a?.Z ?? Number.NaN) * STEEL.fy, EXACT);
  }
});

describe("two equal plates with a gap between them", () => {
  const pair = sectionOfParts([
    partOf([rectangleAt(0, 0, 100, 10)], { id: "a" }),
    partOf([rectangleAt(0, 60, 100, 10)], { id: "b" }),
  ]);
  const p = must(sectionProperties(pair));

  test("have the equal-area axis in the middle of the gap, and are told so", () => {
    expectRel(p.pna?.y ?? null, 35, EXACT);
    const warning = p.warnings.find((w) => w.code === "plastic.axisInGap");
    expect(warning?.detail).toContain("x–x within 50.00 mm");
    expectRel(plasticAbout(pair, 0)?.gap ?? null, 50, { rel: 1e-9 });
    expect(plasticAbout(pair, 90)?.gap).toBe(0);
  });

  test("have the Z of any axis in the gap", () => {
    expectRel(p.Zx, 2 * 1000 * 30, EXACT);
  });
});

describe("a girder with a weaker bottom flange", () => {
  const weak = { ...STEEL, id: "weak", fy: 235 };
  const parts = [
    partOf([rectangleAt(-100, 520, 200, 20)], { id: "top" }),
    partOf([rectangleAt(-5, 20, 10, 500)], { id: "web" }),
    partOf([rectangleAt(-100, 0, 200, 20)], { id: "bottom", material: weak }),
  ];
  const p = must(sectionProperties(sectionOfParts(parts)));

  test("keeps Z and its axis geometric", () => {
    expectRel(p.pna?.y ?? null, 270, EXACT);
    expectRel(p.Zx, 2 * (4000 * 260 + 2500 * 125), EXACT);
  });

  test("has the equal-force axis, Mp and squash load of hand calculation", () => {
    // Forces: top 4000·355, web 5000·355, bottom 4000·235; half of the sum is reached in the web.
    const squash = 9000 * 355 + 4000 * 235;
    expectRel(p.squash, squash, EXACT);
    const yAxis = 20 + (squash / 2 - 4000 * 235) / (10 * 355);
    expectRel(p.equalForceAxis?.y ?? null, yAxis, EXACT);
    const Mp =
      4000 * 235 * (yAxis - 10) +
      4000 * 355 * (530 - yAxis) +
      (10 * 355 * ((yAxis - 20) ** 2 + (520 - yAxis) ** 2)) / 2;
    expectRel(p.Mp?.x ?? null, Mp, EXACT);
    expectRel(plasticAbout(sectionOfParts(parts), 0)?.Mp ?? null, Mp, EXACT);
  });
});

test("one strength leaves the equal-force axis out and has Mp = fy·Z", () => {
  const p = must(sectionProperties(sectionOfRegions([rectangleAt(0, 0, 30, 80)])));
  expect(p.equalForceAxis).toBeNull();
  expectRel(p.Mp?.x ?? null, 355 * (p.Zx ?? Number.NaN), EXACT);
  expectRel(p.squash, 355 * p.area, EXACT);
});

test("without area there is nothing plastic", () => {
  expect(plasticAbout(sectionOfRegions([]), 0)).toBeNull();
});
