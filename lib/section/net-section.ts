import type { Point, Region } from "@/lib/geometry/region";
import { cosSinOfDegrees } from "@/lib/geometry/ring";
import { err, ok, type Fault, type Result } from "@/lib/result";
import type { SectionProperties } from "@/lib/section/properties";
import { rearranged } from "@/lib/section/rearrange";
import type { Section } from "@/lib/section/section";
import { sectionProperties } from "@/lib/section/section-properties";

/**
 * A hole drilled through material in the plane of the section: it appears as a strip. `at` is the middle of the strip in
 * drawing axes, `angle` the direction of drilling in degrees from +x (90 for a hole down through a flange), `diameter`
 * what is to be deducted across it and `length` how far it reaches along the drilling, mm.
 */
export type HoleDeduction = Readonly<{ at: Point; angle: number; diameter: number; length: number }>;

/** Both sets of figures, and the section that is left. */
export type GrossAndNet = Readonly<{ gross: SectionProperties; net: SectionProperties; netSection: Section }>;

const strip = ({ at, angle, diameter, length }: HoleDeduction): Region => {
  const [c, s] = cosSinOfDegrees(angle);
  const corner = (along: number, across: number): Point => ({
    x: at.x + c * along - s * across,
    y: at.y + s * along + c * across,
  });
  const [l, d] = [length / 2, diameter / 2];
  return { outer: [corner(-l, -d), corner(l, -d), corner(l, d), corner(-l, d)], holes: [] };
};

const badHole = (hole: HoleDeduction, i: number): Fault | null => {
  for (const field of ["diameter", "length"] as const)
    if (!(hole[field] > 0 && Number.isFinite(hole[field])))
      return {
        code: "hole.badSize",
        detail: `Hole ${i + 1}: ${field} must be greater than 0. Correct it or remove the hole.`,
        pointer: `/holes/${i}/${field}`,
      };
  return [hole.at.x, hole.at.y, hole.angle].every(Number.isFinite)
    ? null
    : {
        code: "hole.badPlace",
        detail: `Hole ${i + 1}: its place and angle must be numbers. Correct them or remove the hole.`,
        pointer: `/holes/${i}/at`,
      };
};

/**
 * Gross properties and, beside them, those with holes deducted: the section actually left, with its own centroid.
 * @param holes strips taken out of every part they meet. Holes that overlap are deducted once; one that meets no material
 * deducts nothing. No rule of any code (stagger, holes of compression flanges) is applied.
 * @returns `hole.badSize` or `hole.badPlace` with a pointer, or the faults of the arrangement and of `sectionProperties`.
 */
export const grossAndNet = (
  section: Section,
  holes: readonly HoleDeduction[],
): Result<GrossAndNet, readonly Fault[]> => {
  const bad = holes.flatMap((hole, i) => badHole(hole, i) ?? []);
  if (bad.length > 0) return err(bad);
  const gross = sectionProperties(section);
  if (!gross.ok) return err([gross.error]);
  if (holes.length === 0) return ok({ gross: gross.value, net: gross.value, netSection: section });
  const left = rearranged(
    section,
    section.parts,
    holes.map((hole, i) => ({ id: `hole ${i + 1}`, name: `Hole ${i + 1}`, regions: [strip(hole)] })),
  );
  if (!left.ok) return left;
  const net = sectionProperties(left.value);
  if (!net.ok) return err([net.error]);
  return ok({ gross: gross.value, net: net.value, netSection: left.value });
};
