import type { Drawing, DrawingPart } from "@/lib/drawing/schema";
import { newDrawing } from "@/lib/drawing/new-drawing";

export const platePart = (
  id: string,
  width: number,
  height: number,
  x: number,
  y: number,
  more: Partial<DrawingPart> = {},
): DrawingPart =>
  ({
    id,
    name: id,
    material: "steel",
    at: { x, y },
    angle: 0,
    shape: { kind: "plate", width, height },
    ...more,
  }) as DrawingPart; // safe: `more` only overrides fields of a plate part in tests

export const drawingOf = (...parts: DrawingPart[]): Drawing => ({ ...newDrawing(), parts });

/** Top flange 420 × 36, web 18 × 564, bottom flange 280 × 32, standing on the datum. */
export const girder = (): Drawing =>
  drawingOf(
    platePart("tf", 420, 36, 0, 614),
    platePart("web", 18, 564, 0, 314),
    platePart("bf", 280, 32, 0, 16),
  );
