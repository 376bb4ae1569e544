import { describe, expect, test } from "vitest";
import { sectionOf } from "@/lib/drawing/section-of";
import type { Drawing } from "@/lib/drawing/schema";
import { jointForces } from "@/lib/section/joint-forces";
import { sectionCut, type CutPiece } from "@/lib/section/section-cut";
import { sectionProperties } from "@/lib/section/section-properties";
import { steelDrawing } from "@/tests/helpers/steel-drawing";
import { expectRel } from "@/tests/helpers/expect-rel";
import { must } from "@/tests/helpers/must";
import { partOf, rectangleAt, sectionOfParts, sectionOfRegions } from "@/tests/helpers/sections";

/** Closed forms over rectangles: rounding, and the 1e-10 that noding may move a corner by on 100 mm. */
const CLOSE = { rel: 1e-10 };
const value = <T>(result: { ok: true; value: T } | { ok: false; error: unknown }): T => {
  if (!result.ok) throw new Error(JSON.stringify(result.error));
  return result.value;
};
const section = (drawing: Drawing) => value(sectionOf(drawing));
const plate = (width: number, height: number, x: number, y: number) => ({
  shape: { kind: "plate" as const, width, height },
  at: { x, y },
});
const above = (y: number) => ({ normal: { x: 0, y: -1 }, offset: -y });
const below = (y: number) => ({ normal: { x: 0, y: 1 }, offset: y });
const rightOf = (x: number) => ({ normal: { x: -1, y: 0 }, offset: -x });
const only = (pieces: readonly CutPiece[]): CutPiece => {
  if (pieces.length !== 1 || pieces[0] === undefined) throw new Error(`${pieces.length} pieces`);
  return pieces[0];
};

test("a rectangle has 1.5 V/A at mid-depth and the parabola between", () => {
  const [b, h] = [40, 90];
  const bar = sectionOfRegions([rectangleAt(7, -3, b, h)]);
  for (const share of [0.1, 0.5, 0.8]) {
    const piece = only(value(sectionCut(bar, [above(-3 + share * h)])));
    expectRel(piece.meanPerVy, (1.5 / (b * h)) * (1 - (2 * share - 1) ** 2), CLOSE);
    expectRel(piece.meanPerVx, 0, { ...CLOSE, scale: 1 / (b * h) });
    expect(piece.shared).toBe(false);
  }
});

test("a solid round has 4V/3A mean shear at its diameter", () => {
  const round = section(steelDrawing({ shape: { kind: "round", diameter: 60 } }));
  expectRel(only(value(sectionCut(round, [above(0)]))).meanPerVy, 4 / (3 * Math.PI * 900), CLOSE);
});

test("the sides of a cut have opposite flows", () => {
  const bar = sectionOfRegions([rectangleAt(0, 0, 30, 100)]);
  const [up, down] = [only(value(sectionCut(bar, [above(63)]))), only(value(sectionCut(bar, [below(63)])))];
  expectRel(up.perVy, -down.perVy, CLOSE);
  expectRel(up.Qx, -down.Qx, CLOSE);
  expect(up.perVy).toBeGreaterThan(0);
});

describe("a plate girder", () => {
  const girder = section(
    steelDrawing(plate(250, 20, 0, 1240), plate(10, 1200, 0, 630), plate(450, 30, 0, 15)),
  );
  const p = must(sectionProperties(girder));

  test("cut along the flange has the flow of its joint, through the web's width", () => {
    const piece = only(value(sectionCut(girder, [above(1230)])));
    const joint = jointForces(girder).find((j) => j.parts.includes("p1"));
    expectRel(piece.perVy, Math.abs(joint?.perVy ?? Number.NaN), CLOSE);
    expectRel(piece.length, 10, CLOSE);
    expectRel(piece.Qx, 250 * 20 * (1240 - p.centroid.y), CLOSE);
  });

  test("cut through the flange beside the web has V·Q/I of the outstand", () => {
    const tip = only(value(sectionCut(girder, [above(1230), rightOf(25)])));
    expectRel(tip.area, 100 * 20, CLOSE);
    expectRel(tip.perVy, (100 * 20 * (1240 - p.centroid.y)) / p.Ix, CLOSE);
    expectRel(tip.perVx, (100 * 20 * 75) / p.Iy, CLOSE);
    expectRel(tip.length, 20, CLOSE);
  });
});

