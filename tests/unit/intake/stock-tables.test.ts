import { describe, expect, test } from "vitest";
import { choicesFor, openQuestion, standingOf, tabulatedFigures } from "@/lib/intake/delivery-plan";
import type { CauseCode } from "@/lib/intake/row-reason";
import { expectRel } from "@/tests/helpers/expect-rel";
import { stock, takeIn, verdicts } from "./intake-of";

describe("the European table (semicolon, decimal comma, y–z, units in the headings)", () => {
  const taken = takeIn(stock("stock-eu"));

  test("is read as it is, every row accepted", () => {
    expect(taken.fault).toBeNull();
    expect(taken.rows).toHaveLength(65);
    expect(new Set(verdicts(taken))).toEqual(new Set(["accepted"]));
    expect(taken.recognition?.questions).toEqual([]);
  });

  test("says what was recognised and why", () => {
    expect(taken.recognition?.evidence).toMatchObject({
      delimiter: expect.stringContaining("20 fields in 60"),
      marks: expect.stringContaining("8,1"),
      axes: "the file's y–y is our x–x, its z–z our y–y",
    });
    const column = taken.recognition?.columns.find((c) => c.heading === "Iy [cm⁴]");
    expect(column).toMatchObject({ field: "Ix", unit: "cm4", samples: ["171", "317,8"] });
    expect(column?.evidence).toContain("our x–x");
  });

  // IPE 300: EN 10365 prints A 53,81 cm² and Iy 8356 cm⁴, four digits each.
  test("keeps figures in mm units, computed with fillets", () => {
    const ipe = taken.rows.find((r) => r.inspection.designation === "IPE 300")?.inspection;
    expectRel(ipe?.properties?.Ix ?? null, 8356e4, { rel: 2e-4 });
    expect(tabulatedFigures(ipe ?? never(), null)).toMatchObject({ area: 5381, Ix: 8356e4 });
  });

  test("UPN rows carry 8 % slopes with tf at half the width, hollow rows the radii of their standard", () => {
    const of = (name: string) =>
      taken.rows.find((r) => r.inspection.designation === name)?.inspection.profile;
    expect(of("UPN 200")?.dimensions).toMatchObject({
      flangeSlope: 0.08,
      thicknessAt: 37.5,
      toeRadius: 5.75,
    });
    expect(of("RHS 200x100x8")?.dimensions).toMatchObject({ outerRadius: 20, innerRadius: 12 });
    expect(of("SHS 60x60x4")?.dimensions).toMatchObject({ outerRadius: 6, innerRadius: 4 });
    expect(of("L 100x65x8")?.dimensions).toMatchObject({ rootRadius: 10, toeRadius: 5 });
  });

  test("printed torsion and warping constants are kept and said not to be compared", () => {
    const ipe = taken.rows[0]?.inspection;
    expect(ipe?.uncompared.map((u) => u.key)).toEqual(["J", "Cw"]);
    expectRel(ipe?.uncompared[1]?.tabulated ?? null, 0.3514e9, { rel: 1e-12 });
    expect(ipe?.comparisons.some((c) => String(c.key) === "J")).toBe(false);
  });
});

describe("the US table (inches, points, k for design, design wall)", () => {
  const taken = takeIn(stock("stock-us"));

  test("no row is refused and every query is explained by a convention", () => {
    expect(taken.rows).toHaveLength(42);
    expect(verdicts(taken)).not.toContain("refused");
    const causes = new Set(taken.rows.flatMap((r) => r.inspection.reasons.map((x) => x.cause)));
    expect(causes).toEqual(new Set(["convention"]));
  });

  test("with the conventions named in the reading every row is accepted", () => {
    const named = takeIn(stock("stock-us"), {
      change: (r) => ({
        ...r,
        conventions: ["mass-by-nominal-wall", "toes-not-printed", "radii-not-printed"],
      }),
    });
    expect(new Set(verdicts(named))).toEqual(new Set(["accepted"]));
    const tube = named.rows.find((r) => r.inspection.designation === "HSS4X4X1/4")?.inspection;
    expect(tube?.comparisons.find((c) => c.key === "mass")).toMatchObject({
      within: true,
      convention: "mass-by-nominal-wall",
    });
  });

  // AISC prints k for design; k − tf reproduces the printed areas (W8X31: 0.829 − 0.435 in).
  test("the root radius of a W shape is k − tf", () => {
    const w = taken.rows.find((r) => r.inspection.designation === "W8X31")?.inspection.profile;
    expectRel(w?.family === "i-section" ? w.dimensions.rootRadius : null, (0.829 - 0.435) * 25.4, {
      rel: 1e-12,
    });
  });
});

