import type { DrawingMaterial, PartShape } from "@/lib/drawing/schema";
import type { Profile } from "@/lib/profiles/families";
import type { Fault, Result } from "@/lib/result";
import { err, ok } from "@/lib/result";
import type { Material } from "@/lib/section/section";

const profileThickness = ({ family, dimensions: d }: Profile): number => {
  switch (family) {
    case "i-section":
    case "channel":
    case "tee":
      return Math.max(d.flangeThickness, d.webThickness);
    case "i-section-unequal":
      return Math.max(d.topThickness, d.bottomThickness, d.webThickness);
    case "angle":
    case "zee":
    case "lipped-channel":
    case "rectangular-hollow":
    case "round-hollow":
      return d.thickness;
    case "flat":
      return Math.min(d.width, d.thickness);
    case "timber":
      return Math.min(d.width, d.depth);
    case "round":
      return d.diameter;
    default:
      return family satisfies never;
  }
};

/**
 * The thickness that decides the yield strength band of a part, mm: the lesser size of a plate, the wall of a tube, the
 * diameter of a solid round, the thickest element of a profile. Null for an outline, which has no one thickness.
 * @source EN 1993-1-1, table 3.1: fy by the nominal thickness of the element. The thickest element of a profile for all
 * of it is on the safe side.
 */
export const thicknessOf = (shape: PartShape): number | null => {
  switch (shape.kind) {
    case "plate":
      return Math.min(shape.width, shape.height);
    case "round":
      return shape.wall ?? shape.diameter;
    case "profile":
      return profileThickness(shape);
    case "outline":
      return null;
    default:
      return shape satisfies never;
  }
};

/** A part's material with its fy, and whether that fy is the least band for want of a thickness. */
export type ResolvedMaterial = Readonly<{ material: Material; leastBand: boolean }>;

/**
 * The material of a part with its yield strength found by thickness.
 * @param thickness mm, or null where the part has none: then the least fy of all bands holds.
 * @returns `fy.noBand` where the part is thicker than the last band reaches. A thickness equal to `upTo` is still in the
 * band.
 */
export const resolveMaterial = (
  material: DrawingMaterial,
  thickness: number | null,
): Result<ResolvedMaterial, Fault> => {
  const { fy, ...rest } = material;
  if (typeof fy === "number") return ok({ material: { ...rest, fy }, leastBand: false });
  const bands = fy.toSorted((a, b) => a.upTo - b.upTo);
  if (thickness === null) {
    const least = bands.reduce((low, band) => Math.min(low, band.fy), Infinity);
    return ok({ material: { ...rest, fy: least }, leastBand: bands.length > 1 });
  }
  const band = bands.find(({ upTo }) => thickness <= upTo);
  if (band !== undefined) return ok({ material: { ...rest, fy: band.fy }, leastBand: false });
  const last = bands.at(-1)?.upTo ?? 0;
  return err({
    code: "fy.noBand",
    detail: `The part is ${thickness} mm thick, but ${material.name} has yield strengths up to ${last} mm only. Add a band to the material or choose another.`,
  });
};
