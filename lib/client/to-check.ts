"use client";
import { useQueries, useQuery } from "@tanstack/react-query";
import { api } from "@/lib/client/api";
import { queryKeys } from "@/lib/client/query-keys";
import type { FinderPage, FinderRow } from "@/lib/schemas/find-shapes";
import type { RevisionRecord, ShapeSheet } from "@/lib/schemas/shape";

const QUERY = { state: "submitted", include: "drawing", limit: 60, sort: "designation" };

/** Submitted revisions that this person may see. */
export const useSubmitted = (initial: FinderPage) =>
  useQuery({
    queryKey: [...queryKeys.waiting(), "rows"],
    queryFn: async ({ signal }) => (await api.get<FinderPage>("/shapes", { query: QUERY, signal })).data,
    initialData: initial,
  });

/** The sheets of the submitted rows: who drew them, since when they wait, what may be done. */
export const useSheetsOf = (rows: readonly FinderRow[]) =>
  useQueries({
    queries: rows.map((row) => ({
      queryKey: [...queryKeys.shape(row.id), row.ordinal],
      queryFn: async ({ signal }: { signal: AbortSignal }) => {
        const query = { revision: row.ordinal };
        const answer = await api.get<ShapeSheet>(`/shapes/${row.id}`, { query, signal });
        return { sheet: answer.data, etag: answer.etag };
      },
    })),
  });

/** The revision before each submitted one, for the change; null where there is none. */
export const useRevisionsBefore = (sheets: readonly ShapeSheet[]) =>
  useQueries({
    queries: sheets.map((sheet) => {
      const before = Math.max(
        0,
        ...sheet.revisions.map((r) => r.ordinal).filter((n) => n < sheet.revision.ordinal),
      );
      return {
        queryKey: [...queryKeys.shape(sheet.id), "revision", before],
        enabled: before > 0,
        queryFn: async ({ signal }: { signal: AbortSignal }) =>
          (await api.get<RevisionRecord>(`/shapes/${sheet.id}/revisions/${before}`, { signal })).data,
      };
    }),
  });
