import type { Drawing } from "@/lib/drawing/schema";
import { sectionOf } from "@/lib/drawing/section-of";
import { slendernessOf, type Slenderness } from "@/lib/drawing/slenderness";
import { tabulate, type Tabulation } from "@/lib/drawing/tabulation";
import { regionArea } from "@/lib/geometry/ring";
import type { Fault, Result } from "@/lib/result";
import { err, ok } from "@/lib/result";
import type { SectionProperties } from "@/lib/section/properties";
import { jointForces, type JointForce } from "@/lib/section/joint-forces";
import { pickedProperties } from "@/lib/section/picked-parts";
import type { Section } from "@/lib/section/section";
import type { TorsionProperties } from "@/lib/section/torsion/torsion-properties";
import { sectionProperties } from "@/lib/section/section-properties";

export type BenchRequest = Readonly<{ drawing: Drawing; picked: readonly string[] }>;

/** Area in mm² and mass in kg/m of one part, cut-outs taken away and overlaps counted once. */
export type PartFigures = Readonly<{ area: number; mass: number }>;

/** Everything the Bench shows of a drawing. */
export type BenchFigures = Readonly<{
  section: Section;
  properties: SectionProperties;
  parts: Readonly<Record<string, PartFigures>>;
  tabulation: Readonly<{ x: Tabulation; y: Tabulation }>;
  slenderness: readonly Slenderness[];
  /** Shear in each line of contact per unit of shear force. */
  jointForces: readonly JointForce[];
  /** Torsion and shear with their stress fields; null until the second answer, and where they cannot be had. */
  torsion: TorsionProperties | null;
  /** Without cut-outs; null where the drawing has none. */
  gross: SectionProperties | null;
  /** Of the picked parts alone; null where none or all are picked. */
  picked: SectionProperties | null;
}>;

export type BenchAnswer = Result<BenchFigures, readonly Fault[]>;

const propertiesOf = (drawing: Drawing): SectionProperties | null => {
  const section = sectionOf(drawing);
  if (!section.ok) return null;
  const properties = sectionProperties(section.value);
  return properties.ok ? properties.value : null;
};

/** The work for one drawing in steps; between them it can be stopped. */
export function* benchFigures({ drawing, picked }: BenchRequest): Generator<undefined, BenchAnswer> {
  const section = sectionOf(drawing);
  if (!section.ok) return section;
  yield;
  const properties = sectionProperties(section.value);
  if (!properties.ok) return err([properties.error]);
  yield;
  const [x, y] = [tabulate(section.value, "x"), tabulate(section.value, "y")];
  if (!x.ok) return err([x.error]);
  if (!y.ok) return err([y.error]);
  yield;
  const cutouts = drawing.parts.filter((p) => p.cutout === true);
  const solids = drawing.parts.filter((p) => p.cutout !== true);
  const gross = cutouts.length > 0 ? propertiesOf({ ...drawing, parts: solids }) : null;
  yield;
  const some = section.value.parts.map((p) => p.id).filter((id) => picked.includes(id));
  const ofPicked =
    some.length > 0 && some.length < section.value.parts.length
      ? pickedProperties(section.value, some)
      : null;
  return ok({
    section: section.value,
    properties: properties.value,
    parts: Object.fromEntries(
      section.value.parts.map((p): [string, PartFigures] => {
        const area = p.regions.reduce((sum, r) => sum + regionArea(r), 0);
        return [p.id, { area, mass: area * p.material.density * 1e-6 }];
      }),
    ),
    tabulation: { x: x.value, y: y.value },
    slenderness: slendernessOf(drawing, section.value.contacts),
    jointForces: jointForces(section.value),
    torsion: null,
    gross,
    picked: ofPicked?.ok ? ofPicked.value : null,
  });
}
