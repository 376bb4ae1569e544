import { describe, expect, test } from "vitest";
import { jsonPointer, readDrawing } from "@/lib/drawing/upgrade";

const plate = {
  id: "p1",
  name: "Web",
  material: "s355",
  at: { x: 0, y: 0 },
  angle: 0,
  shape: { kind: "plate", width: 10, height: 600 },
};
const drawing = {
  version: 1,
  unit: "mm",
  reference: "s355",
  materials: [{ id: "s355", name: "S355", E: 210000, G: 81000, fy: 355, density: 7850 }],
  parts: [plate],
};
const pointers = (json: unknown) => {
  const read = readDrawing(json);
  return read.ok ? [] : read.error.map(({ pointer }) => pointer);
};

describe("readDrawing", () => {
  test("reads a drawing of today's version and fills in the joints", () => {
    expect(readDrawing(drawing)).toEqual({ ok: true, value: { ...drawing, joints: [] } });
  });

  test("refuses what is no drawing, and versions it does not know, each with its own words", () => {
    for (const json of [null, 3, "x", [drawing]]) expect(pointers(json)).toEqual([""]);
    const newer = readDrawing({ ...drawing, version: 2 });
    expect(newer).toMatchObject({ ok: false, error: [{ code: "drawing.version", pointer: "/version" }] });
    if (!newer.ok) expect(newer.error[0]?.detail).toContain("newer");
    for (const version of [undefined, "1", 0, 0.5, "toString"])
      expect(pointers({ ...drawing, version })).toEqual(["/version"]);
  });

  test("points at each wrong field and names its part", () => {
    const read = readDrawing({
      ...drawing,
      parts: [plate, { ...plate, id: "p2", shape: { kind: "plate", width: -5, height: 0 } }],
    });
    expect(read).toMatchObject({
      ok: false,
      error: [
        { part: "p2", pointer: "/parts/1/shape/width" },
        { part: "p2", pointer: "/parts/1/shape/height" },
      ],
    });
  });

  test("refuses NaN, infinity, text and null for a number, and fields it does not know", () => {
    for (const width of [Number.NaN, Infinity, "10", null])
      expect(pointers({ ...drawing, parts: [{ ...plate, shape: { ...plate.shape, width } }] })).toEqual([
        "/parts/0/shape/width",
      ]);
    expect(pointers({ ...drawing, colour: "red" })).toEqual([""]);
  });

  test("points into a cut-out by what a cut-out is, not by what a plate would need", () => {
    const hole = { id: "c", name: "Hole", cutout: true, at: { x: 0, y: 0 }, angle: 0 };
    expect(
      pointers({ ...drawing, parts: [plate, { ...hole, shape: { kind: "round", diameter: 0 } }] }),
    ).toEqual(["/parts/1/shape/diameter"]);
  });
});

test("a JSON pointer escapes ~ and /", () => {
  expect(jsonPointer(["a/b", 0, "c~d"])).toBe("/a~1b/0/c~0d");
});