test("a box cut across both webs tells the sum only", () => {
  const box = section(
    steelDrawing(
      plate(400, 20, 0, 410),
      plate(400, 20, 0, -10),
      plate(10, 400, -150, 200),
      plate(10, 400, 150, 200),
    ),
  );
  const piece = only(value(sectionCut(box, [above(300)])));
  expect(piece.shared).toBe(true);
  expect(piece.segments).toHaveLength(2);
  expectRel(piece.length, 20, CLOSE);
});

test("legs taken off together are two pieces, each with its own flow", () => {
  const channel = section(
    steelDrawing({
      shape: {
        kind: "profile",
        family: "channel",
        dimensions: { depth: 200, flangeWidth: 75, webThickness: 8, flangeThickness: 11, rootRadius: 11 },
      },
    }),
  );
  const pieces = value(sectionCut(channel, [rightOf(0)]));
  expect(pieces).toHaveLength(2);
  for (const piece of pieces) {
    expectRel(piece.area, 37.5 * 11, CLOSE);
    expect(piece.segments).toHaveLength(1);
  }
  expectRel(pieces[0]?.perVy ?? null, -(pieces[1]?.perVy ?? Number.NaN), CLOSE);
});

test("bends freely: the zee's flow has both components", () => {
  const [h, b, t] = [200, 90, 15];
  const zee = section(
    steelDrawing(
      plate(t, h, 0, 0),
      plate(b - t, t, b / 2, (h - t) / 2),
      plate(b - t, t, -b / 2, (t - h) / 2),
    ),
  );
  const { Ix, Iy, Ixy } = must(sectionProperties(zee));
  const piece = only(value(sectionCut(zee, [rightOf(30)])));
  const [A, x, y] = [(b - t / 2 - 30) * t, (30 + b - t / 2) / 2, (h - t) / 2];
  expectRel(piece.perVy, (A * (Iy * y - Ixy * x)) / (Ix * Iy - Ixy ** 2), CLOSE);
  expectRel(piece.perVx, (A * (Ix * x - Ixy * y)) / (Ix * Iy - Ixy ** 2), CLOSE);
});

test("parts that count for mass only are not cut", () => {
  const withRail = sectionOfParts([
    partOf([rectangleAt(0, 0, 30, 100)], { id: "bar" }),
    partOf([rectangleAt(0, 100, 30, 50)], { id: "rail", counts: "mass" }),
  ]);
  const piece = only(value(sectionCut(withRail, [above(50)])));
  expectRel(piece.area, 1500, CLOSE);
  expectRel(piece.meanPerVy, 1.5 / 3000, CLOSE);
});

test("a cut beside the section takes nothing off", () => {
  expect(value(sectionCut(sectionOfRegions([rectangleAt(0, 0, 30, 100)]), [above(200)]))).toEqual([]);
});

test("a cut without direction is named, and without area there is nothing to cut", () => {
  const bar = sectionOfRegions([rectangleAt(0, 0, 30, 100)]);
  const faults = (s: typeof bar, cut: Parameters<typeof sectionCut>[1]) => {
    const r = sectionCut(s, cut);
    return r.ok ? [] : r.error.map((f) => [f.code, f.pointer]);
  };
  expect(faults(bar, [])).toEqual([["cut.badHalfPlane", "/halfPlanes/0"]]);
  expect(faults(bar, [above(1), { normal: { x: 0, y: 0 }, offset: 0 }])).toEqual([
    ["cut.badHalfPlane", "/halfPlanes/1"],
  ]);
  expect(faults(bar, [{ normal: { x: 1, y: 0 }, offset: Number.NaN }])).toEqual([
    ["cut.badHalfPlane", "/halfPlanes/0"],
  ]);
  expect(faults(sectionOfRegions([]), [above(0)])).toEqual([["section.noArea", undefined]]);
});
