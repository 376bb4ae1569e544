import type { Point } from "@/lib/geometry/region";
import type { Body } from "@/lib/section/torsion/body";
import { gradientTable } from "@/lib/section/torsion/element/gradient-at";
import { shearWeights } from "@/lib/section/torsion/warping-figures";
import type { Warping } from "@/lib/section/torsion/warping";

/** τ_zx and τ_zy at each point of the picture. */
export type StressField = Readonly<{ x: Float64Array; y: Float64Array }>;

/** The greatest shear stress found and where (drawing coordinates, mm). */
export type GreatestStress = Readonly<{ value: number; at: Point }>;

/**
 * Shear stresses of a connected section, sampled for a picture: points (drawing coordinates, mm), six to an element, and
 * triangles over them (three indices each). `torsion` per unit torque about the shear centre, anticlockwise (1/mm³);
 * `shearX`, `shearY` per unit force through the shear centre along x, y (1/mm²); real stresses in each material, ν = 0.
 * `greatest` leaves out a ball of 0.1 of the local thickness round each of the `excludedCorners` re-entrant corners and
 * corners of materials: there the stress has no finite value.
 */
export type StressFields = Readonly<{
  x: Float64Array;
  y: Float64Array;
  triangles: Uint32Array;
  torsion: StressField;
  shearX: StressField;
  shearY: StressField;
  greatest: Readonly<{ torsion: GreatestStress; shearX: GreatestStress; shearY: GreatestStress }>;
  excludedCorners: number;
}>;

/** Corners and middles of the edges. */
const PLACES = [
  [0, 0],
  [1, 0],
  [0, 1],
  [0.5, 0],
  [0, 0.5],
  [0.5, 0.5],
] as const;
const PIECES = [0, 3, 4, 3, 1, 5, 4, 5, 2, 3, 5, 4] as const;

/** Share of the local thickness round a re-entrant corner in which no greatest stress is sought. */
const EXCLUDED_SHARE = 0.1;

/**
 * Samples the torsion and shear stress fields of a body.
 * @param J of the body, mm⁴.
 * @source τ = T g (grad w + (−y, x))/J; τ = V g grad p (Saint-Venant; ν = 0).
 */
export const stressFields = (body: Body, { space, w, px, py }: Warping, J: number): StressFields => {
  const { mesh, sorted, shear, corners, centroid } = body;
  const size = PLACES.length;
  const count = mesh.region.length * size;
  const field = (): { x: Float64Array; y: Float64Array } => ({
    x: new Float64Array(count),
    y: new Float64Array(count),
  });
  const [places, torsion, shearX, shearY] = [field(), field(), field(), field()];
  const triangles = new Uint32Array(mesh.region.length * PIECES.length);
  const weights = shearWeights(body);
  const sharp = corners.filter((corner) => corner.reentrant);
  const allowed = (x: number, y: number): boolean =>
    sharp.every((c) => Math.hypot(x - c.x, y - c.y) > EXCLUDED_SHARE * c.lfs);
  const greatest = { torsion: none(), shearX: none(), shearY: none() };
  const table = gradientTable(mesh, sorted, space, [w, px, py], PLACES);
  for (let t = 0; t < mesh.region.length; t++) {
    const { x, y, dx, dy } = table.at(t);
    const g = shear[t]!;
    PIECES.forEach((place, i) => {
      triangles[t * PIECES.length + i] = t * size + place;
    });
    for (let q = 0; q < size; q++) {
      const i = t * size + q;
      places.x[i] = x[q]! + centroid.x;
      places.y[i] = y[q]! + centroid.y;
      torsion.x[i] = (g * (dx[0]![q]! - y[q]!)) / J;
      torsion.y[i] = (g * (dy[0]![q]! + x[q]!)) / J;
      shearX.x[i] = g * (weights.x[0] * dx[1]![q]! + weights.x[1] * dx[2]![q]!);
      shearX.y[i] = g * (weights.x[0] * dy[1]![q]! + weights.x[1] * dy[2]![q]!);
      shearY.x[i] = g * (weights.y[0] * dx[1]![q]! + weights.y[1] * dx[2]![q]!);
      shearY.y[i] = g * (weights.y[0] * dy[1]![q]! + weights.y[1] * dy[2]![q]!);
      const larger = (
        [
          ["torsion", torsion],
          ["shearX", shearX],
          ["shearY", shearY],
        ] as const
      ).filter(([name, stress]) => Math.hypot(stress.x[i]!, stress.y[i]!) > greatest[name].value);
      if (larger.length === 0 || !allowed(x[q]!, y[q]!)) continue;
      for (const [name, stress] of larger)
        greatest[name] = {
          value: Math.hypot(stress.x[i]!, stress.y[i]!),
          at: { x: places.x[i]!, y: places.y[i]! },
        };
    }
  }
  return { ...places, triangles, torsion, shearX, shearY, greatest, excludedCorners: sharp.length };
};

const none = (): GreatestStress => ({ value: 0, at: { x: 0, y: 0 } });
