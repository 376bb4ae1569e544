import type { Point, Ring } from "@/lib/geometry/region";

/** Roles decide line width, dash and colour by the tokens of the look; a display list holds no colour. */
export type LineRole =
  "cut" | "hand" | "dimension" | "axis" | "principal" | "plastic" | "ghost" | "hatch" | "mark" | "grid";

/**
 * One thing to draw. Positions are in drawing axes (mm, y up); sizes that must not zoom (ticks, text, pitch) are in px.
 * The SVG side and the konva side are the only readers.
 */
export type FigureItem =
  | Readonly<{
      kind: "material";
      part: string;
      rings: readonly Ring[];
      hatch: "rising" | "falling" | "rising-wide" | "solid" | "grain" | "none";
      inHand: boolean;
    }>
  | Readonly<{ kind: "path"; role: LineRole; ring: Ring; closed: boolean; part?: string }>
  | Readonly<{ kind: "line"; role: LineRole; from: Point; to: Point; label?: string }>
  | Readonly<{
      kind: "text";
      at: Point;
      text: string;
      anchor: "start" | "middle" | "end";
      turnDeg: 0 | 90;
      role: "dimension" | "label";
      offsetPx?: Readonly<{ x: number; y: number }>;
    }>
  | Readonly<{
      kind: "dimension";
      from: Point;
      to: Point;
      axis: "x" | "y";
      /** Distance of the dimension line from the points, px on screen; sign gives the side (+ is right or up). */
      offsetPx: number;
      text: string;
      part?: string;
    }>
  | Readonly<{ kind: "mark"; mark: "centroid" | "shear-centre" | "datum" | "unsymmetrical"; at: Point }>
  | Readonly<{ kind: "balloon"; at: Point; towards: Point; text: string; part: string; inHand: boolean }>
  | Readonly<{ kind: "weld"; at: Point; turnDeg: number }>;

export type DisplayList = Readonly<{
  items: readonly FigureItem[];
  /** Box of the material, mm. */
  bounds: Readonly<{ xMin: number; xMax: number; yMin: number; yMax: number }>;
}>;
