import { describe, expect, test } from "vitest";
import { computeProperties } from "@/lib/drawing/compute-properties";
import type { Drawing } from "@/lib/drawing/schema";
import { sectionOf } from "@/lib/drawing/section-of";
import { regionArea } from "@/lib/geometry/ring";
import { expectRel } from "@/tests/helpers/expect-rel";

type Part = Drawing["parts"][number];
const steel = {
  id: "s355",
  name: "S355",
  E: 210000,
  G: 81000,
  fy: [
    { upTo: 40, fy: 345 },
    { upTo: 16, fy: 355 },
  ],
  density: 7850,
};
const plate = (id: string, x: number, y: number, width: number, height: number, more = {}): Part => ({
  id,
  name: id.toUpperCase(),
  material: "s355",
  at: { x, y },
  angle: 0,
  shape: { kind: "plate", width, height },
  ...more,
});
const drawing = (parts: Part[], more = {}): Drawing => ({
  version: 1,
  unit: "mm",
  reference: "s355",
  materials: [steel],
  parts,
  joints: [],
  ...more,
});
const faults = (d: Drawing) => {
  const section = sectionOf(d);
  return section.ok ? [] : section.error.map(({ code, part, pointer }) => [code, part, pointer]);
};
const sectionOk = (d: Drawing) => {
  const section = sectionOf(d);
  if (!section.ok) throw new Error(JSON.stringify(section.error));
  return section.value;
};

