import { sectionOf } from "@/lib/drawing/section-of";
import type { Drawing } from "@/lib/drawing/schema";
import { arrange } from "@/lib/geometry/arrange";
import { checkRings } from "@/lib/geometry/check-rings";
import type { Region } from "@/lib/geometry/region";
import { disc, partOf, put } from "@/tests/helpers/parts";
import type { Ratio } from "@/tests/performance/area-moments";
import { leastTime, shoelace, star } from "@/tests/performance/area-moments";

const plate = (
  id: string,
  x: number,
  y: number,
  width: number,
  height: number,
): Drawing["parts"][number] => ({
  id,
  name: id,
  material: "s355",
  at: { x, y },
  angle: 0,
  shape: { kind: "plate", width, height },
});

const girder: Drawing = {
  version: 1,
  unit: "mm",
  reference: "s355",
  materials: [{ id: "s355", name: "S355", E: 210_000, G: 81_000, fy: 355, density: 7850 }],
  parts: [
    plate("bottom", 0, 15, 450, 30),
    plate("web", 0, 630, 10, 1200),
    plate("top", 0, 1240, 250, 20),
    plate("cap", 0, 1257.5, 300, 15),
    ...[200, 500, 800, 1100].flatMap((y) => [
      plate(`r${y}`, 65, y, 120, 12),
      plate(`l${y}`, -65, y, 120, 12),
    ]),
  ],
  joints: [],
};

const girderRegions: readonly Region[] = girder.parts.flatMap(({ shape, at }) =>
  shape.kind === "plate"
    ? [
        {
          outer: [
            { x: at.x - shape.width / 2, y: at.y - shape.height / 2 },
            { x: at.x + shape.width / 2, y: at.y - shape.height / 2 },
            { x: at.x + shape.width / 2, y: at.y + shape.height / 2 },
            { x: at.x - shape.width / 2, y: at.y + shape.height / 2 },
          ],
          holes: [],
        },
      ]
    : [],
);

/** Two touching halves of a star outline: every vertex of the one side lies on its neighbour's seam or outside. */
const halves = (vertices: number) => {
  const ring = star(vertices)[0]?.outer ?? [];
  const middle = Math.floor(ring.length / 2);
  const [first, opposite] = [ring[0], ring[middle]];
  if (first === undefined || opposite === undefined) return [];
  return [ring.slice(0, middle + 1), [opposite, ...ring.slice(middle + 1), first]].map((outer, i) =>
    partOf(`half ${i}`, [{ outer, holes: [] }]),
  );
};

const tubes = [partOf("a", [disc(109.55, 101.55)]), partOf("b", [put(disc(109.55, 101.55), 140, 20)])];

/** A fourfold outline may take at most this many times as long: n log n takes 4.7 times, n² sixteen. */
const FOURFOLD_LIMIT = 8;

/** Calls that take tens of milliseconds need few rounds. */
const FEW = 7;

const growth = (run: (vertices: number) => () => unknown): number =>
  leastTime(run(20_000), FEW) / leastTime(run(5_000), FEW);

/**
 * What arranging costs, as multiples of a plain shoelace loop over the same edges, and how it grows with the number of
 * vertices, where a limit is promised: nothing grows faster than n log n.
 */
export const arrangementRatios = (): readonly Ratio[] => {
  const outline = star(20_000);
  const plain = leastTime(() => shoelace(outline));
  const checked = (vertices: number) => {
    const rings = star(vertices).map(({ outer }) => outer);
    return () => checkRings(rings);
  };
  const arranged = (vertices: number) => {
    const parts = halves(vertices);
    return () => arrange(parts, []);
  };
  return [
    {
      name: "drawing to section, 12-part girder",
      ratio: leastTime(() => sectionOf(girder)) / leastTime(() => shoelace(girderRegions)),
      limit: null,
    },
    {
      name: "outline of 20,000 vertices checked",
      ratio: leastTime(checked(20_000), FEW) / plain,
      limit: null,
    },
    {
      name: "two touching halves of 20,000 vertices arranged",
      ratio: leastTime(arranged(20_000), FEW) / plain,
      limit: null,
    },
    {
      name: "two overlapping tubes against 20,000 straight edges",
      ratio: leastTime(() => arrange(tubes, []), FEW) / plain,
      limit: null,
    },
    { name: "checking, 20,000 vertices against 5,000", ratio: growth(checked), limit: FOURFOLD_LIMIT },
    { name: "arranging, 20,000 vertices against 5,000", ratio: growth(arranged), limit: FOURFOLD_LIMIT },
  ];
};
