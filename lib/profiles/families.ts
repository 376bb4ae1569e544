import { z } from "zod";
import { MAX_LENGTH_MM, MIN_SIZE_MM } from "@/lib/geometry/limits";

const size = z.number().min(MIN_SIZE_MM).max(MAX_LENGTH_MM);
const sizeOrZero = z.number().min(0).max(MAX_LENGTH_MM);
const slope = z.number().min(0).max(1);

const tapered = {
  flangeSlope: slope.optional(),
  toeRadius: sizeOrZero.optional(),
  thicknessAt: sizeOrZero.optional(),
};

/** Dimensions of each family, mm; which dimension means what stands in `lib/profiles`. */
export const FAMILY_DIMENSIONS = {
  "i-section": z.strictObject({
    depth: size,
    flangeWidth: size,
    webThickness: size,
    flangeThickness: size,
    rootRadius: sizeOrZero,
    ...tapered,
  }),
  "i-section-unequal": z.strictObject({
    depth: size,
    topWidth: size,
    topThickness: size,
    bottomWidth: size,
    bottomThickness: size,
    webThickness: size,
    rootRadius: sizeOrZero,
  }),
  channel: z.strictObject({
    depth: size,
    flangeWidth: size,
    webThickness: size,
    flangeThickness: size,
    rootRadius: sizeOrZero,
    ...tapered,
  }),
  angle: z.strictObject({
    legLong: size,
    legShort: size,
    thickness: size,
    rootRadius: sizeOrZero,
    toeRadius: sizeOrZero,
  }),
  tee: z.strictObject({
    depth: size,
    flangeWidth: size,
    webThickness: size,
    flangeThickness: size,
    rootRadius: sizeOrZero,
  }),
  zee: z.strictObject({ depth: size, flangeWidth: size, thickness: size, innerRadius: sizeOrZero }),
  "rectangular-hollow": z.strictObject({
    depth: size,
    width: size,
    thickness: size,
    outerRadius: sizeOrZero,
    innerRadius: sizeOrZero,
  }),
  "round-hollow": z.strictObject({ diameter: size, thickness: size }),
  flat: z.strictObject({ width: size, thickness: size }),
  round: z.strictObject({ diameter: size }),
  "lipped-channel": z.strictObject({
    depth: size,
    flangeWidth: size,
    lip: size,
    thickness: size,
    innerRadius: sizeOrZero,
  }),
  timber: z.strictObject({ width: size, depth: size }),
} as const;

export type Family = keyof typeof FAMILY_DIMENSIONS;
export type FamilyDimensions = { [F in Family]: z.infer<(typeof FAMILY_DIMENSIONS)[F]> };
export type Profile = { [F in Family]: { family: F; dimensions: FamilyDimensions[F] } }[Family];
