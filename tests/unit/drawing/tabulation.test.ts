import fc from "fast-check";
import { expect, test } from "vitest";
import { computeProperties } from "@/lib/drawing/compute-properties";
import { newDrawing, SOFTWOOD, STEEL } from "@/lib/drawing/new-drawing";
import type { Drawing, DrawingPart } from "@/lib/drawing/schema";
import { sectionOf } from "@/lib/drawing/section-of";
import { tabulate } from "@/lib/drawing/tabulation";
import { expectRel } from "@/tests/helpers/expect-rel";
import { girder } from "@/tests/helpers/drawings";

const size = fc.double({ min: 5, max: 400, noNaN: true });
/** Parts in lanes of their own, so that they never overlap. */
const part = (i: number) =>
  fc
    .record({
      a: size,
      b: size,
      y: fc.double({ min: -500, max: 500, noNaN: true }),
      kind: fc.nat(2),
      wood: fc.boolean(),
    })
    .map(({ a, b, y, kind, wood }): DrawingPart => ({
      id: `p${i}`,
      name: `Part ${i}`,
      material: wood ? "softwood" : "steel",
      at: { x: i * 1000, y },
      angle: kind === 1 ? 37 : 0,
      shape:
        kind === 2 ? { kind: "round", diameter: a, wall: a * 0.2 } : { kind: "plate", width: a, height: b },
    }));
const drawing: fc.Arbitrary<Drawing> = fc
  .integer({ min: 1, max: 8 })
  .chain((n) => fc.tuple(...Array.from({ length: n }, (_, i) => part(i))))
  .map((parts) => ({ ...newDrawing(), materials: [STEEL, SOFTWOOD], parts }));

// Two ways of summing the same double-precision terms; 1e-10 leaves room for cancellation in the centroid.
const REL = 1e-10;

test("the tabulation's sums are the engine's values for 50 random drawings, about both axes", () => {
  fc.assert(
    fc.property(drawing, (d) => {
      const [section, properties] = [sectionOf(d), computeProperties(d)];
      if (!section.ok || !properties.ok) throw new Error("random drawings are valid");
      const p = properties.value;
      for (const [axis, inertia, centroid] of [
        ["x", p.Ix, p.centroid.y],
        ["y", p.Iy, p.centroid.x],
      ] as const) {
        const t = tabulate(section.value, axis);
        if (!t.ok) throw new Error(t.error.detail);
        expectRel(t.value.sum.area, p.area, { rel: REL });
        expectRel(t.value.centroid, centroid, { rel: REL, scale: 1000 });
        expectRel(t.value.inertia, inertia, { rel: REL });
        expectRel(t.value.sum.areaDistance2 + t.value.sum.own, inertia, { rel: REL });
      }
    }),
    { numRuns: 50 },
  );
});

test("each line can be followed by hand: the top flange of a girder", () => {
  const section = sectionOf(girder());
  if (!section.ok) throw new Error("the girder is valid");
  const t = tabulate(section.value, "x");
  if (!t.ok) throw new Error(t.error.detail);
  const row = t.value.rows[0];
  expectRel(row?.area ?? null, 420 * 36, { rel: 1e-12 });
  expectRel(row?.at ?? null, 614, { rel: 1e-12 });
  expectRel(row?.firstMoment ?? null, 420 * 36 * 614, { rel: 1e-12 });
  expectRel(row?.own ?? null, (420 * 36 ** 3) / 12, { rel: 1e-12 });
  expect(t.value.transformed).toBe(false);
});
