import { z } from "zod";

/** What waits for the asker: badges of the area tabs. */
export const Waiting = z.strictObject({
  /** Submitted revisions that the asker may check or release. */
  toCheck: z.number().int(),
  /** Deliveries that are not put away yet. */
  deliveries: z.number().int(),
});
export type Waiting = z.infer<typeof Waiting>;
