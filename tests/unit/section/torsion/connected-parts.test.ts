import { describe, expect, test } from "vitest";
import { sectionOf } from "@/lib/drawing/section-of";
import type { Drawing, DrawingPart } from "@/lib/drawing/schema";
import { jointForces } from "@/lib/section/joint-forces";
import { jointForcesInCells } from "@/lib/section/joint-forces-in-cells";
import type { Section } from "@/lib/section/section";
import { expectRel } from "@/tests/helpers/expect-rel";
import { rectangleAt, sectionOfParts, partOf, STEEL, sectionOfRegions } from "@/tests/helpers/sections";
import { connectedTorsion, torsionOf } from "@/tests/helpers/torsion";
import { REFERENCE_SHAPES } from "@/tests/helpers/torsion-shapes";

const plate = (id: string, x: number, y: number, width: number, height: number): DrawingPart => ({
  id,
  name: id,
  material: "steel",
  at: { x, y },
  angle: 0,
  shape: { kind: "plate", width, height },
});

const sectionOfPlates = (...parts: readonly DrawingPart[]): Section => {
  const drawing: Drawing = {
    version: 1,
    unit: "mm",
    reference: "steel",
    materials: [STEEL],
    parts: [...parts],
    joints: [],
  };
  const section = sectionOf(drawing);
  if (!section.ok) throw new Error(JSON.stringify(section.error));
  return section.value;
};

const girder = sectionOfPlates(
  plate("bottom", 0, 15, 450, 30),
  plate("web", 0, 630, 10, 1200),
  plate("top", 0, 1237.5, 250, 15),
);

const BOX = { b: 300, h: 620, tl: 10, tr: 12, tf: 20 };
const box = sectionOfPlates(
  plate("top", 0, 310, 400, BOX.tf),
  plate("bottom", 0, -310, 400, BOX.tf),
  plate("left", -150, 0, BOX.tl, 600),
  plate("right", 150, 0, BOX.tr, 600),
);

describe("plates that touch along an edge", () => {
  test("act as the one body they make", () => {
    const found = connectedTorsion(girder);
    const { J, S, Cw } = REFERENCE_SHAPES.find(({ name }) => name.includes("250 × 15"))!;
    expectRel(found.J, J, { rel: 1e-4 });
    expectRel(found.shearCentre.y, S.y, { rel: 1e-4, scale: found.r0 });
    expectRel(found.Cw, Cw, { rel: 2e-4 });
  });

  test("pass on VQ/I through an open joint, to the digits of the mesh", () => {
    const { joints } = connectedTorsion(girder);
    const statics = jointForces(girder);
    expect(joints.length).toBe(2);
    for (const force of statics) {
      const flow = joints.find(({ parts }) => force.parts.every((part) => parts.includes(part)))!;
      const sign = force.beyond.includes(flow.parts[0]) && force.beyond.length === 1 ? 1 : -1;
      expectRel(sign * flow.perVy, force.perVy!, { rel: 1e-9, name: force.parts.join("–") });
      expectRel(flow.perVx, 0, { rel: 1e-9, scale: Math.abs(flow.perVy) });
    }
  });

  test("share the flow of a closed cell so that each plate is in equilibrium", () => {
    const { joints } = connectedTorsion(box);
    const forces = jointForcesInCells(jointForces(box), joints);
    expect(forces.map(({ absent }) => absent)).toEqual([null, null, null, null]);
    const { I, Q } = {
      I: 2 * ((400 * 20 ** 3) / 12 + 8000 * 310 ** 2) + (22 * 600 ** 3) / 12,
      Q: 8000 * 310,
    };
    const intoTop = forces
      .filter(({ parts }) => parts.includes("top"))
      .map(({ parts, perVy }) => (parts[1] === "top" ? perVy! : -perVy!));
    expect(intoTop.length).toBe(2);
    expectRel(intoTop[0]! + intoTop[1]!, Q / I, { rel: 1e-9 });
    expect(Math.min(...intoTop)).toBeGreaterThan(0);
  });

  test("carry torsion round a cell as Bredt says, T/(2 Am), within the wall's share", () => {
    const { joints } = connectedTorsion(box);
    const Am = (BOX.b + (BOX.tl + BOX.tr) / 2 - 11) * BOX.h;
    for (const { perT } of joints) expectRel(Math.abs(perT), 1 / (2 * Am), { rel: 5e-3 });
  });
});

describe("pieces that do not touch along an edge", () => {
  const apart = sectionOfRegions([rectangleAt(0, 0, 100, 10), rectangleAt(0, 11, 100, 10)]);
  const corner = sectionOfRegions([rectangleAt(0, 0, 100, 10), rectangleAt(100, 10, 100, 10)]);

  test.each([
    ["with a gap", apart],
    ["in a point only", corner],
  ])("%s give J as a sum and say why there is no shear centre", (_, section) => {
    const found = torsionOf(section);
    expectRel(found.J, 2 * 31232.50375, { rel: 1e-4 });
    expect(found.bodies).toBe(2);
    expect([found.Cw, found.shearCentre, found.Avx, found.Avy, found.betaX, found.betaY, found.r0]).toEqual(
      Array(7).fill(null),
    );
    expect(found.absent.map(({ property }) => property)).toEqual([
      "Cw",
      "shearCentre",
      "Avx",
      "Avy",
      "betaX",
      "betaY",
      "r0",
    ]);
    expect(new Set(found.absent.map(({ code }) => code))).toEqual(new Set(["torsion.notConnected"]));
  });

  test("a gap of 1 µm keeps them apart", () => {
    const found = torsionOf(sectionOfRegions([rectangleAt(0, 0, 100, 10), rectangleAt(0, 10.001, 100, 10)]));
    expectRel(found.J, 2 * 31232.50375, { rel: 1e-4 });
  });
});

