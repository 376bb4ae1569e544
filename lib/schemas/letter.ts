import { z } from "zod";
import { Id, Moment } from "./common";

/** A letter of the outbox; its text only in the demo, from the fake mail server's mailbox. */
export const LetterItem = z.strictObject({
  id: Id,
  to: z.string(),
  subject: z.string(),
  state: z.enum(["waiting", "sent", "failed"]),
  failure: z.string(),
  createdAt: Moment,
  sentAt: Moment.nullable(),
});
export const CaughtLetter = z.strictObject({
  to: z.string(),
  subject: z.string(),
  text: z.string(),
  at: Moment,
});
export const LetterList = z.strictObject({
  items: z.array(LetterItem),
  /** The demo's mailbox, newest first; null where letters go out to a mail server. */
  mailbox: z.array(CaughtLetter).nullable(),
});
export type LetterList = z.infer<typeof LetterList>;
