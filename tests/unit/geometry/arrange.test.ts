import { describe, expect, test } from "vitest";
import { arrange } from "@/lib/geometry/arrange";
import { perimeterOf } from "@/lib/geometry/perimeter";
import { expectRel } from "@/tests/helpers/expect-rel";
import { areaOf, arranged, cutoutOf, disc, partOf, put, rectangle } from "@/tests/helpers/parts";

const codes = (warnings: readonly { code: string }[]) => warnings.map(({ code }) => code);

describe("parts that touch", () => {
  const web = partOf("web", [put(rectangle(10, 600), 0, 0)]);
  const top = partOf("top", [put(rectangle(300, 20), 0, 310)]);
  const bottom = partOf("bottom", [put(rectangle(200, 20), 0, -310)]);

  test("a girder hangs together along its two joints and is one outline of twelve edges and four splits", () => {
    const { parts, outline, contacts, bodies, warnings } = arranged([web, top, bottom]);
    expect(bodies).toEqual([[0, 1, 2]]);
    expect(warnings).toEqual([]);
    expect(contacts).toEqual([
      { parts: [0, 1], lines: [{ from: { x: 5, y: 300 }, to: { x: -5, y: 300 } }] },
      { parts: [0, 2], lines: [{ from: { x: -5, y: -300 }, to: { x: 5, y: -300 } }] },
    ]);
    expect(outline).toHaveLength(1);
    expect(outline[0]?.outer).toHaveLength(12);
    expect(areaOf(outline)).toBe(16_000);
    expect(parts.map(areaOf)).toEqual([6_000, 6_000, 4_000]);
    expect(perimeterOf(outline).outer).toBe(2 * 300 + 2 * 200 + 4 * 20 + 2 * 600 - 2 * 10);
  });

  test("a part that touches nothing keeps its coordinates and arcs to the last bit", () => {
    const tube = put(disc(54.3, 47.1), 1000.1, 0.7, 33.3);
    expect(arranged([web, partOf("tube", [tube])]).parts[1]).toEqual([tube]);
  });

  test("plates round a cell leave a hole in the outline", () => {
    const side = (x: number) => put(rectangle(10, 100), x, 0);
    const flange = (y: number) => put(rectangle(110, 10), 0, y);
    const box = [side(-50), side(50), flange(55), flange(-55)].map((r, i) => partOf(`p${i}`, [r]));
    const { outline, bodies } = arranged(box);
    expect(bodies).toHaveLength(1);
    expect(outline).toHaveLength(1);
    expect(outline[0]?.holes).toHaveLength(1);
    expectRel(areaOf(outline), 110 * 120 - 90 * 100, { rel: 1e-14 });
  });

  test("a bar in a bore of its own radius touches along arcs, whichever way each was turned", () => {
    const tube = partOf("tube", [put(disc(60, 50), 7, 9, 12)]);
    const bar = partOf("bar", [put(disc(50), 7, 9, 71)]);
    const { contacts, bodies, outline } = arranged([tube, bar]);
    expect(bodies).toEqual([[0, 1]]);
    const swept = contacts[0]?.lines.reduce((sum, { bulge = 0 }) => sum + 4 * Math.atan(bulge), 0) ?? 0;
    expectRel(Math.abs(swept), 2 * Math.PI, { rel: 1e-9 });
    expect(outline[0]?.holes).toEqual([]);
    expectRel(areaOf(outline), Math.PI * 60 ** 2, { rel: 1e-12 });
  });

  test("names parts that touch in a corner, touch in a point of a round, and float", () => {
    const plate = partOf("plate", [rectangle(100, 10)]);
    const corner = partOf("corner", [put(rectangle(20, 20), 60, 15)]);
    const bar = partOf("bar", [put(disc(10), 0, 15)]);
    const far = partOf("far", [put(rectangle(5, 5), 0, 500)]);
    const { bodies, warnings, contacts } = arranged([plate, corner, bar, far]);
    expect(bodies).toEqual([[0], [1], [2], [3]]);
    expect(contacts).toEqual([]);
    expect(warnings.map(({ code, parts }) => [code, parts])).toEqual([
      ["parts.pointContact", ["plate", "corner"]],
      ["parts.pointContact", ["plate", "bar"]],
      ["parts.floating", ["far"]],
    ]);
    expect(warnings[0]?.detail).toContain("(50, 5)");
  });

  test("a part that counts for mass only joins nothing", () => {
    const upper = partOf("upper", [put(rectangle(100, 10), 0, 20)]);
    const lower = partOf("lower", [rectangle(100, 10)]);
    const rail = (stiff: boolean) => partOf("rail", [put(rectangle(10, 10), 0, 10)], { stiff });
    expect(arranged([upper, lower, rail(true)]).bodies).toEqual([[0, 1, 2]]);
    const { bodies, warnings, outline } = arranged([upper, lower, rail(false)]);
    expect(bodies).toEqual([[0], [1]]);
    expect(codes(warnings)).toEqual(["parts.floating"]);
    expect(outline).toHaveLength(1);
  });
});

