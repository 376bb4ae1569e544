import type { Box } from "@/lib/geometry/arc";
import { ringBox } from "@/lib/geometry/arc";
import { boxesMeet, growBox } from "@/lib/geometry/edge";
import type { Region } from "@/lib/geometry/region";
import { TOUCH_MM } from "@/lib/geometry/tolerance";

/** For each part, the boxes of the parts that it may touch. */
export type Neighbours = readonly (readonly Box[])[];

const around = (boxes: readonly Box[]): Box =>
  boxes.reduce<Box>(
    (all, box) => ({
      xMin: Math.min(all.xMin, box.xMin),
      xMax: Math.max(all.xMax, box.xMax),
      yMin: Math.min(all.yMin, box.yMin),
      yMax: Math.max(all.yMax, box.yMax),
    }),
    { xMin: Infinity, xMax: -Infinity, yMin: Infinity, yMax: -Infinity },
  );

/**
 * For each part the boxes, grown by the tolerance, of other parts that meet its own box. A part with none touches nothing.
 * Every pair of boxes is compared: parts are few beside their vertices.
 */
export const neighbourBoxes = (parts: readonly (readonly Region[])[]): Neighbours => {
  const boxes = parts.map((regions) =>
    growBox(around(regions.flatMap(({ outer }) => ringBox(outer) ?? [])), 2 * TOUCH_MM),
  );
  return boxes.map((box, i) => boxes.filter((other, k) => k !== i && boxesMeet(box, other)));
};
