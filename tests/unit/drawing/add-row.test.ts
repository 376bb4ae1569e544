import { expect, test } from "vitest";
import { parseRow, partFor } from "@/lib/drawing/add-row";
import { addParts } from "@/lib/drawing/edit-parts";
import { mendFloating, mendOverlap } from "@/lib/drawing/mend";
import { newDrawing } from "@/lib/drawing/new-drawing";
import { boxOfParts } from "@/lib/drawing/placed-part";
import type { Drawing } from "@/lib/drawing/schema";
import { slendernessOf } from "@/lib/drawing/slenderness";
import { drawingOf, girder, platePart } from "@/tests/helpers/drawings";

const row = (text: string, unit: "mm" | "in" = "mm") => {
  const shape = parseRow(text, { unit });
  return shape.ok ? shape.value : shape.error.code;
};

test("a row is width by height, with sums, fractions, units and either sign of times", () => {
  expect(row("420x36")).toEqual({ kind: "plate", width: 420, height: 36 });
  expect(row(" 18 × 632-36-32 ")).toEqual({ kind: "plate", width: 18, height: 564 });
  expect(row("12 x 3/4 in")).toEqual({ kind: "plate", width: 304.8, height: 19.05 });
  expect(row("10 1/2 x 1", "in")).toEqual({ kind: "plate", width: 266.7, height: 25.4 });
  expect(row("Ø219.1x8")).toEqual({ kind: "round", diameter: 219.1, wall: 8 });
  expect(row("dia 60")).toEqual({ kind: "round", diameter: 60 });
});

test("what is no row of sizes is refused with a reason", () => {
  expect(row("420")).toBe("row.unreadable");
  expect(row("420x0")).toBe("row.noSize");
  expect(row("Ø20x10")).toBe("row.noBore");
  expect(typeof row("RB 310x165x63")).toBe("string");
  expect(typeof row("")).toBe("string");
});

test("a girder typed from the bottom flange up stands as it was typed", () => {
  const typed = ["280x32", "18x564", "420x36"].reduce<Drawing>((d, text) => {
    const shape = parseRow(text, {});
    return shape.ok ? addParts(d, [partFor(d, shape.value)]) : d;
  }, newDrawing());
  expect(typed.parts.map((p) => p.at)).toEqual([
    { x: 0, y: 16 },
    { x: 0, y: 314 },
    { x: 0, y: 614 },
  ]);
  expect(boxOfParts(typed)).toEqual({ xMin: -210, xMax: 210, yMin: 0, yMax: 632 });
});

test("a plate that runs into another can be cut back or set against it", () => {
  const d = drawingOf(platePart("f", 200, 20, 0, 10), platePart("w", 10, 300, 0, 155));
  const mends = mendOverlap(d, ["f", "w"]);
  expect(mends.map((m) => m.label)).toEqual(["cut 2 back", "set 2 against 1"]);
  expect(mends[0]?.drawing.parts[1]).toMatchObject({
    at: { x: 0, y: 162.5 },
    shape: { height: 285, width: 10 },
  });
  expect(mends[1]?.drawing.parts[1]?.at).toEqual({ x: 0, y: 170 });
});

test("a floating plate is moved against the nearest part", () => {
  const d = drawingOf(platePart("f", 200, 20, 0, 10), platePart("w", 10, 300, 0, 175));
  expect(mendFloating(d, ["w"])).toMatchObject([{ label: "move against 1" }]);
  expect(mendFloating(d, ["w"])[0]?.drawing.parts[1]?.at).toEqual({ x: 0, y: 170 });
});

test("b/t runs from face to free edge in flanges and between faces in the web", () => {
  const contact = (a: string, b: string, y: number) => ({
    parts: [a, b] as const,
    lines: [{ from: { x: -9, y }, to: { x: 9, y } }],
  });
  const facts = slendernessOf(girder(), [contact("tf", "web", 596), contact("web", "bf", 32)]);
  expect(facts.map((f) => [f.part, f.kind, f.width, f.thickness])).toEqual([
    ["tf", "face to free edge", 201, 36],
    ["web", "between faces", 564, 18],
    ["bf", "face to free edge", 131, 32],
  ]);
});
