import { err, ok, type Fault, type Result } from "@/lib/result";
import type { SectionProperties } from "@/lib/section/properties";
import { rearranged } from "@/lib/section/rearrange";
import type { Section } from "@/lib/section/section";
import { sectionProperties } from "@/lib/section/section-properties";

/**
 * Properties of picked parts only, as if the others were not there; the reference material stays that of the section.
 * @param ids of parts of the section. A part that an overlap was taken from has what is left of it.
 * @returns `parts.unknown` for an id the section does not have, `parts.nonePicked` for an empty list, else as
 * `sectionProperties`.
 */
export const pickedProperties = (
  section: Section,
  ids: readonly string[],
): Result<SectionProperties, readonly Fault[]> => {
  if (ids.length === 0) return err([{ code: "parts.nonePicked", detail: "Pick at least one part." }]);
  const unknown = ids.find((id) => !section.parts.some((part) => part.id === id));
  if (unknown !== undefined)
    return err([
      {
        code: "parts.unknown",
        detail: `The section has no part ${unknown}: pick one of its parts.`,
        part: unknown,
      },
    ]);
  const picked = rearranged(
    section,
    section.parts.filter((part) => ids.includes(part.id)),
    [],
  );
  if (!picked.ok) return picked;
  const properties = sectionProperties(picked.value);
  return properties.ok ? ok(properties.value) : err([properties.error]);
};
