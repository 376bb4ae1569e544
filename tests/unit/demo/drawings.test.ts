import { describe, expect, test } from "vitest";
import { builtUpShapes } from "@/lib/demo/built-up";
import { rolledShapes } from "@/lib/demo/rolled";
import { computeProperties } from "@/lib/drawing/compute-properties";
import { DrawingV1 } from "@/lib/drawing/schema";
import { checkDrawing } from "@/lib/drawing/check-drawing";
import { Designation } from "@/lib/schemas/designation";
import { expectRel } from "@/tests/helpers/expect-rel";

const shapes = [...rolledShapes(), ...builtUpShapes()];

test("no two shapes of the demo share a designation", () => {
  const names = shapes.map((shape) => shape.designation.toLowerCase());
  expect(new Set(names).size).toBe(names.length);
});

describe.each(shapes)("$designation", (shape) => {
  test("is a drawing the program takes, and computes without a fault", () => {
    expect(Designation.safeParse(shape.designation).success).toBe(true);
    expect(DrawingV1.safeParse(shape.drawing).error).toBeUndefined();
    expect(checkDrawing(shape.drawing)).toEqual([]);
    const computed = computeProperties(shape.drawing);
    expect(computed).toMatchObject({ ok: true });
  });
});

test("a rolled shape is named by the mass that the engine computes, within the rounding of its name", () => {
  for (const shape of rolledShapes()) {
    const named = Number(shape.designation.split("x").at(-1));
    const computed = computeProperties(shape.drawing);
    if (!computed.ok) throw new Error(shape.designation);
    const rounding = named < 100 ? 0.05 : 0.5;
    expectRel(computed.value.mass, named, { rel: (rounding * 1.001) / named, name: shape.designation });
  }
});
