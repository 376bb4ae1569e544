import earcut from "earcut";
import fc from "fast-check";
import * as Flatten from "@flatten-js/core";
import { Polygon as PlanckPolygon, Vec2 } from "planck";
import { describe, test } from "vitest";
import type { Point, Region, Ring } from "@/lib/geometry/region";
import { ringBox } from "@/lib/geometry/arc";
import { arcOf } from "@/lib/geometry/arc";
import type { Profile } from "@/lib/profiles/families";
import { profileRegions } from "@/lib/profiles/profile-regions";
import { sectionProperties } from "@/lib/section/section-properties";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";
import { starRegion } from "@/tests/helpers/rings";
import { sectionOfRegions } from "@/tests/helpers/sections";

type Triangle = readonly [Point, Point, Point];

const trianglesOf = ({ outer, holes }: Region): readonly Triangle[] => {
  const points = [outer, ...holes].flat();
  const starts = holes.map((_, i) => [outer, ...holes.slice(0, i)].flat().length);
  const indices = earcut(
    points.flatMap((p) => [p.x, p.y]),
    starts,
  );
  return Array.from({ length: indices.length / 3 }, (_, k): Triangle => {
    const corner = (j: number): Point => points[indices[3 * k + j] ?? -1] ?? { x: Number.NaN, y: Number.NaN };
    return [corner(0), corner(1), corner(2)];
  });
};

const areaOf = ([a, b, c]: Triangle) => Math.abs((b.x - a.x) * (c.y - a.y) - (c.x - a.x) * (b.y - a.y)) / 2;

/** Area, first and second moments by the rule of side midpoints, which is exact for squares of coordinates. */
const byMidpoints = (triangles: readonly Triangle[]) => {
  const sum = { area: 0, x: 0, y: 0, xx: 0, xy: 0, yy: 0 };
  for (const triangle of triangles) {
    const third = areaOf(triangle) / 3;
    triangle.forEach((p, i) => {
      const q = triangle[(i + 1) % 3] as Point;
      const [x, y] = [(p.x + q.x) / 2, (p.y + q.y) / 2];
      sum.area += third;
      sum.x += third * x;
      sum.y += third * y;
      sum.xx += third * x * x;
      sum.xy += third * x * y;
      sum.yy += third * y * y;
    });
  }
  return sum;
};

/** planck is made for bodies of about a metre: ours are brought to that size. */
const M = 1e-2;

/** planck welds corners nearer than half its linear slop of 5 mm. */
const WELD = 2.6e-3;

const shortestSide = (t: Triangle): number =>
  Math.min(...t.map((p, i) => Math.hypot(p.x - (t[(i + 1) % 3] ?? p).x, p.y - (t[(i + 1) % 3] ?? p).y)));

/** Area and polar moment about the origin, triangle by triangle, with density 1. */
const byPlanck = (triangles: readonly Triangle[]) =>
  triangles.reduce(
    (sum, triangle) => {
      const data = { mass: 0, center: new Vec2(0, 0), I: 0 };
      new PlanckPolygon(triangle.map((p) => new Vec2(p.x * M, p.y * M))).computeMass(data, 1);
      return { area: sum.area + data.mass / M ** 2, polar: sum.polar + data.I / M ** 4 };
    },
    { area: 0, polar: 0 },
  );

