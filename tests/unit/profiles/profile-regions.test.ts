import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { ringBox } from "@/lib/geometry/arc";
import { directionAt, ringEdges } from "@/lib/geometry/edge";
import { ringArea, regionArea } from "@/lib/geometry/ring";
import { FAMILY_DIMENSIONS, type Family, type Profile } from "@/lib/profiles/families";
import { profileRegions } from "@/lib/profiles/profile-regions";
import { sectionProperties } from "@/lib/section/section-properties";
import { expectRel } from "@/tests/helpers/expect-rel";
import { fault, must } from "@/tests/helpers/must";
import { sectionOfRegions } from "@/tests/helpers/sections";

/** Sums over at most 24 edges. */
const EXACT = { rel: 1e-12 };
const areaOf = (profile: Profile) => must(profileRegions(profile)).reduce((sum, r) => sum + regionArea(r), 0);
const propertiesOf = (profile: Profile) =>
  must(sectionProperties(sectionOfRegions(must(profileRegions(profile)))));

/** What a fillet of radius r adds in a square corner: r² less a quarter circle. */
const spandrel = (r: number) => (1 - Math.PI / 4) * r * r;

const I: Profile = {
  family: "i-section",
  dimensions: { depth: 300, flangeWidth: 150, webThickness: 8, flangeThickness: 12, rootRadius: 15 },
};
const UNEQUAL: Profile = {
  family: "i-section-unequal",
  dimensions: {
    depth: 600,
    topWidth: 200,
    topThickness: 15,
    bottomWidth: 300,
    bottomThickness: 25,
    webThickness: 10,
    rootRadius: 6,
  },
};
const CHANNEL: Profile = {
  family: "channel",
  dimensions: { depth: 200, flangeWidth: 80, webThickness: 6, flangeThickness: 11, rootRadius: 13 },
};
const ANGLE: Profile = {
  family: "angle",
  dimensions: { legLong: 150, legShort: 90, thickness: 10, rootRadius: 12, toeRadius: 6 },
};
const TEE: Profile = {
  family: "tee",
  dimensions: { depth: 150, flangeWidth: 150, webThickness: 8, flangeThickness: 12, rootRadius: 15 },
};
const ZEE: Profile = {
  family: "zee",
  dimensions: { depth: 200, flangeWidth: 75, thickness: 2, innerRadius: 4 },
};
const LIPPED: Profile = {
  family: "lipped-channel",
  dimensions: { depth: 200, flangeWidth: 75, lip: 20, thickness: 2, innerRadius: 4 },
};
const RHS: Profile = {
  family: "rectangular-hollow",
  dimensions: { depth: 200, width: 100, thickness: 8, outerRadius: 16, innerRadius: 8 },
};
const CHS: Profile = { family: "round-hollow", dimensions: { diameter: 219.1, thickness: 8 } };
const FLAT: Profile = { family: "flat", dimensions: { width: 150, thickness: 12 } };
const ROUND: Profile = { family: "round", dimensions: { diameter: 40 } };
const TIMBER: Profile = { family: "timber", dimensions: { width: 60, depth: 240 } };

const ALL = [I, UNEQUAL, CHANNEL, ANGLE, TEE, ZEE, LIPPED, RHS, CHS, FLAT, ROUND, TIMBER];

test("every family of the schema is drawn", () => {
  expect(ALL.map((p) => p.family).sort()).toEqual((Object.keys(FAMILY_DIMENSIONS) as Family[]).sort());
});

describe.each(ALL.map((p) => [p.family, p] as const))("a %s", (_, profile) => {
  const regions = must(profileRegions(profile));

  test("lies about the centre of its box, outer ring anticlockwise, holes clockwise", () => {
    const box = ringBox(regions[0]?.outer ?? []);
    if (box === null) throw new Error("no box");
    const size = Math.max(box.xMax - box.xMin, box.yMax - box.yMin);
    expectRel(box.xMin + box.xMax, 0, { ...EXACT, scale: size });
    expectRel(box.yMin + box.yMax, 0, { ...EXACT, scale: size });
    for (const { outer, holes } of regions) {
      expect(ringArea(outer)).toBeGreaterThan(0);
      for (const hole of holes) expect(ringArea(hole)).toBeLessThan(0);
    }
  });

  test("meets its arcs without a kink", () => {
    for (const { outer, holes } of regions)
      for (const ring of [outer, ...holes]) {
        const edges = ringEdges(ring);
        edges.forEach((edge, i) => {
          const next = edges[(i + 1) % edges.length] ?? edge;
          if (edge.arc === null && next.arc === null) return;
          const [u, v] = [directionAt(edge, 1), directionAt(next, 0)];
          expectRel(u.x * v.x + u.y * v.y, 1, EXACT);
        });
      }
  });
});

