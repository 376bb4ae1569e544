import type { Gesture, GestureTools, PointerAt } from "@/components/bench/canvas/gesture";
import { NO_OVERLAY } from "@/components/bench/canvas/overlay";
import { moveParts, wholeGroups } from "@/lib/drawing/edit-parts";
import { boxOfParts, placedRegions } from "@/lib/drawing/placed-part";
import { snapMove, snapTargets, type Snapped } from "@/lib/drawing/snap";
import type { Point } from "@/lib/geometry/region";

/** A pull shorter than this is a click. */
const CLICK_PX = 3;

/** Parts dragged with snapping; a distance can be typed on the way; Escape goes back to before it. */
export const moveGesture = (tools: GestureTools, start: PointerAt): Gesture => {
  const { store, act, show, snap, formatLength } = tools;
  const base = store.getState().history.now;
  const ids = wholeGroups(base, store.getState().picked).filter(
    (id) => base.parts.find((p) => p.id === id)?.locked !== true,
  );
  const box = boxOfParts(base, ids);
  const targets = snapTargets(base, ids);
  const ghost = base.parts
    .filter((p) => ids.includes(p.id))
    .flatMap((p) => placedRegions(p).map((r) => r.outer));
  let begun = false;
  let typed = "";
  let last: Snapped = { by: { x: 0, y: 0 }, hits: [], words: "" };

  const showMove = (moved: Snapped) => {
    if (!box) return;
    last = moved;
    act.preview(moveParts(base, ids, moved.by));
    const distance = `${formatLength(moved.by.x)}, ${formatLength(moved.by.y)}`;
    const flagAt = {
      x: moved.hits.find((h) => h.axis === "x" && h.kind !== "grid")?.at ?? box.xMax + moved.by.x,
      y: moved.hits.find((h) => h.axis === "y" && h.kind !== "grid")?.at ?? box.yMax + moved.by.y,
    };
    show({
      hits: moved.hits,
      ghost,
      flag: {
        at: flagAt,
        head: moved.words || "free",
        note: typed ? `distance ${typed} · Enter sets it` : `moved ${distance} · hold Q to free`,
      },
    });
  };
  const finish = () => {
    act.endGesture();
    show(NO_OVERLAY);
    if (begun) act.say(`Moved ${formatLength(last.by.x)}, ${formatLength(last.by.y)}. ${last.words}`);
  };
  const towards = (d: number): Point =>
    Math.abs(last.by.x) >= Math.abs(last.by.y)
      ? { x: Math.sign(last.by.x || 1) * d, y: 0 }
      : { x: 0, y: Math.sign(last.by.y || 1) * d };

  return {
    move: (p) => {
      const far = Math.hypot(p.screen.x - start.screen.x, p.screen.y - start.screen.y) >= CLICK_PX;
      if (!box || ids.length === 0 || (!begun && !far)) return;
      if (!begun) act.beginGesture(ids);
      begun = true;
      const wanted = { x: p.at.x - start.at.x, y: p.at.y - start.at.y };
      const straight = p.shift
        ? Math.abs(wanted.x) >= Math.abs(wanted.y)
          ? { x: wanted.x, y: 0 }
          : { x: 0, y: wanted.y }
        : wanted;
      showMove(snapMove(box, straight, targets, snap()));
    },
    up: () => {
      finish();
      return true;
    },
    key: (event) => {
      if (!begun) return false;
      if (/^[\d.,/\s+*-]$/.test(event.key) || (typed && /^[a-z"']$/i.test(event.key))) typed += event.key;
      else if (event.key === "Backspace") typed = typed.slice(0, -1);
      else if (event.key === "Enter" && typed) {
        const mm = tools.readLength(typed);
        if (mm === null) return true;
        typed = "";
        showMove({ by: towards(mm), hits: [], words: "typed" });
        finish();
        return "done";
      } else return false;
      showMove(last);
      return true;
    },
    cancel: () => {
      act.bail();
      show(NO_OVERLAY);
    },
  };
};
