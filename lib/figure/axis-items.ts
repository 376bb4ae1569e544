import type { Point } from "@/lib/geometry/region";
import type { SectionProperties } from "@/lib/section/properties";
import type { Box, FigureItem } from "@/lib/figure/display-list";

export type AxisProperties = Pick<
  SectionProperties,
  "centroid" | "angle" | "I1" | "I2" | "pna" | "shearCentre" | "unsymmetrical"
>;

/** Principal axes are drawn only where they differ from x–x or y–y by more than this. */
const PRINCIPAL_FROM_DEG = 0.1;

/** Axes through the centroid, `pastPx` beyond the material so that their letters clear the dimensions, plastic neutral axis, centroid and shear centre. */
export const axisItems = (p: AxisProperties, bounds: Box, pxPerMm: number, pastPx: number): FigureItem[] => {
  const past = pastPx / pxPerMm;
  const { centroid } = p;
  const half = Math.max(centroid.x - bounds.xMin, bounds.xMax - centroid.x) + past;
  const items: FigureItem[] = [
    {
      kind: "line",
      role: "axis",
      from: { x: centroid.x - half, y: centroid.y },
      to: { x: centroid.x + half, y: centroid.y },
      startLabel: "x",
      endLabel: "x",
    },
    {
      kind: "line",
      role: "axis",
      from: { x: centroid.x, y: bounds.yMin - 30 / pxPerMm },
      to: { x: centroid.x, y: bounds.yMax + 26 / pxPerMm },
      startLabel: "y",
      endLabel: "y",
    },
  ];
  const lean = Math.abs(p.angle) % 90;
  const differ =
    Math.abs(p.I1 - p.I2) > 1e-9 * (p.I1 + p.I2) && Math.min(lean, 90 - lean) > PRINCIPAL_FROM_DEG;
  if (differ) {
    const side = 56 / pxPerMm;
    const above = 22 / pxPerMm;
    const reach: Box = {
      xMin: bounds.xMin - side,
      xMax: bounds.xMax + side,
      yMin: bounds.yMin - above,
      yMax: bounds.yMax + above,
    };
    items.push(through(centroid, p.angle, reach, "1"), through(centroid, p.angle + 90, reach, "2"));
  }
  if (p.pna && Math.abs(p.pna.y - centroid.y) * pxPerMm > 3)
    items.push({
      kind: "line",
      role: "plastic",
      from: { x: bounds.xMin - 20 / pxPerMm, y: p.pna.y },
      to: { x: bounds.xMax + 40 / pxPerMm, y: p.pna.y },
      startLabel: "PNA",
    });
  if (p.shearCentre && Math.hypot(p.shearCentre.x - centroid.x, p.shearCentre.y - centroid.y) * pxPerMm > 3)
    items.push({ kind: "mark", mark: "shear-centre", at: p.shearCentre, label: "SC" });
  items.push({ kind: "mark", mark: "centroid", at: centroid, label: "C" });
  return items;
};

/** A line through a point, ended where it leaves the box. */
const through = (c: Point, deg: number, box: Box, label: string): FigureItem => {
  const turn = (deg * Math.PI) / 180;
  const d = { x: Math.cos(turn), y: Math.sin(turn) };
  const along = (from: number, to: number, step: number) =>
    Math.abs(step) < 1e-9 ? Infinity : Math.max((from - to) / step, 0);
  const forward = Math.min(
    along(d.x > 0 ? box.xMax : box.xMin, c.x, d.x),
    along(d.y > 0 ? box.yMax : box.yMin, c.y, d.y),
  );
  const back = Math.min(
    along(d.x > 0 ? box.xMin : box.xMax, c.x, -d.x),
    along(d.y > 0 ? box.yMin : box.yMax, c.y, -d.y),
  );
  return {
    kind: "line",
    role: "principal",
    from: { x: c.x - d.x * back, y: c.y - d.y * back },
    to: { x: c.x + d.x * forward, y: c.y + d.y * forward },
    endLabel: label,
  };
};
