"use client";
import { memo, useEffect, useMemo, useRef, useState, type PointerEvent } from "react";
import { Layer, Shape, Stage } from "react-konva";
import { useBench, useBenchActions } from "@/components/bench/bench-store";
import { CanvasFlag } from "@/components/bench/canvas/canvas-flag";
import { DetailGlass } from "@/components/bench/canvas/detail-glass";
import { CanvasKey, ScaleBar } from "@/components/bench/canvas/canvas-key";
import type { PointerAt } from "@/components/bench/canvas/gesture";
import { handleStrokes, overlayStrokes } from "@/components/bench/canvas/overlay";
import { outlineHandles } from "@/components/bench/canvas/outline-handles";
import { handlesOf } from "@/components/bench/canvas/resize-gesture";
import { gridStrokes, rulerStrokes } from "@/components/bench/canvas/ruler";
import { ViewButtons } from "@/components/bench/canvas/view-buttons";
import { useCanvasKeys } from "@/components/bench/canvas/use-canvas-keys";
import { useColours } from "@/components/bench/canvas/use-colours";
import { useGestures } from "@/components/bench/canvas/use-gestures";
import { useSize } from "@/components/bench/canvas/use-size";
import { useView } from "@/components/bench/canvas/use-view";
import { useLengths } from "@/components/bench/use-lengths";
import { paintStrokes } from "@/components/figure/figure-konva";
import { SHOW_ALL } from "@/lib/figure/compose-figure";
import { drawingFigure } from "@/lib/figure/drawing-figure";
import type { DisplayList } from "@/lib/figure/display-list";
import { strokesOf } from "@/lib/figure/strokes";
import type { Stroke } from "@/lib/figure/stroke";
import { toDrawing, type View } from "@/lib/figure/view";
import type { Point } from "@/lib/geometry/region";
import type { Context } from "konva/lib/Context";

const NONE: readonly Stroke[] = [];
/** From here on balloons and dimensions are left out while the hand moves, so that it stays smooth. */
const MANY_PARTS = 24;
const WHILE_MOVING = { ...SHOW_ALL, balloons: false, dimensions: false };
const native = (context: Context): CanvasRenderingContext2D => context._context;

const useFigure = (view: View | null): DisplayList | null => {
  const drawing = useBench((s) => s.history.now);
  const picked = useBench((s) => s.picked);
  const hovered = useBench((s) => s.hovered);
  const moving = useBench((s) => s.moving);
  const figures = useBench((s) => s.figures);
  const { formatLength } = useLengths();
  return useMemo(() => {
    if (!view || drawing.parts.length === 0) return null;
    return drawingFigure({
      drawing,
      picked: new Set(hovered ? [...picked, hovered] : picked),
      contacts: figures?.section.contacts ?? [],
      moving: new Set(moving),
      properties: figures?.properties ?? null,
      pxPerMm: view.pxPerMm,
      formatLength,
      show: drawing.parts.length > MANY_PARTS && moving.length > 0 ? WHILE_MOVING : SHOW_ALL,
    });
  }, [drawing, picked, hovered, moving, figures, view, formatLength]);
};

