import type { WornFaces } from "@/lib/geometry/offset";
import { wornAway } from "@/lib/geometry/offset";
import type { Fault, Result } from "@/lib/result";
import { err, ok } from "@/lib/result";
import { rearranged } from "@/lib/section/rearrange";
import type { Section } from "@/lib/section/section";

/** Notices about the single regions that wear takes; they say nothing about what was drawn. */
const ABOUT_CUTOUTS = new Set(["cutout.outside", "cutout.nothing", "cutout.parts"]);

/**
 * The section after wear or corrosion took `depth` off its faces: those of the union of all parts, so that plates which
 * touch do not wear between each other. Yield strengths stay those of the nominal thickness.
 * @param depth allowance for each face, mm.
 * @param faces `outer` leaves holes and cells as they are, `all` wears them too.
 * @returns `wear.badDepth`, `section.noArea` where nothing is left, or the faults of the arrangement. Parts that wore away
 * whole, and pieces that came apart, are named in the warnings.
 */
export const wornSection = (
  section: Section,
  depth: number,
  faces: WornFaces = "outer",
): Result<Section, readonly Fault[]> => {
  const taken = wornAway(section.outline, depth, faces);
  if (!taken.ok) return err([taken.error]);
  const wear = taken.value.map((region, i) => ({ id: `wear ${i}`, name: "Wear", regions: [region] }));
  const worn = rearranged(section, section.parts, wear);
  if (!worn.ok) return worn;
  const pieces = worn.value.bodies.length;
  const apart = {
    code: "wear.parts",
    detail: `Wear leaves ${pieces} pieces that no longer hang together.`,
    parts: worn.value.bodies.flat(),
  };
  const warnings = worn.value.warnings
    .filter(({ code }) => !ABOUT_CUTOUTS.has(code))
    .map((warning) => ({ ...warning, parts: warning.parts.filter((id) => !id.startsWith("wear ")) }));
  return ok({
    ...worn.value,
    warnings: pieces > section.bodies.length ? [...warnings, apart] : warnings,
  });
};
