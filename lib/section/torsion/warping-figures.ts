import type { Point } from "@/lib/geometry/region";
import type { Body } from "@/lib/section/torsion/body";
import { emptyGeometry, readGeometry } from "@/lib/section/torsion/element/geometry";
import { visitGradients } from "@/lib/section/torsion/element/gradients";
import { unknownsOf } from "@/lib/section/torsion/element/space";
import type { Warping } from "@/lib/section/torsion/warping";

/**
 * What one run of the warping and shear solution gives for a body, weighted by G/G_ref and E/E_ref. `Jupper` in mm⁴;
 * `shearCentre` in mm from the centroid; Cw in mm⁶; shear areas in mm²; `mean` of w (mm²) over the body.
 */
export type WarpingFigures = Readonly<{
  Jupper: number;
  shearCentre: Point;
  Cw: number;
  Avx: number;
  Avy: number;
  mean: number;
}>;

/** Weights of px and py in the shear potential under a unit force along x and along y. */
export type ShearWeights = Readonly<{ x: readonly [number, number]; y: readonly [number, number] }>;

/** @source σ' = a x + b y, a = (Vx Ixx − Vy Ixy)/D, b = (Vy Iyy − Vx Ixy)/D: bending about any axes. */
export const shearWeights = ({ Ixx, Iyy, Ixy }: Body): ShearWeights => {
  const D = Ixx * Iyy - Ixy * Ixy;
  return { x: [Ixx / D, -Ixy / D], y: [-Ixy / D, Iyy / D] };
};

/** ∫ e w, ∫ e w x, ∫ e w y, and the energies ∫ e x px, ∫ e x py, ∫ e y py, by the load tables of the reference element. */
const loadIntegrals = ({ mesh, sorted, axial }: Body, { space, w, px, py }: Warping) => {
  const { n, load } = space.element;
  const g = emptyGeometry();
  const own = new Int32Array(n);
  let [m, mx, my, xx, xy, yy] = [0, 0, 0, 0, 0, 0];
  for (let t = 0; t < mesh.region.length; t++) {
    readGeometry(mesh, sorted, t, g);
    unknownsOf(space, t, own);
    const scale = axial[t]! * g.area2;
    for (let i = 0; i < n; i++) {
      const u = own[i]!;
      if (u < 0) continue;
      const [l0, l1, l2] = [load[i]!, load[n + i]!, load[2 * n + i]!];
      const lx = scale * (l0 * g.x[0]! + l1 * g.x[1]! + l2 * g.x[2]!);
      const ly = scale * (l0 * g.y[0]! + l1 * g.y[1]! + l2 * g.y[2]!);
      m += w[u]! * scale * (l0 + l1 + l2);
      mx += w[u]! * lx;
      my += w[u]! * ly;
      xx += px[u]! * lx;
      xy += py[u]! * lx;
      yy += py[u]! * ly;
    }
  }
  return { m, mx, my, xx, xy, yy };
};

/** ∫ e (w − mean − ys x + xs y)²: the function formed first, then squared with the element's mass matrix. */
const squareOf = ({ mesh, sorted, axial }: Body, { space, w }: Warping, mean: number, s: Point): number => {
  const { n, mass } = space.element;
  const g = emptyGeometry();
  const own = new Int32Array(n);
  const c = new Float64Array(n);
  let Cw = 0;
  for (let t = 0; t < mesh.region.length; t++) {
    readGeometry(mesh, sorted, t, g);
    unknownsOf(space, t, own);
    for (let i = 0; i < n; i++) c[i] = own[i]! < 0 ? 0 : w[own[i]!]!;
    // The corner functions are the only ones that a linear function has a share in.
    for (let k = 0; k < 3; k++) c[k]! -= mean + s.y * g.x[k]! - s.x * g.y[k]!;
    let sum = 0;
    for (let i = 0; i < n; i++) {
      let row = 0;
      for (let j = 0; j < n; j++) row += mass[i * n + j]! * c[j]!;
      sum += c[i]! * row;
    }
    Cw += axial[t]! * g.area2 * sum;
  }
  return Cw;
};

/**
 * J (upper bound), shear centre, warping constant and shear areas.
 * @source J = ∫ g |grad w + (−y, x)|² dA, an upper bound for every w (Saint-Venant; Prager & Synge 1947). Shear centre by
 * energy: xs = (Ixy Iwx − Iyy Iwy)/D, ys = (Ixx Iwx − Ixy Iwy)/D with Iwx = ∫ e w x (Trefftz 1935; ν = 0).
 * Cw = ∫ e ws² with ws = w − mean − ys x + xs y. Shear area Av = V² / ∫ |τ|²/g of the transverse shear field, ν = 0; the
 * energy ∫ g |grad p|² is taken as the work of the load on p, which is the same number for the discrete solution.
 */
export const warpingFigures = (body: Body, warping: Warping): WarpingFigures => {
  const { mesh, sorted, shear, Ixx, Iyy, Ixy, area } = body;
  const { m, mx, my, xx, xy, yy } = loadIntegrals(body, warping);
  const D = Ixx * Iyy - Ixy * Ixy;
  const shearCentre = { x: (Ixy * mx - Iyy * my) / D, y: (Ixx * mx - Ixy * my) / D };
  const mean = m / area;
  let Jupper = 0;
  visitGradients(mesh, sorted, warping.space, warping.w, (t, { x, y, weight, dx, dy }) => {
    let sum = 0;
    for (let q = 0; q < weight.length; q++) {
      const [tx, ty] = [dx[q]! - y[q]!, dy[q]! + x[q]!];
      sum += weight[q]! * (tx * tx + ty * ty);
    }
    Jupper += shear[t]! * sum;
  });
  const areaOf = ([a, b]: readonly [number, number]): number =>
    1 / (a * a * xx + 2 * a * b * xy + b * b * yy);
  const force = shearWeights(body);
  return {
    Jupper,
    shearCentre,
    Cw: squareOf(body, warping, mean, shearCentre),
    Avx: areaOf(force.x),
    Avy: areaOf(force.y),
    mean,
  };
};
