"use client";
import { keepPreviousData, useInfiniteQuery, useQuery } from "@tanstack/react-query";
import { api } from "@/lib/client/api";
import { queryKeys } from "@/lib/client/query-keys";
import type { BayList } from "@/lib/schemas/bay";
import type { FinderPage } from "@/lib/schemas/find-shapes";
import type { ShapeSheet } from "@/lib/schemas/shape";

export const PAGE_ROWS = 60;

export type SheetAnswer = Readonly<{ sheet: ShapeSheet; etag: string | null }>;

/** Pages of a search, the first with its counts; rows carry their drawings for the silhouettes. */
export const useShapeSearch = (query: Readonly<Record<string, string>>, first: FinderPage | null) =>
  useInfiniteQuery({
    queryKey: queryKeys.shapes(query),
    queryFn: async ({ pageParam, signal }) => {
      const include = pageParam === null ? "counts,drawing" : "drawing";
      const answer = await api.get<FinderPage>("/shapes", {
        query: { ...query, limit: PAGE_ROWS, include, cursor: pageParam },
        signal,
      });
      return answer.data;
    },
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.next,
    placeholderData: keepPreviousData,
    ...(first && { initialData: { pages: [first], pageParams: [null] } }),
  });

export const useBays = (initial?: BayList) =>
  useQuery({
    queryKey: queryKeys.bays(),
    queryFn: async ({ signal }) => (await api.get<BayList>("/bays", { signal })).data,
    ...(initial && { initialData: initial }),
  });

/** The sheet of a shape: the released revision, or the one asked for. */
export const useShapeSheet = (id: string | null, revision?: number | null, initial?: SheetAnswer) =>
  useQuery({
    queryKey: [...queryKeys.shape(id ?? ""), revision ?? null],
    enabled: id !== null,
    queryFn: async ({ signal }): Promise<SheetAnswer> => {
      const answer = await api.get<ShapeSheet>(`/shapes/${id}`, { query: { revision }, signal });
      return { sheet: answer.data, etag: answer.etag };
    },
    ...(initial && { initialData: initial }),
  });