describe("parts that overlap", () => {
  test("a cross of two bars counts the middle once, as part of the larger, and says so", () => {
    const level = partOf("level", [rectangle(100, 10)]);
    const upright = partOf("upright", [rectangle(10, 80)]);
    for (const order of [
      [level, upright],
      [upright, level],
    ]) {
      const { parts, outline, bodies, contacts, warnings } = arranged(order);
      expectRel(
        parts.map(areaOf).reduce((a, b) => a + b),
        1000 + 800 - 100,
        { rel: 1e-14 },
      );
      expectRel(areaOf(parts[order.indexOf(level)] ?? []), 1000, { rel: 1e-14 });
      expectRel(areaOf(outline), 1700, { rel: 1e-14 });
      expect(bodies).toEqual([[0, 1]]);
      expect(contacts[0]?.lines).toHaveLength(2);
      expect(warnings).toMatchObject([{ code: "overlap.countedOnce", parts: ["upright", "level"] }]);
    }
  });

  test("the weaker part keeps the overlap, and a part that counts for mass only never takes from a stiff one", () => {
    const weak = partOf("weak", [rectangle(10, 10)], { strength: 235 });
    const strong = partOf("strong", [put(rectangle(100, 10), 50, 0)]);
    const rail = partOf("rail", [put(rectangle(200, 10), 0, 5)], { strength: 100, stiff: false });
    const { parts, warnings } = arranged([strong, weak]);
    expectRel(areaOf(parts[1] ?? []), 100, { rel: 1e-14 });
    expect(warnings[0]?.detail).toContain("lower yield strength");
    expectRel(areaOf(arranged([rail, weak]).parts[1] ?? []), 100, { rel: 1e-14 });
  });

  test("two tubes that cross have the area of the closed form for two lenses", () => {
    const [R, r, d] = [100, 92, 130];
    const lens = (a: number, b: number) => {
      if (d >= a + b) return 0;
      const x = (d * d + a * a - b * b) / (2 * d);
      const y = Math.sqrt(a * a - x * x);
      return a * a * Math.acos(x / a) + b * b * Math.acos((d - x) / b) - d * y;
    };
    const both = lens(R, R) - 2 * lens(R, r) + lens(r, r);
    const exact = 2 * Math.PI * (R * R - r * r) - both;
    const tubes = [partOf("a", [disc(R, r)]), partOf("b", [put(disc(R, r), d * 0.6, d * 0.8, 17)])];
    const { parts, outline } = arranged(tubes);
    expectRel(areaOf(outline), exact, { rel: 1e-12 });
    expectRel(
      parts.map(areaOf).reduce((a, b) => a + b),
      exact,
      { rel: 1e-12 },
    );
    for (const region of outline) expect(region.outer.length).toBeLessThan(12);
  });

  test("one drawn twice counts once; one inside another is named as covered", () => {
    const twice = arranged([partOf("a", [rectangle(50, 20)]), partOf("b", [rectangle(50, 20)])]);
    expect(twice.parts.map(areaOf)).toEqual([1000, 0]);
    expect(codes(twice.warnings)).toEqual(["part.covered"]);
    const inner = arranged([partOf("a", [disc(50)]), partOf("b", [put(rectangle(5, 5), 3, 4, 9)])]);
    expectRel(areaOf(inner.outline), Math.PI * 2500, { rel: 1e-14 });
    expect(codes(inner.warnings)).toEqual(["part.covered"]);
  });

  test("refuses an overlap of different materials and names both parts; touching is allowed", () => {
    const steel = partOf("steel", [rectangle(100, 10)]);
    const timber = (y: number) => partOf("timber", [put(rectangle(50, 40), 0, y)], { material: "c24" });
    expect(arrange([steel, timber(20)], [])).toMatchObject({
      ok: false,
      error: [
        { code: "overlap.differentMaterials", part: "steel", detail: expect.stringContaining("TIMBER") },
      ],
    });
    expect(arranged([steel, timber(25)]).bodies).toEqual([[0, 1]]);
  });
});

