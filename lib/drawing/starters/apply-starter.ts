import { freeId } from "@/lib/drawing/edit-parts";
import { SOFTWOOD } from "@/lib/drawing/new-drawing";
import { boxOfParts } from "@/lib/drawing/placed-part";
import type { Drawing, DrawingJoint, DrawingMaterial, DrawingPart } from "@/lib/drawing/schema";
import { starterById } from "@/lib/drawing/starters/starters";
import type { Starter, StarterPart, StarterValues } from "@/lib/drawing/starters/starter";
import { MAX_LENGTH_MM, MIN_SIZE_MM } from "@/lib/geometry/limits";
import type { Point } from "@/lib/geometry/region";
import { err, ok, type Fault, type Result } from "@/lib/result";

type SolidPart = Extract<DrawingPart, { material: string }>;

const checkValues = (starter: Starter, values: StarterValues): Fault | null => {
  for (const { key, label, mayBeZero } of starter.fields) {
    const value = values[key];
    const least = mayBeZero ? 0 : MIN_SIZE_MM;
    if (value === undefined || !Number.isFinite(value) || value < least || value > MAX_LENGTH_MM)
      return {
        code: "starter.badSize",
        detail: `${label}: type a size ${mayBeZero ? "of 0 or more" : "above 0"}.`,
        pointer: `/${key}`,
      };
  }
  return null;
};

/** The parts of a starter about its own origin, or the reason why its sizes do not fit together. */
export const starterParts = (
  starter: Starter,
  values: StarterValues,
): Result<readonly StarterPart[], Fault> => {
  const bad = checkValues(starter, values);
  return bad ? err(bad) : starter.parts(values);
};

const isTimber = (m: DrawingMaterial) => m.density < 1_500 && m.E < 30_000;

const partOf = (
  made: StarterPart,
  id: string,
  origin: Point,
  material: string,
  starter: SolidPart["starter"],
): SolidPart => ({
  id,
  name: made.name,
  material,
  at: { x: origin.x + made.at.x, y: origin.y + made.at.y },
  angle: made.angle ?? 0,
  ...(made.mirror ? { mirror: true } : {}),
  shape: made.shape,
  ...(starter ? { starter } : {}),
});

/**
 * The drawing with a starter placed: on the datum where nothing is drawn, else to the right of what is. Each part remembers
 * the starter and its sizes, so that the form can be opened again.
 */
export const placeStarter = (
  drawing: Drawing,
  starter: Starter,
  values: StarterValues,
): Result<Readonly<{ drawing: Drawing; ids: readonly string[] }>, Fault> => {
  const made = starterParts(starter, values);
  if (!made.ok) return made;
  const timber = made.value.some((p) => p.timber);
  const materials = [...drawing.materials];
  if (timber && !materials.some(isTimber)) materials.push(SOFTWOOD);
  const wood = materials.find(isTimber)?.id ?? drawing.reference;
  const metal =
    materials.find((m) => m.id === drawing.reference && !isTimber(m)) ?? materials.find((m) => !isTimber(m));
  const reach = Math.max(...made.value.map((p) => Math.abs(p.at.x)), 0) + 300;
  const box = boxOfParts(drawing);
  const origin = box ? { x: Math.round(box.xMax + reach), y: 0 } : { x: 0, y: 0 };
  const instance = freeInstance(drawing);
  const names = new Map<string, string>();
  for (const p of made.value) names.set(p.role, freeId(drawing, new Set(names.values())));
  const parts = made.value.map((p) =>
    partOf(p, names.get(p.role) ?? p.role, origin, p.timber ? wood : (metal?.id ?? drawing.reference), {
      kind: starter.id,
      instance,
      role: p.role,
      ...values,
    }),
  );
  const joints = starter.joints.map(({ between, kind }): DrawingJoint => ({
    between: [names.get(between[0]) ?? between[0], names.get(between[1]) ?? between[1]],
    kind,
    size: null,
  }));
  return ok({
    drawing: {
      ...drawing,
      materials,
      reference: timber && drawing.parts.length === 0 ? wood : drawing.reference,
      parts: [...drawing.parts, ...parts],
      joints: [...drawing.joints, ...joints],
    },
    ids: parts.map((p) => p.id),
  });
};

const freeInstance = (drawing: Drawing): string => {
  const used = new Set(
    drawing.parts.flatMap((p) => (p.cutout === true ? [] : [String(p.starter?.instance)])),
  );
  let n = 1;
  while (used.has(`s${n}`)) n++;
  return `s${n}`;
};

export type PlacedStarter = Readonly<{
  starter: Starter;
  instance: string;
  values: StarterValues;
  ids: readonly string[];
  /** Where the starter's own origin lies, mm. */
  origin: Point;
}>;

const same = (a: number, b: number) => Math.abs(a - b) <= 1e-6;

/**
 * The starter a part came from, while the section keeps its structure: every part still there, with the shape and the place
 * the sizes give. Null once it was changed by hand.
 */
export const starterOfPart = (drawing: Drawing, partId: string): PlacedStarter | null => {
  const part = drawing.parts.find((p): p is SolidPart => p.id === partId && p.cutout !== true);
  const marks = part?.starter;
  const starter = marks && starterById(String(marks.kind));
  if (!part || !marks || !starter) return null;
  const instance = String(marks.instance);
  const values = Object.fromEntries(starter.fields.map((f) => [f.key, Number(marks[f.key])]));
  const made = starterParts(starter, values);
  if (!made.ok) return null;
  const mine = drawing.parts.filter(
    (p): p is SolidPart => p.cutout !== true && String(p.starter?.instance) === instance,
  );
  if (mine.length !== made.value.length) return null;
  const own = made.value.find((p) => p.role === marks.role);
  if (!own) return null;
  const origin = { x: part.at.x - own.at.x, y: part.at.y - own.at.y };
  const kept = made.value.every((p) => {
    const drawn = mine.find((m) => m.starter?.role === p.role);
    return (
      drawn !== undefined &&
      same(drawn.at.x, origin.x + p.at.x) &&
      same(drawn.at.y, origin.y + p.at.y) &&
      drawn.angle === (p.angle ?? 0) &&
      (drawn.mirror ?? false) === (p.mirror ?? false) &&
      JSON.stringify(drawn.shape) === JSON.stringify(p.shape)
    );
  });
  return kept ? { starter, instance, values, ids: mine.map((p) => p.id), origin } : null;
};

/** The drawing with a placed starter rebuilt to other sizes; ids, names, materials and joints stay. */
export const changeStarter = (
  drawing: Drawing,
  placed: PlacedStarter,
  values: StarterValues,
): Result<Drawing, Fault> => {
  const made = starterParts(placed.starter, values);
  if (!made.ok) return made;
  return ok({
    ...drawing,
    parts: drawing.parts.map((p) => {
      if (p.cutout === true || String(p.starter?.instance) !== placed.instance) return p;
      const next = made.value.find((m) => m.role === p.starter?.role);
      if (!next) return p;
      return {
        ...p,
        shape: next.shape,
        at: { x: placed.origin.x + next.at.x, y: placed.origin.y + next.at.y },
        starter: { ...p.starter, ...values },
      };
    }),
  });
};
