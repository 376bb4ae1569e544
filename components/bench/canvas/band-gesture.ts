import type { Gesture, GestureTools, PointerAt } from "@/components/bench/canvas/gesture";
import { NO_OVERLAY } from "@/components/bench/canvas/overlay";
import { wholeGroups } from "@/lib/drawing/edit-parts";
import { partsWithin } from "@/lib/drawing/pick";
import type { Box } from "@/lib/geometry/arc";
import type { Point } from "@/lib/geometry/region";

export const boxBetween = (a: Point, b: Point): Box => ({
  xMin: Math.min(a.x, b.x),
  xMax: Math.max(a.x, b.x),
  yMin: Math.min(a.y, b.y),
  yMax: Math.max(a.y, b.y),
});

/** A band pulled over empty paper: what lies wholly in it is picked; with Shift it is added to the pick. */
export const bandGesture = ({ store, act, show }: GestureTools, start: PointerAt): Gesture => {
  const before = start.shift ? store.getState().picked : [];
  if (!start.shift) act.pick([]);
  return {
    move: (p) => {
      const band = boxBetween(start.at, p.at);
      show({ band });
      const drawing = act.drawing();
      act.pick([...new Set([...before, ...wholeGroups(drawing, partsWithin(drawing, band))])]);
    },
    up: () => {
      show(NO_OVERLAY);
      return true;
    },
    cancel: () => {
      act.pick(before);
      show(NO_OVERLAY);
    },
  };
};
