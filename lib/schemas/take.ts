import { z } from "zod";
import { Id, Moment, Person, plainText } from "./common";

export const CreateTakeInput = z.strictObject({
  /** The revision that was taken; it must be the released one. */
  ordinal: z.number().int().min(1),
  jobNumber: plainText(60, 1),
  jobName: plainText(120).optional(),
  pieceMark: plainText(60).optional(),
  quantity: z.number().int().min(1).max(100_000),
  lengthMm: z.number().positive().max(1e6).nullable().optional(),
});
export type CreateTakeInput = z.infer<typeof CreateTakeInput>;

export const Take = z.strictObject({
  id: Id,
  ordinal: z.number().int(),
  letter: z.string(),
  jobNumber: z.string(),
  jobName: z.string(),
  pieceMark: z.string(),
  quantity: z.number().int(),
  lengthMm: z.number().nullable(),
  by: Person,
  at: Moment,
});
export type Take = z.infer<typeof Take>;

export const TakeList = z.strictObject({ items: z.array(Take) });
export type TakeList = z.infer<typeof TakeList>;
