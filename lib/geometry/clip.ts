import polygonClipping from "polygon-clipping";
import type { MultiPolygon, Polygon } from "polygon-clipping";
import { AREA_IDENTITY_REL, SNAP_STEPS_MM } from "@/lib/geometry/tolerance";
import type { Result } from "@/lib/result";
import { err, ok } from "@/lib/result";

/** Polygons as the clipper takes them: polygon → ring (outer first) → [x, y], mm. */
export type Polygons = MultiPolygon;

/** What a clip gave, and the grid step it was done on, mm; more than the first step means it had to be retried. */
export type Clipped<T> = Readonly<{ value: T; stepMm: number }>;

const snapTo = (polygons: Polygons, step: number): Polygons =>
  polygons.map((polygon) =>
    polygon.map((ring) => ring.map(([x, y]) => [Math.round(x / step) * step, Math.round(y / step) * step])),
  );

const ringArea = (ring: Polygon[number]): number => {
  const [ox, oy] = ring[0] ?? [0, 0];
  let twice = 0;
  let [x0, y0] = [0, 0];
  for (const [px, py] of ring) {
    const [x1, y1] = [px - ox, py - oy];
    twice += x0 * y1 - x1 * y0;
    [x0, y0] = [x1, y1];
  }
  return Math.abs(twice) / 2;
};

/** Area of polygons whose first rings are outer ones and the rest holes, mm². */
export const polygonsArea = (polygons: Polygons): number =>
  polygons.reduce(
    (sum, polygon) => polygon.reduce((rest, ring, i) => rest + (i === 0 ? 1 : -1) * ringArea(ring), sum),
    0,
  );

/**
 * Runs a clip on one grid after the other until it gives an answer: a throw, or null for areas that do not add up, is
 * tried again on the next coarser one.
 * @returns the answer and its grid, or `clip.failed` with the reason of the last grid.
 */
export const onGrids = <T>(once: (step: number) => T | null): Result<Clipped<T>> => {
  let reason = "its areas did not add up";
  for (const stepMm of SNAP_STEPS_MM) {
    try {
      const value = once(stepMm);
      if (value !== null) return ok({ value, stepMm });
    } catch (thrown) {
      reason = thrown instanceof Error ? thrown.message : String(thrown);
    }
  }
  return err({
    code: "clip.failed",
    detail: `The overlap could not be worked out (${reason}). Move one of the parts a little, or draw them without overlap.`,
  });
};

const addUp = (a: number, b: number, sum: number): boolean =>
  Math.abs(a + b - sum) <= AREA_IDENTITY_REL * sum;

/** What of `subject` lies outside and inside `other`. */
export type Cut = Readonly<{ rest: Polygons; common: Polygons }>;

/**
 * Cuts `subject` along the outline of everything in `others`. Vertices are snapped to a grid first (the clipper throws on
 * edges that differ in their last bits), a throw is tried again on coarser grids, and |A∖B| + |A∩B| = |A| is asked to
 * hold: with |A∪B| = |A∖B| + |B|, which `arrange` asks of the outline it traces, |A∪B| + |A∩B| = |A| + |B|.
 * @param others polygons that may overlap each other.
 * @returns the two pieces, or `clip.failed` when no grid gave an answer that adds up.
 */
export const cutPolygons = (subject: Polygons, others: readonly Polygons[]): Result<Clipped<Cut>> =>
  onGrids((step) => {
    const a = snapTo(subject, step);
    const [first = [], ...more] = others.map((other) => snapTo(other, step));
    const cover = more.length === 0 ? first : polygonClipping.union(first, ...more);
    const rest = polygonClipping.difference(a, cover);
    const common = polygonClipping.intersection(a, cover);
    return addUp(polygonsArea(rest), polygonsArea(common), polygonsArea(a)) ? { rest, common } : null;
  });
