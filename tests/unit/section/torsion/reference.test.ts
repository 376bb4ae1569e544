import { describe, expect, test } from "vitest";
import { centralMoments } from "@/lib/geometry/moments";
import { expectRel } from "@/tests/helpers/expect-rel";
import { sectionOfRegions } from "@/tests/helpers/sections";
import { connectedTorsion } from "@/tests/helpers/torsion";
import { REFERENCE_SHAPES } from "@/tests/helpers/torsion-shapes";

/** What is promised of every section: J and the shear centre (over r_p) to 0.01 %, Cw to 0.02 %. */
const J_REL = 1e-4;
const S_REL = 1e-4;
const CW_REL = 2e-4;

/** Rounding of the reference values and of the sums, over and above the bounds. */
const ROUNDING_REL = 2e-9;

describe.each(REFERENCE_SHAPES)("$name", ({ region, J, S, Cw }) => {
  const found = connectedTorsion(sectionOfRegions([region]));
  const { moments } = centralMoments([{ regions: [region], weight: 1 }])!;
  const rp = Math.sqrt((moments.xx + moments.yy) / moments.area);

  test("J, shear centre and Cw are those of the reference solution", () => {
    expectRel(found.J, J, { rel: J_REL, name: "J" });
    expectRel(found.shearCentre.x, S.x, { rel: S_REL, scale: rp, name: "xs" });
    expectRel(found.shearCentre.y, S.y, { rel: S_REL, scale: rp, name: "ys" });
    expectRel(found.Cw, Cw, { rel: CW_REL, name: "Cw" });
  });

  test("the bounds hold J between them", () => {
    expect(found.JBounds.lower).toBeLessThanOrEqual(J * (1 + ROUNDING_REL));
    expect(found.JBounds.upper).toBeGreaterThanOrEqual(J * (1 - ROUNDING_REL));
  });

  test("every error is within its estimate, and every estimate is below 0.1 %", () => {
    const { estimates } = found;
    expect(Math.abs(found.J / J - 1)).toBeLessThanOrEqual(estimates.J + ROUNDING_REL);
    const moved = Math.hypot(found.shearCentre.x - S.x, found.shearCentre.y - S.y);
    expect(moved / rp).toBeLessThanOrEqual(estimates.shearCentre + ROUNDING_REL);
    expect(Math.abs(found.Cw / Cw - 1)).toBeLessThanOrEqual(estimates.Cw + ROUNDING_REL);
    expect(Math.max(estimates.J, estimates.Cw, estimates.shearCentre)).toBeLessThan(1e-3);
  });
});
