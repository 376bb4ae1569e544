import { z } from "zod";

/** An id as clients send it: whatever it looks like, an unknown one is simply not found. */
export const Id = z.string().min(1).max(64);

/** A moment as answers carry it: ISO 8601 in UTC. */
export const Moment = z.string();

/** Version of an editable record, from 1; also its ETag. */
export const Version = z.number().int().min(1);

export const MAX_PAGE = 200;

/** A number written in a query string: blank, words, NaN, Infinity and 1e309 are errors, nothing is coerced. */
export const numericText = z
  .string()
  .trim()
  .regex(/^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d{1,3})?$/i, "must be a number")
  .transform(Number)
  .pipe(z.number());

export const limitText = z
  .string()
  .trim()
  .regex(/^\d{1,6}$/, "must be a whole number")
  .transform(Number)
  .pipe(z.number().int().min(1).max(MAX_PAGE));

export const PageQuery = z.strictObject({
  cursor: z.string().min(1).max(500).optional(),
  limit: limitText.optional(),
});
export type PageQuery = z.infer<typeof PageQuery>;

export const pageOf = <T extends z.ZodType>(item: T) =>
  z.strictObject({ items: z.array(item), next: z.string().nullable() });

/** A person as answers name one. */
export const Person = z.strictObject({ id: Id, name: z.string() });
export type Person = z.infer<typeof Person>;

/** Text as people type it: NFC, trimmed, no control characters except line breaks. */
export const plainText = (max: number, min = 0) =>
  z
    .string()
    .transform((text) => text.normalize("NFC").trim())
    .pipe(
      z
        .string()
        .min(min)
        .max(max)
        .regex(/^[^\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]*$/, "must not hold control characters"),
    );

/** What every problem document says (RFC 9457). */
export const Problem = z.strictObject({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string(),
  requestId: z.string(),
  issues: z.array(
    z.strictObject({
      pointer: z.string().optional(),
      code: z.string(),
      detail: z.string(),
      part: z.string().optional(),
    }),
  ),
});
export type Problem = z.infer<typeof Problem>;

/** An action that needs nothing but the version in If-Match. */
export const Nothing = z.strictObject({});
