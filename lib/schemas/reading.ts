import { z } from "zod";
import { Reading } from "@/lib/intake/schema";
import { Id, Moment, Person, plainText, Version } from "./common";

/** What was learned about a supplier's columns, kept by name for the next delivery. */
export const KeptReading = z.strictObject({
  id: Id,
  name: z.string(),
  reading: Reading,
  createdBy: Person,
  updatedAt: Moment,
  version: Version,
});
export type KeptReading = z.infer<typeof KeptReading>;

export const ReadingList = z.strictObject({ items: z.array(KeptReading) });
export type ReadingList = z.infer<typeof ReadingList>;

export const CreateReadingInput = z.strictObject({ name: plainText(120, 1), reading: Reading });
export type CreateReadingInput = z.infer<typeof CreateReadingInput>;

export const UpdateReadingInput = z.strictObject({
  name: plainText(120, 1).optional(),
  reading: Reading.optional(),
});
export type UpdateReadingInput = z.infer<typeof UpdateReadingInput>;
