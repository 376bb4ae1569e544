import type { Drawing } from "@/lib/drawing/schema";
import type { Properties } from "@/lib/schemas/properties";

/** Steel of the tests; values are the usual design constants of carbon steel. */
export const TEST_STEEL = { id: "steel", name: "Test steel", E: 210_000, G: 81_000, fy: 355, density: 7850 };

/** A drawing of one plate, mm, centred on the origin. */
export const rectangleDrawing = (width: number, depth: number): Drawing => ({
  version: 1,
  unit: "mm",
  reference: "steel",
  materials: [TEST_STEEL],
  parts: [
    {
      id: "p1",
      name: "Plate",
      material: "steel",
      at: { x: 0, y: 0 },
      angle: 0,
      shape: { kind: "plate", width, height: depth },
    },
  ],
  joints: [],
});

/** Properties of that plate by the closed forms of a rectangle (A = bh, I = bh³/12, S = bh²/6, Z = bh²/4). */
export const rectangleProperties = (b: number, h: number): Properties => {
  const [Ix, Iy] = [(b * h ** 3) / 12, (h * b ** 3) / 12];
  const [Sx, Sy] = [(b * h * h) / 6, (h * b * b) / 6];
  const [Zx, Zy] = [(b * h * h) / 4, (h * b * b) / 4];
  const upright = Ix >= Iy;
  return {
    area: b * h,
    perimeter: { outer: 2 * (b + h), inner: 0 },
    mass: b * h * 1e-6 * TEST_STEEL.density,
    surface: 2e-3 * (b + h),
    centroid: { x: 0, y: 0 },
    extents: { xMin: -b / 2, xMax: b / 2, yMin: -h / 2, yMax: h / 2 },
    Ix,
    Iy,
    Ixy: 0,
    I1: Math.max(Ix, Iy),
    I2: Math.min(Ix, Iy),
    angle: upright ? 0 : 90,
    SxTop: Sx,
    SxBottom: Sx,
    SyLeft: Sy,
    SyRight: Sy,
    Sx,
    Sy,
    S1: upright ? Sx : Sy,
    S2: upright ? Sy : Sx,
    Zx,
    Zy,
    Z1: upright ? Zx : Zy,
    Z2: upright ? Zy : Zx,
    pna: { x: 0, y: 0 },
    equalForceAxis: null,
    Mp: { x: Zx * TEST_STEEL.fy, y: Zy * TEST_STEEL.fy },
    squash: b * h * TEST_STEEL.fy,
    rx: Math.sqrt(Ix / (b * h)),
    ry: Math.sqrt(Iy / (b * h)),
    r1: Math.sqrt(Math.max(Ix, Iy) / (b * h)),
    r2: Math.sqrt(Math.min(Ix, Iy) / (b * h)),
    J: null,
    Cw: null,
    shearCentre: null,
    Avx: null,
    Avy: null,
    betaX: null,
    betaY: null,
    r0: null,
    estimates: { J: null, Cw: null, shearCentre: null },
    plain: null,
    stressFactors: [],
    unsymmetrical: null,
    absent: [{ property: "J", code: "torsion.notComputed", detail: "Not computed here." }],
    warnings: [],
  };
};
