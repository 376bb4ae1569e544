"use client";
import { useQuery } from "@tanstack/react-query";
import { api } from "@/lib/client/api";
import { queryKeys } from "@/lib/client/query-keys";
import type { Waiting } from "@/lib/schemas/work";

/** What waits for this person; asked again each minute and after every step that changes it. */
export const useWaiting = () =>
  useQuery({
    queryKey: queryKeys.waiting(),
    queryFn: async ({ signal }) => (await api.get<Waiting>("/waiting", { signal })).data,
    refetchInterval: 60_000,
  });
