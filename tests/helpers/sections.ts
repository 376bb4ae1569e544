import type { Region } from "@/lib/geometry/region";
import type { Material, Section, SectionPart } from "@/lib/section/section";

/** Structural steel as the drawing format writes it. */
export const STEEL: Material = { id: "steel", name: "Steel", E: 210_000, G: 81_000, fy: 355, density: 7850 };

export type PartOptions = Readonly<{
  id?: string;
  material?: Material;
  counts?: SectionPart["counts"];
  thickness?: number | null;
}>;

/** A part that occupies exactly these regions. */
export const partOf = (regions: readonly Region[], options: PartOptions = {}): SectionPart => ({
  id: options.id ?? "p1",
  name: options.id ?? "Part 1",
  material: options.material ?? STEEL,
  counts: options.counts ?? "stiffness and mass",
  regions,
  thickness: options.thickness ?? null,
});

/** A section of parts that are known not to overlap; its outline is the parts side by side, its contacts are not sought. */
export const sectionOfParts = (parts: readonly SectionPart[], reference: Material = STEEL): Section => ({
  reference,
  parts,
  outline: parts.flatMap((part) => part.regions),
  contacts: [],
  bodies: [parts.map((part) => part.id)],
  warnings: [],
});

/** A section of one steel part. */
export const sectionOfRegions = (regions: readonly Region[]): Section => sectionOfParts([partOf(regions)]);

/** A rectangle with its lower left corner at (x, y). */
export const rectangleAt = (x: number, y: number, width: number, height: number): Region => ({
  outer: [
    { x, y },
    { x: x + width, y },
    { x: x + width, y: y + height },
    { x, y: y + height },
  ],
  holes: [],
});
