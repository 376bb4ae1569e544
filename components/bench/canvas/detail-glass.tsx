"use client";
import { Layer, Shape, Stage } from "react-konva";
import type { Colours } from "@/components/figure/figure-konva";
import { paintStrokes } from "@/components/figure/figure-konva";
import type { Size } from "@/components/bench/canvas/use-size";
import type { DisplayList } from "@/lib/figure/display-list";
import { strokesOf } from "@/lib/figure/strokes";
import { toDrawing, toScreen, type View } from "@/lib/figure/view";
import type { Point } from "@/lib/geometry/region";

const SIDE_PX = 190;
const TIMES = 6;

/** A magnified detail of what lies under the pointer, for thin webs and corners; line widths stay as they are. */
export const DetailGlass = ({
  list,
  view,
  pointer,
  size,
  colours,
}: {
  list: DisplayList;
  view: View;
  pointer: Point;
  size: Size;
  colours: Colours;
}) => {
  const at = toDrawing(view, pointer);
  const pxPerMm = view.pxPerMm * TIMES;
  const near: View = {
    pxPerMm,
    xPx: SIDE_PX / 2 - at.x * pxPerMm,
    yPx: SIDE_PX / 2 + at.y * pxPerMm,
  };
  const strokes = list.items
    .filter((item) => item.kind !== "dimension" && item.kind !== "balloon")
    .flatMap((item) => strokesOf(item, near));
  const centre = toScreen(near, at);
  const left = pointer.x > size.width / 2 ? 32 : size.width - SIDE_PX - 16;
  return (
    <figure
      className="pointer-events-none absolute top-8 border-2 border-ink bg-sheet"
      style={{ left, width: SIDE_PX + 4 }}
      aria-label={`Detail, ${TIMES} times larger`}
    >
      <Stage width={SIDE_PX} height={SIDE_PX} listening={false}>
        <Layer listening={false}>
          <Shape
            listening={false}
            sceneFunc={(context) => {
              paintStrokes(context._context, strokes, colours);
              paintStrokes(
                context._context,
                [
                  {
                    kind: "path",
                    data: `M${centre.x - 8} ${centre.y}H${centre.x + 8}M${centre.x} ${centre.y - 8}V${centre.y + 8}`,
                    fill: null,
                    line: "oxide-ink",
                    widthPx: 1,
                    dashPx: null,
                  },
                ],
                colours,
              );
            }}
          />
        </Layer>
      </Stage>
      <figcaption className="border-t border-frame px-2 text-note text-ink-2">
        detail, {TIMES} × · G puts it away
      </figcaption>
    </figure>
  );
};
