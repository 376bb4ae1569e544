import { expect, test } from "vitest";
import { boxOfParts } from "@/lib/drawing/placed-part";
import { snapMove, snapTargets } from "@/lib/drawing/snap";
import { snapPoint } from "@/lib/drawing/snap-point";
import { drawingOf, girder, platePart } from "@/tests/helpers/drawings";

const lip = () => {
  const d = girder();
  return { ...d, parts: [...d.parts, platePart("lip", 16, 200, 156, 495)] };
};
const options = { reach: 8, grid: 0, centroid: null };
const moved = (by: { x: number; y: number }, more: Partial<typeof options> & { centroid?: never } = {}) => {
  const d = lip();
  const box = boxOfParts(d, ["lip"]);
  if (!box) throw new Error("the lip plate has a box");
  return snapMove(box, by, snapTargets(d, ["lip"]), { ...options, ...more });
};

test("a plate dragged near the flange's edge stands flush with it and says so", () => {
  const { by, words } = moved({ x: 43, y: 30 });
  expect(by.x).toBe(46);
  expect(words).toContain("flush with 1, right edge");
});

test("a plate dragged under the flange stands against its underside", () => {
  const { by, words } = moved({ x: -20, y: 3 });
  expect(by.y).toBe(1);
  expect(words).toContain("against 1, underside");
});

test("edges of one part met on both axes are its corner", () => {
  expect(moved({ x: 43, y: 3 }).words).toContain("corner of 1");
});

test("out of reach nothing is met and the move stays as it was", () => {
  expect(moved({ x: 20, y: -40 })).toEqual({ by: { x: 20, y: -40 }, hits: [], words: "" });
});

test("an edge goes before the grid, the grid before nothing", () => {
  expect(moved({ x: 43, y: -40.4 }, { grid: 10 }).words).toContain("flush with 1, right edge");
  const free = moved({ x: 21, y: -41 }, { grid: 10 });
  expect((148 + free.by.x) % 10).toBe(0);
  expect(free.words).toBe("grid, 10 mm");
});

test("centre lines and the centroid are met", () => {
  const wide = drawingOf(platePart("a", 300, 20, 0, 0), platePart("b", 60, 20, 100, 200));
  const small = boxOfParts(wide, ["b"]);
  if (!small) throw new Error("b has a box");
  const centred = snapMove(small, { x: -96, y: 0 }, snapTargets(wide, ["b"]), options);
  expect(centred.words).toBe("on the centre line of 1");
  expect(centred.by.x).toBe(-100);
  const d = drawingOf(platePart("a", 10, 10, 0, 0), platePart("b", 10, 10, 200, 300));
  const box = boxOfParts(d, ["b"]);
  if (!box) throw new Error("b has a box");
  const hit = snapMove(box, { x: -97, y: 0 }, snapTargets(d, ["b"]), {
    ...options,
    centroid: { x: 100, y: 900 },
  });
  expect(hit.words).toBe("on the centroid");
  expect(hit.by.x).toBe(-100);
});

test("points go to corners first, then middles, edges, and lines with earlier points", () => {
  const d = girder();
  expect(snapPoint({ x: 208, y: 630 }, d, options)).toEqual({
    point: { x: 210, y: 632 },
    words: "corner of 1",
  });
  expect(snapPoint({ x: 2, y: 635 }, d, options).words).toBe("middle of an edge of 1");
  expect(snapPoint({ x: 100, y: 635 }, d, options)).toEqual({
    point: { x: 100, y: 632 },
    words: "on an edge of 1",
  });
  expect(snapPoint({ x: 503, y: 900 }, d, options, [{ x: 500, y: 700 }])).toEqual({
    point: { x: 500, y: 900 },
    words: "upright with an earlier point",
  });
});