/** The sheet on which the section is drawn. Everything on it can be done in the parts table too. */
export const BenchCanvas = memo(function BenchCanvas() {
  const box = useRef<HTMLDivElement>(null);
  const size = useSize(box);
  const colours = useColours(box);
  const { view, fit, zoom, pan } = useView(size);
  const gestures = useGestures();
  const act = useBenchActions();
  const drawing = useBench((s) => s.history.now);
  const picked = useBench((s) => s.picked);
  const tool = useBench((s) => s.tool);
  const { unitMm } = useLengths();
  const [pointer, setPointer] = useState<Point | null>(null);
  const panning = useRef<Point | null>(null);
  const space = useCanvasKeys({ fit, zoom, active: gestures.active });
  const list = useFigure(view);
  const figure = useMemo(
    () => (list && view ? list.items.flatMap((item) => strokesOf(item, view)) : NONE),
    [list, view],
  );
  const glass = useBench((s) => s.glass);

  useEffect(() => {
    const target = box.current;
    if (!target) return;
    const onWheel = (event: WheelEvent) => {
      event.preventDefault();
      const bounds = target.getBoundingClientRect();
      const at = { x: event.clientX - bounds.left, y: event.clientY - bounds.top };
      if (event.shiftKey && !event.ctrlKey) pan(-event.deltaY - event.deltaX, 0);
      else zoom(Math.exp(-event.deltaY * (event.ctrlKey ? 0.01 : 0.0015)), at);
    };
    target.addEventListener("wheel", onWheel, { passive: false });
    return () => target.removeEventListener("wheel", onWheel);
  }, [pan, zoom]);

  const placeOf = (event: PointerEvent): PointerAt | null => {
    const bounds = box.current?.getBoundingClientRect();
    if (!bounds || !view) return null;
    const screen = { x: event.clientX - bounds.left, y: event.clientY - bounds.top };
    return { screen, at: toDrawing(view, screen), shift: event.shiftKey };
  };
  const onPointerDown = (event: PointerEvent<HTMLDivElement>) => {
    const p = placeOf(event);
    if (!p) return;
    event.currentTarget.focus({ preventScroll: true });
    event.currentTarget.setPointerCapture(event.pointerId);
    if (event.button === 1 || space.current) {
      event.preventDefault();
      panning.current = p.screen;
    } else if (event.button === 0) gestures.press(p);
  };
  const onPointerMove = (event: PointerEvent<HTMLDivElement>) => {
    const p = placeOf(event);
    if (!p) return;
    setPointer(p.screen);
    if (panning.current) {
      pan(p.screen.x - panning.current.x, p.screen.y - panning.current.y);
      panning.current = p.screen;
    } else gestures.move(p);
  };
  const onPointerUp = (event: PointerEvent<HTMLDivElement>) => {
    const p = placeOf(event);
    if (panning.current) panning.current = null;
    else if (p) gestures.release(p);
  };

  const ready = size && view && colours;
  return (
    <>
      <div
        ref={box}
        role="application"
        tabIndex={0}
        data-view={view ? `${view.xPx} ${view.yPx} ${view.pxPerMm}` : undefined}
        aria-label="Drawing sheet. The parts table below holds the same parts, every number to be typed."
        className="absolute inset-0 touch-none overflow-hidden outline-offset-[-2px]"
        style={{ cursor: tool === "select" ? "default" : "crosshair" }}
        onPointerDown={onPointerDown}
        onPointerMove={onPointerMove}
        onPointerUp={onPointerUp}
        onPointerCancel={onPointerUp}
        onPointerLeave={() => {
          setPointer(null);
          gestures.leave();
        }}
        onDoubleClick={() => act.use("select")}
      >
        {ready && (
          <>
            <Stage width={size.width} height={size.height} listening={false}>
              <Layer listening={false}>
                <Shape
                  listening={false}
                  perfectDrawEnabled={false}
                  sceneFunc={(context) => {
                    paintStrokes(native(context), gridStrokes(view, size, unitMm), colours);
                    paintStrokes(native(context), figure, colours);
                  }}
                />
              </Layer>
              <Layer listening={false}>
                <Shape
                  listening={false}
                  perfectDrawEnabled={false}
                  sceneFunc={(context) => {
                    const handles = [...handlesOf(drawing, picked), ...outlineHandles(drawing, picked)].map(
                      (h) => h.at,
                    );
                    paintStrokes(
                      native(context),
                      [
                        ...overlayStrokes(gestures.overlay, view, size),
                        ...handleStrokes(handles, view),
                        ...rulerStrokes(view, size, unitMm, pointer),
                      ],
                      colours,
                    );
                  }}
                />
              </Layer>
            </Stage>
            <ScaleBar view={view} />
            <CanvasKey />
            {glass && list && pointer && (
              <DetailGlass list={list} view={view} pointer={pointer} size={size} colours={colours} />
            )}
            {gestures.overlay.flag && <CanvasFlag flag={gestures.overlay.flag} view={view} size={size} />}
          </>
        )}
      </div>
      <ViewButtons fit={fit} zoom={zoom} />
    </>
  );
});
