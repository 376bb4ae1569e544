import { describe, expect, test } from "vitest";
import { sectionOf } from "@/lib/drawing/section-of";
import { grossAndNet } from "@/lib/section/net-section";
import { pickedProperties } from "@/lib/section/picked-parts";
import { sectionProperties } from "@/lib/section/section-properties";
import { steelDrawing } from "@/tests/helpers/steel-drawing";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";
import { partOf, rectangleAt, sectionOfParts, sectionOfRegions } from "@/tests/helpers/sections";

/** Rounding, and the 1e-10 that noding may move a corner by on 100 mm. */
const CLOSE = { rel: 1e-10 };

const value = <T>(result: { ok: true; value: T } | { ok: false; error: unknown }): T => {
  if (!result.ok) throw new Error(JSON.stringify(result.error));
  return result.value;
};

const IPE = {
  shape: {
    kind: "profile" as const,
    family: "i-section" as const,
    dimensions: { depth: 300, flangeWidth: 150, webThickness: 7.1, flangeThickness: 10.7, rootRadius: 15 },
  },
};

describe("holes deducted from one flange of an I", () => {
  const beam = value(sectionOf(steelDrawing(IPE)));
  const hole = (x: number) => ({ at: { x, y: 150 - 10.7 / 2 }, angle: 90, diameter: 22, length: 20 });
  const { gross, net, netSection } = value(grossAndNet(beam, [hole(-45), hole(45)]));

  test("leave A, centroid and Ix of the strips taken away by hand", () => {
    const taken = 2 * 22 * 10.7;
    expectRel(net.area, gross.area - taken, CLOSE);
    const yStrip = 150 - 10.7 / 2;
    const y = -(taken * yStrip) / net.area;
    expectRel(net.centroid.y, y, CLOSE);
    const Ix = gross.Ix - taken * yStrip ** 2 - (2 * 22 * 10.7 ** 3) / 12 - net.area * y ** 2;
    expectRel(net.Ix, Ix, CLOSE);
  });

  test("keep the fillets: the arcs are still arcs", () => {
    const bulges = netSection.outline.flatMap((r) => r.outer).filter((v) => (v.bulge ?? 0) !== 0);
    expect(bulges).toHaveLength(4);
  });

  test("leave the gross figures as they are", () => {
    expect(gross).toEqual(must(sectionProperties(beam)));
  });
});

test("no holes, one figure", () => {
  const { gross, net } = value(grossAndNet(sectionOfRegions([rectangleAt(0, 0, 50, 10)]), []));
  expect(net).toEqual(gross);
});

test("a hole without size or place is named with its field", () => {
  const plate = sectionOfRegions([rectangleAt(0, 0, 50, 10)]);
  const good = { at: { x: 25, y: 5 }, angle: 90, diameter: 10, length: 20 };
  const bad = grossAndNet(plate, [good, { ...good, diameter: 0 }, { ...good, at: { x: Number.NaN, y: 0 } }]);
  expect(bad.ok ? [] : bad.error.map((f) => [f.code, f.pointer])).toEqual([
    ["hole.badSize", "/holes/1/diameter"],
    ["hole.badPlace", "/holes/2/at"],
  ]);
});

test("holes that take everything away are a fault", () => {
  const plate = sectionOfRegions([rectangleAt(0, 0, 50, 10)]);
  const all = grossAndNet(plate, [{ at: { x: 25, y: 5 }, angle: 0, diameter: 100, length: 100 }]);
  expect(all.ok ? [] : all.error.map((f) => f.code)).toEqual(["section.noArea"]);
});

describe("picked parts", () => {
  const girder = sectionOfParts([
    partOf([rectangleAt(-100, 520, 200, 20)], { id: "top" }),
    partOf([rectangleAt(-5, 20, 10, 500)], { id: "web" }),
    partOf([rectangleAt(-100, 0, 200, 20)], { id: "bottom" }),
  ]);

  test("have their properties as if the others were not there, with their own perimeter", () => {
    const tee = value(pickedProperties(girder, ["top", "web"]));
    expectRel(tee.area, 4000 + 5000, CLOSE);
    expectRel(tee.centroid.y, (4000 * 530 + 5000 * 270) / 9000, CLOSE);
    expectRel(tee.perimeter.outer, 2 * (200 + 20) + 2 * 500, CLOSE);
  });

  test("must be some, and of the section", () => {
    const codes = (ids: readonly string[]) => {
      const r = pickedProperties(girder, ids);
      return r.ok ? [] : r.error.map((f) => [f.code, f.part]);
    };
    expect(codes([])).toEqual([["parts.nonePicked", undefined]]);
    expect(codes(["web", "rib"])).toEqual([["parts.unknown", "rib"]]);
  });

  test("that only count for mass have no stiffness", () => {
    const section = sectionOfParts([
      partOf([rectangleAt(0, 0, 10, 10)], { id: "plate" }),
      partOf([rectangleAt(0, 10, 10, 10)], { id: "rail", counts: "mass" }),
    ]);
    const r = pickedProperties(section, ["rail"]);
    expect(r.ok ? [] : r.error.map((f) => f.code)).toEqual(["section.noArea"]);
  });
});
