import { ringMoments } from "@/lib/geometry/moments";
import type { Point, Region, Ring, Vertex } from "@/lib/geometry/region";
import { reverseRing } from "@/lib/geometry/reverse-ring";

/** A vertex without a `bulge` key where the edge is straight, so that equal geometry is equal as data. */
export const vertexOf = (x: number, y: number, bulge = 0): Vertex =>
  bulge === 0 ? { x, y } : { x, y, bulge };

/**
 * Signed area of a ring of lines and arcs, mm², anticlockwise positive; 0 for a ring without vertices.
 * Exact up to rounding, summed from the ring's first vertex so that distance from the origin costs no digits.
 * @source Green's theorem, see `ringMoments`.
 */
export const ringArea = (ring: Ring): number => {
  const first = ring[0];
  return first === undefined ? 0 : ringMoments(ring, first).area;
};

/** Area of a region, mm²: the outer ring less its holes. Holes count by size whichever way they run. */
export const regionArea = (region: Region): number =>
  region.holes.reduce((area, hole) => area - Math.abs(ringArea(hole)), Math.abs(ringArea(region.outer)));

/** The ring run anticlockwise (`outer`) or clockwise (`hole`), as `Region` asks. */
export const orientRing = (ring: Ring, as: "outer" | "hole"): Ring =>
  ringArea(ring) > 0 === (as === "outer") ? ring : reverseRing(ring);

/** The ring moved by (dx, dy), mm. */
export const moveRing = (ring: Ring, dx: number, dy: number): Ring =>
  ring.map((v) => vertexOf(v.x + dx, v.y + dy, v.bulge));

/** The region moved by (dx, dy), mm. */
export const moveRegion = (region: Region, dx: number, dy: number): Region => ({
  outer: moveRing(region.outer, dx, dy),
  holes: region.holes.map((hole) => moveRing(hole, dx, dy)),
});

/** Number of vertices of a region, holes included. */
export const vertexCount = (region: Region): number =>
  region.holes.reduce((n, hole) => n + hole.length, region.outer.length);

/** Where a thing is put: its origin goes to `at` (mm), after a turn by `angle` (degrees anticlockwise), after `mirror` (x → −x). */
export type Placement = Readonly<{ at: Point; angle: number; mirror?: boolean | undefined }>;

const EXACT_TURNS: Readonly<Record<number, readonly [number, number]>> = {
  0: [1, 0],
  90: [0, 1],
  180: [-1, 0],
  270: [0, -1],
};

/** [cos, sin] of an angle in degrees; exact at multiples of 90°, where Math.cos leaves 6e-17. */
export const cosSinOfDegrees = (degrees: number): readonly [number, number] => {
  const turn = ((degrees % 360) + 360) % 360;
  const radians = (turn * Math.PI) / 180;
  return EXACT_TURNS[turn] ?? [Math.cos(radians), Math.sin(radians)];
};

const placeRing = (ring: Ring, placement: Placement): Ring => {
  const [c, s] = cosSinOfDegrees(placement.angle);
  const side = placement.mirror === true ? -1 : 1;
  const placed = ring.map((v) =>
    vertexOf(
      placement.at.x + (c * side * v.x - s * v.y),
      placement.at.y + (s * side * v.x + c * v.y),
      side * (v.bulge ?? 0),
    ),
  );
  return side === 1 ? placed : reverseRing(placed);
};

/** The region mirrored, turned and moved, in that order; rings keep their direction (outer anticlockwise). */
export const placeRegion = (region: Region, placement: Placement): Region => ({
  outer: placeRing(region.outer, placement),
  holes: region.holes.map((hole) => placeRing(hole, placement)),
});
