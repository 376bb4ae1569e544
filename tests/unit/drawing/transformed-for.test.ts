import { expect, test } from "vitest";
import type { Drawing } from "@/lib/drawing/schema";
import { transformedFor } from "@/lib/drawing/transformed-for";

const material = (id: string, name: string, E: number) => ({ id, name, E, G: E / 2.6, fy: 20, density: 500 });
const plate = (id: string, of: string) => ({
  id,
  name: id,
  material: of,
  at: { x: 0, y: 0 },
  angle: 0,
  shape: { kind: "plate" as const, width: 75, height: 300 },
});
const drawing = (parts: Drawing["parts"]): Drawing => ({
  version: 1,
  unit: "mm",
  reference: "wood",
  materials: [material("wood", "Oak beam", 11_000), material("steel", "Plate", 210_000)],
  parts,
  joints: [],
});

test("a beam of timber and steel is transformed for its reference material", () => {
  expect(transformedFor(drawing([plate("a", "wood"), plate("b", "steel")]))).toBe("Oak beam");
});

test("a beam of one material is not transformed, whatever else only weighs", () => {
  expect(transformedFor(drawing([plate("a", "wood")]))).toBe(null);
  expect(transformedFor(drawing([plate("a", "wood"), { ...plate("b", "steel"), counts: "mass" }]))).toBe(
    null,
  );
});
