import type { Point } from "@/lib/geometry/region";
import type { FigureItem, LineRole } from "@/lib/figure/display-list";
import { dimensionStrokes } from "@/lib/figure/dimension-strokes";
import { hatchData } from "@/lib/figure/hatch";
import { markStrokes } from "@/lib/figure/mark-strokes";
import { pathData, thinnessOf } from "@/lib/figure/outline";
import { LINES, type Stroke } from "@/lib/figure/stroke";
import { toScreen, type View } from "@/lib/figure/view";

/** Material thinner than this on screen is filled solid. */
const SOLID_BELOW_PX = 5;

/** What an item looks like at a view: paths and texts in px, y down, with colour roles instead of colours. */
export const strokesOf = (item: FigureItem, view: View): readonly Stroke[] => {
  switch (item.kind) {
    case "material":
      return materialStrokes(item, view);
    case "path":
      return [
        { kind: "path", data: pathData(item.ring, view, item.closed), fill: null, ...LINES[item.role] },
      ];
    case "line":
      return lineStrokes(item, view);
    case "text": {
      const p = toScreen(view, item.at);
      return [
        {
          kind: "text",
          x: p.x + item.shiftPx.x,
          y: p.y + item.shiftPx.y,
          text: item.text,
          anchor: item.anchor,
          turnDeg: 0,
          face: "figure",
          ink: inkOf(item.role),
        },
      ];
    }
    case "dimension":
      return dimensionStrokes(item, view);
    case "mark":
    case "balloon":
    case "weld":
      return markStrokes(item, view);
  }
};

const inkOf = (role: LineRole) => LINES[role].line ?? "dim";

const materialStrokes = (item: Extract<FigureItem, { kind: "material" }>, view: View): Stroke[] => {
  const data = item.rings.map((ring) => pathData(ring, view)).join("");
  const outline = item.inHand ? LINES.hand : LINES.cut;
  if (item.hatch === "void") return [{ kind: "path", data, fill: "sheet", ...outline, part: item.part }];
  const solid = item.hatch === "solid" || thinnessOf(item.rings) * view.pxPerMm < SOLID_BELOW_PX;
  if (solid && item.hatch !== "none") {
    const fill = item.inHand ? ("oxide" as const) : ("cut" as const);
    return [
      { kind: "path", data, fill, line: fill, widthPx: item.inHand ? 2 : 1, dashPx: null, part: item.part },
    ];
  }
  const ground = item.inHand ? ("oxide-wash" as const) : ("sheet" as const);
  const lines = hatchData(item.rings, item.hatch, view);
  const hatch: Stroke[] =
    lines === ""
      ? []
      : [
          {
            kind: "path",
            data: lines,
            fill: null,
            line: item.inHand ? "hatch-hand" : "hatch",
            widthPx: item.inHand ? 1.5 : 1,
            dashPx: null,
          },
        ];
  return [
    { kind: "path", data, fill: ground, line: null, widthPx: 0, dashPx: null },
    ...hatch,
    { kind: "path", data, fill: null, ...outline, part: item.part },
  ];
};

const lineStrokes = (item: Extract<FigureItem, { kind: "line" }>, view: View): Stroke[] => {
  const a = toScreen(view, item.from);
  const b = toScreen(view, item.to);
  const length = Math.hypot(b.x - a.x, b.y - a.y) || 1;
  const u = { x: (b.x - a.x) / length, y: (b.y - a.y) / length };
  const label = (text: string | undefined, at: { x: number; y: number }, sign: number): Stroke[] =>
    text === undefined
      ? []
      : [
          {
            kind: "text",
            ...labelPlace(item.role, at, u, sign),
            text,
            anchor: "middle",
            turnDeg: 0,
            face: item.role === "axis" || item.role === "principal" ? "axis" : "figure",
            ink: item.role === "principal" ? "mill-ink" : inkOf(item.role),
          },
        ];
  const r = (v: number) => Math.round(v * 100) / 100;
  return [
    {
      kind: "path",
      data: `M${r(a.x)} ${r(a.y)}L${r(b.x)} ${r(b.y)}`,
      fill: null,
      ...LINES[item.role],
    },
    ...label(item.startLabel, a, -1),
    ...label(item.endLabel, b, 1),
  ];
};

/** Beyond the end of a level line, beside the end of an upright one, above the start of the plastic axis. */
const labelPlace = (role: LineRole, at: Point, u: Point, sign: number): Point => {
  if (role === "plastic") return { x: at.x + 14, y: at.y - 5 };
  if (Math.abs(u.y) > 0.7) return { x: at.x + (role === "principal" ? -9 : 9), y: at.y + 4.5 };
  return { x: at.x + sign * u.x * 9, y: at.y + sign * u.y * 9 + 4.5 };
};
