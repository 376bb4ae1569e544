"use client";
import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { api } from "@/lib/client/api";
import { queryKeys } from "@/lib/client/query-keys";

export type CommentItem = Readonly<{
  id: string;
  ordinal: number | null;
  text: string;
  by: Readonly<{ id: string; name: string }>;
  at: string;
}>;
/** A deed as the log tells it to those who may read the shape. */
export type DeedItem = Readonly<{ id: string; verb: string; by: string; at: string; detail: string }>;

const commentsKey = (shapeId: string) => [...queryKeys.shape(shapeId), "comments"];

export const useComments = (shapeId: string) =>
  useQuery({
    queryKey: commentsKey(shapeId),
    queryFn: async ({ signal }) =>
      (await api.get<{ items: readonly CommentItem[] }>(`/shapes/${shapeId}/comments`, { signal })).data
        .items,
  });

export function useAddComment(shapeId: string) {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: (text: string) => api.post(`/shapes/${shapeId}/comments`, { body: { text } }),
    onSuccess: () => cache.invalidateQueries({ queryKey: commentsKey(shapeId) }),
  });
}

export const useDeeds = (shapeId: string, enabled: boolean) =>
  useQuery({
    queryKey: [...queryKeys.shape(shapeId), "deeds"],
    enabled,
    queryFn: async ({ signal }) =>
      (await api.get<{ items: readonly DeedItem[] }>(`/shapes/${shapeId}/deeds`, { signal })).data.items,
  });
