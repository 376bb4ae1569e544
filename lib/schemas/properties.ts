import { z } from "zod";
import { DrawingV1 } from "@/lib/drawing/schema";

/** `POST /properties`: a drawing, nothing stored. */
export const ComputePropertiesInput = z.strictObject({ drawing: DrawingV1 });
export type ComputePropertiesInput = z.infer<typeof ComputePropertiesInput>;

const number = z.number();
const maybe = z.number().nullable();
const point = z.strictObject({ x: number, y: number });
const face = z.strictObject({
  face: z.enum(["top", "bottom", "left", "right"]),
  nominal: number,
  actual: number,
  factor: number,
  at: point,
});

/** Every property of a section: the shape of lib/section/properties.ts on the wire; a test holds the two equal. */
export const Properties = z.strictObject({
  area: number,
  perimeter: z.strictObject({ outer: number, inner: number }),
  mass: number,
  surface: number,
  centroid: point,
  extents: z.strictObject({ xMin: number, xMax: number, yMin: number, yMax: number }),
  Ix: number,
  Iy: number,
  Ixy: number,
  I1: number,
  I2: number,
  angle: number,
  SxTop: number,
  SxBottom: number,
  SyLeft: number,
  SyRight: number,
  Sx: number,
  Sy: number,
  S1: number,
  S2: number,
  Zx: maybe,
  Zy: maybe,
  Z1: maybe,
  Z2: maybe,
  pna: point.nullable(),
  equalForceAxis: point.nullable(),
  Mp: point.nullable(),
  squash: maybe,
  rx: number,
  ry: number,
  r1: number,
  r2: number,
  J: maybe,
  Cw: maybe,
  shearCentre: point.nullable(),
  Avx: maybe,
  Avy: maybe,
  betaX: maybe,
  betaY: maybe,
  r0: maybe,
  estimates: z.strictObject({ J: maybe, Cw: maybe, shearCentre: maybe }),
  plain: z
    .strictObject({
      area: number,
      centroid: point,
      Ix: number,
      Iy: number,
      Ixy: number,
      I1: number,
      I2: number,
      angle: number,
      Sx: number,
      Sy: number,
      rx: number,
      ry: number,
    })
    .nullable(),
  stressFactors: z
    .array(z.strictObject({ material: z.string(), name: z.string(), factor: number }))
    .readonly(),
  unsymmetrical: z
    .strictObject({
      share: number,
      SxFree: number,
      SyFree: number,
      factorX: number,
      factorY: number,
      underMx: z.array(face).readonly(),
      underMy: z.array(face).readonly(),
    })
    .nullable(),
  absent: z.array(z.strictObject({ property: z.string(), code: z.string(), detail: z.string() })).readonly(),
  warnings: z
    .array(z.strictObject({ code: z.string(), detail: z.string(), parts: z.array(z.string()).readonly() }))
    .readonly(),
});
export type Properties = z.infer<typeof Properties>;

/** Tabulated values of a supplier's table, by property key; what the table does not print is missing. */
export const TabulatedFigures = z.record(z.string(), z.number());
export type TabulatedFigures = z.infer<typeof TabulatedFigures>;

export const ComputedProperties = z.strictObject({ properties: Properties, engineVersion: z.string() });
export type ComputedProperties = z.infer<typeof ComputedProperties>;
