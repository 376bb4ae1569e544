import { z } from "zod";
import { FAMILY_DIMENSIONS, type Family } from "@/lib/profiles/families";
import { MAX_LENGTH_MM, MIN_SIZE_MM } from "@/lib/geometry/limits";

/** Limits of a drawing: enforced in the browser and again on the server. */
export const MAX_PARTS = 500;
export const MAX_VERTICES = 20_000;

const coordinate = z.number().min(-MAX_LENGTH_MM).max(MAX_LENGTH_MM);
const size = z.number().min(MIN_SIZE_MM).max(MAX_LENGTH_MM);
const id = z.string().min(1).max(64);
const label = z.string().max(120);
const point = z.strictObject({ x: coordinate, y: coordinate });
const vertex = z.strictObject({
  x: coordinate,
  y: coordinate,
  bulge: z.number().min(-1e3).max(1e3).optional(),
});
const ring = z.array(vertex).min(2).max(MAX_VERTICES);

const profileOf = <F extends Family>(family: F) =>
  z.strictObject({
    kind: z.literal("profile"),
    family: z.literal(family),
    dimensions: FAMILY_DIMENSIONS[family],
  });

const profile = z.discriminatedUnion("family", [
  profileOf("i-section"),
  profileOf("i-section-unequal"),
  profileOf("channel"),
  profileOf("angle"),
  profileOf("tee"),
  profileOf("zee"),
  profileOf("rectangular-hollow"),
  profileOf("round-hollow"),
  profileOf("flat"),
  profileOf("round"),
  profileOf("lipped-channel"),
  profileOf("timber"),
]);

export const PartShape = z.discriminatedUnion("kind", [
  z.strictObject({ kind: z.literal("plate"), width: size, height: size }),
  z.strictObject({ kind: z.literal("outline"), outer: ring, holes: z.array(ring).max(500) }),
  z.strictObject({ kind: z.literal("round"), diameter: size, wall: size.optional() }),
  profile,
]);

const fyBands = z
  .array(z.strictObject({ upTo: size, fy: z.number().positive().max(1e5) }))
  .min(1)
  .max(20);

const material = z.strictObject({
  id,
  name: label.min(1),
  E: z.number().positive().max(1e7),
  G: z.number().positive().max(1e7),
  fy: z.union([z.number().positive().max(1e5), fyBands]),
  density: z.number().positive().max(1e5),
});

export const PART_COUNTS = ["stiffness and mass", "mass", "nothing"] as const;

const common = {
  id,
  name: label,
  at: point,
  angle: z.number().min(-360).max(360),
  mirror: z.boolean().optional(),
  shape: PartShape,
  group: id.optional(),
  locked: z.boolean().optional(),
};

const solidPart = z.strictObject({
  ...common,
  material: id,
  cutout: z.literal(false).optional(),
  counts: z.enum(PART_COUNTS).optional(),
  starter: z.record(z.string().max(64), z.union([z.string().max(120), z.number()])).optional(),
  from: z.strictObject({ shape: id, revision: z.number().int().min(1) }).optional(),
});

const cutoutPart = z.strictObject({ ...common, cutout: z.literal(true) });

const joint = z.strictObject({
  between: z.tuple([id, id]),
  kind: z.enum(["fillet", "cjp", "pjp", "bolts", "none"]),
  measure: z.enum(["leg", "throat"]).optional(),
  size: size.nullable(),
  sides: z.union([z.literal(1), z.literal(2)]).optional(),
  length: size.nullable().optional(),
  pitch: size.nullable().optional(),
});

/** The drawing document, version 1: the editable description of a section. */
export const DrawingV1 = z.strictObject({
  version: z.literal(1),
  unit: z.literal("mm"),
  reference: id,
  materials: z.array(material).min(1).max(50),
  parts: z.array(z.union([cutoutPart, solidPart])).max(MAX_PARTS),
  joints: z
    .array(joint)
    .max(2 * MAX_PARTS)
    .default([]),
});

export type Drawing = z.infer<typeof DrawingV1>;
export type DrawingPart = Drawing["parts"][number];
export type DrawingMaterial = Drawing["materials"][number];
export type DrawingJoint = Drawing["joints"][number];
export type PartShape = z.infer<typeof PartShape>;