describe("a slit", () => {
  test("opens a tube: J falls to that of the unrolled wall", () => {
    const [r, t, half] = [50, 2, 0.25 / 50];
    const at = (radius: number, angle: number) => ({
      x: radius * Math.cos(angle),
      y: radius * Math.sin(angle),
    });
    const sweep = 2 * Math.PI - 2 * half;
    const [outer, inner] = [r + t / 2, r - t / 2];
    const bulge = Math.tan(sweep / 8);
    const ring = [
      { ...at(outer, half), bulge },
      { ...at(outer, Math.PI), bulge },
      at(outer, -half),
      { ...at(inner, -half), bulge: -bulge },
      { ...at(inner, Math.PI), bulge: -bulge },
      at(inner, half),
    ];
    const found = connectedTorsion(sectionOfRegions([{ outer: ring, holes: [] }]));
    // Thin strip J = bt³/3 less 0.21 t⁴ of each end (the series of a rectangle); curvature acts at (t/r)².
    const b = sweep * r;
    expectRel(found.J, (b * t ** 3) / 3 - 0.21 * t ** 4, { rel: 2e-3 });
    // e = 2r from the centre, away from the slit. Roark, Formulas for Stress and Strain, thin slit tube (from memory).
    expectRel(found.shearCentre.x, -2 * r, { rel: 5e-3 });
  });
});

describe("several materials", () => {
  const half = { ...STEEL, id: "half", E: STEEL.E / 2, G: STEEL.G / 2 };
  const twice = { ...STEEL, id: "twice", E: STEEL.E * 2, G: STEEL.G * 2 };

  test("a section all of one other material scales with its G and E", () => {
    const other = connectedTorsion(
      sectionOfParts([partOf([rectangleAt(0, 0, 100, 10)], { material: half })]),
    );
    const own = connectedTorsion(sectionOfRegions([rectangleAt(0, 0, 100, 10)]));
    expectRel(other.J, own.J / 2, { rel: 1e-12 });
    expectRel(other.Cw, own.Cw / 2, { rel: 1e-12 });
    expectRel(other.Avy, own.Avy / 2, { rel: 1e-12 });
    expectRel(other.r0, own.r0, { rel: 1e-12 });
  });

  test("a section cut into parts of the same material is the same section", () => {
    const cut = connectedTorsion(
      sectionOfParts([
        partOf([rectangleAt(0, 0, 60, 40)], { id: "a" }),
        partOf([rectangleAt(60, 0, 40, 40)], { id: "b" }),
      ]),
    );
    const whole = connectedTorsion(sectionOfRegions([rectangleAt(0, 0, 100, 40)]));
    expectRel(cut.J, whole.J, { rel: 1e-5 });
    expectRel(cut.Cw, whole.Cw, { rel: 1e-4 });
  });

  /** @source Muskhelishvili; two strips glued along the long side act as J = Σ for thin layers far from each other's neutral line. */
  test("a two-layer plate has the J of the layered strip", () => {
    // Thin layers 0 ≤ y ≤ t of G₁ and t ≤ y ≤ 2t of G₂: τ = 2θG(y − ȳ) with no net force, ȳ weighted by G.
    const [b, t, g1, g2] = [2000, 5, 1, 2];
    const found = connectedTorsion(
      sectionOfParts([
        partOf([rectangleAt(0, 0, b, t)], { id: "a" }),
        partOf([rectangleAt(0, t, b, t)], { id: "b", material: twice }),
      ]),
    );
    const centre = (g1 * t * (t / 2) + g2 * t * ((3 * t) / 2)) / ((g1 + g2) * t);
    const second = (g: number, y: number) => g * (t ** 3 / 12 + t * (y - centre) ** 2);
    const strip = 4 * b * (second(g1, t / 2) + second(g2, (3 * t) / 2));
    // The ends take about 0.63 · 2t off the width, as for one material.
    expectRel(found.J, strip * (1 - (0.63 * 2 * t) / b), { rel: 1e-3 });
  });

  test("a stiff core in a soft round bar adds up as G times Ip", () => {
    const circle = (radius: number) => [
      { x: radius, y: 0, bulge: 1 },
      { x: -radius, y: 0, bulge: 1 },
    ];
    const hole = [
      { x: 30, y: 0, bulge: -1 },
      { x: -30, y: 0, bulge: -1 },
    ];
    const found = connectedTorsion(
      sectionOfParts([
        partOf([{ outer: circle(30), holes: [] }], { id: "core", material: twice }),
        partOf([{ outer: circle(50), holes: [hole] }], { id: "shell" }),
      ]),
    );
    const Ip = (r: number) => (Math.PI * r ** 4) / 2;
    expectRel(found.J, 2 * Ip(30) + Ip(50) - Ip(30), { rel: 2e-4 });
    expect(Math.abs(found.J / (Ip(30) + Ip(50)) - 1)).toBeLessThan(found.estimates.J + 1e-4);
  });
});
