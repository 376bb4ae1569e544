import { extremePoint } from "@/lib/geometry/extreme-point";
import { centralMoments, type CentralMoments, type WeightedRegions } from "@/lib/geometry/moments";
import type { Point, Region } from "@/lib/geometry/region";
import { everyNumberIsFinite } from "@/lib/section/finite";
import { PRODUCT_ROUNDING_REL, principalAxes } from "@/lib/section/principal-axes";

/** Elastic properties about the centroid: units and signs as in `SectionProperties`. */
export type ElasticValues = Readonly<{
  area: number;
  centroid: Point;
  extents: Readonly<{ xMin: number; xMax: number; yMin: number; yMax: number }>;
  Ix: number;
  Iy: number;
  Ixy: number;
  I1: number;
  I2: number;
  angle: number;
  SxTop: number;
  SxBottom: number;
  SyLeft: number;
  SyRight: number;
  Sx: number;
  Sy: number;
  S1: number;
  S2: number;
  rx: number;
  ry: number;
  r1: number;
  r2: number;
}>;

/**
 * `anyAngle`: every axis through the centroid is principal. `central`: moments to third order about the centroid, for the
 * monosymmetry constants.
 */
export type Elastic = Readonly<{ values: ElasticValues; anyAngle: boolean; central: CentralMoments }>;

const RIGHT: Point = { x: 1, y: 0 };
const UP: Point = { x: 0, y: 1 };
const turned = (p: Point, factor: number): Point => ({ x: p.x * factor, y: p.y * factor });

/** Distances from the centroid to the extreme fibres along ± a direction. */
const reach = (regions: readonly Region[], direction: Point, from: Point): readonly [number, number] => [
  extremePoint(regions, direction, from)?.distance ?? 0,
  extremePoint(regions, turned(direction, -1), from)?.distance ?? 0,
];

/**
 * Area, centroid, second moments, principal axes, elastic section moduli and radii of gyration of weighted regions.
 * @param sets regions in drawing axes, mm; weight 1 for plain values, n = E/E_ref for transformed ones.
 * @returns null where the weighted area is not positive or sizes are beyond what numbers hold. SxTop = Ix / (yMax − ȳ) and so on; Sx, Sy, S1, S2 are the lesser
 * of their two faces; S1 = I1 over the greatest distance from axis 1. Exact over lines and arcs.
 * @source Definitions; Green's theorem for the integrals (`lib/geometry/moments`).
 */
export const elasticOf = (sets: readonly WeightedRegions[]): Elastic | null => {
  const central = centralMoments(sets);
  if (central === null) return null;
  const { centroid, moments } = central;
  const { area, yy: Ix, xx: Iy } = moments;
  const Ixy = Math.abs(moments.xy) <= PRODUCT_ROUNDING_REL * (Ix + Iy) ? 0 : moments.xy;
  const principal = principalAxes({ Ix, Iy, Ixy });
  const regions = sets.flatMap((set) => set.regions);
  const radians = (principal.angle * Math.PI) / 180;
  const along: Point = { x: Math.cos(radians), y: Math.sin(radians) };
  const [right, left] = reach(regions, RIGHT, centroid);
  const [top, bottom] = reach(regions, UP, centroid);
  const fromAxis1 = Math.max(...reach(regions, { x: -along.y, y: along.x }, centroid));
  const fromAxis2 = Math.max(...reach(regions, along, centroid));
  if (!(Math.min(right, left, top, bottom, fromAxis1, fromAxis2, principal.I2) > 0)) return null;
  const values: ElasticValues = {
    area,
    centroid,
    extents: {
      xMin: centroid.x - left,
      xMax: centroid.x + right,
      yMin: centroid.y - bottom,
      yMax: centroid.y + top,
    },
    Ix,
    Iy,
    Ixy,
    I1: principal.I1,
    I2: principal.I2,
    angle: principal.angle,
    SxTop: Ix / top,
    SxBottom: Ix / bottom,
    SyLeft: Iy / left,
    SyRight: Iy / right,
    Sx: Ix / Math.max(top, bottom),
    Sy: Iy / Math.max(left, right),
    S1: principal.I1 / fromAxis1,
    S2: principal.I2 / fromAxis2,
    rx: Math.sqrt(Ix / area),
    ry: Math.sqrt(Iy / area),
    r1: Math.sqrt(principal.I1 / area),
    r2: Math.sqrt(principal.I2 / area),
  };
  // D = I1·I2 divides every stress of unsymmetrical bending.
  return everyNumberIsFinite([values, moments, values.I1 * values.I2]) && values.I1 * values.I2 > 0
    ? { values, anyAngle: principal.any, central }
    : null;
};
