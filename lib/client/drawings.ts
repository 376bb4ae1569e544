"use client";
import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { api } from "@/lib/client/api";
import { queryKeys } from "@/lib/client/query-keys";
import type { DrawingItem, DrawingPage, DrawingRecord } from "@/lib/schemas/drawing";

/** One's own drawings, the one last saved first. */
export const useDrawings = (limit = 100) =>
  useQuery({
    queryKey: [...queryKeys.drawings(), limit],
    queryFn: async ({ signal }) =>
      (await api.get<DrawingPage>("/drawings", { query: { limit }, signal })).data,
  });

/** Renaming, copying, deleting and bringing back; the list is read again after each. */
export const useDrawingDeeds = () => {
  const cache = useQueryClient();
  const onSuccess = () => cache.invalidateQueries({ queryKey: queryKeys.drawings() });
  // The ETag of a drawing is its version in quotes; a list carries the version only.
  const ifMatch = (item: DrawingItem) => `"${item.version}"`;
  return {
    rename: useMutation({
      mutationFn: ({ item, name }: { item: DrawingItem; name: string }) =>
        api.patch<DrawingRecord>(`/drawings/${item.id}`, { body: { name }, ifMatch: ifMatch(item) }),
      onSuccess,
    }),
    duplicate: useMutation({
      mutationFn: (item: DrawingItem) => api.post<DrawingRecord>(`/drawings/${item.id}/duplicate`),
      onSuccess,
    }),
    remove: useMutation({
      mutationFn: (item: DrawingItem) => api.delete(`/drawings/${item.id}`, { ifMatch: ifMatch(item) }),
      onSuccess,
    }),
    restore: useMutation({
      mutationFn: (id: string) => api.post<DrawingRecord>(`/drawings/${id}/restore`),
      onSuccess,
    }),
  };
};
