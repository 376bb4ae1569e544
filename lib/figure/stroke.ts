import type { LineRole } from "@/lib/figure/display-list";

/** Colour roles: the names of the look's tokens, resolved by whoever paints. */
export const INKS = [
  "ink",
  "cut",
  "hatch",
  "hatch-hand",
  "oxide",
  "oxide-ink",
  "oxide-wash",
  "on-oxide",
  "sheet",
  "axis",
  "mill",
  "mill-ink",
  "dim",
  "ghost",
  "grid",
  "chalk",
  "chalk-ink",
] as const;
export type Ink = (typeof INKS)[number];

export type Line = Readonly<{ line: Ink | null; widthPx: number; dashPx: readonly number[] | null }>;

/** One thing to paint, px on screen, y down. `data` is SVG path data (M, L, A, Z); fills are even-odd. */
export type Stroke =
  | (Readonly<{ kind: "path"; data: string; fill: Ink | null; part?: string }> & Line)
  | Readonly<{
      kind: "text";
      x: number;
      y: number;
      text: string;
      anchor: "start" | "middle" | "end";
      /** Degrees clockwise on screen; −90 reads from the right. */
      turnDeg: 0 | -90;
      /** Figure face 12 px, axis letters italic 14 px; ruler 11 px and balloon numbers 11.5 px stand without halo. */
      face: "figure" | "axis" | "balloon" | "ruler";
      ink: Ink;
    }>;

const CHAIN = [14, 3, 2, 3] as const;
const DOUBLE_CHAIN = [14, 3, 2, 3, 2, 3] as const;

/** Line widths and dashes of the roles (ISO 128 pair 1:2); they do not zoom. */
export const LINES: Readonly<Record<LineRole, Line>> = {
  cut: { line: "cut", widthPx: 2, dashPx: null },
  hand: { line: "oxide", widthPx: 3, dashPx: null },
  dimension: { line: "dim", widthPx: 1, dashPx: null },
  "dimension-hand": { line: "oxide-ink", widthPx: 1, dashPx: null },
  axis: { line: "axis", widthPx: 1.2, dashPx: CHAIN },
  principal: { line: "mill", widthPx: 1, dashPx: DOUBLE_CHAIN },
  plastic: { line: "axis", widthPx: 1.2, dashPx: [5, 3] },
  ghost: { line: "ghost", widthPx: 1.2, dashPx: DOUBLE_CHAIN },
  guide: { line: "oxide-ink", widthPx: 1, dashPx: [6, 4] },
  mark: { line: "ink", widthPx: 1.3, dashPx: null },
  fault: { line: "oxide-ink", widthPx: 2, dashPx: null },
  grid: { line: "grid", widthPx: 1, dashPx: null },
};
