import type { FigureItem } from "@/lib/figure/display-list";
import type { Stroke } from "@/lib/figure/stroke";
import { toScreen, type View } from "@/lib/figure/view";

type MarkItem = Extract<FigureItem, { kind: "mark" | "balloon" | "weld" }>;

const BALLOON_PX = 9.5;
const WELD_PX = 8.5;
const r = (v: number) => Math.round(v * 100) / 100;
const circle = (x: number, y: number, radius: number) =>
  `M${r(x - radius)} ${r(y)}A${radius} ${radius} 0 1 1 ${r(x + radius)} ${r(y)}A${radius} ${radius} 0 1 1 ${r(x - radius)} ${r(y)}Z`;
const thin = { widthPx: 1.3, dashPx: null } as const;

/** Centroid, shear centre, datum, balloons and welds: their size does not zoom. */
export const markStrokes = (item: MarkItem, view: View): Stroke[] => {
  switch (item.kind) {
    case "balloon":
      return balloonStrokes(item, view);
    case "weld": {
      const p = toScreen(view, item.at);
      const corner = (d: { x: number; y: number }) => `${r(p.x + d.x * WELD_PX)} ${r(p.y - d.y * WELD_PX)}`;
      return [
        {
          kind: "path",
          data: `M${r(p.x)} ${r(p.y)}L${corner(item.along)}L${corner(item.out)}Z`,
          fill: item.sized ? "ink" : "sheet",
          line: "ink",
          widthPx: 1,
          dashPx: null,
        },
      ];
    }
    case "mark":
      return signStrokes(item, view);
  }
};

const balloonStrokes = (item: Extract<MarkItem, { kind: "balloon" }>, view: View): Stroke[] => {
  const on = toScreen(view, item.on);
  const c = { x: on.x + item.shiftPx.x, y: on.y + item.shiftPx.y };
  const length = Math.hypot(item.shiftPx.x, item.shiftPx.y) || 1;
  const edge = {
    x: c.x - (item.shiftPx.x / length) * BALLOON_PX,
    y: c.y - (item.shiftPx.y / length) * BALLOON_PX,
  };
  const line = item.inHand ? ("oxide-ink" as const) : ("ink" as const);
  return [
    {
      kind: "path",
      data: `M${r(on.x)} ${r(on.y)}L${r(edge.x)} ${r(edge.y)}`,
      fill: null,
      line,
      widthPx: 1,
      dashPx: null,
    },
    { kind: "path", data: circle(on.x, on.y, 2), fill: line, line: null, widthPx: 0, dashPx: null },
    {
      kind: "path",
      data: circle(c.x, c.y, BALLOON_PX),
      fill: item.inHand ? "oxide" : "sheet",
      line: item.inHand ? "oxide" : "ink",
      widthPx: 1,
      dashPx: null,
      part: item.part,
    },
    {
      kind: "text",
      x: c.x,
      y: c.y + 4,
      text: item.text,
      anchor: "middle",
      turnDeg: 0,
      face: "balloon",
      ink: item.inHand ? "on-oxide" : "ink",
    },
  ];
};

const signStrokes = (item: Extract<MarkItem, { kind: "mark" }>, view: View): Stroke[] => {
  const { x, y } = toScreen(view, item.at);
  const label: Stroke[] =
    item.label === undefined
      ? []
      : [
          {
            kind: "text",
            x: x + 12,
            y: y + 18,
            text: item.label,
            anchor: "start",
            turnDeg: 0,
            face: "figure",
            ink: "ink",
          },
        ];
  switch (item.mark) {
    case "centroid": {
      const quarter = (sx: number, sy: number) =>
        `M${r(x)} ${r(y)}L${r(x)} ${r(y + 8 * sy)}A8 8 0 0 1 ${r(x + 8 * sx)} ${r(y)}Z`;
      return [
        { kind: "path", data: circle(x, y, 8), fill: "sheet", line: "ink", ...thin },
        { kind: "path", data: quarter(1, -1) + quarter(-1, 1), fill: "ink", line: null, ...thin },
        ...label,
      ];
    }
    case "shear-centre":
      return [
        {
          kind: "path",
          data: `M${r(x - 6)} ${r(y - 6)}L${r(x + 6)} ${r(y - 6)}L${r(x + 6)} ${r(y + 6)}L${r(x - 6)} ${r(y + 6)}Z`,
          fill: "sheet",
          line: "ink",
          ...thin,
        },
        {
          kind: "path",
          data: `M${r(x - 6)} ${r(y - 6)}L${r(x + 6)} ${r(y + 6)}M${r(x + 6)} ${r(y - 6)}L${r(x - 6)} ${r(y + 6)}`,
          fill: null,
          line: "ink",
          ...thin,
        },
        ...label,
      ];
    case "datum":
      return [
        {
          kind: "path",
          data: `M${r(x)} ${r(y)}L${r(x + 9)} ${r(y)}L${r(x)} ${r(y - 9)}Z`,
          fill: "ink",
          line: null,
          ...thin,
        },
        ...label,
      ];
    case "unsymmetrical":
      return [
        {
          kind: "path",
          data: `M${r(x - 9)} ${r(y)}L${r(x + 9)} ${r(y)}M${r(x - 8)} ${r(y + 5)}L${r(x + 8)} ${r(y - 5)}`,
          fill: null,
          line: "ink",
          ...thin,
        },
        ...label,
      ];
  }
};
