import { checkDrawing } from "@/lib/drawing/check-drawing";
import { shapeRegions } from "@/lib/drawing/part-regions";
import { resolveMaterial, thicknessOf } from "@/lib/drawing/part-thickness";
import type { Drawing, DrawingPart } from "@/lib/drawing/schema";
import { placeRegion } from "@/lib/geometry/ring";
import type { Fault, Result } from "@/lib/result";
import { err, ok } from "@/lib/result";
import type { Section, SectionPart, SectionWarning } from "@/lib/section/section";

type Placed = Readonly<{ part: SectionPart; warnings: readonly SectionWarning[] }>;

const nameOf = (part: DrawingPart): string => part.name || part.id;

const placePart = (drawing: Drawing, part: DrawingPart, index: number): Result<Placed, readonly Fault[]> => {
  const regions = shapeRegions(part.shape);
  if (!regions.ok)
    return err(
      regions.error.map(({ code, detail, pointer = "" }) => ({
        code,
        detail: `${nameOf(part)}: ${detail}`,
        part: part.id,
        pointer: `/parts/${index}/shape${pointer}`,
      })),
    );
  if (part.cutout === true) return err([]);
  const material = drawing.materials.find(({ id }) => id === part.material);
  if (material === undefined) return err([]);
  const thickness = thicknessOf(part.shape);
  const resolved = resolveMaterial(material, thickness);
  if (!resolved.ok) return err([{ ...resolved.error, part: part.id, pointer: `/parts/${index}/material` }]);
  return ok({
    part: {
      id: part.id,
      name: nameOf(part),
      material: resolved.value.material,
      counts: part.counts === "mass" ? "mass" : "stiffness and mass",
      regions: regions.value.map((region) => placeRegion(region, part)),
      thickness,
    },
    warnings: resolved.value.leastBand
      ? [
          {
            code: "fy.leastBand",
            detail: `${nameOf(part)} is an outline without one thickness: the least yield strength of ${material.name} is taken.`,
            parts: [part.id],
          },
        ]
      : [],
  });
};

/**
 * The section that a drawing describes: parts placed, cut-outs taken away, overlaps counted once, contacts found.
 * @param drawing a checked document (`readDrawing`), mm.
 * @returns disjoint parts in drawing axes, or one fault for each thing wrong, with part and JSON pointer.
 */
export const sectionOf = (drawing: Drawing): Result<Section, readonly Fault[]> => {
  const wrong = checkDrawing(drawing);
  if (wrong.length > 0) return err(wrong);
  const placed = drawing.parts.map((part, i) => placePart(drawing, part, i));
  const faults = placed.flatMap((p) => (p.ok ? [] : p.error));
  if (faults.length > 0) return err(faults);
  const counted = placed.flatMap((p, i) => {
    const part = drawing.parts[i];
    return p.ok && !(part?.cutout !== true && part?.counts === "nothing") ? [p.value] : [];
  });
  const parts = counted.map(({ part }) => part);
  if (!parts.some(({ counts }) => counts === "stiffness and mass"))
    return err([
      {
        code: "drawing.empty",
        detail: "Nothing in the drawing counts for stiffness yet. Add a part.",
        pointer: "/parts",
      },
    ]);
  const reference = drawing.materials.find(({ id }) => id === drawing.reference);
  const material = reference === undefined ? undefined : resolveMaterial(reference, null);
  if (material === undefined || !material.ok) return err([]);
  return ok({
    reference: material.value.material,
    parts,
    outline: parts.flatMap(({ regions }) => regions),
    contacts: [],
    bodies: [parts.map(({ id }) => id)],
    warnings: counted.flatMap(({ warnings }) => warnings),
  });
};
