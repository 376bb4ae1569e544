import { z } from "zod";
import { Id, limitText, Moment, pageOf, Person } from "./common";

export const LogQuery = z.strictObject({
  cursor: z.string().min(1).max(500).optional(),
  limit: limitText.optional(),
  /** Only deeds of this person, verb, or thing; `from` and `to` are days or moments in UTC. */
  actor: Id.optional(),
  verb: z.string().max(60).optional(),
  entity: Id.optional(),
  from: z.iso.datetime().or(z.iso.date()).optional(),
  to: z.iso.datetime().or(z.iso.date()).optional(),
  q: z.string().max(120).optional(),
});
export type LogQuery = z.infer<typeof LogQuery>;

export const LogEntry = z.strictObject({
  id: Id,
  at: Moment,
  actor: Person,
  verb: z.string(),
  entity: z.string(),
  entityId: Id,
  /** What people call it: a designation with its revision, a bay, a member. */
  subject: z.string(),
  before: z.record(z.string(), z.unknown()).nullable(),
  after: z.record(z.string(), z.unknown()).nullable(),
  requestId: z.string(),
});
export type LogEntry = z.infer<typeof LogEntry>;

export const LogPage = pageOf(LogEntry);
export type LogPage = z.infer<typeof LogPage>;
