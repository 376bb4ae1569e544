import type { PartShape } from "@/lib/drawing/schema";
import { arcOf } from "@/lib/geometry/arc";
import type { Point, Vertex } from "@/lib/geometry/region";
import { err, ok, type Fault, type Result } from "@/lib/result";

export type Outline = Extract<PartShape, { kind: "outline" }>;
type Bulged = Readonly<{ x: number; y: number; bulge?: number | undefined }>;

const vertex = (v: Bulged): Vertex => (v.bulge ? { x: v.x, y: v.y, bulge: v.bulge } : { x: v.x, y: v.y });
const withVertex = (outline: Outline, i: number, next: Bulged): Outline => ({
  ...outline,
  outer: outline.outer.map((v, k) => (k === i ? vertex(next) : v)),
});
const at = (outline: Outline, i: number): Vertex | undefined => {
  const v = outline.outer[(i + outline.outer.length) % outline.outer.length];
  return v && vertex(v);
};

/** A corner moved; the arcs of its two edges keep their included angle. */
export const moveVertex = (outline: Outline, i: number, to: Point): Outline => {
  const v = at(outline, i);
  return v ? withVertex(outline, i, { ...v, x: to.x, y: to.y }) : outline;
};

/** A new corner in the middle of the edge that leaves corner `i`; an arc is parted into two of the same circle. */
export const insertVertex = (outline: Outline, i: number): Outline => {
  const [a, b] = [at(outline, i), at(outline, i + 1)];
  if (!a || !b) return outline;
  const bulge = a.bulge ? Math.tan(Math.atan(a.bulge) / 2) : 0;
  const middle = edgeMiddle(a, b);
  const outer = [...outline.outer];
  outer[i] = vertex({ x: a.x, y: a.y, bulge });
  outer.splice(i + 1, 0, vertex({ ...middle, bulge }));
  return { ...outline, outer };
};

/** The outline without a corner; at least three stay. */
export const removeVertex = (outline: Outline, i: number): Outline =>
  outline.outer.length <= 3 ? outline : { ...outline, outer: outline.outer.filter((_, k) => k !== i) };

/** The middle of an edge, on its arc where it has one. */
export const edgeMiddle = (a: Vertex, b: Point): Point => {
  const sagitta = ((a.bulge ?? 0) * Math.hypot(b.x - a.x, b.y - a.y)) / 2;
  const length = Math.hypot(b.x - a.x, b.y - a.y) || 1;
  return {
    x: (a.x + b.x) / 2 + (sagitta * (b.y - a.y)) / length,
    y: (a.y + b.y) / 2 - (sagitta * (b.x - a.x)) / length,
  };
};

/** The edge that leaves corner `i` bent so that it passes through a point: its middle handle dragged. Straight when near. */
export const bendEdge = (outline: Outline, i: number, through: Point, straightBelow: number): Outline => {
  const [a, b] = [at(outline, i), at(outline, i + 1)];
  if (!a || !b) return outline;
  const chord = Math.hypot(b.x - a.x, b.y - a.y);
  if (chord === 0) return outline;
  const sagitta =
    ((through.x - (a.x + b.x) / 2) * (b.y - a.y) - (through.y - (a.y + b.y) / 2) * (b.x - a.x)) / chord;
  const bulge = Math.abs(sagitta) <= straightBelow ? 0 : (2 * sagitta) / chord;
  return withVertex(outline, i, { x: a.x, y: a.y, bulge: Math.max(-50, Math.min(50, bulge)) });
};

/** Radius of the edge that leaves corner `i`, mm, positive where it bulges outwards; null for a straight one. */
export const edgeRadius = (outline: Outline, i: number): number | null => {
  const [a, b] = [at(outline, i), at(outline, i + 1)];
  const arc = a && b ? arcOf(a, b) : null;
  return arc && a ? arc.radius * Math.sign(a.bulge ?? 0) : null;
};

