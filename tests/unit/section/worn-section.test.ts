import { describe, expect, test } from "vitest";
import { sectionProperties } from "@/lib/section/section-properties";
import { wornSection } from "@/lib/section/worn-section";
import type { Section } from "@/lib/section/section";
import { arranged, partOf as arrangePart, put, rectangle } from "@/tests/helpers/parts";
import { partOf, STEEL } from "@/tests/helpers/sections";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";

const girder = (): Section => {
  const regions = [
    put(rectangle(10, 600), 0, 0),
    put(rectangle(300, 20), 0, 310),
    put(rectangle(300, 20), 0, -310),
  ];
  const { parts, outline, contacts, bodies } = arranged(regions.map((r, i) => arrangePart(`p${i}`, [r])));
  return {
    reference: STEEL,
    parts: parts.map((list, i) => partOf(list, { id: `p${i}`, thickness: [10, 20, 20][i] ?? null })),
    outline,
    contacts: contacts.map(({ parts: [a, b], lines }) => ({ parts: [`p${a}`, `p${b}`], lines })),
    bodies: bodies.map((body) => body.map((i) => `p${i}`)),
    warnings: [],
  };
};

describe("wornSection", () => {
  test("a girder loses the allowance on its faces, not between its plates", () => {
    const worn = wornSection(girder(), 1);
    if (!worn.ok) throw new Error(JSON.stringify(worn.error));
    const { area, extents } = must(sectionProperties(worn.value));
    // A − P·d + 8 outer corners d², less 4 inner corners of πd²/4.
    expectRel(area, 18_000 - (2 * 640 + 4 * 300 - 20), { rel: 0.002 });
    expectRel(area, 18_000 - (4 * 300 + 4 * 20 + 2 * 600 - 2 * 10) + 8 - Math.PI, { rel: 1e-11 });
    expectRel(extents.yMax, 319, { rel: 1e-12 });
    expect(worn.value.bodies).toHaveLength(1);
    expect(worn.value.warnings).toEqual([]);
  });

  test("names plates that wear away whole and says when the rest comes apart", () => {
    const worn = wornSection(girder(), 5);
    if (!worn.ok) throw new Error(JSON.stringify(worn.error));
    expect(worn.value.warnings.map(({ code, parts }) => [code, parts])).toEqual([
      ["part.covered", ["p0"]],
      ["wear.parts", ["p1", "p2"]],
    ]);
  });

  test("refuses what leaves nothing", () => {
    expect(wornSection(girder(), 12)).toMatchObject({ ok: false, error: [{ code: "section.noArea" }] });
  });
});
