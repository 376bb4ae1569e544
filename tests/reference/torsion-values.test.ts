import { describe, expect, test } from "vitest";
import { sectionProperties } from "@/lib/section/section-properties";
import type { SectionProperties } from "@/lib/section/properties";
import type { Section } from "@/lib/section/section";
import { connectedTorsion } from "@/tests/helpers/torsion";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";
import { CHECK_ROWS, UNIT_VALUE, type CheckRow } from "@/tests/reference/check-rows";
import { torsionSectionOfRow } from "@/tests/reference/torsion-section-of-row";

type Found = Readonly<{ torsion: ReturnType<typeof connectedTorsion>; area: SectionProperties }>;
type Getter = (found: Found, row: CheckRow) => number;

const side = (row: CheckRow, key: string): number => Number(row.dims[key]) * 100;

/** Rows drawn 100 times their size give coefficients without unit. */
const GETTERS: Readonly<Record<string, Getter>> = {
  It: ({ torsion }) => torsion.J,
  J: ({ torsion }) => torsion.J,
  Iw: ({ torsion }) => torsion.Cw,
  Cw: ({ torsion }) => torsion.Cw,
  ym: ({ torsion, area }) => Math.abs(torsion.shearCentre.x - area.centroid.x),
  eo: ({ torsion, area }) => area.extents.xMin - torsion.shearCentre.x,
  e: ({ torsion }) => Math.abs(torsion.shearCentre.x),
  beta: ({ torsion }, row) => torsion.J / (side(row, "b") * side(row, "t") ** 3),
  alpha: ({ torsion }, row) =>
    1 / (torsion.fields!.greatest.torsion.value * side(row, "b") * side(row, "t") ** 2),
  k: ({ torsion }, row) => (torsion.fields!.greatest.torsion.value * torsion.J) / side(row, "t"),
  tauCoef: ({ torsion }) => torsion.fields!.greatest.torsion.value,
};

/**
 * Where a row is exact and the solver draws arcs as chords or takes stress from a mesh, the program's own promise is the
 * measure: 0.01 % for J and Cw, 0.5 % for the greatest stress found at the sample points.
 */
const OWN_REL: Readonly<Record<string, number>> = {
  J: 1e-4,
  beta: 1e-5,
  Cw: 2e-4,
  alpha: 5e-3,
  k: 5e-3,
  tauCoef: 5e-3,
};

/** The finite-element numbers beside the rows are good to 0.2 %. */
const FE_REL = 2e-3;

/** By the table's own formula or rule for strength, not by torsion theory: not what the solver computes. */
const BY_RULE = new Set(["Avz", "Ct", "C"]);

const rows = CHECK_ROWS.filter((row) => row.property in GETTERS && row.dims["b"] !== "inf");
const solved = new Map<string, Found | null>();
const solve = (section: Section): Found => ({
  torsion: connectedTorsion(section, { fields: true }),
  area: must(sectionProperties(section)),
});
const foundFor = (row: CheckRow): Found => {
  const key = JSON.stringify([row.shape, row.dims]);
  const section = solved.has(key) ? null : torsionSectionOfRow(row);
  if (section !== null) solved.set(key, solve(section));
  const found = solved.get(key);
  if (found === undefined || found === null) throw new Error(`${row.id}: cannot be drawn`);
  return found;
};

describe("published and closed-form values of torsion", () => {
  test.each(rows.map((row) => [row.id, row] as const))("%s", (_, row) => {
    const unit = row.unit === "1/mm3" ? 1 : UNIT_VALUE[row.unit];
    const value = GETTERS[row.property]!(foundFor(row), row);
    if (unit === undefined) throw new Error(`${row.id}: unit ${row.unit} is unknown`);
    const name = `${row.designation} ${row.property}; ${row.source}; ${row.note ?? "no note"}`;
    expectRel(value, row.value * unit, { rel: Math.max(row.tol, OWN_REL[row.property] ?? 0), name });
    if (row.feRef !== undefined && row.feRef !== null)
      expectRel(value, row.feRef * unit, { rel: FE_REL, name: `${name}; finite elements` });
  });
});

test("every row about torsion is checked here, but for the limit b/t → ∞ and values by a table's own rule", () => {
  expect(rows.length).toBe(115);
  expect(CHECK_ROWS.filter(({ property }) => BY_RULE.has(property)).length).toBe(14);
});
