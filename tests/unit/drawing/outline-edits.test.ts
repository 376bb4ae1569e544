import { describe, expect, test } from "vitest";
import { computeProperties } from "@/lib/drawing/compute-properties";
import { changeJoint } from "@/lib/drawing/joints";
import { addMaterial, removeMaterial, setReference } from "@/lib/drawing/materials";
import { STEEL } from "@/lib/drawing/new-drawing";
import {
  bendEdge,
  chamferCorner,
  edgeMiddle,
  edgeRadius,
  filletCorner,
  insertVertex,
  removeVertex,
  setEdgeRadius,
  type Outline,
} from "@/lib/drawing/outline-edits";
import { partAt, partsWithin } from "@/lib/drawing/pick";
import { toOwn, toPlaced } from "@/lib/drawing/placed-part";
import { expectRel } from "@/tests/helpers/expect-rel";
import { drawingOf, girder, platePart } from "@/tests/helpers/drawings";

const square: Outline = {
  kind: "outline",
  outer: [
    { x: 0, y: 0 },
    { x: 100, y: 0 },
    { x: 100, y: 100 },
    { x: 0, y: 100 },
  ],
  holes: [],
};
const areaOf = (outline: Outline): number => {
  const p = computeProperties(drawingOf({ ...platePart("o", 1, 1, 0, 0), shape: outline }));
  if (!p.ok) throw new Error(JSON.stringify(p.error));
  return p.value.area;
};
const must = (result: ReturnType<typeof filletCorner>): Outline => {
  if (!result.ok) throw new Error(result.error.detail);
  return result.value;
};

describe("an outline", () => {
  test.each([0, 1, 2, 3])(
    "loses (1 − π/4)·r² of area to a fillet at corner %i, whichever corner it is",
    (i) => {
      expectRel(areaOf(must(filletCorner(square, i, 20))), 1e4 - (1 - Math.PI / 4) * 400, { rel: 1e-12 });
    },
  );

  test("run clockwise, loses the same", () => {
    const clockwise = { ...square, outer: [...square.outer].reverse() };
    expectRel(areaOf(must(filletCorner(clockwise, 1, 20))), 1e4 - (1 - Math.PI / 4) * 400, { rel: 1e-12 });
  });

  test("loses half of c² to a chamfer", () => {
    expectRel(areaOf(must(chamferCorner(square, 2, 30))), 1e4 - 450, { rel: 1e-12 });
  });

  test("bent through a point gains a circular segment and keeps the point as its middle", () => {
    const bent = bendEdge(square, 1, { x: 150, y: 50 }, 1);
    expectRel(areaOf(bent), 1e4 + (Math.PI * 2500) / 2, { rel: 1e-12 });
    expectRel(edgeRadius(bent, 1), 50, { rel: 1e-12 });
    const [a, b] = [bent.outer[1], bent.outer[2]];
    if (!a || !b) throw new Error("corners are there");
    const middle = edgeMiddle({ x: a.x, y: a.y, bulge: a.bulge ?? 0 }, b);
    expectRel(middle.x, 150, { rel: 1e-12 });
    expect(edgeRadius(bendEdge(bent, 1, { x: 100.5, y: 50 }, 1), 1)).toBeNull();
  });

  test("a typed radius spans the edge, inwards when negative, and is refused when it is too short", () => {
    expectRel(edgeRadius(must(setEdgeRadius(square, 0, 80)), 0), 80, { rel: 1e-12 });
    expect(areaOf(must(setEdgeRadius(square, 0, -80)))).toBeLessThan(1e4);
    expect(setEdgeRadius(square, 0, 40).ok).toBe(false);
  });

  test("a corner added in the middle of an edge changes no area, on arcs too", () => {
    const bent = bendEdge(square, 1, { x: 130, y: 50 }, 1);
    expectRel(areaOf(insertVertex(bent, 1)), areaOf(bent), { rel: 1e-12 });
    expect(insertVertex(square, 0).outer).toHaveLength(5);
  });

  test("keeps three corners, and refuses what finds no room", () => {
    const triangle = { ...square, outer: square.outer.slice(0, 3) };
    expect(removeVertex(triangle, 0)).toBe(triangle);
    expect(filletCorner(square, 0, 100).ok).toBe(false);
    expect(filletCorner(must(filletCorner(square, 0, 10)), 0, 5).ok).toBe(false);
  });
});

test("a point taken into a part's own axes and back is where it was", () => {
  const part = platePart("p", 10, 20, 30, -40, { angle: 33, mirror: true });
  const p = toPlaced(part, toOwn(part, { x: 7, y: 9 }));
  expectRel(p.x, 7, { rel: 1e-12 });
  expectRel(p.y, 9, { rel: 1e-12 });
});

test("a part is hit inside and within reach of its edge, holes first; a band picks what lies wholly in it", () => {
  const d = girder();
  expect(partAt(d, { x: 0, y: 300 }, 1)).toBe("web");
  expect(partAt(d, { x: 12, y: 300 }, 1)).toBeNull();
  expect(partAt(d, { x: 12, y: 300 }, 5)).toBe("web");
  expect(partsWithin(d, { xMin: -150, xMax: 150, yMin: -1, yMax: 600 })).toEqual(["web", "bf"]);
});

test("a joint is written down where there was none, found in either order, and changed in place", () => {
  const once = changeJoint(girder(), ["tf", "web"], { size: 6 });
  expect(once.joints).toEqual([{ between: ["tf", "web"], kind: "fillet", size: 6 }]);
  expect(changeJoint(once, ["web", "tf"], { kind: "cjp" }).joints).toEqual([
    { between: ["tf", "web"], kind: "cjp", size: 6 },
  ]);
});

test("materials get free ids and names; one in use or the reference stays", () => {
  const two = addMaterial(girder(), STEEL);
  expect(two.materials.map((m) => [m.id, m.name])).toEqual([
    ["steel", "Steel"],
    ["steel 2", "Steel 2"],
  ]);
  expect(removeMaterial(two, "steel")).toBe(two);
  expect(removeMaterial(two, "steel 2").materials).toHaveLength(1);
  expect(setReference(two, "none")).toBe(two);
});
