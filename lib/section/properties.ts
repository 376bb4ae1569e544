import type { Point } from "@/lib/geometry/region";
import type { SectionWarning } from "@/lib/section/section";

export type Absent = Readonly<{ property: string; code: string; detail: string }>;

/** Extreme stress at one face under a unit moment, for a section whose x and y are not principal. */
export type FreeBendingFace = Readonly<{
  face: "top" | "bottom" | "left" | "right";
  /** M/S at this face per unit moment, 1/mm³. */
  nominal: number;
  /** True extreme stress on this side of the centroid per unit moment, 1/mm³, with the other axis free to bend. */
  actual: number;
  /** actual / nominal. */
  factor: number;
  at: Point;
}>;

export type Unsymmetrical = Readonly<{
  /** |Ixy| / I1. */
  share: number;
  /** Least S that holds for free bending under Mx alone and under My alone, mm³. */
  SxFree: number;
  SyFree: number;
  /** Largest factor actual/nominal against Sx and Sy. */
  factorX: number;
  factorY: number;
  underMx: readonly FreeBendingFace[];
  underMy: readonly FreeBendingFace[];
}>;

/** Plain geometric values where E differs between parts (every part with weight 1). */
export type PlainProperties = Readonly<{
  area: number;
  centroid: Point;
  Ix: number;
  Iy: number;
  Ixy: number;
  I1: number;
  I2: number;
  angle: number;
  Sx: number;
  Sy: number;
  rx: number;
  ry: number;
}>;

/** Stress in a material = factor × (M/S of the transformed section): n = E/E_ref. */
export type StressFactor = Readonly<{ material: string; name: string; factor: number }>;

/**
 * Every property of a section. Units in `lib/units/property-units.ts`; axes x right, y up through the centroid;
 * angle in degrees from +x anticlockwise to axis 1, in (−90, 90]. A value that could not be computed is null and has its
 * reason in `absent`; never 0, never NaN. Where E differs between parts, A, I, S and r are the transformed values for the
 * reference material and `plain` holds the geometric ones.
 */
export type SectionProperties = Readonly<{
  area: number;
  perimeter: Readonly<{ outer: number; inner: number }>;
  mass: number;
  surface: number;
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
  Zx: number | null;
  Zy: number | null;
  Z1: number | null;
  Z2: number | null;
  /** Equal-area axes: `y` of the axis parallel to x–x, `x` of the axis parallel to y–y, drawing coordinates. */
  pna: Readonly<{ x: number; y: number }> | null;
  /** Equal-force axes where fy differs between parts, else null. */
  equalForceAxis: Readonly<{ x: number; y: number }> | null;
  Mp: Readonly<{ x: number; y: number }> | null;
  squash: number | null;
  rx: number;
  ry: number;
  r1: number;
  r2: number;
  J: number | null;
  Cw: number | null;
  shearCentre: Point | null;
  Avx: number | null;
  Avy: number | null;
  betaX: number | null;
  betaY: number | null;
  r0: number | null;
  estimates: Readonly<{ J: number | null; Cw: number | null; shearCentre: number | null }>;
  plain: PlainProperties | null;
  stressFactors: readonly StressFactor[];
  unsymmetrical: Unsymmetrical | null;
  absent: readonly Absent[];
  warnings: readonly SectionWarning[];
}>;
