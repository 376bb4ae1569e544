import { expect, test } from "vitest";
import { boxOfRings, chordsOf, insideChords, pathData, pointInside, thinnessOf } from "@/lib/figure/outline";
import { hatchData } from "@/lib/figure/hatch";
import { silhouetteOfRings } from "@/lib/figure/silhouette";
import { centredView, fittingScale, toDrawing, toScreen, zoomedView } from "@/lib/figure/view";
import { expectRel } from "@/tests/helpers/expect-rel";
import { plateRing } from "@/tests/helpers/figure-girder";

const view = { pxPerMm: 1, xPx: 0, yPx: 0 };
const disc = [
  { x: -50, y: 0, bulge: 1 },
  { x: 50, y: 0, bulge: 1 },
];

test("the box of a disc of two half circles is its diameter", () => {
  const box = boxOfRings([disc]);
  expectRel(box?.yMax ?? null, 50, { rel: 1e-12 });
  expectRel(box?.yMin ?? null, -50, { rel: 1e-12 });
});

test("a quarter arc turning anticlockwise bulges to the right of its chord and is drawn against the clock on screen", () => {
  const ring = [
    { x: 0, y: 0, bulge: Math.tan(Math.PI / 8) },
    { x: 10, y: 10 },
    { x: 0, y: 10 },
  ];
  expectRel(boxOfRings([ring])?.xMax ?? null, 10, { rel: 1e-9 });
  expect(pathData(ring, view)).toBe("M0 0A10 10 0 0 0 10 -10L0 -10Z");
  expect(boxOfRings([ring])?.yMin).toBe(0);
});

test("thinness of a long plate is its thickness", () => {
  expectRel(thinnessOf([plateRing(0, 0, 1000, 10)]), 10, { rel: 0.011 });
});

test("a point inside a tube lies in its wall", () => {
  const inner = [
    { x: -45, y: 0, bulge: -1 },
    { x: 45, y: 0, bulge: -1 },
  ];
  const p = pointInside([disc, inner]);
  expect(p).not.toBeNull();
  expect(insideChords([chordsOf(disc, 1), chordsOf(inner, 1)], p ?? { x: 0, y: 0 })).toBe(true);
});

test("hatch lines stay inside the plate and keep a pitch of 6 px", () => {
  const data = hatchData([plateRing(50, -50, 100, 100)], "rising", view);
  const numbers = [...data.matchAll(/-?\d+(\.\d+)?/g)].map((m) => Number(m[0]));
  expect(numbers.every((n) => n >= -0.1 && n <= 100.1)).toBe(true);
  // A square of side 100 hatched at 45° shows diagonal / pitch lines: 141.4 / 6.
  expect(data.split("M").length - 1).toBeGreaterThanOrEqual(23);
  expect(data.split("M").length - 1).toBeLessThanOrEqual(24);
});

test("hatch does not swim: panned by 17 px it is the same hatch moved by 17 px", () => {
  const ring = [plateRing(0, 0, 40, 30)];
  const shift = (data: string) =>
    [...data.matchAll(/[ML](-?[\d.]+) (-?[\d.]+)/g)].map((m) => `${Math.round(Number(m[1]))}`).length;
  expect(shift(hatchData(ring, "falling", view))).toBe(
    shift(hatchData(ring, "falling", { ...view, xPx: 17, yPx: 5 })),
  );
});

test("a silhouette stands on the rule", () => {
  expect(silhouetteOfRings([plateRing(100, 300, 20, 40)])).toEqual({
    path: "M0 0L20 0L20 -40L0 -40Z",
    widthMm: 20,
    heightMm: 40,
  });
  expect(silhouetteOfRings([])).toBeNull();
});

test("screen and drawing are inverse, and zoom keeps the point under the pointer", () => {
  const box = { xMin: -10, xMax: 10, yMin: 0, yMax: 40 };
  const margin = { left: 10, right: 20, top: 5, bottom: 5 };
  const scale = fittingScale(box, 200, 150, margin);
  expectRel(scale, 140 / 40, { rel: 1e-12 });
  const v = centredView(box, scale, 200, 150, margin);
  const p = toDrawing(v, toScreen(v, { x: 3, y: 7 }));
  expectRel(p.x, 3, { rel: 1e-12 });
  expectRel(p.y, 7, { rel: 1e-12 });
  const at = { x: 60, y: 70 };
  const before = toDrawing(v, at);
  const after = toDrawing(zoomedView(v, at, 1.7), at);
  expectRel(after.x, before.x, { rel: 1e-9, scale: 1 });
  expectRel(after.y, before.y, { rel: 1e-9, scale: 1 });
});
