import { segmentIntegrals } from "@/lib/geometry/circular-segment";
import type { Point, Region, Ring } from "@/lib/geometry/region";

/**
 * Integrals of 1, x, y, x², xy, y², x³, x²y, xy², y³ over an area, in this order of keys; mm² to mm⁵.
 * Coordinates are measured from the origin that the function which made them was given.
 */
export type Moments = Readonly<{
  area: number;
  x: number;
  y: number;
  xx: number;
  xy: number;
  yy: number;
  xxx: number;
  xxy: number;
  xyy: number;
  yyy: number;
}>;

export const NO_MOMENTS: Moments = {
  area: 0,
  x: 0,
  y: 0,
  xx: 0,
  xy: 0,
  yy: 0,
  xxx: 0,
  xxy: 0,
  xyy: 0,
  yyy: 0,
};

/** a + weight × b. Both must be about the same origin. */
export const addMoments = (a: Moments, b: Moments, weight = 1): Moments => ({
  area: a.area + weight * b.area,
  x: a.x + weight * b.x,
  y: a.y + weight * b.y,
  xx: a.xx + weight * b.xx,
  xy: a.xy + weight * b.xy,
  yy: a.yy + weight * b.yy,
  xxx: a.xxx + weight * b.xxx,
  xxy: a.xxy + weight * b.xxy,
  xyy: a.xyy + weight * b.xyy,
  yyy: a.yyy + weight * b.yyy,
});

/**
 * Moments of the same area after it is moved by (dx, dy), which is also moments about an origin moved by (−dx, −dy).
 * @source Binomial expansion of (x + dx)^p (y + dy)^q: Steiner's rule to third order.
 */
export const moveMoments = (m: Moments, dx: number, dy: number): Moments => ({
  area: m.area,
  x: m.x + dx * m.area,
  y: m.y + dy * m.area,
  xx: m.xx + 2 * dx * m.x + dx * dx * m.area,
  xy: m.xy + dx * m.y + dy * m.x + dx * dy * m.area,
  yy: m.yy + 2 * dy * m.y + dy * dy * m.area,
  xxx: m.xxx + 3 * dx * m.xx + 3 * dx * dx * m.x + dx * dx * dx * m.area,
  xxy: m.xxy + 2 * dx * m.xy + dy * m.xx + dx * dx * m.y + 2 * dx * dy * m.x + dx * dx * dy * m.area,
  xyy: m.xyy + 2 * dy * m.xy + dx * m.yy + dy * dy * m.x + 2 * dx * dy * m.y + dx * dy * dy * m.area,
  yyy: m.yyy + 3 * dy * m.yy + 3 * dy * dy * m.y + dy * dy * dy * m.area,
});

/**
 * The moments seen in axes turned anticlockwise by `angle` radians about the same origin.
 * @source x' = x cos + y sin, y' = −x sin + y cos, expanded.
 */
export const momentsInAxes = (m: Moments, angle: number): Moments => {
  const c = Math.cos(angle);
  const s = Math.sin(angle);
  return {
    area: m.area,
    x: c * m.x + s * m.y,
    y: c * m.y - s * m.x,
    xx: c * c * m.xx + 2 * c * s * m.xy + s * s * m.yy,
    xy: (c * c - s * s) * m.xy + c * s * (m.yy - m.xx),
    yy: c * c * m.yy - 2 * c * s * m.xy + s * s * m.xx,
    xxx: c * c * c * m.xxx + 3 * c * c * s * m.xxy + 3 * c * s * s * m.xyy + s * s * s * m.yyy,
    xxy:
      -c * c * s * m.xxx +
      c * (c * c - 2 * s * s) * m.xxy +
      s * (2 * c * c - s * s) * m.xyy +
      c * s * s * m.yyy,
    xyy:
      c * s * s * m.xxx +
      s * (s * s - 2 * c * c) * m.xxy +
      c * (c * c - 2 * s * s) * m.xyy +
      c * c * s * m.yyy,
    yyy: -s * s * s * m.xxx + 3 * c * s * s * m.xxy - 3 * c * c * s * m.xyy + c * c * c * m.yyy,
  };
};

const segmentMoments = (from: Point, to: Point, bulge: number, origin: Point): Moments => {
  const dx = to.x - from.x;
  const dy = to.y - from.y;
  const chord = Math.hypot(dx, dy);
  if (chord === 0) return NO_MOMENTS;
  const sign = Math.sign(bulge);
  const k = segmentIntegrals(chord, Math.abs(bulge));
  const [ux, uy] = [dx / chord, dy / chord];
  const [nx, ny] = [sign * uy, -sign * ux];
  const about: Moments = {
    area: sign * k.area,
    x: sign * k.v * nx,
    y: sign * k.v * ny,
    xx: sign * (k.uu * ux * ux + k.vv * nx * nx),
    xy: sign * (k.uu * ux * uy + k.vv * nx * ny),
    yy: sign * (k.uu * uy * uy + k.vv * ny * ny),
    xxx: sign * (3 * k.uuv * ux * ux * nx + k.vvv * nx * nx * nx),
    xxy: sign * (k.uuv * (ux * ux * ny + 2 * ux * uy * nx) + k.vvv * nx * nx * ny),
    xyy: sign * (k.uuv * (uy * uy * nx + 2 * ux * uy * ny) + k.vvv * nx * ny * ny),
    yyy: sign * (3 * k.uuv * uy * uy * ny + k.vvv * ny * ny * ny),
  };
  return moveMoments(
    about,
    (from.x - origin.x + (to.x - origin.x)) / 2,
    (from.y - origin.y + (to.y - origin.y)) / 2,
  );
};

