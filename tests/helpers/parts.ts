import { arrange } from "@/lib/geometry/arrange";
import type { Arrangement, ArrangeCutout, ArrangePart } from "@/lib/geometry/arrange-types";
import type { Region, Ring } from "@/lib/geometry/region";
import { placeRegion, regionArea } from "@/lib/geometry/ring";

/** A rectangle about (0, 0), anticlockwise, mm. */
export const rectangle = (width: number, height: number): Region => ({
  outer: [
    { x: -width / 2, y: -height / 2 },
    { x: width / 2, y: -height / 2 },
    { x: width / 2, y: height / 2 },
    { x: -width / 2, y: height / 2 },
  ],
  holes: [],
});

const circle = (radius: number, way: 1 | -1): Ring => [
  { x: radius, y: 0, bulge: way },
  { x: -radius, y: 0, bulge: way },
];

/** A disc about (0, 0), or a tube where a bore is given; radii in mm. */
export const disc = (radius: number, bore?: number): Region => ({
  outer: circle(radius, 1),
  holes: bore === undefined ? [] : [circle(bore, -1)],
});

/** The region turned by degrees and then moved. */
export const put = (region: Region, x: number, y: number, angle = 0): Region =>
  placeRegion(region, { at: { x, y }, angle });

/** A stiff part of steel. */
export const partOf = (
  id: string,
  regions: readonly Region[],
  more: Partial<ArrangePart> = {},
): ArrangePart => ({
  id,
  name: id.toUpperCase(),
  material: "steel",
  strength: 355,
  stiff: true,
  regions,
  ...more,
});

export const cutoutOf = (id: string, regions: readonly Region[]): ArrangeCutout => ({
  id,
  name: id.toUpperCase(),
  regions,
});

/** The arrangement, or an error that tells the faults. */
export const arranged = (
  parts: readonly ArrangePart[],
  cutouts: readonly ArrangeCutout[] = [],
): Arrangement => {
  const result = arrange(parts, cutouts);
  if (!result.ok) throw new Error(JSON.stringify(result.error));
  return result.value;
};

export const areaOf = (regions: readonly Region[]): number =>
  regions.reduce((sum, region) => sum + regionArea(region), 0);
