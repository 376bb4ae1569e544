import { expect, test } from "vitest";
import { composeFigure, SHOW_ALL } from "@/lib/figure/compose-figure";
import { dimensionTextBox } from "@/lib/figure/dimension-strokes";
import { overlap } from "@/lib/figure/place";
import { figurePart, girderParts, girderTouching, plateRing } from "@/tests/helpers/figure-girder";

const girder = (pxPerMm: number, parts = girderParts) =>
  composeFigure({
    parts,
    touching: girderTouching,
    properties: {
      centroid: { x: 17.3, y: 379.4 },
      angle: -2.17,
      I1: 2387.4e6,
      I2: 397.7e6,
      pna: { x: 2.5, y: 490.2 },
      shearCentre: null,
      unsymmetrical: null,
    },
    welds: [],
    pxPerMm,
    formatLength: (mm) => String(Math.round(mm * 10) / 10),
    show: SHOW_ALL,
  });

const dimensionsOf = (list: ReturnType<typeof girder>) =>
  list.items.flatMap((item) => (item.kind === "dimension" ? [item] : []));

test("touching parts hatch in opposite directions, a third neighbour takes the wide pitch", () => {
  const parts = [0, 1, 2].map((i) => figurePart(String(i), String(i + 1), [plateRing(0, i * 10, 50, 10)]));
  const list = composeFigure({
    parts,
    touching: [
      ["0", "1"],
      ["1", "2"],
      ["0", "2"],
    ],
    properties: null,
    welds: [],
    pxPerMm: 1,
    formatLength: String,
    show: SHOW_ALL,
  });
  expect(list.items.flatMap((i) => (i.kind === "material" ? [i.hatch] : []))).toEqual([
    "rising",
    "falling",
    "rising-wide",
  ]);
});

test("every plate's sizes, the chain and the overall depth are dimensioned", () => {
  const texts = dimensionsOf(girder(0.6)).map((d) => d.text);
  for (const text of ["420", "280", "18", "36", "564", "32", "632", "200", "16", "379.4"])
    expect(texts).toContain(text);
});

test("a size is not dimensioned twice", () => {
  const texts = dimensionsOf(girder(0.6)).map((d) => `${d.axis} ${d.text}`);
  expect(texts).toEqual([...new Set(texts)]);
});

test.each([0.05, 0.2, 0.6, 2])("no two figures collide at %d px per mm", (scale) => {
  const boxes = dimensionsOf(girder(scale)).map((d) => dimensionTextBox(d, scale));
  const hits = boxes.flatMap((a, i) => boxes.slice(i + 1).filter((b) => overlap(a, b)));
  expect(hits).toEqual([]);
});

test("balloons keep clear of material and of one another", () => {
  const parts = girderParts.map((p) => ({ ...p, inHand: false }));
  const balloons = girder(0.6, parts).items.flatMap((i) => (i.kind === "balloon" ? [i] : []));
  expect(balloons.map((b) => b.text)).toEqual(["1", "2", "3", "4"]);
  for (const b of balloons) {
    const c = { x: b.on.x * 0.6 + b.shiftPx.x, y: -b.on.y * 0.6 + b.shiftPx.y };
    const inside = parts.some(
      (p) =>
        c.x > p.box.xMin * 0.6 &&
        c.x < p.box.xMax * 0.6 &&
        -c.y > p.box.yMin * 0.6 &&
        -c.y < p.box.yMax * 0.6,
    );
    expect(inside).toBe(false);
  }
});

test("principal axes are drawn only where they differ from x–x by more than 0.1°", () => {
  const principal = (angle: number) =>
    composeFigure({
      parts: girderParts,
      touching: [],
      properties: {
        centroid: { x: 0, y: 0 },
        angle,
        I1: 2,
        I2: 1,
        pna: null,
        shearCentre: null,
        unsymmetrical: null,
      },
      welds: [],
      pxPerMm: 0.5,
      formatLength: String,
      show: SHOW_ALL,
    }).items.filter((i) => i.kind === "line" && i.role === "principal").length;
  expect([0, 0.09, 0.2, 90, 89.95, -45].map(principal)).toEqual([0, 0, 2, 0, 0, 2]);
});
