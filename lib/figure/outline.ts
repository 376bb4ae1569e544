import type { Point, Ring, Vertex } from "@/lib/geometry/region";
import type { Box } from "@/lib/figure/display-list";
import { toScreen, type View } from "@/lib/figure/view";

const FULL_TURN = 2 * Math.PI;
const round = (v: number) => Math.round(v * 100) / 100;

type Arc = Readonly<{ centre: Point; radius: number; start: number; sweep: number }>;

/** The circular arc of an edge with bulge ≠ 0; angles in radians, sweep positive anticlockwise. */
export const arcOf = (a: Vertex, b: Point): Arc | null => {
  const bulge = a.bulge ?? 0;
  const dx = b.x - a.x;
  const dy = b.y - a.y;
  if (bulge === 0 || (dx === 0 && dy === 0)) return null;
  const lift = (1 - bulge * bulge) / (4 * bulge);
  const centre = { x: (a.x + b.x) / 2 - dy * lift, y: (a.y + b.y) / 2 + dx * lift };
  return {
    centre,
    radius: Math.hypot(a.x - centre.x, a.y - centre.y),
    start: Math.atan2(a.y - centre.y, a.x - centre.x),
    sweep: 4 * Math.atan(bulge),
  };
};

/** Points along a ring, arcs as chords of at most `stepDeg`; for hit tests, hatching and placing, never for properties. */
export const chordsOf = (ring: Ring, stepDeg = 10): Point[] =>
  ring.flatMap((a, i) => {
    const arc = arcOf(a, ring[(i + 1) % ring.length] ?? a);
    if (!arc) return [{ x: a.x, y: a.y }];
    const n = Math.max(1, Math.ceil(Math.abs(arc.sweep) / ((stepDeg * Math.PI) / 180)));
    return Array.from({ length: n }, (_, k) =>
      k === 0
        ? { x: a.x, y: a.y }
        : {
            x: arc.centre.x + arc.radius * Math.cos(arc.start + (arc.sweep * k) / n),
            y: arc.centre.y + arc.radius * Math.sin(arc.start + (arc.sweep * k) / n),
          },
    );
  });

const passes = (arc: Arc, angle: number): boolean => {
  const turn = arc.sweep > 0 ? angle - arc.start : arc.start - angle;
  return ((turn % FULL_TURN) + FULL_TURN) % FULL_TURN <= Math.abs(arc.sweep);
};

const extremesOf = (arc: Arc): Point[] =>
  [0, Math.PI / 2, Math.PI, -Math.PI / 2]
    .filter((angle) => passes(arc, angle))
    .map((angle) => ({
      x: arc.centre.x + arc.radius * Math.round(Math.cos(angle)),
      y: arc.centre.y + arc.radius * Math.round(Math.sin(angle)),
    }));

/** Bounding box of rings, arcs included exactly; null when there is no vertex. */
export const boxOfRings = (rings: readonly Ring[]): Box | null => {
  let box: Box | null = null;
  const take = (p: Point) => {
    box = box
      ? {
          xMin: Math.min(box.xMin, p.x),
          xMax: Math.max(box.xMax, p.x),
          yMin: Math.min(box.yMin, p.y),
          yMax: Math.max(box.yMax, p.y),
        }
      : { xMin: p.x, xMax: p.x, yMin: p.y, yMax: p.y };
  };
  for (const ring of rings)
    ring.forEach((a, i) => {
      take(a);
      const arc = arcOf(a, ring[(i + 1) % ring.length] ?? a);
      if (arc) extremesOf(arc).forEach(take);
    });
  return box;
};

export const joinBoxes = (boxes: readonly Box[]): Box | null =>
  boxes.reduce<Box | null>(
    (sum, b) =>
      sum
        ? {
            xMin: Math.min(sum.xMin, b.xMin),
            xMax: Math.max(sum.xMax, b.xMax),
            yMin: Math.min(sum.yMin, b.yMin),
            yMax: Math.max(sum.yMax, b.yMax),
          }
        : b,
    null,
  );