describe("sectionOf", () => {
  test("a plate of b × h has A = bh and I = bh³/12 wherever it stands and however it is turned by right angles", () => {
    for (const angle of [0, 90, 180, -90]) {
      const properties = computeProperties(drawing([plate("p", 1000, -500, 300, 20, { angle })]));
      if (!properties.ok) throw new Error(JSON.stringify(properties.error));
      expectRel(properties.value.area, 6000, { rel: 1e-14 });
      expectRel(Math.max(properties.value.Ix, properties.value.Iy), (20 * 300 ** 3) / 12, { rel: 1e-13 });
    }
  });

  test("mirror comes before the turn: x goes to −x", () => {
    const outline = {
      id: "o",
      name: "O",
      material: "s355",
      at: { x: 100, y: 0 },
      angle: 90,
      mirror: true,
      shape: {
        kind: "outline" as const,
        outer: [
          { x: 0, y: 0 },
          { x: 30, y: 0, bulge: 0.5 },
          { x: 30, y: 10 },
        ],
        holes: [],
      },
    };
    const [part] = sectionOk(drawing([outline])).parts;
    const ring = part?.regions[0]?.outer ?? [];
    expect(ring).toContainEqual({ x: 100, y: -30 });
    expect(ring).toContainEqual({ x: 90, y: -30, bulge: 0.5 });
  });

  test("a plate takes the yield strength of the band of its lesser size, the limit included", () => {
    const { parts } = sectionOk(drawing([plate("a", 0, 0, 300, 16), plate("b", 0, 100, 16.1, 300)]));
    expect(parts.map(({ material, thickness }) => [material.fy, thickness])).toEqual([
      [355, 16],
      [345, 16.1],
    ]);
    expect(faults(drawing([plate("c", 0, 0, 300, 50)]))).toEqual([["fy.noBand", "c", "/parts/0/material"]]);
  });

  test("an outline with bands takes the least strength and says so", () => {
    const shape = {
      kind: "outline" as const,
      outer: [
        { x: 0, y: 0 },
        { x: 30, y: 0 },
        { x: 0, y: 10 },
      ],
      holes: [],
    };
    const section = sectionOk(
      drawing([{ id: "o", name: "O", material: "s355", at: { x: 0, y: 0 }, angle: 0, shape }]),
    );
    expect(section.parts[0]).toMatchObject({ thickness: null, material: { fy: 345 } });
    expect(section.warnings).toMatchObject([{ code: "fy.leastBand", parts: ["o"] }]);
  });

  test("a tube is the ring between two circles; a wall that fills it is refused", () => {
    const tube = (wall: number): Part => ({
      id: "t",
      name: "Tube",
      material: "s355",
      at: { x: 5, y: 5 },
      angle: 30,
      shape: { kind: "round", diameter: 100, wall },
    });
    const area = sectionOk(drawing([tube(8)])).parts[0]?.regions.reduce((a, r) => a + regionArea(r), 0) ?? 0;
    expectRel(area, (Math.PI / 4) * (100 ** 2 - 84 ** 2), { rel: 1e-14 });
    expect(faults(drawing([tube(50)]))).toEqual([["round.noBore", "t", "/parts/0/shape/wall"]]);
  });

  test("parts that count for nothing are left out but still checked; mass alone is no section", () => {
    const rail = plate("r", 0, 100, 10, 10, { counts: "nothing" });
    expect(sectionOk(drawing([plate("p", 0, 0, 10, 10), rail])).parts.map(({ id }) => id)).toEqual(["p"]);
    expect(faults(drawing([plate("m", 0, 0, 10, 10, { counts: "mass" })]))).toEqual([
      ["drawing.empty", undefined, "/parts"],
    ]);
    expect(faults(drawing([]))).toEqual([["drawing.empty", undefined, "/parts"]]);
  });

  test("names ids given twice, unknown materials and a reference that is not there", () => {
    expect(
      faults(
        drawing([plate("p", 0, 0, 9, 9), plate("p", 0, 50, 9, 9, { material: "x" })], { reference: "y" }),
      ),
    ).toEqual([
      ["drawing.repeatedId", undefined, "/parts/1/id"],
      ["part.unknownMaterial", "p", "/parts/1/material"],
      ["drawing.unknownReference", undefined, "/reference"],
    ]);
  });

  test("points at the edge of an outline that crosses itself, and at the profile dimension that does not fit", () => {
    const bow = [
      { x: 0, y: 0 },
      { x: 10, y: 10 },
      { x: 10, y: 0 },
      { x: 0, y: 20 },
    ];
    const common = { material: "s355", at: { x: 0, y: 0 }, angle: 0 };
    const outline: Part = {
      ...common,
      id: "o",
      name: "O",
      shape: { kind: "outline", outer: bow, holes: [] },
    };
    const profile: Part = {
      ...common,
      id: "h",
      name: "H",
      shape: { kind: "profile", family: "round-hollow", dimensions: { diameter: 100, thickness: 60 } },
    };
    expect(faults(drawing([outline, profile]))).toEqual([
      ["ring.selfCrossing", "o", "/parts/0/shape/outer/0"],
      ["profile.doesNotFit", "h", "/parts/1/shape/dimensions/thickness"],
    ]);
  });

  test("names what is not finite or has no size even where no schema looked first", () => {
    expect(
      faults(
        drawing([
          plate("a", Number.NaN, 0, 10, 10),
          plate("b", 0, 0, 10, 10, { angle: Infinity }),
          plate("c", 0, 0, 0, 10),
          plate("d", 0, 0, 10, Number.NaN),
          plate("e", 0, 0, 1, 1, { shape: { kind: "round", diameter: -3 } }),
        ]),
      ),
    ).toEqual([
      ["part.notFinite", "a", "/parts/0/at/x"],
      ["part.notFinite", "b", "/parts/1/angle"],
      ["part.badSize", "c", "/parts/2/shape/width"],
      ["part.badSize", "d", "/parts/3/shape/height"],
      ["part.badSize", "e", "/parts/4/shape/diameter"],
    ]);
  });

  test("takes cut-outs away and points at parts of different materials that overlap", () => {
    const hole: Part = {
      id: "h",
      name: "Hole",
      cutout: true,
      at: { x: 5, y: 5 },
      angle: 0,
      shape: { kind: "round", diameter: 6 },
    };
    const section = sectionOk(drawing([hole, plate("p", 0, 0, 100, 40)]));
    expectRel(regionArea(section.outline[0] ?? { outer: [], holes: [] }), 4000 - 9 * Math.PI, { rel: 1e-14 });
    expect(section.parts.map(({ id }) => id)).toEqual(["p"]);
    expect(faults(drawing([plate("p", 5, 5, 2, 2), { ...hole, at: { x: 5, y: 5 } }]))).toEqual([
      ["drawing.cutAway", undefined, "/parts"],
    ]);
    const timber = { ...steel, id: "c24", name: "C24", E: 11_000 };
    const mixed = drawing([plate("p", 0, 0, 100, 40), plate("t", 0, 20, 50, 40, { material: "c24" })], {
      materials: [steel, timber],
    });
    expect(faults(mixed)).toEqual([["overlap.differentMaterials", "p", "/parts/0"]]);
  });

  test("contacts, bodies and outline stand in drawing axes", () => {
    const { contacts, bodies, outline } = sectionOk(
      drawing([plate("web", 1000, -500, 10, 600), plate("top", 1000, -190, 300, 20)]),
    );
    expect(contacts).toEqual([
      { parts: ["web", "top"], lines: [{ from: { x: 1005, y: -200 }, to: { x: 995, y: -200 } }] },
    ]);
    expect(bodies).toEqual([["web", "top"]]);
    expect(outline[0]?.outer).toContainEqual({ x: 1150, y: -180 });
  });

  test("says which joints join nothing", () => {
    const joint = (a: string, b: string, kind: "fillet" | "bolts") => ({
      between: [a, b] as [string, string],
      kind,
      size: 6,
    });
    const parts = [plate("a", 0, 0, 100, 10), plate("b", 0, 10, 100, 10), plate("c", 0, 100, 100, 10)];
    const joints = [
      joint("b", "a", "fillet"),
      joint("a", "c", "fillet"),
      joint("a", "c", "bolts"),
      joint("a", "x", "bolts"),
    ];
    const { warnings } = sectionOk(drawing(parts, { joints }));
    expect(warnings.map(({ code, parts: named }) => [code, named])).toEqual([
      ["parts.floating", ["c"]],
      ["joint.noContact", ["a", "c"]],
      ["joint.unknownPart", ["a"]],
    ]);
  });
});
