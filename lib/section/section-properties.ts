import { perimeterOf } from "@/lib/geometry/perimeter";
import { regionMoments } from "@/lib/geometry/moments";
import { err, ok, type Result } from "@/lib/result";
import { elasticOf } from "@/lib/section/elastic";
import { everyNumberIsFinite } from "@/lib/section/finite";
import { plainProperties, stressFactors } from "@/lib/section/composite";
import { plasticProperties } from "@/lib/section/plastic-properties";
import type { Absent, SectionProperties } from "@/lib/section/properties";
import type { Section, SectionWarning } from "@/lib/section/section";
import { modularRatio, stiffParts, weightedBy } from "@/lib/section/stiffness";
import { unsymmetricalBending } from "@/lib/section/unsymmetrical";

/** mm² × kg/m³ → kg/m, and mm → m²/m. */
const MM2_PER_M2 = 1e6;
const MM_PER_M = 1e3;

const NEEDS_TORSION = ["J", "Cw", "shearCentre", "Avx", "Avy", "betaX", "betaY", "r0"] as const;

const torsionAbsent: readonly Absent[] = NEEDS_TORSION.map((property) => ({
  property,
  code: "torsion.notComputed",
  detail: "The torsion and shear solution has not been computed for this section.",
}));

const massOf = (section: Section): number =>
  section.parts.reduce((sum, part) => {
    const origin = part.regions[0]?.outer[0];
    if (origin === undefined) return sum;
    return sum + (regionMoments(part.regions, origin).area * part.material.density) / MM2_PER_M2;
  }, 0);

/**
 * Every area property of a section: the only way from regions to numbers, for drawn and tabulated sections alike.
 * @param section disjoint parts in drawing axes, mm, with materials; `outline` is their union.
 * @returns units and keys of `lib/units/property-units`. A, I, S, r are transformed by n = E/E_ref where E differs (`plain`
 * then holds the geometric values); Z is geometric; extents and S concern the parts that count for stiffness, mass and
 * perimeter all parts; the painted surface is the outer perimeter. Faults: `section.nothingStiff` (no part counts for
 * stiffness), `section.noArea`, `section.notFinite` (a size beyond what numbers hold). Torsion and shear values are null
 * and listed in `absent`.
 * @source Formulas stand with the functions used here.
 */
export const sectionProperties = (section: Section): Result<SectionProperties> => {
  const parts = stiffParts(section);
  if (parts.length === 0)
    return err({
      code: "section.nothingStiff",
      detail: "No part counts for stiffness: draw a part, or let one count for stiffness and mass.",
    });
  const elastic = elasticOf(weightedBy(parts, modularRatio(section.reference)));
  if (elastic === null)
    return err({
      code: "section.noArea",
      detail: "The parts leave no area: check their sizes and the cut-outs.",
    });
  const { values, anyAngle } = elastic;
  const perimeter = perimeterOf(section.outline);
  const plastic = plasticProperties(parts, values);
  const round: readonly SectionWarning[] = anyAngle
    ? [{ code: "principal.any", detail: "Every axis through the centroid is a principal axis.", parts: [] }]
    : [];
  const properties: SectionProperties = {
    ...values,
    perimeter,
    mass: massOf(section),
    surface: perimeter.outer / MM_PER_M,
    ...plastic.values,
    J: null,
    Cw: null,
    shearCentre: null,
    Avx: null,
    Avy: null,
    betaX: null,
    betaY: null,
    r0: null,
    estimates: { J: null, Cw: null, shearCentre: null },
    plain: plainProperties(parts, section.reference),
    stressFactors: stressFactors(parts, section.reference),
    unsymmetrical: unsymmetricalBending(
      values,
      parts.flatMap((part) => part.regions),
    ),
    absent: [...torsionAbsent, ...plastic.absent],
    warnings: [...section.warnings, ...round, ...plastic.warnings],
  };
  return everyNumberIsFinite(properties)
    ? ok(properties)
    : err({ code: "section.notFinite", detail: "The sizes are beyond what can be computed: check them." });
};
