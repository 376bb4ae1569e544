"use client";
import { useCallback, useEffect, useMemo, useRef, useState } from "react";
import { useBenchContext } from "@/components/bench/bench-store";
import { bandGesture } from "@/components/bench/canvas/band-gesture";
import {
  dimensionGesture,
  outlineGesture,
  plateGesture,
  roundGesture,
} from "@/components/bench/canvas/draw-gestures";
import type { Gesture, GestureTools, PointerAt } from "@/components/bench/canvas/gesture";
import { moveGesture } from "@/components/bench/canvas/move-gesture";
import { NO_OVERLAY, type Overlay } from "@/components/bench/canvas/overlay";
import { outlineHandleGesture, outlineHandles } from "@/components/bench/canvas/outline-handles";
import { handlesOf, resizeGesture } from "@/components/bench/canvas/resize-gesture";
import { useLengths } from "@/components/bench/use-lengths";
import { wholeGroups } from "@/lib/drawing/edit-parts";
import { partAt } from "@/lib/drawing/pick";
import { toScreen } from "@/lib/figure/view";

const REACH_PX = 8;
const HANDLE_PX = 7;

/** Which gesture a press begins, and the keys that belong to one while it goes on. */
export const useGestures = () => {
  const { store, act } = useBenchContext();
  const lengths = useLengths();
  const [overlay, setOverlay] = useState<Overlay>(NO_OVERLAY);
  const gesture = useRef<Gesture | null>(null);
  const free = useRef(false);

  const tools = useMemo(
    (): GestureTools => ({
      store,
      act,
      show: (change) => setOverlay((now) => (change === NO_OVERLAY ? NO_OVERLAY : { ...now, ...change })),
      snap: () => {
        const { view, grid, snapping, figures } = store.getState();
        const on = snapping && !free.current;
        return {
          reach: on ? REACH_PX / (view?.pxPerMm ?? 1) : 0,
          grid: on ? grid : 0,
          centroid: figures?.properties.centroid ?? null,
        };
      },
      ...lengths,
    }),
    [store, act, lengths],
  );

  const begin = useCallback(
    (p: PointerAt): Gesture | null => {
      const { tool, view, history, picked } = store.getState();
      const pxPerMm = () => store.getState().view?.pxPerMm ?? 1;
      if (!view) return null;
      switch (tool) {
        case "plate":
          return plateGesture(tools, p);
        case "round":
          return roundGesture(tools, p, false);
        case "hole":
          return roundGesture(tools, p, true);
        case "outline":
          return outlineGesture(tools, p, pxPerMm);
        case "dimension":
          return dimensionGesture(tools, p, () => REACH_PX / 2 / pxPerMm());
        case "select": {
          const handle = handlesOf(history.now, picked).find((h) => {
            const at = toScreen(view, h.at);
            return Math.hypot(at.x - p.screen.x, at.y - p.screen.y) <= HANDLE_PX;
          });
          const bend = outlineHandles(history.now, picked).find((h) => {
            const at = toScreen(view, h.at);
            return Math.hypot(at.x - p.screen.x, at.y - p.screen.y) <= HANDLE_PX;
          });
          if (bend && picked[0]) return outlineHandleGesture(tools, picked[0], bend, pxPerMm);
          if (handle && picked[0]) return resizeGesture(tools, picked[0], handle);
          const hit = partAt(history.now, p.at, REACH_PX / 2 / view.pxPerMm);
          if (!hit) return bandGesture(tools, p);
          const whole = wholeGroups(history.now, [hit]);
          if (p.shift)
            act.pick(
              picked.includes(hit) ? picked.filter((id) => !whole.includes(id)) : [...picked, ...whole],
            );
          else if (!picked.includes(hit)) act.pick(whole);
          return moveGesture(tools, p);
        }
      }
    },
    [store, act, tools],
  );

  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (event.key.toLowerCase() === "q") free.current = event.type === "keydown";
      if (event.type !== "keydown" || !gesture.current) return;
      const used = event.key === "Escape" ? null : gesture.current.key?.(event);
      if (used === null) gesture.current.cancel();
      if (used === null || used === "done") gesture.current = null;
      if (used !== false && used !== undefined) {
        event.preventDefault();
        event.stopPropagation();
      }
    };
    window.addEventListener("keydown", onKey, true);
    window.addEventListener("keyup", onKey, true);
    return () => {
      window.removeEventListener("keydown", onKey, true);
      window.removeEventListener("keyup", onKey, true);
    };
  }, []);

  useEffect(
    () =>
      store.subscribe((now, before) => {
        if (now.tool === before.tool) return;
        gesture.current?.cancel();
        gesture.current = null;
        setOverlay(NO_OVERLAY);
      }),
    [store],
  );

  return {
    overlay,
    active: () => gesture.current !== null,
    press: (p: PointerAt) => {
      if (gesture.current?.press) {
        if (gesture.current.press(p)) gesture.current = null;
        return;
      }
      gesture.current = begin(p);
    },
    move: (p: PointerAt) => {
      if (gesture.current) gesture.current.move(p);
      else {
        const { view, history } = store.getState();
        act.hover(view ? partAt(history.now, p.at, REACH_PX / 2 / view.pxPerMm) : null);
      }
    },
    release: (p: PointerAt) => {
      if (gesture.current?.up(p)) gesture.current = null;
    },
    leave: () => {
      act.hover(null);
    },
  };
};
