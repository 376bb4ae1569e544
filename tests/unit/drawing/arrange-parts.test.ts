import fc from "fast-check";
import { expect, test } from "vitest";
import { alignParts, arrayParts, mirrorParts, stackParts, turnParts } from "@/lib/drawing/arrange-parts";
import { clipOf, pasteClip } from "@/lib/drawing/clip";
import {
  groupParts,
  lockParts,
  moveParts,
  orderPart,
  removeParts,
  ungroupParts,
  wholeGroups,
} from "@/lib/drawing/edit-parts";
import { boxOfParts, partBox } from "@/lib/drawing/placed-part";
import { computeProperties } from "@/lib/drawing/compute-properties";
import { expectRel } from "@/tests/helpers/expect-rel";
import { drawingOf, girder, platePart } from "@/tests/helpers/drawings";

const at = (d: ReturnType<typeof girder>, id: string) => d.parts.find((p) => p.id === id)?.at;

test("aligned right, all right edges meet the rightmost", () => {
  const d = alignParts(girder(), ["tf", "web", "bf"], "right");
  for (const p of d.parts) expect(partBox(p)?.xMax).toBe(210);
});

test("stacked up, each plate stands on the one below, the lowest stays", () => {
  const loose = drawingOf(
    platePart("c", 100, 10, 0, 400),
    platePart("a", 100, 20, 0, 50),
    platePart("b", 10, 200, 0, 200),
  );
  const d = stackParts(loose, ["a", "b", "c"], "up");
  expect([at(d, "a")?.y, at(d, "b")?.y, at(d, "c")?.y]).toEqual([50, 160, 265]);
});

test("mirrored twice a drawing is what it was, and Ixy changes its sign once", () => {
  const angle = drawingOf({
    id: "a",
    name: "Angle",
    material: "steel",
    at: { x: 30, y: 40 },
    angle: 30,
    shape: {
      kind: "profile",
      family: "angle",
      dimensions: { legLong: 100, legShort: 60, thickness: 8, rootRadius: 8, toeRadius: 4 },
    },
  });
  for (const line of ["upright", "level"] as const) {
    const once = mirrorParts(angle, ["a"], line, 5);
    const [before, after] = [computeProperties(angle), computeProperties(once)];
    if (!before.ok || !after.ok) throw new Error("the angle must compute");
    expectRel(after.value.Ixy, -before.value.Ixy, { rel: 1e-9 });
    expectRel(after.value.Ix, before.value.Ix, { rel: 1e-9 });
    expect(mirrorParts(once, ["a"], line, 5).parts).toEqual(angle.parts);
  }
});

test("four quarter turns about any point bring a plate back", () => {
  fc.assert(
    fc.property(fc.integer({ min: -500, max: 500 }), fc.integer({ min: -500, max: 500 }), (x, y) => {
      let d = girder();
      for (let i = 0; i < 4; i++) d = turnParts(d, ["tf", "web"], 90, { x, y });
      expect(d.parts).toEqual(girder().parts);
    }),
  );
});

test("an array copies parts with new ids, groups and the joints among them", () => {
  const d = {
    ...groupParts(girder(), ["tf", "web"]),
    joints: [{ between: ["tf", "web"] as [string, string], kind: "fillet" as const, size: 6 }],
  };
  const { drawing, ids } = arrayParts(d, ["tf", "web"], 2, { x: 500, y: 0 });
  expect(ids).toHaveLength(4);
  expect(new Set(drawing.parts.map((p) => p.id)).size).toBe(7);
  expect(drawing.joints).toHaveLength(3);
  expect(new Set(drawing.parts.map((p) => p.group)).size).toBe(4);
  expect(drawing.parts.slice(3).map((p) => p.at.x)).toEqual([500, 500, 1000, 1000]);
});

test("locked parts stay when they are dragged, turned or mirrored", () => {
  const d = lockParts(girder(), ["web"], true);
  expect(at(moveParts(d, ["web", "bf"], { x: 5, y: 0 }), "web")).toEqual({ x: 0, y: 314 });
  expect(at(turnParts(d, ["web"], 45, { x: 100, y: 0 }), "web")).toEqual({ x: 0, y: 314 });
  expect(lockParts(d, ["web"], false)).toEqual(girder());
});

test("a group is picked as a whole and can be taken apart", () => {
  const d = groupParts(girder(), ["tf", "web"]);
  expect(wholeGroups(d, ["web"])).toEqual(["tf", "web"]);
  expect(ungroupParts(d, ["tf", "web"])).toEqual(girder());
});

test("removing a part removes its joints, and order moves it in the table", () => {
  const d = {
    ...girder(),
    joints: [{ between: ["tf", "web"] as [string, string], kind: "cjp" as const, size: null }],
  };
  expect(removeParts(d, ["web"]).joints).toEqual([]);
  expect(orderPart(d, "bf", -1).parts.map((p) => p.id)).toEqual(["tf", "bf", "web"]);
  expect(orderPart(d, "tf", -1)).toBe(d);
});

test("pasted parts keep their section, share like materials and bring unlike ones under a free id", () => {
  const source = girder();
  const other = {
    ...girder(),
    materials: [{ ...(source.materials[0] as (typeof source.materials)[number]), fy: 460 }],
  };
  const same = pasteClip(source, clipOf(source, ["tf"]), { x: 10, y: 0 });
  expect(same.drawing.materials).toHaveLength(1);
  const unlike = pasteClip(source, clipOf(other, ["tf", "bf"]), { x: 900, y: 0 });
  expect(unlike.drawing.materials.map((m) => m.id)).toEqual(["steel", "steel-2"]);
  expect(unlike.ids).toHaveLength(2);
  expect(boxOfParts(unlike.drawing, unlike.ids)?.xMin).toBe(690);
});
