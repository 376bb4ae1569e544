import { describe, expect, test } from "vitest";
import { profileRegions } from "@/lib/profiles/profile-regions";
import type { Profile } from "@/lib/profiles/families";
import { sectionProperties } from "@/lib/section/section-properties";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";
import { chordedRegion } from "@/tests/helpers/rings";
import { sectionOfRegions } from "@/tests/helpers/sections";

const profiles: readonly Profile[] = [
  { family: "round-hollow", dimensions: { diameter: 219.1, thickness: 8 } },
  {
    family: "i-section",
    dimensions: { depth: 300, flangeWidth: 150, webThickness: 7.1, flangeThickness: 10.7, rootRadius: 15 },
  },
  {
    family: "channel",
    dimensions: {
      depth: 200,
      flangeWidth: 75,
      webThickness: 8.5,
      flangeThickness: 11.5,
      rootRadius: 11.5,
      toeRadius: 6,
      flangeSlope: 0.08,
    },
  },
  {
    family: "angle",
    dimensions: { legLong: 150, legShort: 90, thickness: 10, rootRadius: 12, toeRadius: 6 },
  },
  {
    family: "rectangular-hollow",
    dimensions: { depth: 200, width: 100, thickness: 8, outerRadius: 20, innerRadius: 12 },
  },
];

const KEYS = ["area", "Ix", "Iy", "I1", "Sx", "Zx", "Zy"] as const;

describe.each(profiles.map((p) => [p.family, p] as const))("the arcs of a %s", (_, profile) => {
  const regions = must(profileRegions(profile));
  const exact = must(sectionProperties(sectionOfRegions(regions)));
  const withChords = (perCircle: number) =>
    must(sectionProperties(sectionOfRegions(regions.map((r) => chordedRegion(r, perCircle)))));

  test("agree with 4,096 chords", () => {
    const fine = withChords(4096);
    // An inscribed 4,096-gon lacks (2π²/3)/4096² = 3.9e-7 of a disc and twice that of its I.
    for (const key of KEYS) expectRel(fine[key], exact[key] ?? Number.NaN, { rel: 1e-6, name: key });
  });

  test("are what chords tend to with the square of their number", () => {
    const off = (perCircle: number, key: (typeof KEYS)[number]) =>
      Math.abs((withChords(perCircle)[key] ?? Number.NaN) - (exact[key] ?? Number.NaN));
    for (const key of KEYS) {
      const order = Math.log2(off(256, key) / off(4096, key)) / 4;
      expect(order, `${key}: measured order`).toBeGreaterThan(1.9);
      expect(order, `${key}: measured order`).toBeLessThan(2.1);
    }
  });
});
