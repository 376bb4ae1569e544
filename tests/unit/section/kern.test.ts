import { describe, expect, test } from "vitest";
import { kern } from "@/lib/section/kern";
import { sectionProperties } from "@/lib/section/section-properties";
import { profileRegions } from "@/lib/profiles/profile-regions";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";
import { chordedRegion } from "@/tests/helpers/rings";
import { rectangleAt, sectionOfRegions } from "@/tests/helpers/sections";

const EXACT = { rel: 1e-12 };

test("the kern of a rectangle is the rhombus of b/6 and h/6", () => {
  const [b, h] = [300, 500];
  const corners = kern(sectionOfRegions([rectangleAt(1000, 0, b, h)])) ?? [];
  expect(corners).toHaveLength(4);
  const x = corners.map((c) => c.x - 1150).sort((p, q) => p - q);
  const y = corners.map((c) => c.y - 250).sort((p, q) => p - q);
  [-b / 6, 0, 0, b / 6].forEach((want, i) => expectRel(x[i] ?? null, want, { ...EXACT, scale: b }));
  [-h / 6, 0, 0, h / 6].forEach((want, i) => expectRel(y[i] ?? null, want, { ...EXACT, scale: h }));
});

describe("the kern of a tube", () => {
  const [D, t] = [200, 10];
  const d = D - 2 * t;
  const tube = sectionOfRegions(
    must(profileRegions({ family: "round-hollow", dimensions: { diameter: D, thickness: t } })),
  );
  const corners = kern(tube) ?? [];

  test("has its corners on the circle of radius (D² + d²)/(8D)", () => {
    expect(corners.length).toBeGreaterThanOrEqual(72);
    for (const c of corners) expectRel(Math.hypot(c.x, c.y), (D * D + d * d) / (8 * D), EXACT);
  });

  test("runs anticlockwise", () => {
    const twice = corners.reduce((sum, a, i) => {
      const b = corners[(i + 1) % corners.length] ?? a;
      return sum + a.x * b.y - a.y * b.x;
    }, 0);
    expect(twice).toBeGreaterThan(0);
  });
});

test("a force at a corner of the kern of an angle leaves one side without stress and none with the other sign", () => {
  const regions = must(
    profileRegions({
      family: "angle",
      dimensions: { legLong: 150, legShort: 90, thickness: 10, rootRadius: 12, toeRadius: 6 },
    }),
  );
  const section = sectionOfRegions(regions);
  const { area, centroid, Ix, Iy, Ixy } = must(sectionProperties(section));
  const D = Ix * Iy - Ixy ** 2;
  const points = regions.flatMap((r) => chordedRegion(r, 16_384).outer);
  for (const e of kern(section) ?? []) {
    const [ex, ey] = [e.x - centroid.x, e.y - centroid.y];
    const stress = points.map((p) => {
      const [x, y] = [p.x - centroid.x, p.y - centroid.y];
      return 1 + (area / D) * (x * (Ix * ex - Ixy * ey) + y * (Iy * ey - Ixy * ex));
    });
    // Rounding below; above, tangents 5° apart stand off the toe arcs of 6 mm by up to 0.006 mm of some 50 mm.
    expect(Math.min(...stress)).toBeGreaterThan(-1e-12);
    expect(Math.min(...stress)).toBeLessThan(2e-4);
  }
});

test("no area, no kern", () => {
  expect(kern(sectionOfRegions([]))).toBeNull();
});
