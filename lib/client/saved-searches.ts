"use client";
import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { api } from "@/lib/client/api";
import { queryKeys } from "@/lib/client/query-keys";

/** A search under a name: the query string of the Rack, kept on the server with the person. */
export type SavedSearch = Readonly<{ id: string; name: string; query: string; version: number }>;

export const useSavedSearches = () =>
  useQuery({
    queryKey: queryKeys.savedSearches(),
    queryFn: async ({ signal }) =>
      (await api.get<{ items: readonly SavedSearch[] }>("/saved-searches", { signal })).data.items,
  });

export function useSaveSearch() {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: (search: Pick<SavedSearch, "name" | "query">) =>
      api.post("/saved-searches", { body: search }),
    onSuccess: () => cache.invalidateQueries({ queryKey: queryKeys.savedSearches() }),
  });
}

export function useForgetSearch() {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: ({ id, version }: SavedSearch) =>
      api.delete(`/saved-searches/${id}`, { ifMatch: `"${version}"` }),
    onSuccess: () => cache.invalidateQueries({ queryKey: queryKeys.savedSearches() }),
  });
}
