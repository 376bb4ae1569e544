import { addParts, freeId } from "@/lib/drawing/edit-parts";
import { renameShared } from "@/lib/drawing/rename-shared";
import type { Copied } from "@/lib/drawing/arrange-parts";
import type { Drawing, DrawingMaterial } from "@/lib/drawing/schema";
import type { Point } from "@/lib/geometry/region";

/** Parts as a drawing of their own, with their materials and the joints among them: what copying puts on the clipboard. */
export const clipOf = (drawing: Drawing, ids: readonly string[]): Drawing => {
  const parts = drawing.parts.filter((p) => ids.includes(p.id));
  const used = new Set(parts.flatMap((p) => (p.cutout === true ? [] : [p.material])));
  const kept = drawing.materials.filter((m) => used.has(m.id) || m.id === drawing.reference);
  return {
    ...drawing,
    materials: kept,
    parts,
    joints: drawing.joints.filter((j) => j.between.every((id) => ids.includes(id))),
  };
};

const alike = (a: DrawingMaterial, b: DrawingMaterial): boolean =>
  JSON.stringify({ ...a, id: "" }) === JSON.stringify({ ...b, id: "" });

/**
 * The parts of a copied drawing added to another, moved by a distance; materials with the same values are shared, others
 * come along under an id that is free. Ids of the new parts are given beside.
 */
export const pasteClip = (drawing: Drawing, clip: Drawing, by: Point): Copied => {
  const materials = [...drawing.materials];
  const nameOf = new Map<string, string>();
  const used = new Set(clip.parts.flatMap((p) => (p.cutout === true ? [] : [p.material])));
  for (const m of clip.materials.filter((one) => used.has(one.id))) {
    const known = materials.find((own) => alike(own, m));
    let id = known?.id ?? m.id;
    for (let n = 2; !known && materials.some((own) => own.id === id); n++) id = `${m.id}-${n}`.slice(-64);
    if (!known) materials.push({ ...m, id });
    nameOf.set(m.id, id);
  }
  const names = new Map<string, string>();
  for (const p of clip.parts) names.set(p.id, freeId(drawing, new Set(names.values())));
  const parts = renameShared(
    clip.parts.map((p) => {
      const placed = { id: names.get(p.id) ?? p.id, at: { x: p.at.x + by.x, y: p.at.y + by.y } };
      return p.cutout === true
        ? { ...p, ...placed }
        : { ...p, ...placed, material: nameOf.get(p.material) ?? p.material };
    }),
  );
  const joints = clip.joints.flatMap((j) => {
    const [a, b] = j.between.map((id) => names.get(id));
    return a && b ? [{ ...j, between: [a, b] as [string, string] }] : [];
  });
  const next = addParts({ ...drawing, materials }, parts);
  return { drawing: { ...next, joints: [...next.joints, ...joints] }, ids: [...names.values()] };
};
