import { z } from "zod";
import { Id, Moment, Person, plainText, Version } from "./common";

export const CreateRightRequestInput = z.strictObject({
  bayId: Id.nullable(),
  right: z.enum(["draft", "release"]),
  reason: plainText(1000, 1),
});
export type CreateRightRequestInput = z.infer<typeof CreateRightRequestInput>;

export const DecideRightRequestInput = z.strictObject({
  granted: z.boolean(),
  until: z.iso.datetime().nullable().optional(),
  answer: plainText(1000).optional(),
});
export type DecideRightRequestInput = z.infer<typeof DecideRightRequestInput>;

export const RightRequest = z.strictObject({
  id: Id,
  member: z.strictObject({ id: Id, name: z.string() }),
  bay: z.strictObject({ id: Id, name: z.string() }).nullable(),
  right: z.enum(["draft", "release"]),
  reason: z.string(),
  state: z.enum(["open", "granted", "refused"]),
  answer: z.string(),
  decidedBy: Person.nullable(),
  createdAt: Moment,
  version: Version,
});
export type RightRequest = z.infer<typeof RightRequest>;
export const RightRequestList = z.strictObject({ items: z.array(RightRequest) });
export type RightRequestList = z.infer<typeof RightRequestList>;
