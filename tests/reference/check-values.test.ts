import { describe, expect, test } from "vitest";
import { computeProperties } from "@/lib/drawing/compute-properties";
import { CHECK_ROWS, UNIT_VALUE, type CheckRow } from "@/tests/reference/check-rows";
import { drawingOfRow } from "@/tests/reference/drawing-of-row";
import { getterOfRow } from "@/tests/reference/value-of-row";
import { steelDrawing } from "@/tests/helpers/steel-drawing";
import { expectRel } from "@/tests/helpers/expect-rel";

const propertiesOf = (row: CheckRow) => {
  const drawing = drawingOfRow(row);
  if (drawing === null) throw new Error(`${row.id}: no drawing`);
  const properties = computeProperties(drawing);
  if (!properties.ok) throw new Error(`${row.id}: ${JSON.stringify(properties.error)}`);
  return properties.value;
};

/** Told as a limit for a thin wall; the tube itself is off by a share of t/r. */
const isLimit = (row: CheckRow) => row.id === "thintube.shapeFactor";

const checked = CHECK_ROWS.filter((row) => getterOfRow(row) !== null && drawingOfRow(row) !== null);
const direct = checked.filter((row) => !isLimit(row));

/** Torsion, warping, shear centre (`torsion-values.test.ts`) and what tables give by rules of their own. */
const TORSION = new Set([
  "It",
  "Iw",
  "J",
  "Cw",
  "Ct",
  "C",
  "eo",
  "e",
  "ym",
  "tauCoef",
  "beta",
  "alpha",
  "k",
  "Avz",
]);
/** Not sections: conversion factors, densities, beams and columns have tests of their own. */
const ELSEWHERE = new Set(["unit", "material", "beam", "column"]);

const countBy = (rows: readonly CheckRow[], key: (row: CheckRow) => string): Record<string, number> => {
  const counts: Record<string, number> = {};
  for (const row of rows) counts[key(row)] = (counts[key(row)] ?? 0) + 1;
  return counts;
};

describe("published and closed-form values", () => {
  test.each(direct.map((row) => [row.id, row] as const))("%s", (_, row) => {
    const unit = UNIT_VALUE[row.unit];
    const get = getterOfRow(row);
    if (unit === undefined || get === null) throw new Error(`${row.id}: unit ${row.unit} is unknown`);
    expectRel(get(propertiesOf(row)), row.value * unit, {
      rel: row.tol,
      name: `${row.designation} ${row.property}; ${row.source}; ${row.provenance}; ${row.note ?? "no note"}`,
    });
  });

  test("the shape factor of a tube tends to 4/π as its wall gets thin", () => {
    const row = CHECK_ROWS.find(isLimit);
    if (row === undefined) throw new Error("row missing");
    const factorAt = (t: number) => {
      const p = computeProperties(steelDrawing({ shape: { kind: "round", diameter: 100, wall: t } }));
      return p.ok && p.value.Zx !== null ? p.value.Zx / p.value.Sx : Number.NaN;
    };
    // Richardson's extrapolation to t = 0 through four walls halved in turn: the factor is a power series in t/D.
    let column = [1, 0.5, 0.25, 0.125].map(factorAt);
    for (let order = 1; column.length > 1; order += 1)
      column = column.slice(1).map((fine, i) => fine + (fine - (column[i] ?? fine)) / (2 ** order - 1));
    expectRel(column[0] ?? null, row.value, { rel: row.tol, name: row.source });
  });
});

test("no row is dropped: each is checked here, with the torsion values, or is not about a section", () => {
  const rest = CHECK_ROWS.filter((row) => !checked.includes(row));
  const torsional = rest.filter((row) => !ELSEWHERE.has(row.shape));
  expect(torsional.filter((row) => !TORSION.has(row.property)).map((row) => row.id)).toEqual([]);
  expect(countBy(checked, (row) => row.property)).toEqual({
    A: 54,
    I: 5,
    I1: 1,
    I2: 1,
    Ic: 1,
    Imax: 1,
    Iu: 6,
    Iv: 6,
    Ix: 21,
    Ixx: 7,
    Iy: 39,
    Iz: 18,
    "Iz(min principal)": 3,
    Sx: 12,
    Sxx: 7,
    Sy: 7,
    Wel: 3,
    Wely: 17,
    Welz: 14,
    Wpl: 5,
    Wply: 17,
    Wplz: 14,
    Wy: 3,
    Zx: 16,
    Zy: 12,
    c: 3,
    cy: 4,
    cz: 3,
    iy: 9,
    iz: 9,
    mass: 9,
    rx: 7,
    ry: 7,
    shapeFactor: 4,
    tanAlpha: 6,
    xbar: 6,
    ybar: 3,
    yc: 2,
    ys: 5,
    "|Ixy|": 1,
  });
  expect(countBy(torsional, (row) => row.property)).toEqual({
    Avz: 9,
    C: 2,
    Ct: 3,
    Cw: 15,
    It: 23,
    Iw: 13,
    J: 23,
    alpha: 8,
    beta: 14,
    e: 3,
    eo: 3,
    k: 8,
    tauCoef: 1,
    ym: 5,
  });
  expect(
    countBy(
      rest.filter((row) => ELSEWHERE.has(row.shape)),
      (row) => row.shape,
    ),
  ).toEqual({ beam: 18, column: 4, material: 2, unit: 15 });
  expect(CHECK_ROWS.length).toBe(537);
});

test("every row names its source and its provenance", () => {
  for (const row of CHECK_ROWS) expect(row.source.length * row.provenance.length, row.id).toBeGreaterThan(0);
});
