import fc from "fast-check";
import type { Region } from "@/lib/geometry/region";
import { disc, put, rectangle } from "@/tests/helpers/parts";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

/** Two plates that touch along an edge: where they do and for how long, mm. */
export type TouchingPlates = Readonly<{
  plates: readonly [Region, Region];
  contact: number;
  area: number;
  perimeter: number;
}>;

/** Offset of the second plate's centre from the first one's along and across it, and how long they touch. */
const OFFSETS = {
  tee: (w: number, t: number, l: number, u: number, share: number) => ({
    turned: true,
    x: (share - 0.5) * (w - u),
    y: t / 2 + l / 2,
    contact: u,
  }),
  lap: (w: number, t: number, l: number, u: number, share: number) => {
    const contact = Math.min(w, l) * (0.05 + 0.9 * share);
    return { turned: false, x: (w + l) / 2 - contact, y: t / 2 + u / 2, contact };
  },
  corner: (w: number, t: number, l: number, u: number) => ({
    turned: true,
    x: w / 2 - u / 2,
    y: -t / 2 - l / 2,
    contact: u,
  }),
} as const;

/** Plates at any angle, somewhere in the drawing, whose touching edges are equal only up to rounding. */
export const touchingPlates = (kind: keyof typeof OFFSETS): fc.Arbitrary<TouchingPlates> =>
  fc
    .record({
      w: between(60, 3000),
      t: between(3, 60),
      l: between(50, 2500),
      u: between(3, 50),
      share: between(0.01, 0.99),
      angle: between(-180, 180),
      x: between(-5000, 5000),
      y: between(-5000, 5000),
    })
    .map(({ w, t, l, u, share, angle, x, y }) => {
      const { turned, contact, ...offset } = OFFSETS[kind](w, t, l, u, share);
      const [c, s] = [Math.cos((angle * Math.PI) / 180), Math.sin((angle * Math.PI) / 180)];
      const at = { x: x + c * offset.x - s * offset.y, y: y + s * offset.x + c * offset.y };
      return {
        plates: [
          put(rectangle(w, t), x, y, angle),
          put(rectangle(l, u), at.x, at.y, angle + (turned ? 90 : 0)),
        ],
        contact,
        area: w * t + l * u,
        perimeter: 2 * (w + t + l + u) - 2 * contact,
      };
    });

const outlineShape = between(0.2, 1).map((bulge): Region => ({
  outer: [
    { x: -40, y: -20, bulge: bulge / 3 },
    { x: 40, y: -20 },
    { x: 40, y: 20, bulge },
    { x: -40, y: 20, bulge: -bulge / 4 },
  ],
  holes: [],
}));

const shape: fc.Arbitrary<Region> = fc.oneof(
  fc.tuple(between(10, 120), between(4, 60)).map(([w, h]) => rectangle(w, h)),
  fc
    .tuple(fc.integer({ min: 1, max: 12 }), fc.integer({ min: 1, max: 12 }))
    .map(([w, h]) => rectangle(10 * w, 10 * h)),
  between(5, 50).map((r) => disc(r)),
  fc.tuple(between(10, 50), between(0.3, 0.95)).map(([r, share]) => disc(r, r * share)),
  outlineShape,
);

/** A few plates, rounds, tubes and outlines thrown together, some on round positions so that edges and corners coincide. */
export const assembly = (least: number, most: number): fc.Arbitrary<readonly Region[]> =>
  fc
    .array(
      fc.record({
        shape,
        x: fc.oneof(
          between(-60, 60),
          fc.integer({ min: -6, max: 6 }).map((k) => 10 * k),
        ),
        y: fc.oneof(
          between(-60, 60),
          fc.integer({ min: -6, max: 6 }).map((k) => 10 * k),
        ),
        angle: fc.oneof(between(-180, 180), fc.constantFrom(0, 30, 45, 90)),
      }),
      { minLength: least, maxLength: most },
    )
    .map((list) => list.map(({ shape: region, x, y, angle }) => put(region, x, y, angle)));
