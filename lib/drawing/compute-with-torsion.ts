import type { Drawing } from "@/lib/drawing/schema";
import { sectionOf } from "@/lib/drawing/section-of";
import type { Fault, Result } from "@/lib/result";
import { err } from "@/lib/result";
import type { SectionProperties } from "@/lib/section/properties";
import type { TorsionOptions } from "@/lib/section/torsion/solve-torsion";
import { propertiesWithTorsion } from "@/lib/section/with-torsion";

/**
 * Every property of a drawing, torsion and shear included: what is stored with a revision. Takes from 10 ms to seconds:
 * for a worker, not for a thread that people wait on.
 * @param drawing a checked document (`readDrawing`).
 * @returns the properties, or what is wrong with the drawing by part and JSON pointer. Where torsion cannot be had, its
 * values are null and `absent` says why.
 * @yields about every 8 ms.
 */
export function* computeWithTorsion(
  drawing: Drawing,
  options: TorsionOptions = {},
): Generator<void, Result<SectionProperties, readonly Fault[]>> {
  const section = sectionOf(drawing);
  if (!section.ok) return section;
  yield;
  const properties = yield* propertiesWithTorsion(section.value, options);
  return properties.ok ? properties : err([properties.error]);
}
