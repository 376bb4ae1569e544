import type { Gesture, GestureTools } from "@/components/bench/canvas/gesture";
import { NO_OVERLAY } from "@/components/bench/canvas/overlay";
import { changePart } from "@/lib/drawing/edit-parts";
import { bendEdge, edgeMiddle, edgeRadius, moveVertex, type Outline } from "@/lib/drawing/outline-edits";
import { placedRegions, toOwn, toPlaced } from "@/lib/drawing/placed-part";
import type { Drawing } from "@/lib/drawing/schema";
import { snapPoint } from "@/lib/drawing/snap-point";
import type { Point } from "@/lib/geometry/region";

export type OutlineHandle = Readonly<{ kind: "corner" | "middle"; index: number; at: Point }>;

/** Corners and edge middles of the one outline in hand, in drawing axes. */
export const outlineHandles = (drawing: Drawing, picked: readonly string[]): OutlineHandle[] => {
  const part = picked.length === 1 ? drawing.parts.find((p) => p.id === picked[0]) : undefined;
  if (!part || part.shape.kind !== "outline" || part.locked === true) return [];
  const { outer } = part.shape;
  return outer.flatMap((v, index): OutlineHandle[] => {
    const next = outer[(index + 1) % outer.length] ?? v;
    const from = v.bulge === undefined ? { x: v.x, y: v.y } : { x: v.x, y: v.y, bulge: v.bulge };
    return [
      { kind: "corner", index, at: toPlaced(part, v) },
      { kind: "middle", index, at: toPlaced(part, edgeMiddle(from, next)) },
    ];
  });
};

const STRAIGHT_PX = 4;

/** A corner dragged to where it should be, or an edge bent into an arc by its middle; near straight it is straight. */
export const outlineHandleGesture = (
  tools: GestureTools,
  id: string,
  handle: OutlineHandle,
  pxPerMm: () => number,
): Gesture => {
  const { act, show, snap, formatLength } = tools;
  const base = act.drawing();
  const part = base.parts.find((p) => p.id === id);
  const others = { ...base, parts: base.parts.filter((p) => p.id !== id) };
  const ghost = part ? placedRegions(part).map((r) => r.outer) : [];
  act.beginGesture([id]);
  const change = (outline: Outline, to: Point): Outline =>
    handle.kind === "corner"
      ? moveVertex(outline, handle.index, to)
      : bendEdge(outline, handle.index, to, STRAIGHT_PX / pxPerMm());
  return {
    move: (p) => {
      if (!part || part.shape.kind !== "outline") return;
      const hit = handle.kind === "corner" ? snapPoint(p.at, others, snap()) : { point: p.at, words: "" };
      const next = change(part.shape, toOwn(part, hit.point));
      act.preview(changePart(base, id, (one) => ({ ...one, shape: next })));
      const radius = handle.kind === "middle" ? edgeRadius(next, handle.index) : null;
      show({
        ghost,
        flag: {
          at: hit.point,
          head:
            handle.kind === "middle"
              ? radius === null
                ? "straight"
                : `radius ${formatLength(Math.abs(radius))}`
              : hit.words || "free",
          note: "Escape goes back",
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