describe("areas of the closed forms with fillets", () => {
  test.each([
    ["i-section", I, 2 * 150 * 12 + 276 * 8 + 4 * spandrel(15)],
    ["i-section-unequal", UNEQUAL, 200 * 15 + 300 * 25 + 560 * 10 + 4 * spandrel(6)],
    ["channel", CHANNEL, 2 * 80 * 11 + 178 * 6 + 2 * spandrel(13)],
    ["angle", ANGLE, (150 + 90 - 10) * 10 + spandrel(12) - 2 * spandrel(6)],
    ["tee", TEE, 150 * 12 + 138 * 8 + 2 * spandrel(15)],
    ["zee", ZEE, (200 + 2 * 75 - 4) * 2 + 2 * spandrel(4) - 2 * spandrel(6)],
    ["lipped-channel", LIPPED, (200 + 2 * 73 + 2 * 18) * 2 + 4 * spandrel(4) - 4 * spandrel(6)],
    ["rectangular-hollow", RHS, 200 * 100 - 184 * 84 - 4 * spandrel(16) + 4 * spandrel(8)],
    ["round-hollow", CHS, Math.PI * (219.1 - 8) * 8],
    ["flat", FLAT, 1800],
    ["round", ROUND, 400 * Math.PI],
    ["timber", TIMBER, 14_400],
  ] as const)("%s", (_, profile, area) => {
    expectRel(areaOf(profile), area, EXACT);
  });
});

describe("where the families point", () => {
  test("a channel has its web at −x, an angle its heel lower left, a tee its flange on top", () => {
    expect(propertiesOf(CHANNEL).centroid.x).toBeLessThan(0);
    const angle = propertiesOf(ANGLE);
    expect(angle.centroid.x).toBeLessThan(0);
    expect(angle.centroid.y).toBeLessThan(0);
    expect(angle.extents.yMax - angle.extents.yMin).toBe(150);
    expect(propertiesOf(TEE).centroid.y).toBeGreaterThan(0);
  });

  test("a zee has its top flange towards +x: Ixy is positive", () => {
    expect(propertiesOf(ZEE).Ixy).toBeGreaterThan(0);
  });

  test("an I with unequal flanges has topWidth on top", () => {
    expect(propertiesOf(UNEQUAL).centroid.y).toBeLessThan(0);
  });

  test("a flat lies, timber stands", () => {
    expect(propertiesOf(FLAT).extents.xMax).toBe(75);
    expect(propertiesOf(TIMBER).extents.yMax).toBe(120);
  });
});

describe("sloped flanges", () => {
  const sloped = (more: object) =>
    ({
      ...CHANNEL,
      dimensions: { ...CHANNEL.dimensions, rootRadius: 0, flangeSlope: 0.08, ...more },
    }) as Profile;

  test("of a channel hold their thickness at the middle of the flange, or where thicknessAt says", () => {
    // A flange is a trapezoid: its mean thickness is that of its middle, (6 + 80)/2 = 43 mm from the back; tf holds at 40 or 43.
    const flanges = (mean: number) => 200 * 6 + 2 * 74 * mean;
    expectRel(areaOf(sloped({})), flanges(11 - 0.08 * 3), EXACT);
    expectRel(areaOf(sloped({ thicknessAt: 43 })), flanges(11), EXACT);
  });

  test("of an I hold their thickness at a quarter of the width, or where thicknessAt says from the web's centre line", () => {
    const i = (more: object) =>
      ({ ...I, dimensions: { ...I.dimensions, rootRadius: 0, flangeSlope: 0.14, ...more } }) as Profile;
    // The middle of a sloped half flange lies (4 + 75)/2 = 39.5 mm from the centre line; tf holds at 37.5 or 39.5.
    const area = (mean: number) => 300 * 8 + 4 * 71 * mean;
    expectRel(areaOf(i({})), area(12 - 0.14 * 2), EXACT);
    expectRel(areaOf(i({ thicknessAt: 39.5 })), area(12), EXACT);
  });

  test("touch their fillets and toes: the arc starts r·tan(φ/2) from the corner", () => {
    const phi = Math.PI / 2 - Math.atan(0.08);
    const rounded = areaOf(sloped({ rootRadius: 10 })) - areaOf(sloped({}));
    // Corner less sector: r²(tan(φ/2) − φ/2), φ the turn of the edges.
    expectRel(rounded, 2 * 100 * (Math.tan(phi / 2) - phi / 2), { rel: 1e-10 });
  });
});

