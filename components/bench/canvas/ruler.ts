import type { Ink, Stroke } from "@/lib/figure/stroke";
import type { View } from "@/lib/figure/view";
import type { Point } from "@/lib/geometry/region";
import type { Size } from "@/components/bench/canvas/use-size";

/** Width of the ruled border of the sheet, px. */
export const RULER_PX = 20;

const LABEL_FROM_PX = 52;
const r = (v: number) => Math.round(v * 10) / 10 + 0;

/** A step of 1, 2 or 5 times a power of ten that is at least `leastPx` wide; in display units. */
export const niceStep = (pxPerUnit: number, leastPx: number): number => {
  const least = leastPx / pxPerUnit;
  const power = 10 ** Math.floor(Math.log10(least));
  return [1, 2, 5, 10].map((k) => k * power).find((s) => s >= least * (1 - 1e-9)) ?? 10 * power;
};

const path = (data: string, line: Ink, widthPx = 1): Stroke => ({
  kind: "path",
  data,
  fill: null,
  line,
  widthPx,
  dashPx: null,
});

/** Lines of the sheet's grid, px apart as the ruler's labels, five times finer where there is room. */
export const gridStrokes = (view: View, size: Size, unitMm: number): Stroke[] => {
  const step = niceStep(view.pxPerMm * unitMm, LABEL_FROM_PX) * unitMm * view.pxPerMm;
  const fine = step / 2;
  let data = "";
  for (let x = ((view.xPx % fine) + fine) % fine; x < size.width; x += fine)
    data += `M${r(x)} 0V${size.height}`;
  for (let y = ((view.yPx % fine) + fine) % fine; y < size.height; y += fine)
    data += `M0 ${r(y)}H${size.width}`;
  return [path(data, "grid")];
};

/** The ruler along the upper and left border with the pointer's place on both. */
export const rulerStrokes = (view: View, size: Size, unitMm: number, pointer: Point | null): Stroke[] => {
  const unitPx = view.pxPerMm * unitMm;
  const step = niceStep(unitPx, LABEL_FROM_PX);
  const minor = step / 10;
  const texts: Stroke[] = [];
  let ticks = "";
  const walk = (
    originPx: number,
    way: 1 | -1,
    lengthPx: number,
    tick: (at: number, long: number, label: string | null) => void,
  ) => {
    const low = Math.ceil((way === 1 ? RULER_PX - originPx : originPx - lengthPx) / unitPx / minor);
    const high = Math.floor((way === 1 ? lengthPx - originPx : originPx - RULER_PX) / unitPx / minor);
    for (let k = low; k <= high; k++) {
      const whole = k % 10 === 0;
      tick(
        originPx + way * k * minor * unitPx,
        whole ? 10 : k % 5 === 0 ? 7 : 4,
        whole ? label(k * minor) : null,
      );
    }
  };
  const label = (v: number) => String(Math.round(v * 1e6) / 1e6 + 0).replace("-", "\u2212");
  walk(view.xPx, 1, size.width, (x, long, text) => {
    ticks += `M${r(x)} ${RULER_PX}V${RULER_PX - long}`;
    if (text !== null) texts.push(figure(text, x, 9, 0));
  });
  walk(view.yPx, -1, size.height, (y, long, text) => {
    ticks += `M${RULER_PX} ${r(y)}H${RULER_PX - long}`;
    if (text !== null) texts.push(figure(text, 9, y, -90));
  });
  const ground: Stroke = {
    kind: "path",
    data: `M0 0H${size.width}V${RULER_PX}H${RULER_PX}V${size.height}H0Z`,
    fill: "sheet",
    line: null,
    widthPx: 0,
    dashPx: null,
  };
  const marks: Stroke[] = pointer
    ? [
        {
          kind: "path",
          data: `M${r(pointer.x - 5)} ${RULER_PX - 8}H${r(pointer.x + 5)}L${r(pointer.x)} ${RULER_PX}ZM${RULER_PX - 8} ${r(pointer.y - 5)}V${r(pointer.y + 5)}L${RULER_PX} ${r(pointer.y)}Z`,
          fill: "oxide-ink",
          line: null,
          widthPx: 0,
          dashPx: null,
        },
      ]
    : [];
  return [
    ground,
    path(ticks, "dim"),
    path(`M${RULER_PX} ${size.height}V${RULER_PX}H${size.width}`, "dim"),
    ...texts,
    ...marks,
    {
      kind: "path",
      data: `M0 0H${RULER_PX}V${RULER_PX}H0Z`,
      fill: "sheet",
      line: null,
      widthPx: 0,
      dashPx: null,
    },
  ];
};

const figure = (text: string, x: number, y: number, turnDeg: 0 | -90): Stroke => ({
  kind: "text",
  x,
  y,
  text,
  anchor: "middle",
  turnDeg,
  face: "ruler",
  ink: "dim",
});
