import { centralMoments } from "@/lib/geometry/moments";
import type { Region } from "@/lib/geometry/region";
import { sectionProperties } from "@/lib/section/section-properties";
import { partOf, rectangleAt, sectionOfParts } from "@/tests/helpers/sections";

/** How many times a plain shoelace loop over the same edges a computation takes; `limit` null where none is promised. */
export type Ratio = Readonly<{ name: string; ratio: number; limit: number | null }>;

const girder: readonly Region[] = [
  rectangleAt(-225, 0, 450, 30),
  rectangleAt(-5, 30, 10, 1200),
  rectangleAt(-125, 1230, 250, 20),
  rectangleAt(-150, 1250, 300, 15),
  ...[200, 500, 800, 1100].flatMap((y) => [rectangleAt(5, y, 120, 12), rectangleAt(-125, y, 120, 12)]),
];

/** An outline of so many straight edges, in and out forty times. */
export const star = (vertices: number): readonly Region[] => [
  {
    outer: Array.from({ length: vertices }, (_, i) => {
      const [r, angle] = [500 + 100 * Math.sin((40 * Math.PI * i) / vertices), (2 * Math.PI * i) / vertices];
      return { x: r * Math.cos(angle), y: r * Math.sin(angle) };
    }),
    holes: [],
  },
];

/** Area of straight outlines by the plainest loop, mm²: what other times are measured against. */
export const shoelace = (regions: readonly Region[]): number => {
  let twice = 0;
  for (const { outer } of regions) {
    let from = outer[outer.length - 1];
    for (const to of outer) {
      if (from !== undefined) twice += from.x * to.y - to.x * from.y;
      from = to;
    }
  }
  return twice / 2;
};

const ROUNDS = 25;
const ROUND_MS = 8;

/** Processor time, ms: waiting on a shared machine is not ours, and would end the warming up too soon. */
const processorTime = (): number => {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1e3;
};

/** Least processor time of one call in ms over rounds that are long against the clock. */
export const leastTime = (call: () => unknown, rounds = ROUNDS): number => {
  let calls = 1;
  const run = () => {
    const start = processorTime();
    for (let i = 0; i < calls; i += 1) call();
    return processorTime() - start;
  };
  while (run() < ROUND_MS) calls *= 2;
  return Math.min(...Array.from({ length: rounds }, run)) / calls;
};

/**
 * Moments to third order (area, centroid, I, and what monosymmetry needs) of a 12-part girder and of an outline of 10,000
 * vertices, promised to take at most 15 times a plain shoelace loop; the whole of the area properties, with extreme fibres
 * and the four plastic axes, beside them for information.
 */
export const areaMomentRatios = (): readonly Ratio[] =>
  (
    [
      ["12-part girder", girder],
      ["outline of 10,000 vertices", star(10_000)],
    ] as const
  ).flatMap(([name, regions]): readonly Ratio[] => {
    const sets = regions.map((region) => ({ regions: [region], weight: 1 }));
    const section = sectionOfParts(regions.map((region, i) => partOf([region], { id: `p${i}` })));
    const plain = leastTime(() => shoelace(regions));
    return [
      { name: `moments, ${name}`, ratio: leastTime(() => centralMoments(sets)) / plain, limit: 15 },
      {
        name: `all area properties, ${name}`,
        ratio: leastTime(() => sectionProperties(section)) / plain,
        limit: null,
      },
    ];
  });
