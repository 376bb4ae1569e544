"use client";
import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { api } from "@/lib/client/api";
import { queryKeys } from "@/lib/client/query-keys";

/** A take as the server answers it: which job took which revision, how many pieces of what length. */
export type TakeItem = Readonly<{
  id: string;
  ordinal: number;
  letter: string;
  jobNumber: string;
  jobName: string;
  pieceMark: string;
  quantity: number;
  lengthMm: number | null;
  by: Readonly<{ id: string; name: string }>;
  at: string;
}>;

export type NewTake = Readonly<{
  ordinal: number;
  jobNumber: string;
  jobName: string;
  pieceMark: string;
  quantity: number;
  lengthMm: number | null;
}>;

const takesKey = (shapeId: string) => [...queryKeys.shape(shapeId), "takes"];

export const useTakes = (shapeId: string) =>
  useQuery({
    queryKey: takesKey(shapeId),
    queryFn: async ({ signal }) =>
      (await api.get<{ items: readonly TakeItem[] }>(`/shapes/${shapeId}/takes`, { signal })).data.items,
  });

export function useRecordTake(shapeId: string) {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: (take: NewTake) => api.post(`/shapes/${shapeId}/takes`, { body: take }),
    onSuccess: () => cache.invalidateQueries({ queryKey: takesKey(shapeId) }),
  });
}

export function useTakeOff(shapeId: string) {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => api.delete(`/shapes/${shapeId}/takes/${id}`),
    onSuccess: () => cache.invalidateQueries({ queryKey: takesKey(shapeId) }),
  });
}
