import { z } from "zod";
import { Id, Moment, Person, plainText } from "./common";

export const CreateCommentInput = z.strictObject({
  text: plainText(4000, 1),
  /** The revision it speaks of; without it the one that is shown first. */
  ordinal: z.number().int().min(1).optional(),
});
export type CreateCommentInput = z.infer<typeof CreateCommentInput>;

export const Comment = z.strictObject({
  id: Id,
  ordinal: z.number().int(),
  letter: z.string(),
  text: z.string(),
  by: Person,
  at: Moment,
});
export type Comment = z.infer<typeof Comment>;

export const CommentList = z.strictObject({ items: z.array(Comment) });
export type CommentList = z.infer<typeof CommentList>;

/** A deed of the log as it is told to those who may read the shape. */
export const ShapeDeed = z.strictObject({
  id: Id,
  verb: z.string(),
  by: z.string(),
  at: Moment,
  detail: z.string(),
});
export type ShapeDeed = z.infer<typeof ShapeDeed>;
export const ShapeDeedList = z.strictObject({ items: z.array(ShapeDeed) });
export type ShapeDeedList = z.infer<typeof ShapeDeedList>;
