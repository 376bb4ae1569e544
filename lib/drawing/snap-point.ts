import { placedRegions } from "@/lib/drawing/placed-part";
import type { Drawing } from "@/lib/drawing/schema";
import { distanceToEdge, pointOnEdge, ringEdges, shareOf } from "@/lib/geometry/edge";
import type { Point } from "@/lib/geometry/region";
import type { SnapOptions } from "@/lib/drawing/snap";

export type SnappedPoint = Readonly<{ point: Point; words: string }>;

type Found = Readonly<{ point: Point; words: string; rank: number }>;

const distance = (a: Point, b: Point) => Math.hypot(a.x - b.x, a.y - b.y);

/**
 * A point under the pointer moved to what it is near: a corner, the middle of an edge, an edge, the centroid, a level or
 * upright line with an earlier point, the grid; in this order. Without anything near it stays.
 */
export const snapPoint = (
  wanted: Point,
  drawing: Drawing,
  options: SnapOptions,
  earlier: readonly Point[] = [],
): SnappedPoint => {
  const near = (p: Point) => distance(p, wanted) <= options.reach;
  const found: Found[] = drawing.parts.flatMap((part, i) =>
    placedRegions(part).flatMap((region) =>
      [region.outer, ...region.holes].flatMap((ring) =>
        ringEdges(ring).flatMap((edge): Found[] => {
          const item = i + 1;
          if (distanceToEdge(edge, wanted) > options.reach) return [];
          const middle = pointOnEdge(edge, 0.5);
          return [
            ...(near(edge.from) ? [{ point: edge.from, words: `corner of ${item}`, rank: 0 }] : []),
            ...(near(middle) ? [{ point: middle, words: `middle of an edge of ${item}`, rank: 1 }] : []),
            { point: pointOnEdge(edge, shareOf(edge, wanted)), words: `on an edge of ${item}`, rank: 2 },
          ];
        }),
      ),
    ),
  );
  if (options.centroid && near(options.centroid))
    found.push({ point: options.centroid, words: "on the centroid", rank: 1.5 });
  earlier.forEach((p, i) => {
    if (near(p))
      found.push({ point: p, words: i === 0 ? "on the first point" : "on an earlier point", rank: 0 });
  });
  const best = found.reduce<Found | null>((a, b) => {
    if (!a || b.rank < a.rank) return b;
    return b.rank === a.rank && distance(b.point, wanted) < distance(a.point, wanted) ? b : a;
  }, null);
  if (best) return { point: { x: best.point.x, y: best.point.y }, words: best.words };
  return inLine(wanted, options, earlier);
};

const inLine = (wanted: Point, options: SnapOptions, earlier: readonly Point[]): SnappedPoint => {
  const upright = earlier.findLast((p) => Math.abs(p.x - wanted.x) <= options.reach);
  const level = earlier.findLast((p) => Math.abs(p.y - wanted.y) <= options.reach);
  const step = (v: number) => (options.grid > 0 ? Math.round(v / options.grid) * options.grid : v);
  const point = { x: upright?.x ?? step(wanted.x), y: level?.y ?? step(wanted.y) };
  const words = [upright && "upright with an earlier point", level && "level with an earlier point"]
    .filter(Boolean)
    .join("; ");
  return { point, words: words || (options.grid > 0 ? `grid, ${options.grid} mm` : "") };
};
