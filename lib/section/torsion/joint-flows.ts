import type { Point } from "@/lib/geometry/region";
import type { Body } from "@/lib/section/torsion/body";
import { emptyGeometry, readGeometry } from "@/lib/section/torsion/element/geometry";
import { unknownsOf } from "@/lib/section/torsion/element/space";
import { findJointLines, type JointLine } from "@/lib/section/torsion/joint-lines";
import { shearWeights } from "@/lib/section/torsion/warping-figures";
import type { Warping } from "@/lib/section/torsion/warping";

/**
 * Longitudinal shear through one line along which two parts touch, `from` one end `to` the other (drawing coordinates, mm;
 * equal for a closed line), `length` mm. Flow into the part named first: `perVx`, `perVy` in 1/mm (N per mm of beam for a
 * force of 1 N through the shear centre), `perT` in 1/mm² (for a torque of 1 N·mm).
 */
export type JointFlow = Readonly<{
  parts: readonly [string, string];
  from: Point;
  to: Point;
  length: number;
  perVx: number;
  perVy: number;
  perT: number;
}>;

type Residuals = Readonly<{ px: number; py: number; w: number }>;

/**
 * For each vertex of joint lines and each part there, ∫ g grad p · grad N − ∫ e x N over the part (likewise with y, and
 * with grad w + (−y, x)), N the hat function of the vertex: the flow that leaves the part near this vertex.
 */
const residualsOf = (
  { mesh, sorted, shear, axial }: Body,
  { space, w, px, py }: Warping,
  partOf: (t: number) => number,
  wanted: ReadonlySet<number>,
): ReadonlyMap<string, Residuals> => {
  const { n, loadR, loadS } = space.element;
  const found = new Map<string, { px: number; py: number; w: number }>();
  const g = emptyGeometry();
  const own = new Int32Array(n);
  for (let t = 0; t < mesh.region.length; t++) {
    const corners = [0, 1, 2].map((k) => sorted.corners[3 * t + k]!);
    if (!corners.some((v) => wanted.has(v))) continue;
    readGeometry(mesh, sorted, t, g);
    unknownsOf(space, t, own);
    const mean = (f: Float64Array): readonly [number, number] => {
      let [r, s] = [0, 0];
      for (let i = 0; i < n; i++) {
        if (own[i]! < 0) continue;
        r += f[own[i]!]! * (loadR[i]! + loadR[n + i]! + loadR[2 * n + i]!);
        s += f[own[i]!]! * (loadS[i]! + loadS[n + i]! + loadS[2 * n + i]!);
      }
      return [g.area2 * (r * g.rx + s * g.sx), g.area2 * (r * g.ry + s * g.sy)];
    };
    const [[wx, wy], [xx, xy], [yx, yy]] = [mean(w), mean(px), mean(py)];
    const [sumX, sumY] = [g.x[0]! + g.x[1]! + g.x[2]!, g.y[0]! + g.y[1]! + g.y[2]!];
    const [tx, ty] = [wx - (g.area2 * sumY) / 6, wy + (g.area2 * sumX) / 6];
    const slopes = [
      [-g.rx - g.sx, -g.ry - g.sy],
      [g.rx, g.ry],
      [g.sx, g.sy],
    ] as const;
    slopes.forEach(([dx, dy], k) => {
      const v = corners[k]!;
      if (!wanted.has(v)) return;
      const key = `${v} ${partOf(t)}`;
      const sum = found.get(key) ?? { px: 0, py: 0, w: 0 };
      // ∫ x N over a triangle with x linear: area/12 · (sum of x + x at the corner).
      const load = (axial[t]! * g.area2) / 24;
      sum.px += shear[t]! * (dx * xx + dy * xy) - load * (sumX + g.x[k]!);
      sum.py += shear[t]! * (dx * yx + dy * yy) - load * (sumY + g.y[k]!);
      sum.w += shear[t]! * (dx * tx + dy * ty);
      found.set(key, sum);
    });
  }
  return found;
};

/**
 * The shear flow through every joint line of a body, closed cells included, from the finite-element field.
 * @param partOf the part of an element; `names` the ids of the parts; J of the body, mm⁴.
 * @returns one entry to a line. Over all lines of a part the flows add up to the exact VQ/I of statics, since they are the
 * nodal forces of the discrete solution; where lines of a part end in one vertex its force is shared equally.
 * @source Equilibrium of the part under the weak form (consistent nodal fluxes). ν = 0.
 */
export const jointFlows = (
  body: Body,
  warping: Warping,
  partOf: (t: number) => number,
  names: readonly string[],
  J: number,
): readonly JointFlow[] => {
  const lines = findJointLines(body.mesh, partOf);
  if (lines.length === 0) return [];
  const wanted = new Set(lines.flatMap((line) => line.vertices));
  const residuals = residualsOf(body, warping, partOf, wanted);
  const sharing = new Map<string, number>();
  for (const { parts, vertices } of lines)
    for (const v of vertices) sharing.set(`${v} ${parts[0]}`, (sharing.get(`${v} ${parts[0]}`) ?? 0) + 1);
  for (const { parts, vertices } of lines)
    for (const v of vertices) sharing.set(`${v} ${parts[1]}`, (sharing.get(`${v} ${parts[1]}`) ?? 0) + 1);
  const weights = shearWeights(body);
  const { mesh, centroid } = body;
  const placeOf = (v: number): Point => ({ x: mesh.x[v]! + centroid.x, y: mesh.y[v]! + centroid.y });
  const flowOf = ({ parts, vertices, ends, length }: JointLine): JointFlow => {
    let [px, py, w] = [0, 0, 0];
    for (const v of vertices) {
      const key = `${v} ${parts[0]}`;
      const share = 1 / sharing.get(key)!;
      const residual = residuals.get(key)!;
      px -= share * residual.px;
      py -= share * residual.py;
      w -= share * residual.w;
    }
    return {
      parts: [names[parts[0]]!, names[parts[1]]!],
      from: placeOf(ends[0]),
      to: placeOf(ends[1]),
      length,
      perVx: weights.x[0] * px + weights.x[1] * py,
      perVy: weights.y[0] * px + weights.y[1] * py,
      perT: w / J,
    };
  };
  return lines.map(flowOf);
};
