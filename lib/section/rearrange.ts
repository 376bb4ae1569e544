import { arrange } from "@/lib/geometry/arrange";
import type { ArrangeCutout } from "@/lib/geometry/arrange-types";
import type { Point, Region } from "@/lib/geometry/region";
import { moveRegion } from "@/lib/geometry/ring";
import { err, ok, type Fault, type Result } from "@/lib/result";
import type { ContactLine, Section, SectionPart } from "@/lib/section/section";

const firstCorner = (parts: readonly SectionPart[]): Point =>
  parts.flatMap((part) => part.regions)[0]?.outer[0] ?? { x: 0, y: 0 };

const moved = (regions: readonly Region[], by: Point, sign: 1 | -1): readonly Region[] =>
  regions.map((region) => moveRegion(region, sign * by.x, sign * by.y));

const movedLine = (line: ContactLine, by: Point): ContactLine => ({
  ...line,
  from: { x: line.from.x + by.x, y: line.from.y + by.y },
  to: { x: line.to.x + by.x, y: line.to.y + by.y },
});

/**
 * A section made anew of some of its parts, with cut-outs taken away from them: outline, contacts and bodies are found
 * again, and the warnings are those of the new arrangement.
 * @param parts disjoint parts of the section, in drawing axes.
 * @param cutouts regions in drawing axes.
 * @returns faults of the arrangement (`clip.failed`, …), or `section.noArea` where nothing that counts for stiffness is left.
 */
export const rearranged = (
  section: Section,
  parts: readonly SectionPart[],
  cutouts: readonly ArrangeCutout[],
): Result<Section, readonly Fault[]> => {
  const origin = firstCorner(parts);
  const arranged = arrange(
    parts.map((part) => ({
      id: part.id,
      name: part.name,
      material: part.material.id,
      strength: part.material.fy,
      stiff: part.counts === "stiffness and mass",
      regions: moved(part.regions, origin, -1),
    })),
    cutouts.map((cutout) => ({ ...cutout, regions: moved(cutout.regions, origin, -1) })),
    origin,
  );
  if (!arranged.ok) return arranged;
  const { outline, contacts, bodies, warnings } = arranged.value;
  if (bodies.length === 0)
    return err([
      {
        code: "section.noArea",
        detail: "Nothing that counts for stiffness is left: pick other parts, or make the cut-outs smaller.",
      },
    ]);
  const idOf = (i: number) => parts[i]?.id ?? "";
  return ok({
    reference: section.reference,
    parts: parts.flatMap((part, i) => {
      const regions = moved(arranged.value.parts[i] ?? [], origin, 1);
      return regions.length === 0 ? [] : [{ ...part, regions }];
    }),
    outline: moved(outline, origin, 1),
    contacts: contacts.map(({ parts: [a, b], lines }) => ({
      parts: [idOf(a), idOf(b)] as const,
      lines: lines.map((line) => movedLine(line, origin)),
    })),
    bodies: bodies.map((body) => body.map(idOf)),
    warnings,
  });
};
