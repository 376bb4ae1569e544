import type { Point } from "@/lib/geometry/region";
import type { Box, DisplayList } from "@/lib/figure/display-list";

/** Where the drawing's origin lies on the screen (px, y down) and how large a millimetre is. The only place y is flipped. */
export type View = Readonly<{ pxPerMm: number; xPx: number; yPx: number }>;

export const toScreen = (view: View, p: Point): Point => ({
  x: view.xPx + p.x * view.pxPerMm,
  y: view.yPx - p.y * view.pxPerMm,
});

export const toDrawing = (view: View, p: Point): Point => ({
  x: (p.x - view.xPx) / view.pxPerMm,
  y: (view.yPx - p.y) / view.pxPerMm,
});

export type Margin = DisplayList["marginPx"];
export const NO_MARGIN: Margin = { left: 0, right: 0, top: 0, bottom: 0 };

/** The largest scale at which the box and its margins fit a sheet of the given size. */
export const fittingScale = (box: Box, widthPx: number, heightPx: number, margin: Margin): number => {
  const width = Math.max(box.xMax - box.xMin, 1e-3);
  const height = Math.max(box.yMax - box.yMin, 1e-3);
  const free = (size: number, a: number, b: number) => Math.max(size - a - b, size * 0.2, 1);
  return Math.min(
    free(widthPx, margin.left, margin.right) / width,
    free(heightPx, margin.top, margin.bottom) / height,
  );
};

/** A view at the given scale with the box and its margins centred on the sheet. */
export const centredView = (
  box: Box,
  pxPerMm: number,
  widthPx: number,
  heightPx: number,
  margin: Margin,
): View => ({
  pxPerMm,
  xPx: (widthPx + margin.left - margin.right) / 2 - ((box.xMin + box.xMax) / 2) * pxPerMm,
  yPx: (heightPx + margin.top - margin.bottom) / 2 + ((box.yMin + box.yMax) / 2) * pxPerMm,
});

/** A view zoomed by `factor` about a point of the screen that stays where it is. */
export const zoomedView = (view: View, at: Point, factor: number): View => ({
  pxPerMm: view.pxPerMm * factor,
  xPx: at.x - (at.x - view.xPx) * factor,
  yPx: at.y - (at.y - view.yPx) * factor,
});
