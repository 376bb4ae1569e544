import { partBox } from "@/lib/drawing/placed-part";
import type { Drawing } from "@/lib/drawing/schema";
import type { Box } from "@/lib/geometry/arc";
import type { Point } from "@/lib/geometry/region";

/** What a moved thing met: the line to draw and the reason in words. */
export type SnapHit = Readonly<{
  axis: "x" | "y";
  at: number;
  reason: string;
  kind: SnapKind;
  item: string | null;
}>;
export type SnapKind = "edge" | "centre line" | "centroid" | "grid";

/** `by` is the move after snapping, mm. `words` is empty where nothing was met. */
export type Snapped = Readonly<{ by: Point; hits: readonly SnapHit[]; words: string }>;

export type SnapTarget = Readonly<{ item: string; box: Box }>;

export type SnapOptions = Readonly<{
  /** How near counts, mm (a fixed number of px on screen). */
  reach: number;
  /** Grid step, mm; 0 for none. */
  grid: number;
  centroid: Point | null;
}>;

/** The parts that stay, as targets; `moving` are left out. Items are their numbers in the parts table. */
export const snapTargets = (drawing: Drawing, moving: readonly string[]): SnapTarget[] =>
  drawing.parts.flatMap((part, i) => {
    const box = moving.includes(part.id) ? null : partBox(part);
    return box ? [{ item: String(i + 1), box }] : [];
  });

type Candidate = Readonly<{ delta: number; hit: SnapHit; rank: number }>;

const RANK: Record<SnapKind, number> = { edge: 0, "centre line": 1, centroid: 2, grid: 3 };
const NAMES = {
  x: { low: "left edge", high: "right edge", min: "xMin", max: "xMax" },
  y: { low: "underside", high: "top", min: "yMin", max: "yMax" },
} as const;

const meets = (a: Box, b: Box, axis: "x" | "y", slack: number): boolean => {
  const { min, max } = NAMES[axis];
  return a[min] - slack <= b[max] && b[min] - slack <= a[max];
};

const candidates = (
  moved: Box,
  axis: "x" | "y",
  targets: readonly SnapTarget[],
  options: SnapOptions,
): Candidate[] => {
  const { low, high, min, max } = NAMES[axis];
  const other = axis === "x" ? "y" : "x";
  const mid = (b: Box) => (b[min] + b[max]) / 2;
  const make = (
    from: number,
    at: number,
    kind: SnapKind,
    reason: string,
    item: string | null,
  ): Candidate => ({
    delta: at - from,
    rank: RANK[kind],
    hit: { axis, at, reason, kind, item },
  });
  const found: Candidate[] = targets.flatMap(({ item, box }) => [
    make(moved[min], box[min], "edge", `flush with ${item}, ${low}`, item),
    make(moved[max], box[max], "edge", `flush with ${item}, ${high}`, item),
    ...(meets(moved, box, other, options.reach)
      ? [
          make(moved[min], box[max], "edge", `against ${item}, ${high}`, item),
          make(moved[max], box[min], "edge", `against ${item}, ${low}`, item),
        ]
      : []),
    make(mid(moved), mid(box), "centre line", `on the centre line of ${item}`, item),
    make(moved[min], mid(box), "centre line", `${low} on the centre line of ${item}`, item),
    make(moved[max], mid(box), "centre line", `${high} on the centre line of ${item}`, item),
  ]);
  if (options.centroid)
    found.push(make(mid(moved), options.centroid[axis], "centroid", "on the centroid", null));
  if (options.grid > 0) {
    const step = (v: number) => Math.round(v / options.grid) * options.grid;
    found.push(make(moved[min], step(moved[min]), "grid", `grid, ${options.grid} mm`, null));
  }
  return found;
};

const nearest = (found: readonly Candidate[], reach: number): Candidate | null =>
  found
    .filter((c) => Math.abs(c.delta) <= (c.hit.kind === "grid" ? Infinity : reach))
    .reduce<Candidate | null>((best, c) => {
      if (!best) return c;
      if (c.rank !== best.rank) return c.rank < best.rank ? c : best;
      return Math.abs(c.delta) < Math.abs(best.delta) - 1e-9 ? c : best;
    }, null);

const shifted = (box: Box, by: Point): Box => ({
  xMin: box.xMin + by.x,
  xMax: box.xMax + by.x,
  yMin: box.yMin + by.y,
  yMax: box.yMax + by.y,
});

/**
 * A move corrected so that edges, corners, centre lines, the centroid or the grid are met, in this order of preference; each
 * axis for itself. Edges of one part met on both axes are its corner.
 */
export const snapMove = (
  box: Box,
  wanted: Point,
  targets: readonly SnapTarget[],
  options: SnapOptions,
): Snapped => {
  const x = nearest(candidates(shifted(box, wanted), "x", targets, options), options.reach);
  const step = { x: wanted.x + (x?.delta ?? 0), y: wanted.y };
  const y = nearest(candidates(shifted(box, step), "y", targets, options), options.reach);
  const by = { x: step.x, y: wanted.y + (y?.delta ?? 0) };
  const hits = [x, y].flatMap((c) => (c ? [c.hit] : []));
  return { by, hits, words: wordsOf(hits) };
};

const wordsOf = (hits: readonly SnapHit[]): string => {
  const told = hits.filter((h) => h.kind !== "grid");
  const [a, b] = told;
  if (a && b && a.kind === "edge" && b.kind === "edge" && a.item === b.item)
    return `corner of ${a.item}: ${a.reason}, ${edgeOf(b)}`;
  if (told.length > 0) return told.map((h) => h.reason).join("; ");
  return hits[0]?.reason ?? "";
};

const edgeOf = (hit: SnapHit): string => hit.reason.split(", ").at(-1) ?? hit.reason;
