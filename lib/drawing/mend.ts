import { changePart, moveParts } from "@/lib/drawing/edit-parts";
import { partBox } from "@/lib/drawing/placed-part";
import type { Drawing, DrawingPart } from "@/lib/drawing/schema";
import type { Box } from "@/lib/geometry/arc";
import type { Point } from "@/lib/geometry/region";

/** One way to put a fault right: what the button says and the drawing it gives. */
export type Mend = Readonly<{ label: string; drawing: Drawing }>;

const itemOf = (drawing: Drawing, id: string) => drawing.parts.findIndex((p) => p.id === id) + 1;

const overlapBox = (a: Box, b: Box): Box | null => {
  const both = {
    xMin: Math.max(a.xMin, b.xMin),
    xMax: Math.min(a.xMax, b.xMax),
    yMin: Math.max(a.yMin, b.yMin),
    yMax: Math.min(a.yMax, b.yMax),
  };
  return both.xMax > both.xMin && both.yMax > both.yMin ? both : null;
};

/** The least move along one axis that sets `b` against `a` without overlap. */
const buttMove = (a: Box, b: Box): Point => {
  const ways: Point[] = [
    { x: a.xMax - b.xMin, y: 0 },
    { x: a.xMin - b.xMax, y: 0 },
    { x: 0, y: a.yMax - b.yMin },
    { x: 0, y: a.yMin - b.yMax },
  ];
  return ways.reduce((best, w) => (Math.abs(w.x + w.y) < Math.abs(best.x + best.y) ? w : best));
};

const squarePlate = (p: DrawingPart): boolean => p.shape.kind === "plate" && p.angle % 180 === 0;

/** A plate cut back so that it ends at the other part's face, where the overlap runs over its whole width at one end. */
const cutBack = (drawing: Drawing, part: DrawingPart, own: Box, both: Box): Drawing | null => {
  if (!squarePlate(part) || part.shape.kind !== "plate") return null;
  const slack = 1e-6 * Math.max(own.xMax - own.xMin, own.yMax - own.yMin);
  const spans = (low: "xMin" | "yMin", high: "xMax" | "yMax") =>
    both[low] <= own[low] + slack && both[high] >= own[high] - slack;
  const rest = { ...own };
  if (spans("xMin", "xMax")) {
    if (both.yMax >= own.yMax - slack) rest.yMax = both.yMin;
    else if (both.yMin <= own.yMin + slack) rest.yMin = both.yMax;
    else return null;
  } else if (spans("yMin", "yMax")) {
    if (both.xMax >= own.xMax - slack) rest.xMax = both.xMin;
    else if (both.xMin <= own.xMin + slack) rest.xMin = both.xMax;
    else return null;
  } else return null;
  const [width, height] = [rest.xMax - rest.xMin, rest.yMax - rest.yMin];
  if (width <= slack || height <= slack) return null;
  return changePart(drawing, part.id, (p) => ({
    ...p,
    at: { x: (rest.xMin + rest.xMax) / 2, y: (rest.yMin + rest.yMax) / 2 },
    shape: { kind: "plate", width, height },
  }));
};

/** The parts whose box overlaps that of a part by more than a sliver, the deepest overlap first. */
export const overlappingWith = (drawing: Drawing, id: string): string[] => {
  const part = drawing.parts.find((p) => p.id === id);
  const own = part && partBox(part);
  if (!own) return [];
  const sizeOf = (b: Box) => (b.xMax - b.xMin) * (b.yMax - b.yMin);
  return drawing.parts
    .flatMap((p) => {
      const box = p.id === id || p.cutout === true ? null : partBox(p);
      const both = box && overlapBox(own, box);
      return both && sizeOf(both) > 1e-6 ? [{ id: p.id, size: sizeOf(both) }] : [];
    })
    .sort((a, b) => b.size - a.size)
    .map((found) => found.id);
};

/** Ways to part two parts that overlap: set the later one against the earlier, or cut the plate back that runs into the other. */
export const mendOverlap = (drawing: Drawing, ids: readonly string[]): Mend[] => {
  const [a, b] = drawing.parts.filter((p) => ids.includes(p.id));
  const [boxA, boxB] = [a && partBox(a), b && partBox(b)];
  const both = boxA && boxB ? overlapBox(boxA, boxB) : null;
  if (!a || !b || !boxA || !boxB || !both) return [];
  const butted = moveParts(drawing, [b.id], buttMove(boxA, boxB));
  const cuts = [b, a].flatMap((part): Mend[] => {
    const cut = cutBack(drawing, part, part === a ? boxA : boxB, both);
    return cut ? [{ label: `cut ${itemOf(drawing, part.id)} back`, drawing: cut }] : [];
  });
  const butt: Mend[] =
    b.locked === true
      ? []
      : [{ label: `set ${itemOf(drawing, b.id)} against ${itemOf(drawing, a.id)}`, drawing: butted }];
  return [...cuts, ...butt];
};

/** The least move that brings box `b` against box `a`: along one axis where they face each other, else to its corner. */
const closeMove = (a: Box, b: Box): Point => {
  const gap = (aMin: number, aMax: number, bMin: number, bMax: number) =>
    bMin > aMax ? aMax - bMin : aMin > bMax ? aMin - bMax : 0;
  return { x: gap(a.xMin, a.xMax, b.xMin, b.xMax), y: gap(a.yMin, a.yMax, b.yMin, b.yMax) };
};

/** Brings a floating body against the nearest part of the rest; where they only face corner to corner it is also slid along. */
export const mendFloating = (drawing: Drawing, ids: readonly string[]): Mend[] => {
  const floating = drawing.parts.filter((p) => ids.includes(p.id));
  const rest = drawing.parts.filter((p) => !ids.includes(p.id) && p.cutout !== true);
  let best: { by: Point; to: string; length: number } | null = null;
  for (const f of floating)
    for (const r of rest) {
      const [own, other] = [partBox(f), partBox(r)];
      if (!own || !other) continue;
      const by = settle(closeMove(other, own), own, other);
      const length = Math.hypot(by.x, by.y);
      if (length > 0 && (!best || length < best.length)) best = { by, to: r.id, length };
    }
  if (!best) return [];
  const moved = moveParts(drawing, ids, best.by);
  return [{ label: `move against ${itemOf(drawing, best.to)}`, drawing: moved }];
};

/** A corner-to-corner move is lengthened along x so that the boxes share a stretch of edge. */
const settle = (by: Point, own: Box, other: Box): Point => {
  if (by.x === 0 || by.y === 0) return by;
  const share = Math.min(own.xMax - own.xMin, other.xMax - other.xMin);
  return { x: by.x + Math.sign(by.x) * share, y: by.y };
};
