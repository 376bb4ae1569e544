import { computeProperties } from "@/lib/drawing/compute-properties";
import type { Drawing } from "@/lib/drawing/schema";
import { sectionOf } from "@/lib/drawing/section-of";
import type { SectionProperties } from "@/lib/section/properties";
import type { Section } from "@/lib/section/section";

export type Part = Drawing["parts"][number];

/** S355 as a material of a drawing. */
export const S355: Drawing["materials"][number] = {
  id: "s355",
  name: "S355",
  E: 210_000,
  G: 81_000,
  fy: 355,
  density: 7850,
};

/** A drawing of these parts, in S355 unless other materials are given. */
export const drawingOf = (parts: readonly Part[], more: Partial<Drawing> = {}): Drawing => ({
  version: 1,
  unit: "mm",
  reference: "s355",
  materials: [S355],
  parts: [...parts],
  joints: [],
  ...more,
});

/** A part of S355 with its origin at (x, y), mm, turned by degrees. */
export const drawn = (id: string, shape: Part["shape"], x: number, y: number, angle = 0): Part => ({
  id,
  name: id.toUpperCase(),
  material: "s355",
  at: { x, y },
  angle,
  shape,
});

/** A plate about (x, y), mm. */
export const plate = (id: string, x: number, y: number, width: number, height: number, angle = 0): Part =>
  drawn(id, { kind: "plate", width, height }, x, y, angle);

/** The section of a drawing that is expected to be sound. */
export const sectionOk = (drawing: Drawing): Section => {
  const section = sectionOf(drawing);
  if (!section.ok) throw new Error(JSON.stringify(section.error));
  return section.value;
};

/** The properties of a drawing that is expected to be sound. */
export const propertiesOk = (drawing: Drawing): SectionProperties => {
  const properties = computeProperties(drawing);
  if (!properties.ok) throw new Error(JSON.stringify(properties.error));
  return properties.value;
};
