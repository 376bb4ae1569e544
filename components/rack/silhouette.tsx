import { cx } from "@/components/ui/cx";
import { shapeRegions } from "@/lib/drawing/part-regions";
import type { Drawing } from "@/lib/drawing/schema";
import { silhouetteOfRings, type Silhouette } from "@/lib/figure/silhouette";
import { placeRegion } from "@/lib/geometry/ring";

const drawn = new WeakMap<Drawing, Silhouette | null>();

/** The outline of a drawing for a row: parts laid side by side, cut-outs as holes by the even-odd rule. */
function silhouetteOfDrawing(drawing: Drawing): Silhouette | null {
  const known = drawn.get(drawing);
  if (known !== undefined) return known;
  const rings = drawing.parts.flatMap((part) => {
    const regions = shapeRegions(part.shape);
    if (!regions.ok) return [];
    return regions.value.flatMap((region) => {
      const placed = placeRegion(region, part);
      return [placed.outer, ...placed.holes];
    });
  });
  const silhouette = silhouetteOfRings(rings);
  drawn.set(drawing, silhouette);
  return silhouette;
}

type RowSilhouetteProps = Readonly<{
  drawing: Drawing | undefined;
  pxPerMm: number;
  width: number;
  height: number;
  inHand?: boolean;
}>;

/** A shape standing on the rule of its row, at the scale all rows share. */
export function RowSilhouette({ drawing, pxPerMm, width, height, inHand }: RowSilhouetteProps) {
  const silhouette = drawing && silhouetteOfDrawing(drawing);
  return (
    <svg
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      aria-hidden
      className={cx("block", inHand ? "text-oxide-ink" : "text-ink in-[[aria-selected=true]]:text-oxide-ink")}
    >
      {silhouette && (
        <path
          d={silhouette.path}
          transform={`translate(${width / 2 - (silhouette.widthMm * pxPerMm) / 2} ${height - 0.5}) scale(${pxPerMm})`}
          fill="currentColor"
          fillRule="evenodd"
          stroke="currentColor"
          strokeWidth={0.9}
          vectorEffect="non-scaling-stroke"
        />
      )}
    </svg>
  );
}

/** Scale at which the largest of the shapes still fits a row. */
export const commonScale = (
  sizes: readonly Readonly<{ depth: number; width: number }>[],
  width: number,
  height: number,
): number =>
  sizes.reduce((scale, s) => Math.min(scale, (height - 1.5) / s.depth, (width - 2) / s.width), 0.12);
