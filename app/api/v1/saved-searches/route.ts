import { json } from "@/lib/http/answer";
import { route } from "@/lib/http/route";
import { createSavedSearch } from "@/lib/services/saved-search/create";
import { listSavedSearches } from "@/lib/services/saved-search/list";

export const GET = route("savedSearch.list", {}, async ({ ctx }) => json(await listSavedSearches({ ctx })));

export const POST = route("savedSearch.create", { body: true }, async ({ ctx, body }) => {
  const saved = await createSavedSearch({ ctx, input: body });
  return json(saved, { status: 201, version: saved.version });
});