/** One set of regions with the weight its material has (n = E / E_ref, or 1). */
export type WeightedRegions = Readonly<{ regions: readonly Region[]; weight: number }>;

/** One loop over all edges with plain variables: this decides the speed of everything that needs moments. */
const weightedMoments = (sets: readonly WeightedRegions[], origin: Point): Moments => {
  const ox = origin.x;
  const oy = origin.y;
  let a = 0;
  let mx = 0;
  let my = 0;
  let mxx = 0;
  let mxy = 0;
  let myy = 0;
  let mxxx = 0;
  let mxxy = 0;
  let mxyy = 0;
  let myyy = 0;
  let arcs = NO_MOMENTS;
  for (const { regions, weight } of sets)
    for (const { outer, holes } of regions)
      for (let k = -1; k < holes.length; k += 1) {
        const ring = k < 0 ? outer : (holes[k] ?? []);
        let from = ring[ring.length - 1];
        if (from === undefined) continue;
        let x0 = from.x - ox;
        let y0 = from.y - oy;
        for (const to of ring) {
          const x1 = to.x - ox;
          const y1 = to.y - oy;
          const c = weight * (x0 * y1 - x1 * y0);
          const sx = x0 + x1;
          const sy = y0 + y1;
          const px = x0 * x0 + x1 * x1;
          const py = y0 * y0 + y1 * y1;
          const p0 = x0 * y0;
          const p1 = x1 * y1;
          a += c;
          mx += c * sx;
          my += c * sy;
          mxx += c * (px + x0 * x1);
          mxy += c * (sx * sy + p0 + p1);
          myy += c * (py + y0 * y1);
          mxxx += c * sx * px;
          mxxy += c * (sy * sx * sx + 2 * (x0 * p0 + x1 * p1));
          mxyy += c * (sx * sy * sy + 2 * (y0 * p0 + y1 * p1));
          myyy += c * sy * py;
          if (from.bulge !== undefined && from.bulge !== 0)
            arcs = addMoments(arcs, segmentMoments(from, to, from.bulge, origin), weight);
          from = to;
          x0 = x1;
          y0 = y1;
        }
      }
  return {
    area: a / 2 + arcs.area,
    x: mx / 6 + arcs.x,
    y: my / 6 + arcs.y,
    xx: mxx / 12 + arcs.xx,
    xy: mxy / 24 + arcs.xy,
    yy: myy / 12 + arcs.yy,
    xxx: mxxx / 20 + arcs.xxx,
    xxy: mxxy / 60 + arcs.xxy,
    xyy: mxyy / 60 + arcs.xyy,
    yyy: myyy / 20 + arcs.yyy,
  };
};

/** Weighted area and first moments only: the first pass towards the centroid. */
const roughCentroid = (sets: readonly WeightedRegions[], origin: Point): Point | null => {
  const ox = origin.x;
  const oy = origin.y;
  let a = 0;
  let mx = 0;
  let my = 0;
  let arcs = NO_MOMENTS;
  for (const { regions, weight } of sets)
    for (const { outer, holes } of regions)
      for (let k = -1; k < holes.length; k += 1) {
        const ring = k < 0 ? outer : (holes[k] ?? []);
        let from = ring[ring.length - 1];
        if (from === undefined) continue;
        let x0 = from.x - ox;
        let y0 = from.y - oy;
        for (const to of ring) {
          const x1 = to.x - ox;
          const y1 = to.y - oy;
          const c = weight * (x0 * y1 - x1 * y0);
          a += c;
          mx += c * (x0 + x1);
          my += c * (y0 + y1);
          if (from.bulge !== undefined && from.bulge !== 0)
            arcs = addMoments(arcs, segmentMoments(from, to, from.bulge, origin), weight);
          from = to;
          x0 = x1;
          y0 = y1;
        }
      }
  const area = a / 2 + arcs.area;
  if (!(area > 0)) return null;
  return { x: origin.x + (mx / 6 + arcs.x) / area, y: origin.y + (my / 6 + arcs.y) / area };
};

/**
 * Moments of regions (outer rings less their holes) to third order, about `origin`.
 * @param regions rings of lines and arcs, mm; anticlockwise counts positive, clockwise negative.
 * @param origin take it near the regions: digits are lost as (distance / size)^order.
 * @returns zeros for an empty list or rings without area. Exact up to rounding for lines and arcs.
 * @source Green's theorem: each chord adds the triangle with the origin (∫xᵖy^q over it = c·Σ i!j!/(p+q+2)! …, with
 * c = x₀y₁ − x₁y₀), each arc the circular segment beside its chord.
 */
export const regionMoments = (regions: readonly Region[], origin: Point): Moments =>
  weightedMoments([{ regions, weight: 1 }], origin);

/** Moments of the area inside one ring about `origin`, negative where it runs clockwise; see `regionMoments`. */
export const ringMoments = (ring: Ring, origin: Point): Moments =>
  regionMoments([{ outer: ring, holes: [] }], origin);

/** An area, its centroid in drawing coordinates, and its moments about that centroid (`x` and `y` are rounding only). */
export type CentralMoments = Readonly<{ centroid: Point; moments: Moments }>;

/**
 * Centroid and central moments of weighted regions.
 * Two passes: about the first vertex for the centroid, then about the centroid itself, so that distance from the
 * drawing's origin costs no digits.
 * @returns null where the weighted area is not positive.
 */
export const centralMoments = (sets: readonly WeightedRegions[]): CentralMoments | null => {
  const first = sets.find((set) => set.regions.length > 0)?.regions[0]?.outer[0];
  if (first === undefined) return null;
  const centroid = roughCentroid(sets, first);
  return centroid === null ? null : { centroid, moments: weightedMoments(sets, centroid) };
};