/**
 * The edge that leaves corner `i` given a radius (the shorter arc; negative bends it inwards), or made straight with null.
 * A radius under half the chord cannot span it.
 */
export const setEdgeRadius = (outline: Outline, i: number, radius: number | null): Result<Outline, Fault> => {
  const [a, b] = [at(outline, i), at(outline, i + 1)];
  if (!a || !b) return ok(outline);
  if (radius === null || radius === 0) return ok(withVertex(outline, i, { x: a.x, y: a.y }));
  const half = Math.hypot(b.x - a.x, b.y - a.y) / 2;
  const size = Math.abs(radius);
  if (size < half * (1 - 1e-9))
    return err({
      code: "outline.radius",
      detail: `A radius of ${size} mm cannot span this edge: at least ${Math.ceil(half * 1e3) / 1e3} mm.`,
    });
  const sweep = 2 * Math.asin(Math.min(half / size, 1));
  return ok(withVertex(outline, i, { x: a.x, y: a.y, bulge: Math.sign(radius) * Math.tan(sweep / 4) }));
};

type Corner = Readonly<{ p: Point; toPrevious: Point; toNext: Point; half: number; room: number }>;

const cornerOf = (outline: Outline, i: number): Result<Corner, Fault> => {
  const [a, p, b] = [at(outline, i - 1), at(outline, i), at(outline, i + 1)];
  if (!a || !p || !b || a.bulge || p.bulge)
    return err({
      code: "outline.arcCorner",
      detail: "Only a corner between two straight edges can be rounded or cut.",
    });
  const [la, lb] = [Math.hypot(a.x - p.x, a.y - p.y), Math.hypot(b.x - p.x, b.y - p.y)];
  const toPrevious = { x: (a.x - p.x) / la, y: (a.y - p.y) / la };
  const toNext = { x: (b.x - p.x) / lb, y: (b.y - p.y) / lb };
  const cos = Math.max(-1, Math.min(1, toPrevious.x * toNext.x + toPrevious.y * toNext.y));
  const half = Math.acos(cos) / 2;
  if (half < 1e-6 || half > Math.PI / 2 - 1e-6)
    return err({
      code: "outline.flatCorner",
      detail: "The edges at this corner run straight on: there is nothing to round.",
    });
  return ok({ p, toPrevious, toNext, half, room: Math.min(la, lb) });
};

const cut = (
  outline: Outline,
  i: number,
  { p, toPrevious, toNext }: Corner,
  back: number,
  bulge: number,
): Outline => {
  const outer = [...outline.outer];
  const start = { x: p.x + toPrevious.x * back, y: p.y + toPrevious.y * back, bulge };
  outer.splice(i, 1, vertex(start), vertex({ x: p.x + toNext.x * back, y: p.y + toNext.y * back }));
  return { ...outline, outer };
};

const noRoom = (): Result<never, Fault> =>
  err({
    code: "outline.noRoom",
    detail: "The edges at this corner are too short for that. Type a smaller size.",
  });

/** A corner rounded with a radius, mm: an arc that touches both edges. */
export const filletCorner = (outline: Outline, i: number, radius: number): Result<Outline, Fault> => {
  const corner = cornerOf(outline, i);
  if (!corner.ok) return corner;
  const { half, room, toPrevious, toNext } = corner.value;
  const back = radius / Math.tan(half);
  if (!(radius > 0) || back >= room) return noRoom();
  const left = toNext.x * -toPrevious.y - toNext.y * -toPrevious.x < 0;
  const bulge = Math.tan((Math.PI / 2 - half) / 2) * (left ? 1 : -1);
  return ok(cut(outline, i, corner.value, back, bulge));
};

/** A corner cut off straight, the same length back along both edges, mm. */
export const chamferCorner = (outline: Outline, i: number, back: number): Result<Outline, Fault> => {
  const corner = cornerOf(outline, i);
  if (!corner.ok) return corner;
  if (!(back > 0) || back >= corner.value.room) return noRoom();
  return ok(cut(outline, i, corner.value, back, 0));
};
