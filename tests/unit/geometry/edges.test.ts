import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { chordPoints } from "@/lib/geometry/chords";
import { regionContains, ringContains } from "@/lib/geometry/contains";
import {
  bulgeBetween,
  directionAt,
  distanceToEdge,
  edgeOf,
  pointOnEdge,
  ringEdges,
  shareOf,
} from "@/lib/geometry/edge";
import { edgeGrid, edgesCrossedFrom, edgesNear } from "@/lib/geometry/edge-grid";
import { edgesMeet } from "@/lib/geometry/meet";
import { reverseRing } from "@/lib/geometry/reverse-ring";
import { ringArea, vertexOf } from "@/lib/geometry/ring";
import { expectRel } from "@/tests/helpers/expect-rel";
import { disc, put, rectangle } from "@/tests/helpers/parts";

const coordinate = fc.double({ min: -100, max: 100, noNaN: true });
const point = fc.record({ x: coordinate, y: coordinate });
const edge = fc
  .tuple(point, point, fc.oneof(fc.constant(0), fc.double({ min: -3, max: 3, noNaN: true })))
  .filter(([a, b]) => Math.hypot(b.x - a.x, b.y - a.y) > 1)
  .map(([a, b, bulge]) => edgeOf(vertexOf(a.x, a.y, Math.abs(bulge) < 1e-3 ? 0 : bulge), b));

describe("a point on an edge", () => {
  test("has the share it was taken at, no distance, and two stretches that make up the edge", () => {
    fc.assert(
      fc.property(edge, fc.double({ min: 0.01, max: 0.99, noNaN: true }), (e, share) => {
        const p = pointOnEdge(e, share);
        const size = e.arc?.radius ?? 100;
        expectRel(shareOf(e, p), share, { rel: 1e-8 });
        expectRel(distanceToEdge(e, p), 0, { rel: 1e-12, scale: size + 100 });
        const halves = [
          edgeOf(vertexOf(e.from.x, e.from.y, bulgeBetween(e, 0, share)), p),
          edgeOf(vertexOf(p.x, p.y, bulgeBetween(e, share, 1)), e.to),
        ];
        for (const half of halves)
          if (e.arc !== null) expectRel(half.arc?.radius ?? 0, e.arc.radius, { rel: 1e-6 });
      }),
    );
  });

  test("beyond the ends the distance is to the nearer end", () => {
    const line = edgeOf({ x: 0, y: 0 }, { x: 10, y: 0 });
    expect(distanceToEdge(line, { x: 13, y: 4 })).toBe(5);
    expect(distanceToEdge(line, { x: -3, y: 4 })).toBe(5);
    const quarter = edgeOf({ x: 10, y: 0, bulge: Math.SQRT2 - 1 }, { x: 0, y: 10 });
    expectRel(distanceToEdge(quarter, { x: 10, y: -5 }), 5, { rel: 1e-12 });
    expectRel(directionAt(quarter, 0).y, 1, { rel: 1e-15 });
    expect(directionAt(edgeOf({ x: 1, y: 1 }, { x: 1, y: 1 }), 0)).toEqual({ x: 0, y: 0 });
  });
});

test("edges that meet, meet in points of both; circles and lines that miss do not", () => {
  fc.assert(
    fc.property(edge, edge, (a, b) => {
      for (const p of edgesMeet(a, b, 1e-7))
        for (const e of [a, b]) expect(distanceToEdge(e, p)).toBeLessThanOrEqual(1e-6);
    }),
  );
  const circle = edgeOf({ x: 5, y: 0, bulge: 1 }, { x: -5, y: 0 });
  expect(edgesMeet(circle, edgeOf({ x: -9, y: 6 }, { x: 9, y: 6 }), 1e-9)).toEqual([]);
  expect(edgesMeet(circle, edgeOf({ x: 0, y: 9 }, { x: 0, y: 1 }), 1e-9)).toHaveLength(1);
  expect(edgesMeet(circle, edgeOf({ x: 25, y: 0, bulge: 1 }, { x: 15, y: 0 }), 1e-9)).toEqual([]);
  expect(
    edgesMeet(edgeOf({ x: 0, y: 0 }, { x: 1, y: 1 }), edgeOf({ x: 0, y: 1 }, { x: 1, y: 2 }), 1e-9),
  ).toEqual([]);
});

test("chords enclose the area of their arc and are the same both ways", () => {
  fc.assert(
    fc.property(edge, (e) => {
      const points = chordPoints(e, 64);
      if (e.arc === null) {
        expect(points).toEqual([]);
        return;
      }
      const [from, to] = [vertexOf(e.from.x, e.from.y), vertexOf(e.to.x, e.to.y)];
      const arc = ringArea([e.from, to]);
      expectRel(ringArea([from, ...points, to]), arc, { rel: 1e-9, scale: e.arc.radius ** 2 });
      const back = chordPoints(edgeOf(vertexOf(e.to.x, e.to.y, -(e.from.bulge ?? 0)), e.from), 64);
      points.forEach((p, i) => {
        const q = back[back.length - 1 - i];
        expectRel(Math.hypot(p.x - (q?.x ?? Infinity), p.y - (q?.y ?? 0)), 0, {
          rel: 1e-9,
          scale: e.arc?.radius ?? 1,
        });
      });
    }),
  );
});

describe("what lies inside", () => {
  test("a ring with arcs holds what its circles hold", () => {
    fc.assert(
      fc.property(point, fc.double({ min: -180, max: 180, noNaN: true }), (p, angle) => {
        const { x, y } = { x: p.x / 2, y: p.y / 2 };
        const off = Math.hypot(x - 3, y - 4);
        const tube = put(disc(30, 20), 3, 4, angle);
        if (Math.abs(off - 30) > 1e-9 && Math.abs(off - 20) > 1e-9)
          expect(regionContains(tube, { x, y })).toBe(off < 30 && off > 20);
      }),
    );
  });

  test("points on a chord, on a vertex's level and beside a large arc are told", () => {
    const major = [
      { x: 0, y: -5, bulge: 2 },
      { x: 0, y: 5 },
    ];
    for (const ring of [major, reverseRing(major)]) {
      expect(ringContains(ring, { x: 1, y: 0 })).toBe(true);
      expect(ringContains(ring, { x: -1, y: 0 })).toBe(false);
      expect(ringContains(ring, { x: 1, y: 5 })).toBe(true);
    }
  });
});

test("the grid finds every edge near a point, and what a ray crosses", () => {
  const rings = [put(rectangle(50, 3), 0, 0, 33), put(disc(20, 14), 30, 10, 70)].flatMap(
    ({ outer, holes }) => [outer, ...holes],
  );
  const edges = rings.flatMap(ringEdges);
  const grid = edgeGrid(edges, 0.5);
  fc.assert(
    fc.property(
      fc.record({
        x: fc.double({ min: -60, max: 60, noNaN: true }),
        y: fc.double({ min: -40, max: 40, noNaN: true }),
      }),
      (p) => {
        const near = edges.flatMap((e, i) => (distanceToEdge(e, p) <= 0.5 ? [i] : []));
        const found = new Set(edgesNear(grid, p));
        expect(near.filter((i) => !found.has(i))).toEqual([]);
        expect(edgesCrossedFrom(grid, p).length % 2 === 1).toBe(
          rings.filter((ring) => ringContains(ring, p)).length % 2 === 1,
        );
      },
    ),
    { numRuns: 500 },
  );
  expect(edgesNear(edgeGrid([], 1), { x: 0, y: 0 })).toEqual([]);
});
