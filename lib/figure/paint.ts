import type { DisplayList } from "@/lib/figure/display-list";
import { strokesOf } from "@/lib/figure/strokes";
import type { Stroke } from "@/lib/figure/stroke";
import { centredView } from "@/lib/figure/view";

/** A display list centred on a sheet of the given size, as strokes in px. */
export const paintedStrokes = (list: DisplayList, widthPx: number, heightPx: number): Stroke[] => {
  const view = centredView(list.bounds, list.pxPerMm, widthPx, heightPx, list.marginPx);
  return list.items.flatMap((item) => strokesOf(item, view));
};
