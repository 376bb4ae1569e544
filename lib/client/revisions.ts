"use client";
import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { api } from "@/lib/client/api";
import { queryKeys } from "@/lib/client/query-keys";
import type { RevisionRecord } from "@/lib/schemas/shape";

/** One revision in full: its drawing and its figures. */
export const useRevision = (shapeId: string, ordinal: number | null) =>
  useQuery({
    queryKey: [...queryKeys.shape(shapeId), "revision", ordinal],
    enabled: ordinal !== null,
    queryFn: async ({ signal }) =>
      (await api.get<RevisionRecord>(`/shapes/${shapeId}/revisions/${ordinal}`, { signal })).data,
  });

export type LifeStep = "submit" | "check" | "send-back" | "release" | "withdraw";
type StepInput = Readonly<{ step: LifeStep; body?: Readonly<Record<string, unknown>> }>;

/** One step in the life of a revision, made from the version on the screen; the Rack and the sheet are fetched again. */
export function useLifeStep(shapeId: string, revision: Readonly<{ ordinal: number; version: number }>) {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: async ({ step, body }: StepInput) =>
      (
        await api.post<RevisionRecord>(`/shapes/${shapeId}/revisions/${revision.ordinal}/${step}`, {
          ...(body && { body }),
          ifMatch: `"${revision.version}"`,
        })
      ).data,
    onSuccess: () => {
      void cache.invalidateQueries({ queryKey: queryKeys.waiting() });
      void cache.invalidateQueries({ queryKey: ["shapes", "search"], refetchType: "none" });
      return cache.invalidateQueries({ queryKey: queryKeys.shape(shapeId) });
    },
  });
}
