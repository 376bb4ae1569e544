"use client";
import { useCallback, useEffect, useRef } from "react";
import { useBench, useBenchActions, useBenchContext } from "@/components/bench/bench-store";
import { RULER_PX } from "@/components/bench/canvas/ruler";
import type { Size } from "@/components/bench/canvas/use-size";
import { boxOfParts } from "@/lib/drawing/placed-part";
import type { Point } from "@/lib/geometry/region";
import { centredView, fittingScale, zoomedView, type View } from "@/lib/figure/view";

const NOTHING_YET = { xMin: -300, xMax: 300, yMin: -60, yMax: 700 };
const LEAST = 1e-3;
const MOST = 2_000;

/** Room for dimensions and axis letters around the section, px. */
const MARGIN = { left: 118 + RULER_PX, right: 118, top: 76 + RULER_PX, bottom: 76 };
const NARROW = { left: 84 + RULER_PX, right: 84, top: 66 + RULER_PX, bottom: 62 };

/**
 * What part of the drawing is seen. It fits the section by itself until somebody zooms or pans, and again after "fit".
 */
export const useView = (size: Size | null) => {
  const { store } = useBenchContext();
  const act = useBenchActions();
  const view = useBench((s) => s.view);
  const byHand = useRef(false);

  const fit = useCallback(() => {
    if (!size || size.width < 50 || size.height < 50) return;
    byHand.current = false;
    const box = boxOfParts(store.getState().history.now) ?? NOTHING_YET;
    const margin = size.width < 700 ? NARROW : MARGIN;
    const scale = Math.min(fittingScale(box, size.width, size.height, margin), MOST);
    act.set({ view: centredView(box, scale, size.width, size.height, margin) });
  }, [size, store, act]);

  useEffect(() => {
    if (!byHand.current) fit();
  }, [fit]);
  useEffect(
    () =>
      store.subscribe((now, before) => {
        const rest = now.history.mark === null;
        if (
          rest &&
          (now.history.now !== before.history.now || before.history.mark !== null) &&
          !byHand.current
        )
          fit();
      }),
    [store, fit],
  );

  const change = useCallback(
    (next: View) => {
      byHand.current = true;
      if (next.pxPerMm >= LEAST && next.pxPerMm <= MOST) act.set({ view: next });
    },
    [act],
  );
  const zoom = useCallback(
    (factor: number, at?: Point) => {
      const now = store.getState().view;
      if (now && size) change(zoomedView(now, at ?? { x: size.width / 2, y: size.height / 2 }, factor));
    },
    [store, size, change],
  );
  const pan = useCallback(
    (dx: number, dy: number) => {
      const now = store.getState().view;
      if (now) change({ ...now, xPx: now.xPx + dx, yPx: now.yPx + dy });
    },
    [store, change],
  );
  return { view, fit, zoom, pan };
};
