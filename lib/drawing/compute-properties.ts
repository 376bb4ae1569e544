import type { Drawing } from "@/lib/drawing/schema";
import { sectionOf } from "@/lib/drawing/section-of";
import type { Fault, Result } from "@/lib/result";
import { err } from "@/lib/result";
import type { SectionProperties } from "@/lib/section/properties";
import { sectionProperties } from "@/lib/section/section-properties";

/**
 * Every property of a drawing: the one way from what is drawn or tabulated to figures.
 * @param drawing a checked document (`readDrawing`).
 * @returns the properties of its section, or what is wrong with the drawing by part and JSON pointer.
 */
export const computeProperties = (drawing: Drawing): Result<SectionProperties, readonly Fault[]> => {
  const section = sectionOf(drawing);
  if (!section.ok) return section;
  const properties = sectionProperties(section.value);
  return properties.ok ? properties : err([properties.error]);
};
