import type { Point, Region, Ring } from "@/lib/geometry/region";
import { rectangleAt } from "@/tests/helpers/sections";

const ring = (...points: readonly (readonly [number, number])[]): Ring => points.map(([x, y]) => ({ x, y }));
const solid = (...points: readonly (readonly [number, number])[]): Region => ({
  outer: ring(...points),
  holes: [],
});
const hole = (x0: number, y0: number, x1: number, y1: number): Ring =>
  ring([x0, y0], [x0, y1], [x1, y1], [x1, y0]);

/** A shape of known torsion properties, mm; J in mm⁴, Cw in mm⁶, S in the shape's axes. */
export type ReferenceShape = Readonly<{ name: string; region: Region; J: number; S: Point; Cw: number }>;

const girder = (
  web: number,
  tw: number,
  bottom: readonly [number, number],
  top: readonly [number, number],
): Region => {
  const [b1, t1] = bottom;
  const [b2, t2] = top;
  const h = t1 + web + t2;
  return solid(
    [-b1 / 2, 0],
    [b1 / 2, 0],
    [b1 / 2, t1],
    [tw / 2, t1],
    [tw / 2, t1 + web],
    [b2 / 2, t1 + web],
    [b2 / 2, h],
    [-b2 / 2, h],
    [-b2 / 2, t1 + web],
    [-tw / 2, t1 + web],
    [-tw / 2, t1],
    [-b1 / 2, t1],
  );
};

const box = (): Region => ({
  outer: ring(
    [-450, 0],
    [450, 0],
    [450, 25],
    [400, 25],
    [400, 1525],
    [600, 1525],
    [600, 1545],
    [-600, 1545],
    [-600, 1525],
    [-400, 1525],
    [-400, 25],
    [-450, 25],
  ),
  holes: [hole(-388, 25, 388, 1525)],
});

/**
 * Torsion reference values: finite elements of degree 8 on meshes graded to 1e-8 at the corners; upper and lower bound of
 * J agree to 1e-9 or better, all digits given are safe. Rectangles agree with the series of Timoshenko & Goodier,
 * Theory of Elasticity, art. 109, to 1e-14; the triangle is √3·a⁴/80 (same, art. 106).
 */
export const REFERENCE_SHAPES: readonly ReferenceShape[] = [
  {
    name: "square 100",
    region: rectangleAt(0, 0, 100, 100),
    J: 14057701.5,
    S: { x: 50, y: 50 },
    Cw: 134402345.6,
  },
  {
    name: "plate 100 × 10",
    region: rectangleAt(0, 0, 100, 10),
    J: 31232.50375,
    S: { x: 50, y: 5 },
    Cw: 6642911.093,
  },
  {
    name: "plate 2500 × 8",
    region: rectangleAt(0, 0, 2500, 8),
    J: 425806.1669,
    S: { x: 1250, y: 4 },
    Cw: 5.555283323e10,
  },
  {
    name: "equilateral triangle of side 100",
    region: solid([0, 0], [100, 0], [50, 50 * Math.sqrt(3)]),
    J: 2165063.509,
    S: { x: 50, y: 28.86751346 },
    Cw: 42957609.31,
  },
  {
    name: "block L",
    region: solid([0, 0], [100, 0], [100, 50], [50, 50], [50, 100], [0, 100]),
    J: 5351895.067,
    S: { x: 32.35323585, y: 32.35323585 },
    Cw: 1261786878,
  },
  {
    name: "angle 100 × 100 × 10",
    region: solid([0, 0], [100, 0], [100, 10], [10, 10], [10, 100], [0, 100]),
    J: 61957.41005,
    S: { x: 5.29598631, y: 5.29598631 },
    Cw: 46721167.26,
  },
  {
    name: "girder 2500 × 8, flanges 500 × 25",
    region: girder(2500, 8, [500, 25], [500, 25]),
    J: 5488109.919,
    S: { x: 0, y: 1275 },
    Cw: 8.301940927e14,
  },
  {
    name: "girder 1200 × 10, flanges 450 × 30 and 250 × 15",
    region: girder(1200, 10, [450, 30], [250, 15]),
    J: 4575934.144,
    S: { x: 0, y: 111.7910582 },
    Cw: 2.693203686e13,
  },
  {
    name: "channel 300 × 100 × 10 × 16",
    region: solid([0, 0], [100, 0], [100, 16], [10, 16], [10, 284], [100, 284], [100, 300], [0, 300]),
    J: 340928.8693,
    S: { x: -30.73837748, y: 150 },
    Cw: 8.004577831e10,
  },
  {
    name: "lipped channel 200 × 75 × 20 × 1.5",
    region: solid(
      [0, 0],
      [75, 0],
      [75, 20],
      [73.5, 20],
      [73.5, 1.5],
      [1.5, 1.5],
      [1.5, 198.5],
      [73.5, 198.5],
      [73.5, 180],
      [75, 180],
      [75, 200],
      [0, 200],
    ),
    J: 432.4043901,
    S: { x: -32.74049805, y: 100 },
    Cw: 3562627257,
  },
  {
    name: "zed 200, flanges 80, 6 thick",
    region: solid([-3, 0], [3, 0], [3, 194], [77, 194], [77, 200], [-3, 200], [-3, 6], [-77, 6], [-77, 0]),
    J: 24971.6282,
    S: { x: 0, y: 100 },
    Cw: 1.148401763e10,
  },
  {
    name: "box 1500 deep with overhanging plates",
    region: box(),
    J: 1.788739569e10,
    S: { x: 0, y: 810.1451917 },
    Cw: 1.260803914e15,
  },
  {
    name: "two cells 620 × 300",
    region: {
      outer: rectangleAt(0, 0, 620, 300).outer,
      holes: [hole(10, 12, 250, 288), hole(258, 12, 608, 288)],
    },
    J: 811512838.3,
    S: { x: 310.2156824, y: 150 },
    Cw: 1.526589482e12,
  },
];
