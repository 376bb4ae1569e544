import type { Drawing } from "@/lib/drawing/schema";

/**
 * The name of the material that A, I, S and r of a drawing are transformed for, where the parts that count for stiffness
 * differ in E; null where all have one E and the figures are the plain geometric ones.
 */
export const transformedFor = (drawing: Drawing): string | null => {
  const used = new Set(
    drawing.parts.flatMap((part) =>
      part.cutout || (part.counts ?? "stiffness and mass") !== "stiffness and mass" ? [] : [part.material],
    ),
  );
  const moduli = new Set(drawing.materials.filter((m) => used.has(m.id)).map((m) => m.E));
  if (moduli.size < 2) return null;
  return drawing.materials.find((m) => m.id === drawing.reference)?.name ?? drawing.reference;
};