/** SVG path data of a ring on screen; arcs stay arcs. */
export const pathData = (ring: Ring, view: View, closed = true): string => {
  const first = ring[0];
  if (!first) return "";
  const start = toScreen(view, first);
  const parts = [`M${round(start.x)} ${round(start.y)}`];
  const count = closed ? ring.length : ring.length - 1;
  for (let i = 0; i < count; i++) {
    const a = ring[i] ?? first;
    const b = ring[(i + 1) % ring.length] ?? first;
    const end = toScreen(view, b);
    const arc = arcOf(a, b);
    if (arc) {
      const r = round(arc.radius * view.pxPerMm);
      const large = Math.abs(arc.sweep) > Math.PI ? 1 : 0;
      parts.push(`A${r} ${r} 0 ${large} ${arc.sweep > 0 ? 0 : 1} ${round(end.x)} ${round(end.y)}`);
    } else if (i < ring.length - 1 || !closed) parts.push(`L${round(end.x)} ${round(end.y)}`);
  }
  return parts.join("") + (closed ? "Z" : "");
};

/** Twice area over perimeter: the thickness of a plate, and a fair measure of how thin anything else is, mm. */
export const thinnessOf = (rings: readonly Ring[]): number => {
  let area = 0;
  let length = 0;
  for (const ring of rings) {
    const pts = chordsOf(ring);
    const o = pts[0];
    if (!o) continue;
    pts.forEach((p, i) => {
      const q = pts[(i + 1) % pts.length] ?? p;
      area += ((p.x - o.x) * (q.y - o.y) - (q.x - o.x) * (p.y - o.y)) / 2;
      length += Math.hypot(q.x - p.x, q.y - p.y);
    });
  }
  return length > 0 ? (2 * Math.abs(area)) / length : 0;
};

/** Even-odd test of a point against rings of chords. */
export const insideChords = (loops: readonly (readonly Point[])[], p: Point): boolean => {
  let inside = false;
  for (const loop of loops)
    for (let i = 0, j = loop.length - 1; i < loop.length; j = i++) {
      const a = loop[i];
      const b = loop[j];
      if (!a || !b) continue;
      if (a.y > p.y !== b.y > p.y && p.x < ((b.x - a.x) * (p.y - a.y)) / (b.y - a.y) + a.x) inside = !inside;
    }
  return inside;
};

/** A point well inside the material: the middle of the longest stretch at the given share of the height (and its neighbours). */
export const pointInside = (rings: readonly Ring[], share = 0.5): Point | null => {
  const box = boxOfRings(rings);
  if (!box) return null;
  const loops = rings.map((r) => chordsOf(r));
  const stretches = [share, share * 0.6 + 0.013, 1 - share * 0.6].flatMap((s) => {
    const y = box.yMin + (box.yMax - box.yMin) * s;
    const xs = crossings(loops, y);
    return xs.flatMap((x, i) => {
      const end = xs[i + 1];
      return i % 2 === 0 && end !== undefined ? [{ x: (x + end) / 2, y, length: end - x }] : [];
    });
  });
  const best = stretches.reduce<(typeof stretches)[number] | null>(
    (a, b) => (a && a.length >= b.length * 0.999 ? a : b),
    null,
  );
  return best && { x: best.x, y: best.y };
};

/** Sorted x of where a level line meets the loops. */
export const crossings = (loops: readonly (readonly Point[])[], y: number): number[] => {
  const xs: number[] = [];
  for (const loop of loops)
    for (let i = 0, j = loop.length - 1; i < loop.length; j = i++) {
      const a = loop[i];
      const b = loop[j];
      if (a && b && a.y > y !== b.y > y) xs.push(((b.x - a.x) * (y - a.y)) / (b.y - a.y) + a.x);
    }
  return xs.sort((a, b) => a - b);
};
