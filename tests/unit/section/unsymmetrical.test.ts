import { describe, expect, test } from "vitest";
import { profileRegions } from "@/lib/profiles/profile-regions";
import type { SectionProperties } from "@/lib/section/properties";
import { sectionProperties } from "@/lib/section/section-properties";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";
import { chordedRegion, turned } from "@/tests/helpers/rings";
import { rectangleAt, sectionOfRegions } from "@/tests/helpers/sections";

const EXACT = { rel: 1e-12 };
const unsymmetrical = (p: SectionProperties) => {
  if (p.unsymmetrical === null) throw new Error("expected an unsymmetrical section");
  return p.unsymmetrical;
};

describe("an angle of 150 × 90 × 10", () => {
  const regions = must(
    profileRegions({
      family: "angle",
      dimensions: { legLong: 150, legShort: 90, thickness: 10, rootRadius: 12, toeRadius: 6 },
    }),
  );
  const p = must(sectionProperties(sectionOfRegions(regions)));
  const u = unsymmetrical(p);
  const D = p.Ix * p.Iy - p.Ixy ** 2;

  test("is marked with |Ixy|/I1", () => {
    expectRel(u.share, Math.abs(p.Ixy) / p.I1, EXACT);
  });

  test("has the true extreme stress of every point of 65,536 chords, on both sides", () => {
    const points = regions.flatMap((r) => chordedRegion(r, 65_536).outer);
    const stress = points.map((q) => (p.Iy * (q.y - p.centroid.y) - p.Ixy * (q.x - p.centroid.x)) / D);
    const [top, bottom] = [
      u.underMx.find((f) => f.face === "top"),
      u.underMx.find((f) => f.face === "bottom"),
    ];
    // The chords miss the extreme point of an arc by (2π/65,536)²/8 of its radius.
    expectRel(top?.actual ?? null, Math.max(...stress), { rel: 1e-9 });
    expectRel(bottom?.actual ?? null, -Math.min(...stress), { rel: 1e-9 });
    const stressY = points.map((q) => (p.Ix * (q.x - p.centroid.x) - p.Ixy * (q.y - p.centroid.y)) / D);
    expectRel(u.underMy.find((f) => f.face === "right")?.actual ?? null, Math.max(...stressY), { rel: 1e-9 });
    expectRel(u.underMy.find((f) => f.face === "left")?.actual ?? null, -Math.min(...stressY), { rel: 1e-9 });
  });

  test("gives M/S beside it, the factor, and the S that holds", () => {
    for (const [faces, S, free, factor] of [
      [u.underMx, p.Sx, u.SxFree, u.factorX],
      [u.underMy, p.Sy, u.SyFree, u.factorY],
    ] as const) {
      for (const f of faces) expectRel(f.factor, f.actual / f.nominal, EXACT);
      expectRel(1 / free, Math.max(...faces.map((f) => f.actual)), EXACT);
      expectRel(factor, S / free, EXACT);
      expect(factor).toBeGreaterThan(1);
    }
    expectRel(u.underMx.find((f) => f.face === "top")?.nominal ?? null, 1 / p.SxTop, EXACT);
    expectRel(u.underMy.find((f) => f.face === "left")?.nominal ?? null, 1 / p.SyLeft, EXACT);
  });
});

test("a turned rectangle under Mx has the stress of bending about its own axes", () => {
  const [b, h, angle] = [40, 120, 0.3];
  const p = must(sectionProperties(sectionOfRegions([turned(rectangleAt(-b / 2, -h / 2, b, h), angle)])));
  // Mx splits into cos about the strong and sin about the weak axis; both are worst in the same corner.
  const worst = Math.cos(angle) / ((b * h * h) / 6) + Math.sin(angle) / ((h * b * b) / 6);
  expectRel(1 / unsymmetrical(p).SxFree, worst, EXACT);
});

test("a section whose x and y are principal is not marked, and one just beyond the limit is", () => {
  const plate = rectangleAt(-20, -60, 40, 120);
  expect(must(sectionProperties(sectionOfRegions([plate]))).unsymmetrical).toBeNull();
  // |Ixy| = (I1 − I2)·sin 2θ/2: a turn of 1e-6 stays below 1e-6·I1, one of 1e-5 does not.
  expect(must(sectionProperties(sectionOfRegions([turned(plate, 1e-6)]))).unsymmetrical).toBeNull();
  expect(must(sectionProperties(sectionOfRegions([turned(plate, 1e-5)]))).unsymmetrical).not.toBeNull();
});
