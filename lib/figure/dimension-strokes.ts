import type { DimensionItem } from "@/lib/figure/display-list";
import { figureWidthPx, type ScreenBox } from "@/lib/figure/place";
import { LINES, type Stroke } from "@/lib/figure/stroke";
import { toScreen, type View } from "@/lib/figure/view";

const GAP_PX = 4;
const PAST_PX = 5;
const TICK_PX = 4;
const r = (v: number) => Math.round(v * 100) / 100;

/** Extension lines, dimension line with 45° ticks, and the figure above the line or, upright, left of it. */
export const dimensionStrokes = (item: DimensionItem, view: View): Stroke[] => {
  const line = LINES[item.inHand ? "dimension-hand" : "dimension"];
  const { a, b, at } = lineOf(item, view);
  const level = item.axis === "x";
  const sign = Math.sign(item.offsetPx);
  const [low, high] = level ? [a.x, b.x] : [a.y, b.y];
  const textPx = figureWidthPx(item.text);
  const tail = textPx + 10;
  const way = level ? 1 : -1;
  const start = low - way * (item.place === "before" ? tail : item.place === "after" ? 8 : 0);
  const end = high + way * (item.place === "after" ? tail : item.place === "before" ? 8 : 0);
  const m = (along: number, cross: number) => (level ? `${r(along)} ${r(cross)}` : `${r(cross)} ${r(along)}`);
  const extension = (p: { x: number; y: number }, along: number): string => {
    if (item.offsetPx === 0) return "";
    const from = level ? p.y : p.x;
    const to = level ? -sign : sign;
    return `M${m(along, from + to * GAP_PX)}L${m(along, at + to * PAST_PX)}`;
  };
  const tick = (along: number): string => {
    const [x, y] = level ? [along, at] : [at, along];
    return `M${r(x - TICK_PX)} ${r(y + TICK_PX)}L${r(x + TICK_PX)} ${r(y - TICK_PX)}`;
  };
  const middle = {
    middle: (low + high) / 2 + item.slidePx,
    before: low - way * (6 + textPx / 2),
    after: high + way * (6 + textPx / 2),
  }[item.place];
  return [
    {
      kind: "path",
      data: `${extension(a, low)}${extension(b, high)}M${m(start, at)}L${m(end, at)}`,
      fill: null,
      ...line,
    },
    { kind: "path", data: tick(low) + tick(high), fill: null, line: line.line, widthPx: 1.6, dashPx: null },
    {
      kind: "text",
      x: level ? middle : at - 4,
      y: level ? at - 4 : middle,
      text: item.text,
      anchor: "middle",
      turnDeg: level ? 0 : -90,
      face: "figure",
      ink: line.line ?? "dim",
    },
  ];
};

/** Ends on screen and where the dimension line runs: its y when level, its x when upright. */
const lineOf = (item: DimensionItem, view: View) => {
  const a = toScreen(view, item.from);
  const b = toScreen(view, item.to);
  const out = item.offsetPx >= 0;
  const at =
    item.axis === "x"
      ? (out ? Math.min(a.y, b.y) : Math.max(a.y, b.y)) - item.offsetPx
      : (out ? Math.max(a.x, b.x) : Math.min(a.x, b.x)) + item.offsetPx;
  return { a, b, at };
};

/** The strip its line takes, on the same sheet as `dimensionTextBox`. */
export const dimensionLineBox = (item: DimensionItem, pxPerMm: number): ScreenBox => {
  const { a, b, at } = lineOf(item, { pxPerMm, xPx: 0, yPx: 0 });
  return item.axis === "x"
    ? { left: a.x, right: b.x, top: at - 5, bottom: at + 5 }
    : { left: at - 5, right: at + 5, top: b.y, bottom: a.y };
};

/** Where the figure of a dimension will stand, px on a sheet whose origin is the drawing's (y down). */
export const dimensionTextBox = (item: DimensionItem, pxPerMm: number): ScreenBox => {
  const text = dimensionStrokes(item, { pxPerMm, xPx: 0, yPx: 0 }).find((s) => s.kind === "text");
  const half = figureWidthPx(item.text) / 2;
  if (text?.kind !== "text") return { left: 0, right: 0, top: 0, bottom: 0 };
  return text.turnDeg === 0
    ? { left: text.x - half, right: text.x + half, top: text.y - 12, bottom: text.y + 7 }
    : { left: text.x - 12, right: text.x + 7, top: text.y - half, bottom: text.y + half };
};