describe("dimensions that do not fit are named", () => {
  const refused = (profile: Profile, more: object) => {
    const found = fault(
      profileRegions({ ...profile, dimensions: { ...profile.dimensions, ...more } } as Profile),
    );
    expect(found.detail).toMatch(/\.$/);
    return [found.code, found.pointer];
  };
  const misfit = (field: string) => ["profile.doesNotFit", `/dimensions/${field}`];

  test.each([
    [I, { rootRadius: 80 }, "rootRadius"],
    [I, { webThickness: 150 }, "webThickness"],
    [I, { flangeThickness: 150 }, "flangeThickness"],
    [I, { flangeSlope: 0.9 }, "flangeSlope"],
    [I, { thicknessAt: 80, flangeSlope: 0.1 }, "thicknessAt"],
    [I, { toeRadius: 13 }, "toeRadius"],
    [UNEQUAL, { topWidth: 10 }, "topWidth"],
    [UNEQUAL, { bottomWidth: 5 }, "bottomWidth"],
    [UNEQUAL, { depth: 40 }, "depth"],
    [CHANNEL, { rootRadius: 90 }, "rootRadius"],
    [CHANNEL, { webThickness: 80 }, "webThickness"],
    [CHANNEL, { flangeThickness: 100 }, "flangeThickness"],
    [CHANNEL, { flangeSlope: 0.5 }, "flangeSlope"],
    [CHANNEL, { thicknessAt: 81 }, "thicknessAt"],
    [ANGLE, { legShort: 151 }, "legShort"],
    [ANGLE, { thickness: 90 }, "thickness"],
    [ANGLE, { toeRadius: 11 }, "toeRadius"],
    [ANGLE, { rootRadius: 85 }, "rootRadius"],
    [TEE, { webThickness: 150 }, "webThickness"],
    [TEE, { flangeThickness: 150 }, "flangeThickness"],
    [ZEE, { thickness: 75 }, "thickness"],
    [ZEE, { innerRadius: 74 }, "innerRadius"],
    [LIPPED, { thickness: 40 }, "thickness"],
    [LIPPED, { lip: 2 }, "lip"],
    [LIPPED, { lip: 100 }, "lip"],
    [LIPPED, { innerRadius: 30 }, "innerRadius"],
    [RHS, { thickness: 50 }, "thickness"],
    [RHS, { outerRadius: 51 }, "outerRadius"],
    [RHS, { innerRadius: 43, outerRadius: 45 }, "innerRadius"],
    [RHS, { outerRadius: 40, innerRadius: 0 }, "outerRadius"],
    [CHS, { thickness: 109.55 }, "thickness"],
  ] as const)("%o with %o", (profile, more, field) => {
    expect(refused(profile, more)).toEqual(misfit(field));
  });

  test.each([
    ["flangeWidth", 0],
    ["depth", -1],
    ["webThickness", Number.NaN],
    ["rootRadius", -1],
    ["flangeThickness", Number.POSITIVE_INFINITY],
  ] as const)("a %s of %s is no dimension", (field, value) => {
    expect(refused(I, { [field]: value })).toEqual(["profile.badDimension", `/dimensions/${field}`]);
  });
});

test("fillets that meet leave one arc after the other, with no edge between", () => {
  const stadium = must(
    profileRegions({
      family: "rectangular-hollow",
      dimensions: { depth: 100, width: 60, thickness: 5, outerRadius: 30, innerRadius: 25 },
    }),
  );
  expect(stadium[0]?.outer).toHaveLength(6);
  expectRel(
    areaOf({
      family: "rectangular-hollow",
      dimensions: { depth: 60, width: 60, thickness: 5, outerRadius: 30, innerRadius: 25 },
    }),
    Math.PI * 55 * 5,
    EXACT,
  );
});

test("any dimensions give an outline or a fault with a field: never NaN, never a throw", () => {
  const dimension = fc.oneof(fc.constant(0), fc.double({ min: 1e-3, max: 1e3, noNaN: true }), fc.double());
  const families = ALL.map((p) => [p.family, Object.keys(FAMILY_DIMENSIONS[p.family].shape)] as const);
  const any = fc.constantFrom(...families).chain(([family, fields]) =>
    fc.tuple(...fields.map(() => dimension)).map(
      (values) =>
        ({
          family,
          dimensions: Object.fromEntries(fields.map((f, i) => [f, values[i]])),
        }) as unknown as Profile,
    ),
  );
  fc.assert(
    fc.property(any, (profile) => {
      const regions = profileRegions(profile);
      if (!regions.ok) {
        expect(regions.error.pointer).toMatch(/^\/dimensions\/[a-zA-Z]+$/);
        return;
      }
      for (const { outer, holes } of regions.value)
        for (const ring of [outer, ...holes])
          for (const v of ring) expect([v.x, v.y, v.bulge ?? 0].every(Number.isFinite)).toBe(true);
    }),
    { numRuns: 2000 },
  );
});
