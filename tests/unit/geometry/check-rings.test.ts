import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { edgeOf } from "@/lib/geometry/edge";
import { checkRings } from "@/lib/geometry/check-rings";
import { findCrossing } from "@/lib/geometry/find-crossing";
import { edgesMeet } from "@/lib/geometry/meet";
import type { Ring } from "@/lib/geometry/region";
import { reverseRing } from "@/lib/geometry/reverse-ring";
import { regionArea } from "@/lib/geometry/ring";
import { expectRel } from "@/tests/helpers/expect-rel";

const square: Ring = [
  { x: 0, y: 0 },
  { x: 10, y: 0 },
  { x: 10, y: 10 },
  { x: 0, y: 10 },
];
const codes = (rings: readonly Ring[]) => {
  const checked = checkRings(rings);
  return checked.ok ? [] : checked.error.map(({ code }) => code);
};

describe("checkRings", () => {
  test("directs the outline anticlockwise and holes clockwise, whichever way they were drawn", () => {
    const hole: Ring = [
      { x: 2, y: 2 },
      { x: 4, y: 2 },
      { x: 4, y: 4 },
    ];
    for (const outer of [square, reverseRing(square)]) {
      for (const inner of [hole, reverseRing(hole)]) {
        const checked = checkRings([outer, inner]);
        expect(checked.ok).toBe(true);
        if (checked.ok) expectRel(regionArea(checked.value), 98, { rel: 1e-15 });
      }
    }
  });

  test("drops edges without length and keeps the arc of the edge that remains", () => {
    const checked = checkRings([
      [
        { x: 0, y: 0 },
        { x: 0, y: 0, bulge: 1 },
        { x: 10, y: 0 },
        { x: 10, y: 0 },
      ],
    ]);
    expect(checked).toMatchObject({ ok: true, value: { outer: [{ bulge: 1 }, { x: 10 }] } });
  });

  test("refuses what is not finite, has too few points or no area", () => {
    expect(codes([[{ x: Number.NaN, y: 0 }, ...square]])).toEqual(["ring.notFinite"]);
    expect(codes([[{ x: 0, y: 0, bulge: Infinity }, ...square]])).toEqual(["ring.notFinite"]);
    expect(codes([square.slice(0, 2)])).toEqual(["ring.tooFewPoints"]);
    expect(codes([[...square.slice(0, 2), { x: 10, y: 0 }]])).toEqual(["ring.tooFewPoints"]);
    expect(codes([[...square.slice(0, 2), { x: 20, y: 0 }]])).toEqual(["ring.noArea"]);
    expect(codes([[]])).toEqual(["ring.tooFewPoints"]);
  });

  test("names both edges of a crossing by the vertices that were drawn", () => {
    const bow: Ring = [
      { x: 0, y: 0 },
      { x: 0, y: 0 },
      { x: 10, y: 10 },
      { x: 10, y: 0 },
      { x: 0, y: 20 },
    ];
    const checked = checkRings([bow]);
    expect(checked).toMatchObject({ ok: false, error: [{ code: "ring.selfCrossing", ring: 0, edge: 1 }] });
    if (!checked.ok)
      expect(checked.error[0]?.detail).toMatch(
        /vertex 2 to 3 of the outline.*vertex 4 to 5.*\(6\.667, 6\.667\)/,
      );
  });

  test.each<[string, Ring[]]>([
    [
      "an arc that bulges over another edge",
      [
        [
          { x: 0, y: 0, bulge: -1 },
          { x: 10, y: 0 },
          { x: 10, y: 4 },
          { x: 0, y: 4 },
        ],
      ],
    ],
    [
      "a vertex on another edge",
      [
        [
          { x: 0, y: 0 },
          { x: 10, y: 0 },
          { x: 10, y: 10 },
          { x: 5, y: 0 },
          { x: 0, y: 10 },
        ],
      ],
    ],
    [
      "two vertices on one point",
      [
        [
          { x: 0, y: 0 },
          { x: 4, y: 0 },
          { x: 2, y: 2 },
          { x: 4, y: 4 },
          { x: 0, y: 4 },
          { x: 2, y: 2 },
        ],
      ],
    ],
    ["an edge that doubles back", [[...square.slice(0, 3), { x: 10, y: 5 }, { x: 0, y: 5 }]]],
    ["a hole across the outline", [square, square.map((v) => ({ x: v.x + 5, y: v.y + 5 }))]],
    [
      "a hole along the outline",
      [
        square,
        [
          { x: 2, y: 0 },
          { x: 4, y: 0 },
          { x: 3, y: 2 },
        ],
      ],
    ],
  ])("refuses %s", (_, rings) => {
    expect(codes(rings)).toEqual(["ring.selfCrossing"]);
  });

  test("refuses a hole outside and a hole in a hole", () => {
    const small = square.map((v) => ({ x: 3 + v.x / 10, y: 3 + v.y / 10 }));
    const middle = square.map((v) => ({ x: 2 + v.x / 2, y: 2 + v.y / 2 }));
    expect(codes([square, small.map((v) => ({ x: v.x + 20, y: v.y }))])).toEqual(["ring.holeOutside"]);
    expect(codes([square, middle, small])).toEqual(["ring.holeInHole"]);
  });

  test("takes fillets, full circles and slots, where edges touch smoothly", () => {
    const circle: Ring = [
      { x: 5, y: 0, bulge: 1 },
      { x: -5, y: 0, bulge: 1 },
    ];
    const slot: Ring = [
      { x: -20, y: -5 },
      { x: 20, y: -5, bulge: 1 },
      { x: 20, y: 5 },
      { x: -20, y: 5, bulge: 1 },
    ];
    const q = Math.SQRT2 - 1;
    const fillet: Ring = [
      { x: 0, y: 0 },
      { x: 100, y: 0 },
      { x: 100, y: 10 },
      { x: 22, y: 10, bulge: -q },
      { x: 10, y: 22 },
      { x: 10, y: 100 },
      { x: 0, y: 100 },
    ];
    for (const ring of [circle, slot, fillet]) expect(codes([ring])).toEqual([]);
  });

  test("answers 20,000 vertices of a diagonal comb without comparing every pair", () => {
    const teeth = Array.from({ length: 5_000 }, (_, i) => [
      { x: i, y: i },
      { x: i + 5_000.2, y: i - 5_000 },
      { x: i + 5_000.5, y: i - 4_999.7 },
      { x: i + 0.5, y: i + 0.5 },
    ]).flat();
    const comb: Ring = [...teeth, { x: -10, y: 5_010 }];
    expect(findCrossing([comb], 1e-6)).toBeNull();
  });
});

test("the sweep finds a crossing exactly where comparing every pair of edges does", () => {
  const vertex = fc.record({
    x: fc.integer({ min: 0, max: 40 }),
    y: fc.integer({ min: 0, max: 40 }),
    bulge: fc.constantFrom(0, 0, 0.3, -0.5, 1),
  });
  const neighbours = (i: number, k: number, n: number) => (i + 1) % n === k || (k + 1) % n === i;
  fc.assert(
    fc.property(fc.array(vertex, { minLength: 3, maxLength: 9 }), (ring) => {
      const distinct = ring.every((v, i) => ring.findIndex((w) => w.x === v.x && w.y === v.y) === i);
      fc.pre(distinct);
      const edges = ring.map((v, i) => edgeOf(v, ring[(i + 1) % ring.length] ?? v));
      const far = edges.some((a, i) =>
        edges.some((b, k) => i < k && !neighbours(i, k, ring.length) && edgesMeet(a, b, 1e-7).length > 0),
      );
      const found = findCrossing([ring], 1e-7);
      if (far) expect(found).not.toBeNull();
      if (found !== null && !far) expect(neighbours(found.a.edge, found.b.edge, ring.length)).toBe(true);
    }),
    { numRuns: 3_000 },
  );
});
