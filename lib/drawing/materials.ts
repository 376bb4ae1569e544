import type { Drawing, DrawingMaterial } from "@/lib/drawing/schema";

/** Yield strength of a material, MPa: the least of its bands where it depends on thickness. */
export const leastFy = ({ fy }: DrawingMaterial): number =>
  typeof fy === "number" ? fy : fy.reduce((least, band) => Math.min(least, band.fy), Infinity);

/** The drawing with another material, under an id and a name that are free. */
export const addMaterial = (drawing: Drawing, material: DrawingMaterial): Drawing => {
  const taken = new Set(drawing.materials.flatMap((m) => [m.id, m.name]));
  let n = 1;
  const numbered = (text: string) => (n === 1 ? text : `${text} ${n}`);
  while (taken.has(numbered(material.id)) || taken.has(numbered(material.name))) n++;
  return {
    ...drawing,
    materials: [
      ...drawing.materials,
      { ...material, id: numbered(material.id), name: numbered(material.name) },
    ],
  };
};

export const changeMaterial = (drawing: Drawing, id: string, change: Partial<DrawingMaterial>): Drawing => ({
  ...drawing,
  materials: drawing.materials.map((m) => (m.id === id ? { ...m, ...change, id } : m)),
});

/** The drawing without a material; one that a part uses or that is the reference stays. */
export const removeMaterial = (drawing: Drawing, id: string): Drawing => {
  const used = drawing.reference === id || drawing.parts.some((p) => p.cutout !== true && p.material === id);
  return used ? drawing : { ...drawing, materials: drawing.materials.filter((m) => m.id !== id) };
};

export const setReference = (drawing: Drawing, id: string): Drawing =>
  drawing.materials.some((m) => m.id === id) ? { ...drawing, reference: id } : drawing;
