import { describe, expect, test } from "vitest";
import {
  arcLength,
  arcOf,
  bulgeOfSweep,
  edgeLength,
  furthestOnEdge,
  isArc,
  pointAt,
  QUARTER_BULGE,
  ringBox,
  shareAtAngle,
} from "@/lib/geometry/arc";
import { expectRel } from "@/tests/helpers/expect-rel";

const EXACT = { rel: 1e-14 };
const quarter = { x: 10, y: 0, bulge: QUARTER_BULGE };
const top = { x: 0, y: 10 };

test("a quarter circle has its centre, radius, angles and length", () => {
  const arc = arcOf(quarter, top);
  if (arc === null) throw new Error("no arc");
  expectRel(arc.centre.x, 0, { ...EXACT, scale: 10 });
  expectRel(arc.centre.y, 0, { ...EXACT, scale: 10 });
  expectRel(arc.radius, 10, EXACT);
  expectRel(arc.start, 0, { ...EXACT, scale: 1 });
  expectRel(arc.sweep, Math.PI / 2, EXACT);
  expectRel(arcLength(arc), 5 * Math.PI, EXACT);
  expectRel(pointAt(arc, 0.5).x, 10 * Math.SQRT1_2, EXACT);
  expectRel(edgeLength(quarter, top), 5 * Math.PI, EXACT);
  expect(isArc(quarter)).toBe(true);
});

test("a negative bulge turns clockwise about the centre on the other side", () => {
  const arc = arcOf({ ...quarter, bulge: -QUARTER_BULGE }, top);
  expectRel(arc?.centre.x ?? null, 10, EXACT);
  expectRel(arc?.centre.y ?? null, 10, EXACT);
  expectRel(arc?.sweep ?? null, -Math.PI / 2, EXACT);
});

test("straight edges and edges without length have no arc", () => {
  expect(arcOf({ x: 0, y: 0 }, top)).toBeNull();
  expect(arcOf({ x: 0, y: 10, bulge: 1 }, top)).toBeNull();
  expect(isArc({ x: 0, y: 0, bulge: 0 })).toBe(false);
  expectRel(edgeLength({ x: 0, y: 0 }, top), 10, EXACT);
});

test("the bulge of a sweep is the tangent of a quarter of it", () => {
  expectRel(bulgeOfSweep(Math.PI / 2), QUARTER_BULGE, EXACT);
  expectRel(bulgeOfSweep(-Math.PI), -1, EXACT);
});

describe("the direction seen from the centre", () => {
  const arc = arcOf(quarter, top);
  test("is found inside the sweep and refused outside, whatever whole turns are added", () => {
    if (arc === null) throw new Error("no arc");
    expectRel(shareAtAngle(arc, Math.PI / 4 + 4 * Math.PI), 0.5, { rel: 1e-13 });
    expect(shareAtAngle(arc, Math.PI)).toBeNull();
  });
});

test("the furthest point of an edge lies on the arc, or at the nearer end", () => {
  const diagonal = { x: Math.SQRT1_2, y: Math.SQRT1_2 };
  expectRel(furthestOnEdge(quarter, top, diagonal).x, 10 * Math.SQRT1_2, EXACT);
  expect(furthestOnEdge(quarter, top, { x: 0, y: -1 })).toEqual({ x: 10, y: 0 });
  expect(furthestOnEdge({ x: 0, y: 0 }, top, { x: 0, y: 1 })).toEqual(top);
});

test("the box of a circle reaches its radius on all sides; an empty ring has none", () => {
  const circle = [
    { x: 0, y: -7, bulge: 1 },
    { x: 0, y: 7, bulge: 1 },
  ];
  const box = ringBox(circle);
  expectRel(box?.xMin ?? null, -7, EXACT);
  expectRel(box?.xMax ?? null, 7, EXACT);
  expectRel(box?.yMin ?? null, -7, EXACT);
  expectRel(box?.yMax ?? null, 7, EXACT);
  expect(ringBox([])).toBeNull();
});
