import { expect, test } from "vitest";
import { addMaterial, changeMaterial, leastFy, removeMaterial, setReference } from "@/lib/drawing/materials";
import { mendFloating, mendOverlap, overlappingWith } from "@/lib/drawing/mend";
import type { Drawing, DrawingPart } from "@/lib/drawing/schema";

const STEEL = { id: "s", name: "Steel", E: 210_000, G: 81_000, fy: 355, density: 7850 };
const plate = (id: string, width: number, height: number, x: number, y: number): DrawingPart => ({
  id,
  name: id,
  material: "s",
  at: { x, y },
  angle: 0,
  shape: { kind: "plate", width, height },
});
const drawing = (...parts: DrawingPart[]): Drawing => ({
  version: 1,
  unit: "mm",
  reference: "s",
  materials: [STEEL],
  parts,
  joints: [],
});
const part = (d: Drawing | undefined, id: string) => d?.parts.find((p) => p.id === id);

test("a plate that runs into another from the side is cut back to its face", () => {
  const d = drawing(plate("web", 20, 200, 0, 0), plate("shelf", 100, 10, 50, 0));
  const [cut, butt] = mendOverlap(d, ["web", "shelf"]);
  expect(cut?.label).toBe("cut 2 back");
  expect(part(cut?.drawing, "shelf")).toMatchObject({
    at: { x: 55, y: 0 },
    shape: { width: 90, height: 10 },
  });
  expect(butt?.label).toBe("set 2 against 1");
  expect(part(butt?.drawing, "shelf")?.at).toEqual({ x: 60, y: 0 });
});

test("a locked part is never moved by a mend, and parts apart need none", () => {
  const locked = { ...plate("shelf", 100, 10, 50, 0), locked: true };
  const labels = mendOverlap(drawing(plate("web", 20, 200, 0, 0), locked), ["web", "shelf"]).map(
    (m) => m.label,
  );
  expect(labels).not.toContain("set 2 against 1");
  expect(mendOverlap(drawing(plate("a", 10, 10, 0, 0), plate("b", 10, 10, 50, 0)), ["a", "b"])).toEqual([]);
});

test("what overlaps a part is listed, the deepest first", () => {
  const d = drawing(
    plate("a", 100, 100, 0, 0),
    plate("edge", 20, 20, 55, 0),
    plate("inside", 20, 20, 0, 0),
    plate("far", 20, 20, 500, 0),
  );
  expect(overlappingWith(d, "a")).toEqual(["inside", "edge"]);
  expect(overlappingWith(d, "none")).toEqual([]);
});

test("a floating part is brought against the nearest; one at a corner shares a stretch of edge then", () => {
  const [facing] = mendFloating(drawing(plate("a", 100, 100, 0, 0), plate("b", 20, 20, 0, 80)), ["b"]);
  expect(facing?.label).toBe("move against 1");
  expect(part(facing?.drawing, "b")?.at).toEqual({ x: 0, y: 60 });
  const [corner] = mendFloating(drawing(plate("a", 100, 100, 0, 0), plate("b", 20, 20, 80, 80)), ["b"]);
  expect(part(corner?.drawing, "b")?.at).toEqual({ x: 40, y: 60 });
  expect(mendFloating(drawing(plate("b", 20, 20, 0, 0)), ["b"])).toEqual([]);
});

test("a material is added under a free name, changed, made the reference, and kept while it is used", () => {
  const one = drawing(plate("a", 10, 10, 0, 0));
  const two = addMaterial(one, STEEL);
  expect(two.materials.map((m) => [m.id, m.name])).toEqual([
    ["s", "Steel"],
    ["s 2", "Steel 2"],
  ]);
  expect(changeMaterial(two, "s 2", { fy: 275 }).materials[1]).toMatchObject({ id: "s 2", fy: 275 });
  expect(setReference(two, "s 2").reference).toBe("s 2");
  expect(setReference(two, "none")).toBe(two);
  expect(removeMaterial(two, "s 2").materials).toEqual(one.materials);
  expect(removeMaterial(two, "s")).toBe(two);
});

test("the least fy of bands is the one that always holds", () => {
  expect(leastFy(STEEL)).toBe(355);
  expect(
    leastFy({
      ...STEEL,
      fy: [
        { upTo: 16, fy: 355 },
        { upTo: 40, fy: 345 },
      ],
    }),
  ).toBe(345);
});
