import type { DrawingPart } from "@/lib/drawing/schema";
import type { Box } from "@/lib/figure/display-list";

/** Whether a plate or flat stands square to the axes, so that its sizes can be read off level and upright dimensions. */
export const standsSquare = (part: DrawingPart): boolean => {
  const { shape } = part;
  const rectangular =
    shape.kind === "plate" ||
    (shape.kind === "profile" && (shape.family === "flat" || shape.family === "timber"));
  return rectangular && part.angle % 90 === 0;
};

/** Levels of flange edges of a profile that stands upright, for the chain; empty for tapered flanges and other families. */
export const levelsOf = (part: DrawingPart, box: Box): number[] => {
  const { shape } = part;
  if (shape.kind !== "profile" || part.angle % 180 !== 0) return [];
  const over = part.angle % 360 !== 0;
  const at = (bottom: number, top: number) =>
    over ? [box.yMin + top, box.yMax - bottom] : [box.yMin + bottom, box.yMax - top];
  switch (shape.family) {
    case "i-section":
    case "channel":
      return shape.dimensions.flangeSlope
        ? []
        : at(shape.dimensions.flangeThickness, shape.dimensions.flangeThickness);
    case "i-section-unequal":
      return at(shape.dimensions.bottomThickness, shape.dimensions.topThickness);
    case "tee":
      return over
        ? [box.yMin + shape.dimensions.flangeThickness]
        : [box.yMax - shape.dimensions.flangeThickness];
    case "rectangular-hollow":
      return at(shape.dimensions.thickness, shape.dimensions.thickness);
    default:
      return [];
  }
};

/** Timber is told from metal by weight and stiffness (common practice: under 1,500 kg/m³ and 30 GPa). */
export const isTimber = (material: Readonly<{ E: number; density: number }>): boolean =>
  material.density < 1_500 && material.E < 30_000;
