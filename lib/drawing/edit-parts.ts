import type { Drawing, DrawingPart, PartShape } from "@/lib/drawing/schema";
import type { Point } from "@/lib/geometry/region";

/** An id that no part of the drawing has yet: p1, p2 … */
export const freeId = (drawing: Drawing, taken: ReadonlySet<string> = new Set()): string => {
  const ids = new Set([...drawing.parts.map((p) => p.id), ...taken]);
  let n = 1;
  while (ids.has(`p${n}`)) n++;
  return `p${n}`;
};

const withParts = (drawing: Drawing, change: (part: DrawingPart) => DrawingPart): Drawing => ({
  ...drawing,
  parts: drawing.parts.map(change),
});

/** The drawing with parts added at the end. */
export const addParts = (drawing: Drawing, parts: readonly DrawingPart[]): Drawing => ({
  ...drawing,
  parts: [...drawing.parts, ...parts],
});

/** The drawing without these parts and without joints that named them. */
export const removeParts = (drawing: Drawing, ids: readonly string[]): Drawing => ({
  ...drawing,
  parts: drawing.parts.filter((p) => !ids.includes(p.id)),
  joints: drawing.joints.filter((j) => !j.between.some((id) => ids.includes(id))),
});

/** The drawing with one part changed; locked parts change too: the lock is against the hand, not against typing. */
export const changePart = (
  drawing: Drawing,
  id: string,
  change: (part: DrawingPart) => DrawingPart,
): Drawing => withParts(drawing, (p) => (p.id === id ? change(p) : p));

export const reshapePart = (drawing: Drawing, id: string, shape: PartShape): Drawing =>
  changePart(drawing, id, (p) => ({ ...p, shape }));

const round = (mm: number) => Math.round(mm * 1e6) / 1e6;
const shifted = (p: DrawingPart, by: Point): DrawingPart => ({
  ...p,
  at: { x: round(p.at.x + by.x), y: round(p.at.y + by.y) },
});

/** Parts moved by a distance, mm (kept to a nanometre); locked ones stay. */
export const moveParts = (drawing: Drawing, ids: readonly string[], by: Point): Drawing =>
  withParts(drawing, (p) => (ids.includes(p.id) && p.locked !== true ? shifted(p, by) : p));

/** Each part moved by a distance of its own. */
export const movePartsBy = (drawing: Drawing, moves: ReadonlyMap<string, Point>): Drawing =>
  withParts(drawing, (p) => {
    const by = moves.get(p.id);
    return by && p.locked !== true ? shifted(p, by) : p;
  });

/** Ids of the parts together with the rest of their groups. */
export const wholeGroups = (drawing: Drawing, ids: readonly string[]): string[] => {
  const groups = new Set(drawing.parts.flatMap((p) => (ids.includes(p.id) && p.group ? [p.group] : [])));
  return drawing.parts
    .filter((p) => ids.includes(p.id) || (p.group !== undefined && groups.has(p.group)))
    .map((p) => p.id);
};

/** Parts joined into one group (at least two), or taken out of theirs. */
export const groupParts = (drawing: Drawing, ids: readonly string[]): Drawing => {
  const used = new Set(drawing.parts.map((p) => p.group));
  let n = 1;
  while (used.has(`g${n}`)) n++;
  return ids.length < 2
    ? drawing
    : withParts(drawing, (p) => (ids.includes(p.id) ? { ...p, group: `g${n}` } : p));
};

export const ungroupParts = (drawing: Drawing, ids: readonly string[]): Drawing =>
  withParts(drawing, (p) => {
    if (!ids.includes(p.id) || p.group === undefined) return p;
    const { group: _group, ...rest } = p;
    return rest;
  });

export const lockParts = (drawing: Drawing, ids: readonly string[], locked: boolean): Drawing =>
  withParts(drawing, (p) => {
    if (!ids.includes(p.id)) return p;
    const { locked: _locked, ...rest } = p;
    return locked ? { ...rest, locked: true } : rest;
  });

/** A part moved up or down in the order of the parts table, which is also the order of drawing and of balloons. */
export const orderPart = (drawing: Drawing, id: string, by: -1 | 1): Drawing => {
  const from = drawing.parts.findIndex((p) => p.id === id);
  const to = from + by;
  const [a, b] = [drawing.parts[from], drawing.parts[to]];
  if (!a || !b) return drawing;
  const parts = [...drawing.parts];
  parts[from] = b;
  parts[to] = a;
  return { ...drawing, parts };
};
