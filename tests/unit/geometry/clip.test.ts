import { describe, expect, test } from "vitest";
import type { Polygons } from "@/lib/geometry/clip";
import { cutPolygons, onGrids, polygonsArea } from "@/lib/geometry/clip";
import { SNAP_STEPS_MM } from "@/lib/geometry/tolerance";
import { expectRel } from "@/tests/helpers/expect-rel";

const box = (x: number, y: number, width: number, height: number): Polygons => [
  [
    [
      [x, y],
      [x + width, y],
      [x + width, y + height],
      [x, y + height],
    ],
  ],
];

describe("clipping", () => {
  test("a cut gives what lies outside and inside, whether or not the cutters overlap each other", () => {
    const cut = cutPolygons(box(0, 0, 100, 50), [box(-10, -10, 30, 30), box(10, 10, 30, 30)]);
    if (!cut.ok) throw new Error(cut.error.detail);
    expectRel(polygonsArea(cut.value.value.common), 400 + 900 - 100, { rel: 1e-12 });
    expectRel(polygonsArea(cut.value.value.rest), 5000 - 1200, { rel: 1e-12 });
    expect(cut.value.stepMm).toBe(SNAP_STEPS_MM[0]);
  });

  test("areas that do not add up are refused: a polygon that crosses itself", () => {
    const bow: Polygons = [
      [
        [
          [0, 0],
          [10, 10],
          [10, 0],
          [0, 20],
        ],
      ],
    ];
    expect(cutPolygons(bow, [box(-5, -5, 50, 50)])).toMatchObject({
      ok: false,
      error: { code: "clip.failed" },
    });
  });

  test("a throw becomes a coarser grid, and the last one a value with its reason", () => {
    const steps: number[] = [];
    const second = onGrids((step) => {
      steps.push(step);
      if (steps.length < 2) throw new Error("no");
      return steps.length < 3 ? null : "done";
    });
    expect(second).toEqual({ ok: true, value: { value: "done", stepMm: SNAP_STEPS_MM[2] } });
    expect(steps).toEqual(SNAP_STEPS_MM.slice(0, 3));
    const never = onGrids(() => {
      throw new Error("sweep line lost its way");
    });
    expect(never).toMatchObject({ ok: false, error: { code: "clip.failed" } });
    if (!never.ok) expect(never.error.detail).toContain("sweep line lost its way");
  });
});
