import { partBox, placedRegions } from "@/lib/drawing/placed-part";
import type { Drawing } from "@/lib/drawing/schema";
import type { Box } from "@/lib/geometry/arc";
import { regionContains } from "@/lib/geometry/contains";
import { distanceToEdge, ringEdges } from "@/lib/geometry/edge";
import type { Point, Region } from "@/lib/geometry/region";

const near = (region: Region, p: Point, reach: number): boolean =>
  [region.outer, ...region.holes].some((ring) =>
    ringEdges(ring).some((edge) => distanceToEdge(edge, p) <= reach),
  );

/** The part under a point: cut-outs lie on top, later parts over earlier ones; `reach` (mm) lets thin parts be hit. */
export const partAt = (drawing: Drawing, p: Point, reach: number): string | null => {
  const order = [
    ...drawing.parts.filter((part) => part.cutout !== true),
    ...drawing.parts.filter((part) => part.cutout === true),
  ];
  const inside = order.findLast((part) => placedRegions(part).some((r) => regionContains(r, p)));
  if (inside) return inside.id;
  return order.findLast((part) => placedRegions(part).some((r) => near(r, p, reach)))?.id ?? null;
};

/** Parts that lie wholly within a box, mm. */
export const partsWithin = (drawing: Drawing, box: Box): string[] =>
  drawing.parts.flatMap((part) => {
    const own = partBox(part);
    const within =
      own && own.xMin >= box.xMin && own.xMax <= box.xMax && own.yMin >= box.yMin && own.yMax <= box.yMax;
    return within ? [part.id] : [];
  });
