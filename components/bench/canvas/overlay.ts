import type { Box } from "@/lib/geometry/arc";
import type { Point, Ring, Vertex } from "@/lib/geometry/region";
import { pathData } from "@/lib/figure/outline";
import { LINES, type Stroke } from "@/lib/figure/stroke";
import { toScreen, type View } from "@/lib/figure/view";
import type { SnapHit } from "@/lib/drawing/snap";
import type { Size } from "@/components/bench/canvas/use-size";

export type Flag = Readonly<{ at: Point; head: string; note: string }>;

/** What lies over the figure while the hand works: nothing of it is part of the drawing. */
export type Overlay = Readonly<{
  hits: readonly SnapHit[];
  flag: Flag | null;
  ghost: readonly Ring[];
  band: Box | null;
  /** Vertices set so far and the one under the pointer. */
  draft: readonly Vertex[];
  measure: readonly [Point, Point] | null;
}>;

export const NO_OVERLAY: Overlay = { hits: [], flag: null, ghost: [], band: null, draft: [], measure: null };

const square = (p: Point, half: number) =>
  `M${p.x - half} ${p.y - half}H${p.x + half}V${p.y + half}H${p.x - half}Z`;

/** Guides along the lines met, a diamond where they cross, the outline before the move, the band and what is being drawn. */
export const overlayStrokes = (overlay: Overlay, view: View, size: Size): Stroke[] => {
  const strokes: Stroke[] = overlay.ghost.map((ring) => ({
    kind: "path",
    data: pathData(ring, view),
    fill: null,
    ...LINES.ghost,
  }));
  for (const hit of overlay.hits.filter((h) => h.kind !== "grid")) {
    const p = toScreen(view, { x: hit.at, y: hit.at });
    const data = hit.axis === "x" ? `M${p.x} 0V${size.height}` : `M0 ${p.y}H${size.width}`;
    strokes.push({ kind: "path", data, fill: null, ...LINES.guide });
  }
  if (overlay.band) {
    const a = toScreen(view, { x: overlay.band.xMin, y: overlay.band.yMax });
    const b = toScreen(view, { x: overlay.band.xMax, y: overlay.band.yMin });
    strokes.push({ kind: "path", data: `M${a.x} ${a.y}H${b.x}V${b.y}H${a.x}Z`, fill: null, ...LINES.guide });
  }
  if (overlay.draft.length > 0) {
    strokes.push({ kind: "path", data: pathData(overlay.draft, view, false), fill: null, ...LINES.hand });
    for (const v of overlay.draft)
      strokes.push({
        kind: "path",
        data: square(toScreen(view, v), 3.5),
        fill: "sheet",
        line: "oxide",
        widthPx: 1.5,
        dashPx: null,
      });
  }
  if (overlay.measure) {
    const [a, b] = overlay.measure.map((p) => toScreen(view, p)) as [Point, Point]; // safe: a pair maps to a pair
    strokes.push({
      kind: "path",
      data: `M${a.x} ${a.y}L${b.x} ${b.y}`,
      fill: null,
      ...LINES["dimension-hand"],
    });
    for (const p of [a, b])
      strokes.push({
        kind: "path",
        data: `M${p.x - 4} ${p.y + 4}L${p.x + 4} ${p.y - 4}`,
        fill: null,
        line: "oxide-ink",
        widthPx: 1.6,
        dashPx: null,
      });
  }
  if (overlay.flag) {
    const p = toScreen(view, overlay.flag.at);
    strokes.push({
      kind: "path",
      data: `M${p.x} ${p.y - 6}L${p.x + 6} ${p.y}L${p.x} ${p.y + 6}L${p.x - 6} ${p.y}Z`,
      fill: "sheet",
      line: "oxide",
      widthPx: 1.5,
      dashPx: null,
    });
  }
  return strokes;
};

/** Squares on the corners and edge middles of a part in hand. */
export const handleStrokes = (points: readonly Point[], view: View): Stroke[] =>
  points.map((p) => ({
    kind: "path",
    data: square(toScreen(view, p), 3.5),
    fill: "sheet",
    line: "oxide",
    widthPx: 1.5,
    dashPx: null,
  }));
