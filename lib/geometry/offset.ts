import type { Edge } from "@/lib/geometry/edge";
import { directionAt, ringEdges } from "@/lib/geometry/edge";
import type { Point, Region, Ring } from "@/lib/geometry/region";
import { vertexOf } from "@/lib/geometry/ring";
import type { Result } from "@/lib/result";
import { err, ok } from "@/lib/result";

/** Which faces wear: the outer ones, or those of holes and cells too. */
export type WornFaces = "outer" | "all";

/** The corner turns away from the material by more than this sine, so that wear rounds it; less is a smooth joint. */
const CORNER_SINE = 1e-9;

const asRegion = (outer: Ring): Region => ({ outer, holes: [] });

const leftOf = (p: Point, direction: Point, by: number): Point => ({
  x: p.x - by * direction.y,
  y: p.y + by * direction.x,
});

const disc = (centre: Point, radius: number): Region =>
  asRegion([vertexOf(centre.x + radius, centre.y, 1), vertexOf(centre.x - radius, centre.y, 1)]);

/** What lies within `depth` of an edge on its left, square to it: a rectangle, or the band between two arcs. */
const band = (edge: Edge, depth: number): readonly Region[] => {
  const { from, to, arc } = edge;
  const bulge = from.bulge ?? 0;
  const start = vertexOf(from.x, from.y, bulge);
  const end = vertexOf(to.x, to.y);
  if (arc !== null && arc.sweep > 0 && depth >= arc.radius) {
    const centre = vertexOf(arc.centre.x, arc.centre.y);
    return [asRegion([start, end, centre]), disc(from, depth), disc(to, depth)];
  }
  const inEnd = leftOf(to, directionAt(edge, 1), depth);
  const inStart = leftOf(from, directionAt(edge, 0), depth);
  return [asRegion([start, end, vertexOf(inEnd.x, inEnd.y, -bulge), vertexOf(inStart.x, inStart.y)])];
};

/** Discs at the corners that point into the material: points near them are near no edge square on. */
const roundings = (edges: readonly Edge[], depth: number): readonly Region[] =>
  edges.flatMap((edge, i) => {
    const before = edges[(i + edges.length - 1) % edges.length] ?? edge;
    const [arriving, leaving] = [directionAt(before, 1), directionAt(edge, 0)];
    const turn = arriving.x * leaving.y - arriving.y * leaving.x;
    return turn < -CORNER_SINE ? [disc(edge.from, depth)] : [];
  });

/**
 * What a wear or corrosion allowance takes: everything of the area that lies within `depth` of its worn faces. Take the
 * regions away (as cut-outs) for the section that is left; corners that point outwards stay sharp, those that point into
 * the material are rounded, arcs stay true arcs of radius r ∓ depth.
 * @param outline directed regions, mm, that do not overlap: the union of all parts, so that faces between parts do not wear.
 * @param depth mm, greater than 0.
 * @returns regions that overlap each other, one or more for each edge, or `wear.badDepth`.
 * @source The inner parallel body: the area less all discs of radius `depth` about points of its faces.
 */
export const wornAway = (
  outline: readonly Region[],
  depth: number,
  faces: WornFaces = "outer",
): Result<readonly Region[]> => {
  if (!(depth > 0 && Number.isFinite(depth)))
    return err({
      code: "wear.badDepth",
      detail: "The allowance must be a length greater than 0.",
      pointer: "/allowance",
    });
  const rings = outline.flatMap(({ outer, holes }) => (faces === "all" ? [outer, ...holes] : [outer]));
  return ok(
    rings.flatMap((ring) => {
      const edges = ringEdges(ring);
      return [...edges.flatMap((edge) => band(edge, depth)), ...roundings(edges, depth)];
    }),
  );
};
