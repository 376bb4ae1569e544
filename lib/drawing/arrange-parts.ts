import { addParts, freeId, movePartsBy } from "@/lib/drawing/edit-parts";
import { renameShared } from "@/lib/drawing/rename-shared";
import { boxOfParts, middleOf, partBox } from "@/lib/drawing/placed-part";
import type { Drawing, DrawingPart } from "@/lib/drawing/schema";
import type { Box } from "@/lib/geometry/arc";
import type { Point } from "@/lib/geometry/region";
import { cosSinOfDegrees } from "@/lib/geometry/ring";

export type AlignTo = "left" | "centre" | "right" | "top" | "middle" | "bottom";

const boxed = (drawing: Drawing, ids: readonly string[]): { id: string; box: Box }[] =>
  drawing.parts.flatMap((p) => {
    const box = ids.includes(p.id) ? partBox(p) : null;
    return box ? [{ id: p.id, box }] : [];
  });

const alignShift = (to: AlignTo, box: Box, whole: Box): Point => {
  const [own, all] = [middleOf(box), middleOf(whole)];
  switch (to) {
    case "left":
      return { x: whole.xMin - box.xMin, y: 0 };
    case "right":
      return { x: whole.xMax - box.xMax, y: 0 };
    case "centre":
      return { x: all.x - own.x, y: 0 };
    case "bottom":
      return { x: 0, y: whole.yMin - box.yMin };
    case "top":
      return { x: 0, y: whole.yMax - box.yMax };
    case "middle":
      return { x: 0, y: all.y - own.y };
  }
};

/** Parts moved so that their edges or centre lines meet those of the box around them all. */
export const alignParts = (drawing: Drawing, ids: readonly string[], to: AlignTo): Drawing => {
  const whole = boxOfParts(drawing, ids);
  if (!whole) return drawing;
  return movePartsBy(
    drawing,
    new Map(boxed(drawing, ids).map(({ id, box }) => [id, alignShift(to, box, whole)])),
  );
};

/** Parts set one against the other in the order they lie: the first stays, each next one touches the one before. */
export const stackParts = (drawing: Drawing, ids: readonly string[], way: "up" | "right"): Drawing => {
  const [low, high] = way === "up" ? (["yMin", "yMax"] as const) : (["xMin", "xMax"] as const);
  const sorted = boxed(drawing, ids).sort((a, b) => a.box[low] - b.box[low]);
  let edge: number | null = null;
  const moves = new Map<string, Point>();
  for (const { id, box } of sorted) {
    const by: number = edge === null ? 0 : edge - box[low];
    moves.set(id, way === "up" ? { x: 0, y: by } : { x: by, y: 0 });
    edge = box[high] + by;
  }
  return movePartsBy(drawing, moves);
};

const clean = (mm: number) => Math.round(mm * 1e6) / 1e6 + 0;
/** Angle in (−180, 180]. */
const turnOf = (deg: number) => {
  const turn = ((deg % 360) + 360) % 360;
  return clean(turn > 180 ? turn - 360 : turn);
};

const turned = (part: DrawingPart, deg: number, about: Point): DrawingPart => {
  const [c, s] = cosSinOfDegrees(deg);
  const d = { x: part.at.x - about.x, y: part.at.y - about.y };
  return {
    ...part,
    at: { x: clean(about.x + c * d.x - s * d.y), y: clean(about.y + s * d.x + c * d.y) },
    angle: turnOf(part.angle + deg),
  };
};

/** Parts turned by degrees anticlockwise about a point, or about the middle of the box around them. */
export const turnParts = (drawing: Drawing, ids: readonly string[], deg: number, about?: Point): Drawing => {
  const whole = boxOfParts(drawing, ids);
  if (!whole) return drawing;
  const centre = about ?? middleOf(whole);
  return {
    ...drawing,
    parts: drawing.parts.map((p) => (ids.includes(p.id) && p.locked !== true ? turned(p, deg, centre) : p)),
  };
};

const mirrored = (part: DrawingPart, line: "upright" | "level", at: number): DrawingPart => {
  const { mirror, ...rest } = part;
  const plain = part.shape.kind === "plate" || part.shape.kind === "round";
  const flip = plain ? mirror === true : mirror !== true;
  const place =
    line === "upright"
      ? { at: { x: clean(2 * at - part.at.x), y: part.at.y }, angle: turnOf(-part.angle) }
      : { at: { x: part.at.x, y: clean(2 * at - part.at.y) }, angle: turnOf((plain ? 0 : 180) - part.angle) };
  return flip ? { ...rest, ...place, mirror: true } : { ...rest, ...place };
};

/** Parts mirrored over an upright or a level line through the middle of the box around them, or at a coordinate. */
export const mirrorParts = (
  drawing: Drawing,
  ids: readonly string[],
  line: "upright" | "level",
  at?: number,
): Drawing => {
  const whole = boxOfParts(drawing, ids);
  if (!whole) return drawing;
  const place = at ?? middleOf(whole)[line === "upright" ? "x" : "y"];
  return {
    ...drawing,
    parts: drawing.parts.map((p) => (ids.includes(p.id) && p.locked !== true ? mirrored(p, line, place) : p)),
  };
};

export type Copied = Readonly<{ drawing: Drawing; ids: readonly string[] }>;

/** Copies of parts, each moved by the step once more than the one before, with the joints among them; ids of what is new. */
export const arrayParts = (drawing: Drawing, ids: readonly string[], copies: number, step: Point): Copied => {
  let next = drawing;
  const made: string[] = [];
  for (let k = 1; k <= copies; k++) {
    const names = new Map<string, string>();
    for (const id of ids) {
      const free = freeId(next, new Set(names.values()));
      names.set(id, free);
    }
    const parts = drawing.parts
      .filter((p) => names.has(p.id))
      .map((p): DrawingPart => ({
        ...p,
        id: names.get(p.id) ?? p.id,
        at: { x: clean(p.at.x + k * step.x), y: clean(p.at.y + k * step.y) },
      }));
    const joints = drawing.joints.flatMap((j) => {
      const [a, b] = j.between.map((id) => names.get(id));
      return a && b ? [{ ...j, between: [a, b] as [string, string] }] : [];
    });
    next = { ...addParts(next, renameShared(parts)), joints: [...next.joints, ...joints] };
    made.push(...names.values());
  }
  return { drawing: next, ids: made };
};
