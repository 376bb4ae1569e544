import type { Point } from "@/lib/geometry/region";
import type { FigureItem } from "@/lib/figure/display-list";
import type { FigurePart } from "@/lib/figure/figure-part";
import { pointInside } from "@/lib/figure/outline";
import type { Room } from "@/lib/figure/place";

type BalloonItem = Extract<FigureItem, { kind: "balloon" }>;

const RADIUS_PX = 11;
const DIRECTIONS = [
  { x: 1, y: 0.55 },
  { x: 1, y: -0.4 },
  { x: -1, y: 0.55 },
  { x: -1, y: -0.4 },
  { x: 0.45, y: 1 },
  { x: -0.45, y: 1 },
  { x: 0.45, y: -1 },
  { x: -0.45, y: -1 },
] as const;
const DISTANCES_PX = [40, 56, 76, 100] as const;

/** Where the leader starts: off the middle for plates, so that it stays clear of the axes. */
const anchorOf = (part: FigurePart): Point | null => {
  const { box } = part;
  if (!part.plain) return pointInside(part.rings, 0.62);
  const level = box.xMax - box.xMin > box.yMax - box.yMin;
  return level
    ? { x: box.xMin + (box.xMax - box.xMin) * (box.yMin > 0 ? 0.2 : 0.8), y: (box.yMin + box.yMax) / 2 }
    : { x: (box.xMin + box.xMax) / 2, y: box.yMin + (box.yMax - box.yMin) * 0.42 };
};

/** Balloons in free places beside their parts; one that finds none is left out unless its part is in hand. */
export const placeBalloons = (parts: readonly FigurePart[], pxPerMm: number, room: Room): BalloonItem[] =>
  parts.flatMap((part): BalloonItem[] => {
    const on = anchorOf(part);
    if (!on) return [];
    const spot = (shiftPx: Point) => ({
      left: on.x * pxPerMm + shiftPx.x - RADIUS_PX,
      right: on.x * pxPerMm + shiftPx.x + RADIUS_PX,
      top: -on.y * pxPerMm + shiftPx.y - RADIUS_PX,
      bottom: -on.y * pxPerMm + shiftPx.y + RADIUS_PX,
    });
    const tries = DISTANCES_PX.flatMap((d) =>
      DIRECTIONS.map((u) => {
        const length = Math.hypot(u.x, u.y);
        return { x: (u.x / length) * d, y: (u.y / length) * d };
      }),
    );
    const shiftPx = tries.find((s) => room.takeIfFree(spot(s)));
    if (!shiftPx && !part.inHand) return [];
    return [
      {
        kind: "balloon",
        on,
        shiftPx: shiftPx ?? { x: 40, y: 22 },
        text: part.item,
        part: part.id,
        inHand: part.inHand,
      },
    ];
  });
