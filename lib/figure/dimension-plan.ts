import type { Box, DimensionItem } from "@/lib/figure/display-list";
import type { FigurePart } from "@/lib/figure/figure-part";
import { dimensionTextBox } from "@/lib/figure/dimension-strokes";
import { figureWidthPx, overlap, Room, Rows, screenBox } from "@/lib/figure/place";

/** First row of dimensions beside the material and the step between rows, px. */
const FIRST_PX = 32;
const STEP_PX = 26;
const MAX_ROWS = 5;

export type DimensionPlan = Readonly<{
  items: readonly DimensionItem[];
  marginPx: Readonly<{ left: number; right: number; top: number; bottom: number }>;
}>;

type Interval = Readonly<{ low: number; high: number; across: number; part?: string; inHand: boolean }>;
type Side = "left" | "right" | "top" | "bottom";

type Input = Readonly<{
  parts: readonly FigurePart[];
  bounds: Box;
  pxPerMm: number;
  formatLength: (mm: number) => string;
  /** Axes that figures keep clear of. */
  axes: Readonly<{ x: number; y: number }> | null;
  /** Whether the height of the x–x axis is dimensioned at the right. */
  centroidDimension: boolean;
}>;

const same = (a: number, b: number, scale: number) => Math.abs(a - b) <= 1e-6 * scale;

/** The levels of a stack of parts that stand on one another from the lowest to the highest edge; empty when there is none. */
const stackLevels = (parts: readonly FigurePart[], bounds: Box): number[] => {
  const size = bounds.yMax - bounds.yMin;
  const levels = [bounds.yMin];
  for (let at = bounds.yMin; !same(at, bounds.yMax, size);) {
    const next = parts.find((p) => same(p.box.yMin, at, size) && p.box.yMax - at > 1e-6 * size);
    if (!next) return [];
    for (const level of [...next.levels, next.box.yMax])
      if (level > at && !levels.some((l) => same(l, level, size))) levels.push(level);
    at = next.box.yMax;
  }
  return levels.sort((a, b) => a - b);
};

/**
 * Chain dimensions inside, overall ones outside, the rest in rows beside the material, so that no two figures collide:
 * rows are packed by interval, and a figure that finds no room is left to the parts table.
 */
