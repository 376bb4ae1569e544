import { json, noContent } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { deleteSavedSearch } from "@/lib/services/saved-search/delete";
import { updateSavedSearch } from "@/lib/services/saved-search/update";

export const PATCH = route(
  "savedSearch.update",
  { body: true, version: true },
  async ({ ctx, params, body, version }) => {
    const saved = await updateSavedSearch({ ctx, savedSearchId: params.id ?? "", version, input: body });
    return json(saved, { version: saved.version });
  },
);

export const DELETE = route("savedSearch.delete", { version: true }, async ({ ctx, params, version }) => {
  await deleteSavedSearch({ ctx, savedSearchId: params.id ?? "", version });
  return noContent();
});
