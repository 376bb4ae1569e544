"use client";
import { useQuery } from "@tanstack/react-query";
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

export const useTakes = (shapeId: string) =>
  useQuery({
    queryKey: [...queryKeys.shape(shapeId), "takes"],
    queryFn: async ({ signal }) =>
      (await api.get<{ items: readonly TakeItem[] }>(`/shapes/${shapeId}/takes`, { signal })).data.items,
  });
