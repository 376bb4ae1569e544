import { z } from "zod";
import { Right } from "./access";
import { Id, plainText, Version } from "./common";

export const FiguresSource = z.enum(["computed", "tabulated"]);
export type FiguresSource = z.infer<typeof FiguresSource>;

export const Bay = z.strictObject({
  id: Id,
  name: z.string(),
  /** Place in the strip, from 1. */
  ordinal: z.number().int(),
  /** Which figures count where a revision has both. */
  counts: FiguresSource,
  /** Relative difference that a delivery lets pass, 0.01 = 1 %. */
  tolerance: z.number(),
  /** Number of released shapes in it. */
  shapes: z.number().int(),
  /** The asker's right here. */
  right: Right,
  version: Version,
});
export type Bay = z.infer<typeof Bay>;

export const BayList = z.strictObject({ items: z.array(Bay) });
export type BayList = z.infer<typeof BayList>;

const tolerance = z.number().min(0).max(0.5);

export const CreateBayInput = z.strictObject({
  name: plainText(60, 1),
  counts: FiguresSource.optional(),
  tolerance: tolerance.optional(),
});
export type CreateBayInput = z.infer<typeof CreateBayInput>;

export const UpdateBayInput = z.strictObject({
  name: plainText(60, 1).optional(),
  counts: FiguresSource.optional(),
  tolerance: tolerance.optional(),
  /** New place in the strip, from 1; the others move up or down. */
  ordinal: z.number().int().min(1).max(1000).optional(),
});
export type UpdateBayInput = z.infer<typeof UpdateBayInput>;
