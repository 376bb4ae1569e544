import { describe, expect, test } from "vitest";
import { computeProperties } from "@/lib/drawing/compute-properties";
import { moveParts, reshapePart } from "@/lib/drawing/edit-parts";
import { newDrawing } from "@/lib/drawing/new-drawing";
import { DrawingV1 } from "@/lib/drawing/schema";
import { changeStarter, placeStarter, starterOfPart } from "@/lib/drawing/starters/apply-starter";
import { firstValues, starterById, STARTERS } from "@/lib/drawing/starters/starters";
import { arrayParts } from "@/lib/drawing/arrange-parts";
import { expectRel } from "@/tests/helpers/expect-rel";

const placed = (id: string, values: Record<string, number> = {}) => {
  const starter = starterById(id);
  if (!starter) throw new Error(`no starter ${id}`);
  const result = placeStarter(newDrawing(), starter, { ...firstValues(starter), ...values });
  if (!result.ok) throw new Error(result.error.detail);
  return result.value;
};

describe.each(STARTERS)("starter $name", (starter) => {
  const { drawing, ids } = placed(starter.id);

  test("is a valid drawing that computes and stands on the datum", () => {
    expect(DrawingV1.parse(drawing)).toEqual(drawing);
    const properties = computeProperties(drawing);
    expect(properties.ok && properties.value.area > 0).toBe(true);
    expectRel(properties.ok ? properties.value.extents.yMin : null, 0, { rel: 1e-9, scale: 100 });
  });

  test("its form opens again from any part, and other sizes keep ids and joints", () => {
    for (const id of ids) expect(starterOfPart(drawing, id)?.values).toEqual(firstValues(starter));
    const open = starterOfPart(drawing, ids[0] ?? "");
    if (!open) throw new Error("the form must open");
    const field = starter.fields[0];
    if (!field) throw new Error("a starter has fields");
    const changed = changeStarter(drawing, open, { ...open.values, [field.key]: field.first * 1.1 });
    if (!changed.ok) throw new Error(changed.error.detail);
    expect(changed.value.parts.map((p) => p.id)).toEqual(drawing.parts.map((p) => p.id));
    expect(starterOfPart(changed.value, ids[0] ?? "")?.values[field.key]).toBe(field.first * 1.1);
  });

  test("a part moved or sized by hand ends the form", () => {
    if (ids.length > 1)
      expect(starterOfPart(moveParts(drawing, [ids[0] ?? ""], { x: 1, y: 0 }), ids[1] ?? "")).toBeNull();
    const sized = reshapePart(drawing, ids[0] ?? "", { kind: "plate", width: 1, height: 1 });
    expect(starterOfPart(sized, ids[0] ?? "")).toBeNull();
  });

  test("a copy is a starter of its own", () => {
    const copy = arrayParts(drawing, ids, 1, { x: 2000, y: 0 });
    expect(starterOfPart(copy.drawing, copy.ids[0] ?? "")?.ids).toEqual(copy.ids);
    expect(starterOfPart(copy.drawing, ids[0] ?? "")?.ids).toEqual(ids);
  });

  test("a size of 0 is refused by its field", () => {
    const field = starter.fields[0];
    const result = placeStarter(newDrawing(), starter, { ...firstValues(starter), [field?.key ?? ""]: 0 });
    expect(result.ok ? null : result.error.pointer).toBe(`/${field?.key}`);
  });
});

test("an equal plate girder has the area and I of its three plates", () => {
  const { drawing } = placed("plate-girder", {
    depth: 600,
    flangeWidth: 300,
    flangeThickness: 20,
    webThickness: 10,
  });
  const p = computeProperties(drawing);
  if (!p.ok) throw new Error("must compute");
  expectRel(p.value.area, 2 * 300 * 20 + 560 * 10, { rel: 1e-12 });
  expectRel(p.value.Ix, (300 * 600 ** 3 - 290 * 560 ** 3) / 12, { rel: 1e-12 });
});

test("the channel cap lies with its web on the beam and its flanges pointing down", () => {
  const { drawing } = placed("crane-girder");
  const p = computeProperties(drawing);
  expectRel(p.ok ? p.value.extents.yMax : null, 410, { rel: 1e-9 });
});

test("a cap too narrow for the beam is refused with the clear width", () => {
  const starter = starterById("crane-girder");
  if (!starter) throw new Error("no crane girder");
  const result = placeStarter(newDrawing(), starter, { ...firstValues(starter), capDepth: 180 });
  expect(result.ok ? "" : result.error.code).toBe("starter.capNarrow");
});

test("a flitch beam is transformed to its timber", () => {
  const { drawing } = placed("flitch-beam");
  expect(drawing.reference).toBe("softwood");
  const p = computeProperties(drawing);
  expectRel(p.ok ? p.value.area : null, 2 * 60 * 240 + (210_000 / 11_000) * 12 * 220, { rel: 1e-12 });
});
