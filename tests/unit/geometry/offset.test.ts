import { describe, expect, test } from "vitest";
import type { WornFaces } from "@/lib/geometry/offset";
import { wornAway } from "@/lib/geometry/offset";
import { perimeterOf } from "@/lib/geometry/perimeter";
import type { Region } from "@/lib/geometry/region";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";
import { areaOf, arranged, cutoutOf, disc, partOf, put, rectangle } from "@/tests/helpers/parts";

const left = (region: Region, depth: number, faces: WornFaces = "outer"): readonly Region[] => {
  const bands = must(wornAway([region], depth, faces)).map((band, i) => cutoutOf(`w${i}`, [band]));
  return arranged([partOf("p", [region])], bands).outline;
};

const REL = 1e-11;

describe("wornAway", () => {
  test("a rectangle keeps its sharp corners: (b − 2d)(h − 2d)", () => {
    for (const angle of [0, 37])
      expectRel(areaOf(left(put(rectangle(100, 40), 3, 4, angle), 1.5)), 97 * 37, { rel: REL });
  });

  test("a solid round and a tube wear to true circles of radius R − d, and r + d where the bore wears too", () => {
    expectRel(areaOf(left(disc(50), 2)), Math.PI * 48 ** 2, { rel: REL });
    const tube = disc(50, 40);
    expectRel(areaOf(left(tube, 2)), Math.PI * (48 ** 2 - 40 ** 2), { rel: REL });
    expectRel(areaOf(left(tube, 2, "all")), Math.PI * (48 ** 2 - 42 ** 2), { rel: REL });
  });

  // A − P·d, plus d²·tan(α/2) for each corner turning by α outwards, less d²·α/2 for each turning inwards or concave arc of
  // sweep α: what bands of neighbouring edges share, and the sectors between them (Steiner's formula for parallel bodies).
  test("an angle is rounded at its inner corner", () => {
    const [a, t, d] = [100, 12, 2];
    const angle: Region = {
      outer: [
        { x: 0, y: 0 },
        { x: a, y: 0 },
        { x: a, y: t },
        { x: t, y: t },
        { x: t, y: a },
        { x: 0, y: a },
      ],
      holes: [],
    };
    const worn = left(angle, d);
    const exact = 2 * a * t - t * t - 4 * a * d + 5 * d * d - (Math.PI / 4) * d * d;
    expectRel(areaOf(worn), exact, { rel: REL });
    expect(worn[0]?.outer.filter(({ bulge }) => bulge !== undefined)).toHaveLength(1);
  });

  test("a fillet grows by the allowance and stays an arc", () => {
    const [a, t, r, d] = [100, 12, 15, 2];
    const q = Math.SQRT2 - 1;
    const angle: Region = {
      outer: [
        { x: 0, y: 0 },
        { x: a, y: 0 },
        { x: a, y: t },
        { x: t + r, y: t, bulge: -q },
        { x: t, y: t + r },
        { x: t, y: a },
        { x: 0, y: a },
      ],
      holes: [],
    };
    const area = 2 * a * t - t * t + (1 - Math.PI / 4) * r * r;
    const around = perimeterOf([angle]).outer;
    expectRel(areaOf(left(angle, d)), area - around * d + 5 * d * d - (Math.PI / 4) * d * d, { rel: REL });
  });

  test("an allowance beyond the radius of a rounded corner still leaves what is farther than it from every face", () => {
    const [b, r, d] = [40, 3, 5];
    const q = Math.SQRT2 - 1;
    const h = b / 2;
    const rounded: Region = {
      outer: [
        { x: -h + r, y: -h },
        { x: h - r, y: -h, bulge: q },
        { x: h, y: -h + r },
        { x: h, y: h - r, bulge: q },
        { x: h - r, y: h },
        { x: -h + r, y: h, bulge: q },
        { x: -h, y: h - r },
        { x: -h, y: -h + r, bulge: q },
      ],
      holes: [],
    };
    expectRel(areaOf(left(rounded, d)), (b - 2 * d) ** 2, { rel: REL });
  });

  test("wear of half the thickness leaves nothing; a depth that is no length is refused", () => {
    expect(left(rectangle(100, 10), 5)).toEqual([]);
    for (const depth of [0, -1, Number.NaN, Infinity])
      expect(wornAway([disc(5)], depth)).toMatchObject({ ok: false, error: { code: "wear.badDepth" } });
  });
});
