import { z } from "zod";
import { plainText } from "./common";

export const Tag = plainText(40, 1).pipe(z.string().regex(/^[^,]*$/, "must not hold a comma"));

export const PutTagsInput = z.strictObject({ tags: z.array(Tag).max(20) });
export type PutTagsInput = z.infer<typeof PutTagsInput>;
