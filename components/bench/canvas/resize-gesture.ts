import type { Gesture, GestureTools } from "@/components/bench/canvas/gesture";
import { NO_OVERLAY } from "@/components/bench/canvas/overlay";
import { changePart } from "@/lib/drawing/edit-parts";
import { partBox, placedRegions } from "@/lib/drawing/placed-part";
import type { Drawing, DrawingPart } from "@/lib/drawing/schema";
import { snapMove, snapTargets } from "@/lib/drawing/snap";
import { MIN_SIZE_MM } from "@/lib/geometry/limits";
import type { Point } from "@/lib/geometry/region";

/** Which side of a plate a handle moves: −1 the lesser edge, 1 the greater, 0 none. */
export type Handle = Readonly<{ x: -1 | 0 | 1; y: -1 | 0 | 1; at: Point }>;

/** Handles of the one plate in hand that stands square to the axes. */
export const handlesOf = (drawing: Drawing, picked: readonly string[]): Handle[] => {
  const part = picked.length === 1 ? drawing.parts.find((p) => p.id === picked[0]) : undefined;
  const box = part && part.shape.kind === "plate" && part.angle % 180 === 0 ? partBox(part) : null;
  if (!box || part?.locked === true) return [];
  const [mx, my] = [(box.xMin + box.xMax) / 2, (box.yMin + box.yMax) / 2];
  const place = (x: -1 | 0 | 1, y: -1 | 0 | 1): Handle => ({
    x,
    y,
    at: { x: [box.xMin, mx, box.xMax][x + 1] ?? mx, y: [box.yMin, my, box.yMax][y + 1] ?? my },
  });
  return [
    place(-1, 0),
    place(1, 0),
    place(0, -1),
    place(0, 1),
    place(-1, -1),
    place(1, -1),
    place(-1, 1),
    place(1, 1),
  ];
};

const resized = (part: DrawingPart, handle: Handle, by: Point): DrawingPart => {
  const box = partBox(part);
  if (!box || part.shape.kind !== "plate") return part;
  const edge = {
    xMin: box.xMin + (handle.x === -1 ? by.x : 0),
    xMax: box.xMax + (handle.x === 1 ? by.x : 0),
    yMin: box.yMin + (handle.y === -1 ? by.y : 0),
    yMax: box.yMax + (handle.y === 1 ? by.y : 0),
  };
  const [width, height] = [edge.xMax - edge.xMin, edge.yMax - edge.yMin];
  if (width < MIN_SIZE_MM || height < MIN_SIZE_MM) return part;
  return {
    ...part,
    at: { x: (edge.xMin + edge.xMax) / 2, y: (edge.yMin + edge.yMax) / 2 },
    shape: { kind: "plate", width, height },
  };
};

/** A plate's edge or corner dragged, meeting what snapping offers. */
export const resizeGesture = (tools: GestureTools, id: string, handle: Handle): Gesture => {
  const { act, show, snap, formatLength } = tools;
  const base = act.drawing();
  const part = base.parts.find((p) => p.id === id);
  const targets = snapTargets(base, [id]);
  const ghost = part ? placedRegions(part).map((r) => r.outer) : [];
  const spot = { xMin: handle.at.x, xMax: handle.at.x, yMin: handle.at.y, yMax: handle.at.y };
  act.beginGesture([id]);
  return {
    move: (p) => {
      if (!part) return;
      const wanted = { x: p.at.x - handle.at.x, y: p.at.y - handle.at.y };
      const snapped = snapMove(spot, wanted, targets, snap());
      const next = resized(part, handle, snapped.by);
      act.preview(changePart(base, id, () => next));
      if (next.shape.kind !== "plate") return;
      show({
        ghost,
        hits: snapped.hits.filter((h) => handle[h.axis] !== 0),
        flag: {
          at: { x: handle.at.x + snapped.by.x, y: handle.at.y + snapped.by.y },
          head: snapped.words || "free",
          note: `${formatLength(next.shape.width)} by ${formatLength(next.shape.height)} · hold Q to free`,
        },
      });
    },
    up: () => {
      act.endGesture();
      show(NO_OVERLAY);
      return true;
    },
    cancel: () => {
      act.bail();
      show(NO_OVERLAY);
    },
  };
};
