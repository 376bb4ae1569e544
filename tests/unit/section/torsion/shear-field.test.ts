import { describe, expect, test } from "vitest";
import type { Region } from "@/lib/geometry/region";
import { makeBody, type Body } from "@/lib/section/torsion/body";
import { gradientTable } from "@/lib/section/torsion/element/gradient-at";
import { visitGradients } from "@/lib/section/torsion/element/gradients";
import { buildMeshes } from "@/lib/section/torsion/mesh/build-meshes";
import { makePacer } from "@/lib/section/torsion/pacer";
import { runToEnd } from "@/lib/section/torsion/run-to-end";
import { solveWarping, type Warping } from "@/lib/section/torsion/warping";
import { shearWeights, warpingFigures } from "@/lib/section/torsion/warping-figures";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";
import { rectangleAt, sectionOfRegions } from "@/tests/helpers/sections";
import { connectedTorsion, moveShape } from "@/tests/helpers/torsion";
import { REFERENCE_SHAPES } from "@/tests/helpers/torsion-shapes";

const solved = (region: Region): Readonly<{ body: Body; warping: Warping }> => {
  const regions = [{ part: 0, region, shear: 1, axial: 1 }];
  const options = { maxVertices: 1e5, refinement: 1, chordsPerCircle: 64 };
  const [mesh] = must(runToEnd(buildMeshes(regions, options, makePacer())));
  const body = makeBody(mesh!, regions);
  return { body, warping: runToEnd(solveWarping(body, 4, makePacer()))! };
};

/** ∫τx, ∫τy and the moment ∫(x τy − y τx) of the field a·px + b·py. */
const resultants = ({ body, warping }: ReturnType<typeof solved>, [a, b]: readonly [number, number]) => {
  const p = warping.px.map((value, i) => a * value + b * warping.py[i]!);
  let [x, y, moment] = [0, 0, 0];
  visitGradients(body.mesh, body.sorted, warping.space, p, (_, at) => {
    for (let q = 0; q < at.weight.length; q++) {
      const [w, tx, ty] = [at.weight[q]!, at.dx[q]!, at.dy[q]!];
      x += w * tx;
      y += w * ty;
      moment += w * (at.x[q]! * ty - at.y[q]! * tx);
    }
  });
  return { x, y, moment };
};

/** The discrete solution is in balance with its load against every linear function: to rounding. */
const BALANCE_REL = 1e-8;

describe.each(
  REFERENCE_SHAPES.map(({ name, region }) => [name, moveShape(region, { degrees: 20 })] as const),
)("%s, turned by 20°", (_, region) => {
  const found = solved(region);
  const weights = shearWeights(found.body);
  const figures = warpingFigures(found.body, found.warping);
  const rp = Math.sqrt((found.body.Ixx + found.body.Iyy) / found.body.area);

  test("the shear field adds up to the force, ∫τ dA = V, in both directions", () => {
    const [alongX, alongY] = [resultants(found, weights.x), resultants(found, weights.y)];
    expectRel(alongX.x, 1, { rel: BALANCE_REL });
    expectRel(alongX.y, 0, { rel: BALANCE_REL, scale: 1 });
    expectRel(alongY.y, 1, { rel: BALANCE_REL });
    expectRel(alongY.x, 0, { rel: BALANCE_REL, scale: 1 });
  });

  test("its moment about the centroid is that of V through the shear centre found from warping", () => {
    const [alongX, alongY] = [resultants(found, weights.x), resultants(found, weights.y)];
    expectRel(alongX.moment, -figures.shearCentre.y, { rel: BALANCE_REL, scale: rp });
    expectRel(alongY.moment, figures.shearCentre.x, { rel: BALANCE_REL, scale: rp });
  });
});

test("the stress at the neutral axis of a girder's web is VQ/(It)", () => {
  const { region } = REFERENCE_SHAPES.find(({ name }) => name.includes("500 × 25"))!;
  const found = connectedTorsion(sectionOfRegions([region]), { fields: true });
  const I = (500 * 2550 ** 3 - 492 * 2500 ** 3) / 12;
  const Q = 500 * 25 * 1262.5 + 8 * 1250 * 625;
  const { x, y, shearY } = found.fields!;
  const middle = [...x.keys()].filter((i) => Math.abs(x[i]!) < 4.1 && Math.abs(y[i]! - 1275) < 4);
  expect(middle.length).toBeGreaterThan(0);
  // Parabola of the web within 4 mm of its top: 1e-5 lower.
  for (const i of middle) expectRel(shearY.y[i]!, Q / (I * 8), { rel: 2e-5 });
});

test("the parabola of a deep rectangle is met at every sample point", () => {
  const found = connectedTorsion(sectionOfRegions([rectangleAt(-5, -100, 10, 200)]), { fields: true });
  const { x, y, shearY, triangles } = found.fields!;
  for (const i of x.keys()) {
    const exact = (1.5 / 2000) * (1 - (y[i]! / 100) ** 2);
    expectRel(shearY.y[i]!, exact, { rel: 1e-4, scale: 1.5 / 2000 });
    expectRel(shearY.x[i]!, 0, { rel: 1e-4, scale: 1.5 / 2000 });
  }
  expect(Math.max(...triangles)).toBe(x.length - 1);
});

test("the stresses of re-entrant corners are left out of the greatest", () => {
  const { region } = REFERENCE_SHAPES.find(({ name }) => name === "block L")!;
  const { fields } = connectedTorsion(sectionOfRegions([region]), { fields: true });
  expect(fields!.excludedCorners).toBe(1);
  for (const { value, at } of Object.values(fields!.greatest)) {
    expect(value).toBeGreaterThan(0);
    // The local thickness there is 50 mm, the distance of the corner from either far side.
    expect(Math.hypot(at.x - 50, at.y - 50)).toBeGreaterThan(5);
  }
});

test("the gradient of the warping function of an equilateral triangle is its closed form", () => {
  // Timoshenko & Goodier, art. 106: f is a cubic, so that degree 4 holds it exactly.
  const { region } = REFERENCE_SHAPES.find(({ name }) => name.startsWith("equilateral"))!;
  const { body, warping } = solved(region);
  const table = gradientTable(body.mesh, body.sorted, warping.space, [warping.w], [[1 / 3, 1 / 3]]);
  const h = 50 * Math.sqrt(3);
  for (let t = 0; t < body.mesh.region.length; t++) {
    const { x, y, dx, dy } = table.at(t);
    // About the centroid, base at the bottom: w = −(x³ − 3xy²)/(2h), which has ∂w/∂n = y nx − x ny on all three sides.
    const k = 3 / (2 * h);
    expectRel(dx[0]![0]!, -k * (x[0]! ** 2 - y[0]! ** 2), { rel: 1e-9, scale: h });
    expectRel(dy[0]![0]!, 2 * k * x[0]! * y[0]!, { rel: 1e-9, scale: h });
  }
});
