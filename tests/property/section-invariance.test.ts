import fc from "fast-check";
import { describe, test } from "vitest";
import type { Region, Ring, Vertex } from "@/lib/geometry/region";
import type { SectionProperties } from "@/lib/section/properties";
import { sectionProperties } from "@/lib/section/section-properties";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";
import { moved, scaled, starRegion, starSpec, starRing, turned, type StarSpec } from "@/tests/helpers/rings";
import { partOf, rectangleAt, sectionOfParts, sectionOfRegions } from "@/tests/helpers/sections";

const propertiesOf = (...regions: readonly Region[]) => must(sectionProperties(sectionOfRegions(regions)));
const near = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const LENGTHS = ["rx", "ry", "r1", "r2"] as const;
const MOMENTS = ["Ix", "Iy", "I1", "I2"] as const;
const MODULI = [
  "SxTop",
  "SxBottom",
  "SyLeft",
  "SyRight",
  "Sx",
  "Sy",
  "S1",
  "S2",
  "Zx",
  "Zy",
  "Z1",
  "Z2",
] as const;

/** Values that do not depend on where the section lies. */
const expectSame = (a: SectionProperties, b: SectionProperties, rel: number, k = 1): void => {
  expectRel(a.area, b.area * k ** 2, { rel, name: "area" });
  for (const key of LENGTHS) expectRel(a[key], b[key] * k, { rel, name: key });
  for (const key of MOMENTS) expectRel(a[key], b[key] * k ** 4, { rel, name: key });
  expectRel(a.Ixy, b.Ixy * k ** 4, { rel, scale: b.I1 * k ** 4, name: "Ixy" });
  for (const key of principalClear(b) ? MODULI : MODULI.filter((m) => !/[12]$/.test(m)))
    expectRel(a[key], (b[key] ?? Number.NaN) * k ** 3, { rel, name: key });
};

/** Where I1 and I2 nearly agree, rounding turns the principal axes and with them S1, S2, Z1, Z2. */
const principalClear = (p: SectionProperties) => p.I1 - p.I2 > 1e-2 * p.I1;

describe("a section of lines and arcs", () => {
  test("keeps its properties when it is moved, up to 1e6 mm away", () => {
    fc.assert(
      fc.property(starRegion(true), near(-1e6, 1e6), near(-1e6, 1e6), (region, dx, dy) => {
        const [a, b] = [propertiesOf(moved(region, dx, dy)), propertiesOf(region)];
        // A coordinate near 1e6 mm is rounded by 1e-10 mm, 1e-12 of a size of 100 mm; the principal axes turn by up to
        // 1e2 times that where I1 and I2 differ by 1 %.
        expectSame(a, b, 1e-9);
        expectRel(a.centroid.x, b.centroid.x + dx, { rel: 1e-12, scale: 1e6 });
        expectRel(a.pna?.y ?? null, (b.pna?.y ?? Number.NaN) + dy, { rel: 1e-12, scale: 1e6 });
      }),
    );
  });

  test("keeps I1, I2, S1, S2, Z1, Z2 and turns its angle when it is turned", () => {
    fc.assert(
      fc.property(starRegion(true), near(-3, 3), (region, angle) => {
        const [a, b] = [propertiesOf(turned(region, angle)), propertiesOf(region)];
        // Rounding of the turned vertices, 1e-16 of 100 mm, through sums over at most 24 edges.
        const rel = 1e-12;
        expectRel(a.area, b.area, { rel });
        expectRel(a.I1, b.I1, { rel });
        expectRel(a.I2, b.I2, { rel });
        if (!principalClear(b)) return;
        const turn = (a.angle - b.angle - (angle * 180) / Math.PI) / 180;
        expectRel(turn - Math.round(turn), 0, { rel: 1e-11, scale: 1 });
        for (const key of ["S1", "S2", "Z1", "Z2"] as const)
          expectRel(a[key], b[key] ?? Number.NaN, { rel: 1e-10, name: key });
      }),
    );
  });

  test("exchanges left and right and the sign of Ixy when it is mirrored", () => {
    const mirrored = (ring: Ring): Ring =>
      ring.map((_, i): Vertex => {
        const n = ring.length;
        const [at, edge] = [ring[n - 1 - i] as Vertex, ring[(2 * n - 2 - i) % n] as Vertex];
        return edge.bulge === undefined ? { x: -at.x, y: at.y } : { x: -at.x, y: at.y, bulge: edge.bulge };
      });
    fc.assert(
      fc.property(starRegion(true), (region) => {
        const a = propertiesOf({ outer: mirrored(region.outer), holes: region.holes.map(mirrored) });
        const b = propertiesOf(region);
        const rel = 1e-12;
        expectRel(a.Ix, b.Ix, { rel });
        expectRel(a.Ixy, -b.Ixy, { rel, scale: b.I1 });
        expectRel(a.SyLeft, b.SyRight, { rel });
        expectRel(a.SyRight, b.SyLeft, { rel });
        expectRel(a.SxTop, b.SxTop, { rel });
        expectRel(a.Zy, b.Zy ?? Number.NaN, { rel });
        expectRel(a.centroid.x, -b.centroid.x, { rel, scale: 100 });
      }),
    );
  });

  test("scales as A·k², I·k⁴, S and Z·k³, r·k", () => {
    fc.assert(
      fc.property(starRegion(true), near(1e-2, 1e3), (region, k) => {
        expectSame(propertiesOf(scaled(region, k)), propertiesOf(region), 1e-11, k);
      }),
    );
  });
});

/** The two pieces of a star ring along the way from vertex 0 over its centre to vertex `at`. */
const cutStar = (spec: StarSpec, at: number): readonly [Region, Region] => {
  const ring = starRing(spec);
  const end = ring[at] as Vertex;
  const start = ring[0] as Vertex;
  const corner = (v: Vertex) => ({ x: v.x, y: v.y });
  return [
    { outer: [...ring.slice(0, at), corner(end), { x: 0, y: 0 }], holes: [] },
    { outer: [...ring.slice(at), corner(start), { x: 0, y: 0 }], holes: [] },
  ];
};

test("a part cut in two has the properties of the whole", () => {
  fc.assert(
    fc.property(starSpec(true), near(0.2, 0.8), (spec, share) => {
      const at = Math.max(1, Math.min(spec.radii.length - 1, Math.round(spec.radii.length * share)));
      const whole = propertiesOf({ outer: starRing(spec), holes: [] });
      const pieces = cutStar(spec, at).map((region, i) => partOf([region], { id: `p${i}` }));
      expectSame(must(sectionProperties(sectionOfParts(pieces))), whole, 1e-11);
    }),
  );
});

test("the order of the parts makes no difference", () => {
  const plates = fc.array(
    fc.record({ x: near(-500, 500), y: near(-500, 500), width: near(5, 200), height: near(5, 200) }),
    { minLength: 2, maxLength: 12 },
  );
  fc.assert(
    fc.property(plates, (list) => {
      const parts = list.map(({ x, y, width, height }, i) =>
        partOf([rectangleAt(x, y, width, height)], { id: `p${i}` }),
      );
      const forth = must(sectionProperties(sectionOfParts(parts)));
      const back = must(sectionProperties(sectionOfParts([...parts].reverse())));
      expectSame(back, forth, 1e-11);
      expectRel(back.mass, forth.mass, { rel: 1e-14 });
    }),
  );
});
