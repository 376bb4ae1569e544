import type { Result } from "@/lib/result";
import type { Absent, SectionProperties } from "@/lib/section/properties";
import { everyNumberIsFinite } from "@/lib/section/finite";
import type { Section } from "@/lib/section/section";
import { sectionProperties } from "@/lib/section/section-properties";
import { solveTorsion, type TorsionOptions } from "@/lib/section/torsion/solve-torsion";
import type { TorsionProperties } from "@/lib/section/torsion/torsion-properties";

const FROM_TORSION = ["J", "Cw", "shearCentre", "Avx", "Avy", "betaX", "betaY", "r0"] as const;
const isFromTorsion = ({ property }: Absent): boolean =>
  (FROM_TORSION as readonly string[]).includes(property);

/**
 * The properties with torsion and shear put in: values, error estimates, and reasons in `absent` for what stays null.
 * @param properties of `sectionProperties`, for the same section.
 * @param torsion what `solveTorsion` returned; a fault leaves the values null, with the fault as their reason.
 */
export const withTorsion = (
  properties: SectionProperties,
  torsion: Result<TorsionProperties>,
): SectionProperties => {
  const others = properties.absent.filter((absent) => !isFromTorsion(absent));
  if (!torsion.ok) {
    const { code, detail } = torsion.error;
    return {
      ...properties,
      absent: [...others, ...FROM_TORSION.map((property) => ({ property, code, detail }))],
    };
  }
  const { J, Cw, shearCentre, Avx, Avy, betaX, betaY, r0, estimates, absent, warnings } = torsion.value;
  const merged: SectionProperties = {
    ...properties,
    J,
    Cw,
    shearCentre,
    Avx,
    Avy,
    betaX,
    betaY,
    r0,
    estimates: { J: estimates.J, Cw: estimates.Cw, shearCentre: estimates.shearCentre },
    absent: [...others, ...absent],
    warnings: [...properties.warnings, ...warnings],
  };
  if (!everyNumberIsFinite(merged)) throw new Error("withTorsion: a number is not finite");
  return merged;
};

/**
 * Every property of a section, torsion and shear included. `sectionProperties` stays the fast way to areas alone.
 * A worker with nothing else to do calls `runToEnd(propertiesWithTorsion(section, { timeLimitMs }))`. One that must stay
 * able to stop steps the generator itself: the browser's answers with `sectionProperties` first, then runs
 * `runInSlices(solveTorsion(section, { fields: true }), wanted)` and sends `withTorsion` of the two as a second message. Run a small
 * section once when the worker starts: the first call takes some hundred milliseconds.
 * @returns faults of `sectionProperties`; a fault of torsion is no fault here but the reason in `absent`.
 * @yields about every 8 ms.
 */
export function* propertiesWithTorsion(
  section: Section,
  options: TorsionOptions = {},
): Generator<void, Result<SectionProperties>> {
  const properties = sectionProperties(section);
  if (!properties.ok) return properties;
  yield;
  const torsion = yield* solveTorsion(section, options);
  return { ok: true, value: withTorsion(properties.value, torsion) };
}
