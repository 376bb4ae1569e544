import { z } from "zod";
import { Id, plainText, Version } from "./common";

/** A query string of the Rack: what a URL may hold, at most 2,000 characters. */
const query = z
  .string()
  .max(2000)
  .regex(/^[A-Za-z0-9\-._~%!$&'()*+,;=:@/?]*$/, "must be a query string");

export const CreateSavedSearchInput = z.strictObject({ name: plainText(60, 1), query });
export type CreateSavedSearchInput = z.infer<typeof CreateSavedSearchInput>;

export const UpdateSavedSearchInput = z.strictObject({
  name: plainText(60, 1).optional(),
  query: query.optional(),
});
export type UpdateSavedSearchInput = z.infer<typeof UpdateSavedSearchInput>;

export const SavedSearch = z.strictObject({ id: Id, name: z.string(), query: z.string(), version: Version });
export type SavedSearch = z.infer<typeof SavedSearch>;
export const SavedSearchList = z.strictObject({ items: z.array(SavedSearch) });
export type SavedSearchList = z.infer<typeof SavedSearchList>;
