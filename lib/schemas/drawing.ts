import { z } from "zod";
import { DrawingV1 } from "@/lib/drawing/schema";
import { Id, Moment, pageOf, plainText, Version } from "./common";

/** The shape a private drawing revises and the revision it started from. */
export const DrawingOf = z.strictObject({ shapeId: Id, ordinal: z.number().int().min(1) });

export const CreateDrawingInput = z.strictObject({
  name: plainText(120, 1),
  drawing: DrawingV1,
  of: DrawingOf.nullable().optional(),
});
export type CreateDrawingInput = z.infer<typeof CreateDrawingInput>;

export const UpdateDrawingInput = z.strictObject({
  name: plainText(120, 1).optional(),
  drawing: DrawingV1.optional(),
  /** Links it to the shape it was saved as, or frees it. */
  of: DrawingOf.nullable().optional(),
});
export type UpdateDrawingInput = z.infer<typeof UpdateDrawingInput>;

export const DrawingItem = z.strictObject({
  id: Id,
  name: z.string(),
  of: DrawingOf.nullable(),
  parts: z.number().int(),
  version: Version,
  createdAt: Moment,
  updatedAt: Moment,
});
export type DrawingItem = z.infer<typeof DrawingItem>;

export const DrawingRecord = DrawingItem.extend({ drawing: DrawingV1 });
export type DrawingRecord = z.infer<typeof DrawingRecord>;

export const DrawingPage = pageOf(DrawingItem);
export type DrawingPage = z.infer<typeof DrawingPage>;
