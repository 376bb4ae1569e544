import { extremePoint } from "@/lib/geometry/extreme-point";
import type { Point, Region } from "@/lib/geometry/region";
import type { ElasticValues } from "@/lib/section/elastic";
import type { FreeBendingFace, Unsymmetrical } from "@/lib/section/properties";

/** Above this share of I1, Ixy makes x–y noticeably not principal (design: Numbers). */
export const UNSYMMETRICAL_REL = 1e-6;

type Face = FreeBendingFace["face"];

/** Extreme stress per unit moment on the side towards `gradient`, where σ = gradient · (p − centroid). */
const faceUnder = (
  face: Face,
  gradient: Point,
  nominal: number,
  regions: readonly Region[],
  centroid: Point,
): FreeBendingFace => {
  const steepness = Math.hypot(gradient.x, gradient.y);
  const direction = { x: gradient.x / steepness, y: gradient.y / steepness };
  const extreme = extremePoint(regions, direction, centroid) ?? { point: centroid, distance: 0 };
  const actual = steepness * extreme.distance;
  return { face, nominal, actual, factor: actual / nominal, at: extreme.point };
};

/**
 * Free bending of a section whose x and y are not principal axes: the true extreme stress under Mx alone and under My
 * alone, beside M/S, for each face.
 * @param regions the parts that carry stress, in drawing axes, mm.
 * @returns null where |Ixy| ≤ 1e-6·I1. Stresses per unit moment in 1/mm³; extreme points on arcs are exact. "top" is the
 * side where Mx alone gives the stress of the sign it has at the top, "bottom" the other one.
 * @source Unsymmetrical bending about the centroid: σ = Mx(Iy·y − Ixy·x)/D under Mx alone, σ = My(Ix·x − Ixy·y)/D under
 * My alone, D = Ix·Iy − Ixy² (σ taken positive at the top, respectively at the right).
 */
export const unsymmetricalBending = (
  elastic: ElasticValues,
  regions: readonly Region[],
): Unsymmetrical | null => {
  const { Ix, Iy, Ixy, I1, I2, centroid } = elastic;
  const share = Math.abs(Ixy) / I1;
  if (share <= UNSYMMETRICAL_REL) return null;
  const D = I1 * I2;
  const underX = { x: -Ixy / D, y: Iy / D };
  const underY = { x: Ix / D, y: -Ixy / D };
  const back = (g: Point): Point => ({ x: -g.x, y: -g.y });
  const face = (name: Face, gradient: Point, S: number) =>
    faceUnder(name, gradient, 1 / S, regions, centroid);
  const underMx = [face("top", underX, elastic.SxTop), face("bottom", back(underX), elastic.SxBottom)];
  const underMy = [face("right", underY, elastic.SyRight), face("left", back(underY), elastic.SyLeft)];
  const SxFree = 1 / Math.max(...underMx.map((f) => f.actual));
  const SyFree = 1 / Math.max(...underMy.map((f) => f.actual));
  return {
    share,
    SxFree,
    SyFree,
    factorX: elastic.Sx / SxFree,
    factorY: elastic.Sy / SyFree,
    underMx,
    underMy,
  };
};