export const planDimensions = (input: Input): DimensionPlan => {
  const { parts, bounds, pxPerMm, formatLength } = input;
  const items: DimensionItem[] = [];
  const width = bounds.xMax - bounds.xMin;
  const height = bounds.yMax - bounds.yMin;
  const used = { x: [] as Interval[], y: [] as Interval[] };
  const rows: Record<Side, Rows> = {
    left: new Rows(),
    right: new Rows(),
    top: new Rows(),
    bottom: new Rows(),
  };
  const known = (axis: "x" | "y", i: Interval) =>
    used[axis].some((u) => same(u.low, i.low, width + height) && same(u.high, i.high, width + height));

  const beside = (side: Side, interval: Interval, fromRow = 0): boolean => {
    const axis = side === "left" || side === "right" ? "y" : "x";
    if (interval.high - interval.low <= 1e-9 * (width + height)) return false;
    const text = formatLength(interval.high - interval.low);
    const lengthPx = (interval.high - interval.low) * pxPerMm;
    const fits = lengthPx >= figureWidthPx(text) + 2;
    const extra = fits ? 3 / pxPerMm : (figureWidthPx(text) + 12) / pxPerMm;
    const row = rows[side].rowFor(interval.low - 3 / pxPerMm, interval.high + extra, fromRow);
    if (row >= MAX_ROWS) return false;
    const edge = { left: bounds.xMin, right: bounds.xMax, top: bounds.yMax, bottom: bounds.yMin }[side];
    const sign = side === "right" || side === "top" ? 1 : -1;
    const across = interval.across;
    const offsetPx = sign * (FIRST_PX + row * STEP_PX + Math.abs(edge - across) * pxPerMm);
    items.push({
      kind: "dimension",
      axis,
      from: axis === "x" ? { x: interval.low, y: across } : { x: across, y: interval.low },
      to: axis === "x" ? { x: interval.high, y: across } : { x: across, y: interval.high },
      offsetPx,
      text,
      place: fits ? "middle" : "after",
      slidePx: fits ? slide(axis, interval.low, interval.high, figureWidthPx(text)) : 0,
      inHand: interval.inHand,
      ...(interval.part === undefined ? {} : { part: interval.part }),
    });
    used[axis].push(interval);
    return true;
  };

  chain();
  parts.filter((p) => !isUpright(p)).forEach((p) => alongFlat(p));
  parts.forEach((p) => ownHeight(p));
  overall();
  const room = new Room();
  const clear = items.filter((item) => room.takeIfFree(dimensionTextBox(item, pxPerMm)));
  items.splice(0, items.length, ...clear);
  parts.filter((p) => isUpright(p)).forEach((p) => acrossUpright(p));
  return { items, marginPx: margins() };

  /** Half a figure and a gap to the left of (or below) the axis where the middle would lie on it and there is room. */
  function slide(axis: "x" | "y", low: number, high: number, textPx: number): number {
    if (!input.axes) return 0;
    const off = ((low + high) / 2 - input.axes[axis]) * pxPerMm;
    if (Math.abs(off) >= textPx / 2 + 8) return 0;
    const by = -(textPx / 2 + 12) - off;
    return ((high - low) * pxPerMm) / 2 + by > textPx / 2 + 4 ? (axis === "x" ? by : -by) : 0;
  }

  function isUpright(p: FigurePart): boolean {
    return p.plain && p.box.xMax - p.box.xMin < p.box.yMax - p.box.yMin;
  }

  function chain(): void {
    const free = parts.filter((p) => !p.inHand && !p.cutout);
    const ownLevels = stackLevels(free, bounds);
    const levels =
      ownLevels.length > 0
        ? ownLevels
        : stackLevels(
            parts.filter((p) => !p.cutout),
            bounds,
          );
    if (levels.length < 3) return;
    levels.slice(1).forEach((high, i) => {
      const low = levels[i] ?? high;
      const text = formatLength(high - low);
      const fits = (high - low) * pxPerMm >= figureWidthPx(text) + 2;
      const end = i === 0 ? "before" : i === levels.length - 2 ? "after" : null;
      const place = fits ? "middle" : end;
      const owner = parts.find((p) => same(p.box.yMin, low, height) && same(p.box.yMax, high, height));
      if (!place) return;
      items.push({
        kind: "dimension",
        axis: "y",
        from: { x: xAt(low), y: low },
        to: { x: xAt(high), y: high },
        offsetPx: -(FIRST_PX + (Math.min(xAt(low), xAt(high)) - bounds.xMin) * pxPerMm),
        text,
        place,
        slidePx: place === "middle" ? slide("y", low, high, figureWidthPx(text)) : 0,
        inHand: owner?.inHand ?? false,
        ...(owner ? { part: owner.id } : {}),
      });
      used.y.push({ low, high, across: bounds.xMin, inHand: false });
    });
    rows.left.rowFor(bounds.yMin, bounds.yMax);
  }

  function xAt(level: number): number {
    const there = parts.filter(
      (p) => level >= p.box.yMin - 1e-6 * height && level <= p.box.yMax + 1e-6 * height,
    );
    return Math.min(...there.map((p) => p.box.xMin), bounds.xMax);
  }

  function acrossUpright(p: FigurePart): void {
    const text = formatLength(p.box.xMax - p.box.xMin);
    for (const share of [0.22, 0.35, 0.65, 0.5, 0.8])
      for (const place of ["after", "before"] as const) {
        const y = p.box.yMin + (p.box.yMax - p.box.yMin) * share;
        const item: DimensionItem = {
          kind: "dimension",
          axis: "x",
          from: { x: p.box.xMin, y },
          to: { x: p.box.xMax, y },
          offsetPx: 0,
          text,
          place,
          slidePx: 0,
          inHand: p.inHand,
          part: p.id,
        };
        const box = dimensionTextBox(item, pxPerMm);
        const blocked = parts.some((o) => o !== p && overlap(box, screenBox(o.box, pxPerMm)));
        if (blocked || !room.takeIfFree(box)) continue;
        items.push(item);
        return;
      }
  }

  function alongFlat(p: FigurePart): void {
    const upper = (p.box.yMin + p.box.yMax) / 2 >= (bounds.yMin + bounds.yMax) / 2;
    const i = {
      low: p.box.xMin,
      high: p.box.xMax,
      across: upper ? p.box.yMax : p.box.yMin,
      part: p.id,
      inHand: p.inHand,
    };
    if (!known("x", i)) beside(upper ? "top" : "bottom", i);
  }

  function ownHeight(p: FigurePart): void {
    if (!p.plain && p.box.yMax - p.box.yMin < 1e-9 * height) return;
    const i = { low: p.box.yMin, high: p.box.yMax, across: p.box.xMax, part: p.id, inHand: p.inHand };
    if (!known("y", i) && !(same(i.low, bounds.yMin, height) && same(i.high, bounds.yMax, height)))
      beside("right", i);
  }

  function overall(): void {
    const x = { low: bounds.xMin, high: bounds.xMax, across: bounds.yMin, inHand: false };
    if (!known("x", x)) beside("bottom", x, rows.bottom.count);
    const y = { low: bounds.yMin, high: bounds.yMax, across: bounds.xMin, inHand: false };
    if (!known("y", y)) beside("left", y, rows.left.count);
    if (input.axes && input.centroidDimension)
      beside(
        "right",
        { low: bounds.yMin, high: input.axes.y, across: bounds.xMax, inHand: false },
        rows.right.count,
      );
  }

  function margins(): DimensionPlan["marginPx"] {
    const of = (side: Side) =>
      Math.max(30, 14 + (rows[side].count > 0 ? FIRST_PX + (rows[side].count - 1) * STEP_PX : 0));
    return { left: of("left") + 8, right: of("right") + 12, top: of("top") + 12, bottom: of("bottom") + 12 };
  }
};
