import type { Point, Ring } from "@/lib/geometry/region";

/** Roles decide line width, dash and colour by the tokens of the look; a display list holds no colour. */
export type LineRole =
  | "cut"
  | "hand"
  | "dimension"
  | "dimension-hand"
  | "axis"
  | "principal"
  | "plastic"
  | "ghost"
  | "guide"
  | "mark"
  | "fault"
  | "grid";

/**
 * How cut material is filled: 45° rising or falling, "wide" at pitch 9 for a third neighbour, solid for what is thinner
 * than 5 px, grain for timber, void for a cut-out, none for plain paper.
 */
export type Hatch =
  "rising" | "falling" | "rising-wide" | "falling-wide" | "grain" | "solid" | "void" | "none";

/** Where a dimension's figure stands: over its line, or beyond its first or second end where the line is too short. */
export type TextPlace = "middle" | "before" | "after";

/** A dimension measured along one axis. `from` is the lesser end. */
export type DimensionItem = Readonly<{
  kind: "dimension";
  axis: "x" | "y";
  from: Point;
  to: Point;
  /** Distance of the dimension line from the outermost point, px on screen; the sign gives the side (+ right or up). */
  offsetPx: number;
  text: string;
  place: TextPlace;
  /** Moves the figure along its line, px, so that it stays clear of an axis. */
  slidePx: number;
  inHand: boolean;
  part?: string;
}>;

/**
 * One thing to draw. Positions are in drawing axes (mm, y up); sizes that do not zoom (ticks, text, pitch) are in px.
 * `strokes.ts` is the only reader; the SVG, konva and print sides draw its strokes.
 */
export type FigureItem =
  | Readonly<{ kind: "material"; part: string; rings: readonly Ring[]; hatch: Hatch; inHand: boolean }>
  | Readonly<{ kind: "path"; role: LineRole; ring: Ring; closed: boolean }>
  | Readonly<{ kind: "line"; role: LineRole; from: Point; to: Point; startLabel?: string; endLabel?: string }>
  | Readonly<{
      kind: "text";
      at: Point;
      text: string;
      anchor: "start" | "middle" | "end";
      role: LineRole;
      shiftPx: Readonly<{ x: number; y: number }>;
    }>
  | DimensionItem
  | Readonly<{
      kind: "mark";
      mark: "centroid" | "shear-centre" | "datum" | "unsymmetrical";
      at: Point;
      label?: string;
    }>
  | Readonly<{
      kind: "balloon";
      /** Point inside the part that the leader starts from. */
      on: Point;
      /** Centre of the balloon relative to `on`, px on screen, y down. */
      shiftPx: Readonly<{ x: number; y: number }>;
      text: string;
      part: string;
      inHand: boolean;
    }>
  | Readonly<{ kind: "weld"; at: Point; along: Point; out: Point; sized: boolean }>;

export type Box = Readonly<{ xMin: number; xMax: number; yMin: number; yMax: number }>;

export type DisplayList = Readonly<{
  items: readonly FigureItem[];
  /** Box of the material, mm. */
  bounds: Box;
  /** The scale for which texts and dimensions were placed. */
  pxPerMm: number;
  /** Room that dimensions and axes take around the material, px. */
  marginPx: Readonly<{ left: number; right: number; top: number; bottom: number }>;
}>;
