import { z } from "zod";
import { RevisionRecord } from "./shape";

/** Two revisions of a shape and what changed between them. */
export const RevisionComparison = z.strictObject({
  from: RevisionRecord,
  to: RevisionRecord,
  changes: z.array(
    z.strictObject({
      property: z.string(),
      from: z.number().nullable(),
      to: z.number().nullable(),
      /** (to − from) / |from|; null where there is nothing to divide by. */
      relative: z.number().nullable(),
    }),
  ),
});
export type RevisionComparison = z.infer<typeof RevisionComparison>;