describe("200 random polygons with holes", () => {
  test("have the moments that earcut's triangles give by the midpoint rule", () => {
    fc.assert(
      fc.property(starRegion(false), (region) => {
        const p = must(sectionProperties(sectionOfRegions([region])));
        const m = byMidpoints(trianglesOf(region));
        const [cx, cy] = [m.x / m.area, m.y / m.area];
        expectRel(p.area, m.area, { rel: 1e-10 });
        expectRel(p.centroid.x, cx, { rel: 1e-10, scale: 100 });
        expectRel(p.centroid.y, cy, { rel: 1e-10, scale: 100 });
        expectRel(p.Ix, m.yy - cy * cy * m.area, { rel: 1e-10 });
        expectRel(p.Iy, m.xx - cx * cx * m.area, { rel: 1e-10 });
        expectRel(p.Ixy, m.xy - cx * cy * m.area, { rel: 1e-10, scale: p.I1 });
      }),
      { numRuns: 200 },
    );
  });

  test("have the area and polar moment of planck's triangles", () => {
    fc.assert(
      fc.property(starRegion(false), (region) => {
        const p = must(sectionProperties(sectionOfRegions([region])));
        const triangles = trianglesOf(region);
        // planck welds corners nearer than its slop and would drop such a triangle.
        fc.pre(triangles.every((t) => shortestSide(t) * M > WELD));
        const { area, polar } = byPlanck(triangles);
        const steiner = p.area * (p.centroid.x ** 2 + p.centroid.y ** 2);
        expectRel(p.area, area, { rel: 1e-10 });
        expectRel(p.Ix + p.Iy + steiner, polar, { rel: 1e-10 });
      }),
      { numRuns: 200 },
    );
  });
});

const flattenRing = (ring: Ring): (Flatten.Segment | Flatten.Arc)[] =>
  ring.map((from, i) => {
    const to = ring[(i + 1) % ring.length] as Point;
    const arc = arcOf(from, to);
    return arc === null
      ? new Flatten.Segment(new Flatten.Point(from.x, from.y), new Flatten.Point(to.x, to.y))
      : new Flatten.Arc(
          new Flatten.Point(arc.centre.x, arc.centre.y),
          arc.radius,
          arc.start,
          arc.start + arc.sweep,
          arc.sweep > 0,
        );
  });

const ROLLED: readonly Profile[] = [
  {
    family: "i-section",
    dimensions: { depth: 300, flangeWidth: 150, webThickness: 7.1, flangeThickness: 10.7, rootRadius: 15 },
  },
  {
    family: "channel",
    dimensions: {
      depth: 300,
      flangeWidth: 100,
      webThickness: 10,
      flangeThickness: 16,
      rootRadius: 16,
      toeRadius: 8,
      flangeSlope: 0.08,
    },
  },
  {
    family: "angle",
    dimensions: { legLong: 150, legShort: 90, thickness: 10, rootRadius: 12, toeRadius: 6 },
  },
  {
    family: "tee",
    dimensions: { depth: 150, flangeWidth: 150, webThickness: 7.1, flangeThickness: 10.7, rootRadius: 15 },
  },
  { family: "zee", dimensions: { depth: 200, flangeWidth: 75, thickness: 2, innerRadius: 4 } },
  {
    family: "lipped-channel",
    dimensions: { depth: 200, flangeWidth: 75, lip: 20, thickness: 1.5, innerRadius: 3 },
  },
  {
    family: "rectangular-hollow",
    dimensions: { depth: 200, width: 100, thickness: 8, outerRadius: 20, innerRadius: 12 },
  },
];

test.each(ROLLED.map((profile) => [profile.family, profile] as const))(
  "the area and the box of a %s agree with @flatten-js/core, which keeps true arcs",
  (_, profile) => {
    const regions = must(profileRegions(profile));
    const { area, extents } = must(sectionProperties(sectionOfRegions(regions)));
    const faces = regions
      .flatMap((r) => [r.outer, ...r.holes])
      .map((ring) => {
        const polygon = new Flatten.Polygon();
        polygon.addFace(flattenRing(ring));
        return polygon;
      });
    const [outer, ...holes] = faces.map((polygon) => polygon.area());
    expectRel(area, (outer ?? Number.NaN) - holes.reduce((sum, a) => sum + a, 0), { rel: 1e-12 });
    const box = ringBox(regions[0]?.outer ?? []);
    expectRel(extents.xMax - extents.xMin, (box?.xMax ?? 0) - (box?.xMin ?? 0), { rel: 1e-13 });
    expectRel(extents.yMax - extents.yMin, faces[0]?.box.height ?? Number.NaN, { rel: 1e-12 });
  },
);
