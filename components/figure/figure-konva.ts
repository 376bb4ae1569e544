"use client";
import { INKS, type Ink, type Stroke } from "@/lib/figure/stroke";

/** The look's colours as the canvas needs them: it cannot read custom properties itself. */
export type Colours = Readonly<Record<Ink, string>> & Readonly<{ fontNum: string; fontUi: string }>;

export const coloursOf = (element: Element): Colours => {
  const style = getComputedStyle(element);
  const read = (name: string) => style.getPropertyValue(name).trim();
  const inks = Object.fromEntries(INKS.map((ink) => [ink, read(`--fb-${ink}`)])) as Record<Ink, string>; // safe: every ink is a key
  return { ...inks, fontNum: read("--fb-font-num"), fontUi: read("--fb-font-ui") };
};

const paths = new Map<string, Path2D>();
const MAX_PATHS = 4_000;

/** Path2D of path data, remembered: most of a figure is the same from one frame to the next. */
const pathOf = (data: string): Path2D => {
  const known = paths.get(data);
  if (known) return known;
  if (paths.size >= MAX_PATHS) paths.clear();
  const made = new Path2D(data);
  paths.set(data, made);
  return made;
};

const fontOf = (face: Extract<Stroke, { kind: "text" }>["face"], c: Colours): string =>
  ({
    figure: `460 12px ${c.fontNum}`,
    axis: `italic 560 14px ${c.fontUi}`,
    ruler: `440 11px ${c.fontNum}`,
    balloon: `560 11.5px ${c.fontNum}`,
  })[face];

const ALIGN = { start: "left", middle: "center", end: "right" } as const;

/** Paints strokes on a canvas context in px: the konva side of the display list. */
export const paintStrokes = (ctx: CanvasRenderingContext2D, strokes: readonly Stroke[], c: Colours): void => {
  for (const s of strokes) {
    if (s.kind === "path") {
      const path = pathOf(s.data);
      if (s.fill) {
        ctx.fillStyle = c[s.fill];
        ctx.fill(path, "evenodd");
      }
      if (s.line && s.widthPx > 0) {
        ctx.strokeStyle = c[s.line];
        ctx.lineWidth = s.widthPx;
        ctx.setLineDash(s.dashPx ? [...s.dashPx] : []);
        ctx.stroke(path);
      }
      continue;
    }
    ctx.save();
    ctx.translate(s.x, s.y);
    if (s.turnDeg) ctx.rotate((s.turnDeg * Math.PI) / 180);
    ctx.font = fontOf(s.face, c);
    ctx.textAlign = ALIGN[s.anchor];
    ctx.textBaseline = "alphabetic";
    if (s.face !== "balloon" && s.face !== "ruler") {
      ctx.setLineDash([]);
      ctx.lineJoin = "round";
      ctx.lineWidth = 3.5;
      ctx.strokeStyle = c.sheet;
      ctx.strokeText(s.text, 0, 0);
    }
    ctx.fillStyle = c[s.ink];
    ctx.fillText(s.text, 0, 0);
    ctx.restore();
  }
};
