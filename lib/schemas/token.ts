import { z } from "zod";
import { Id, Moment, Person, plainText } from "./common";

export const TokenMay = z.enum(["read", "change"]);
export type TokenMay = z.infer<typeof TokenMay>;

export const CreateTokenInput = z.strictObject({
  name: plainText(60, 1),
  may: TokenMay,
  /** Days until it ends, at most a year. */
  days: z.number().int().min(1).max(366),
});
export type CreateTokenInput = z.infer<typeof CreateTokenInput>;

export const Token = z.strictObject({
  id: Id,
  name: z.string(),
  may: TokenMay,
  owner: Person,
  createdAt: Moment,
  expiresAt: Moment,
  lastUsedAt: Moment.nullable(),
});
export type Token = z.infer<typeof Token>;
export const TokenList = z.strictObject({ items: z.array(Token) });
export type TokenList = z.infer<typeof TokenList>;

/** The only answer that ever holds the token itself. */
export const CreatedToken = Token.extend({ token: z.string() });
export type CreatedToken = z.infer<typeof CreatedToken>;