describe("the table with twelve planted defects", () => {
  const taken = takeIn(stock("stock-eu-bad"));
  const EXPECTED: readonly (readonly [number, string, CauseCode, RegExp])[] = [
    [1, "queried", "digits-swapped", /1493.*1943/],
    [2, "queried", "unit", /mm⁴/],
    [3, "queried", "blank", /A is blank.*38,77/],
    [4, "queried", "duplicate", /Row 1/],
    [5, "refused", "not-a-number", /ca\. 78,1/],
    [6, "refused", "sign", /-7,1/],
    [7, "queried", "ambiguous", /11\.77 or 11770.*11770 agrees/],
    [8, "queried", "fields", /22 fields instead of 20.*Lager 2/],
    [9, "queried", "decimal-mark", /66\.3/],
    [10, "refused", "fields", /13 fields instead of 20/],
    [11, "refused", "designation", /begin with =/],
    [12, "refused", "quotes", /never closed/],
  ];

  test("has twelve rows and a byte-order mark that is no part of the first heading", () => {
    expect(taken.rows).toHaveLength(12);
    expect(taken.recognition?.columns[0]?.heading).toBe("Bezeichnung");
  });

  test.each(EXPECTED)("row %i is %s for %s", (number, verdict, cause, words) => {
    const { inspection } = taken.rows[number - 1] ?? never();
    expect(inspection.verdict).toBe(verdict);
    expect(inspection.reasons.map((r) => r.cause)).toEqual([cause]);
    expect(inspection.reasons[0]?.detail).toMatch(words);
  });
});

describe("the plan against the Rack", () => {
  const { inspection } = takeIn(stock("stock-eu")).rows[0] ?? never();
  const next = { bayId: "b", contentHash: "h1", tabulated: tabulatedFigures(inspection, null) };
  const held = {
    shapeId: "s",
    bayId: "b",
    bay: "Rolled beams",
    revision: "A",
    fromTable: true,
    contentHash: "h1",
    tabulated: next.tabulated,
    computed: {},
    inWork: false,
  };

  test("is new, unchanged, changed or held by a drawn shape", () => {
    expect(standingOf(next, null).against).toBe("new");
    expect(standingOf(next, held).against).toBe("unchanged");
    expect(standingOf({ ...next, contentHash: "h2" }, held)).toMatchObject({
      against: "changed",
      detail: expect.stringContaining("the dimensions"),
    });
    expect(standingOf(next, { ...held, tabulated: { ...held.tabulated, Ix: 1 } }).differences).toHaveLength(
      1,
    );
    expect(standingOf(next, { ...held, fromTable: false }).against).toBe("held");
  });

  test("an undecided query blocks; a refused row can only be mended or left out", () => {
    const bad = takeIn(stock("stock-eu-bad")).rows.map((r) => r.inspection);
    const [swapped, cut] = [bad[0] ?? never(), bad[9] ?? never()];
    expect(openQuestion(swapped, null)).toMatch(/1943/);
    expect(openQuestion(swapped, "computed")).toBeNull();
    expect(choicesFor(cut)).toEqual(["leave-out"]);
    expect(openQuestion(cut, "tabulated")).not.toBeNull();
    expect(tabulatedFigures(swapped, "computed").Ix).toBeUndefined();
    expect(tabulatedFigures(swapped, "tabulated").Ix).toBe(1493e4);
  });
});

function never(): never {
  throw new Error("the table has no such row");
}
