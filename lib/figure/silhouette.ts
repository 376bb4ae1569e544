import type { Ring } from "@/lib/geometry/region";
import type { Section } from "@/lib/section/section";
import { ringsOf } from "@/lib/figure/compose-figure";
import { boxOfRings, pathData } from "@/lib/figure/outline";

export type Silhouette = Readonly<{
  /** SVG path data in mm: left edge at x = 0, underside at y = 0, y down (so the shape lies at y ≤ 0); even-odd. */
  path: string;
  widthMm: number;
  heightMm: number;
}>;

/** One compact path of the rings, so that rows can stand at one common scale on their rule. */
export const silhouetteOfRings = (rings: readonly Ring[]): Silhouette | null => {
  const box = boxOfRings(rings);
  if (!box) return null;
  const view = { pxPerMm: 1, xPx: -box.xMin, yPx: box.yMin };
  return {
    path: rings.map((ring) => pathData(ring, view)).join(""),
    widthMm: box.xMax - box.xMin,
    heightMm: box.yMax - box.yMin,
  };
};

/** The outline of a section, all parts united, as one path. */
export const silhouetteOf = (section: Section): Silhouette | null =>
  silhouetteOfRings(ringsOf(section.outline));