test("refuses more overlaps than it can settle in time, with their number", () => {
  const bars = (upright: boolean) =>
    Array.from({ length: 75 }, (_, i) =>
      partOf(`${upright}${i}`, [
        upright ? put(rectangle(2, 1000), 10 * i, 300) : put(rectangle(1000, 2), 300, 10 * i),
      ]),
    );
  expect(arrange([...bars(true), ...bars(false)], [])).toMatchObject({
    ok: false,
    error: [{ code: "arrangement.tooManyOverlaps", detail: expect.stringContaining("5625 pairs") }],
  });
});

describe("cut-outs", () => {
  test.each([0, 8e-14])("a bore that stops %d mm short of a tangent edge takes exact segments", (short) => {
    const [half, outer, inner] = [5, 50 - short, 47.5];
    /** Of a circle, what lies within `half` of its upright diameter. */
    const strip = (r: number) => 2 * (half * Math.sqrt(r * r - half * half) + r * r * Math.asin(half / r));
    const { parts } = arranged(
      [partOf("plate", [rectangle(10, 100)])],
      [cutoutOf("ring", [put(disc(outer, inner), 0, 0, 45)])],
    );
    expectRel(areaOf(parts.flat()), 1000 - strip(outer) + strip(inner), { rel: 1e-9 });
  });

  const plate = partOf("plate", [rectangle(200, 100)]);

  test("a hole inside a part is its exact circle", () => {
    const { parts, outline, warnings } = arranged([plate], [cutoutOf("hole", [put(disc(15), 20, 10, 40)])]);
    expectRel(areaOf(outline), 20_000 - Math.PI * 225, { rel: 1e-14 });
    expect(parts[0]?.[0]?.holes[0]).toHaveLength(2);
    expect(warnings).toEqual([]);
  });

  test("a tube as a cut-out leaves its core, apart, and says so", () => {
    const { parts, warnings, bodies } = arranged([plate], [cutoutOf("groove", [disc(30, 20)])]);
    expect(parts[0]).toHaveLength(2);
    expect(bodies).toEqual([[0], [0]]);
    expectRel(areaOf(parts[0] ?? []), 20_000 - Math.PI * (900 - 400), { rel: 1e-12 });
    expect(warnings).toMatchObject([{ code: "cutout.parts", parts: ["groove"] }]);
  });

  test("a cope over the edge removes what lies inside and says how far it reaches out", () => {
    const { outline, warnings } = arranged([plate], [cutoutOf("cope", [put(disc(20), 100, 50)])]);
    expectRel(areaOf(outline), 20_000 - Math.PI * 100, { rel: 1e-12 });
    expect(warnings).toMatchObject([{ code: "cutout.outside", parts: ["cope"] }]);
    expect(outline[0]?.outer.filter(({ bulge }) => bulge !== undefined)).toHaveLength(1);
  });

  test("a notch flush with the edge does not reach outside", () => {
    const { outline, warnings } = arranged([plate], [cutoutOf("notch", [put(rectangle(20, 20), 0, 40)])]);
    expectRel(areaOf(outline), 19_600, { rel: 1e-14 });
    expect(warnings).toEqual([]);
  });

  test("a cut-out through two touching parts takes from both and reaches nowhere outside", () => {
    const web = partOf("web", [put(rectangle(20, 200), 0, -150)]);
    const { parts, warnings } = arranged([plate, web], [cutoutOf("drain", [put(disc(5), 0, -50)])]);
    expect(warnings).toEqual([]);
    parts.forEach((regions, i) =>
      expectRel(areaOf(regions), [20_000, 4_000][i]! - Math.PI * 12.5, { rel: 1e-12 }),
    );
  });

  test("a slot that parts the section is named with the pieces; one beside it is not", () => {
    const slot = cutoutOf("slot", [rectangle(4, 120)]);
    const hole = cutoutOf("hole", [put(disc(3), 50, 0)]);
    const { bodies, warnings } = arranged([plate], [hole, slot]);
    expect(bodies).toEqual([[0], [0]]);
    expect(codes(warnings)).toEqual(["cutout.outside", "cutout.parts"]);
    expect(warnings[1]).toMatchObject({ parts: ["slot"] });
  });

  test("says when a cut-out cuts nothing, and when it takes a part whole", () => {
    const away = cutoutOf("away", [put(disc(5), 500, 0)]);
    expect(codes(arranged([plate], [away]).warnings)).toEqual(["cutout.nothing"]);
    const small = partOf("small", [put(rectangle(4, 4), 0, 300)]);
    const whole = arranged([plate, small], [cutoutOf("all", [put(disc(20), 0, 300)])]);
    expect(codes(whole.warnings)).toContain("part.covered");
    expect(whole.parts[1]).toEqual([]);
  });
});
