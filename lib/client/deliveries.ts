"use client";
import {
  keepPreviousData,
  useInfiniteQuery,
  useMutation,
  useQuery,
  useQueryClient,
} from "@tanstack/react-query";
import { useEffect } from "react";
import { api, ApiProblem, type Problem } from "@/lib/client/api";
import { queryKeys } from "@/lib/client/query-keys";
import type {
  DecideRowInput,
  DecidedRows,
  Delivery,
  DeliveryPage,
  RowDetail,
  RowPage,
} from "@/lib/schemas/delivery";
import type { KeptReading, ReadingList } from "@/lib/schemas/reading";
import type { Reading } from "@/lib/intake/schema";

const BUSY: readonly Delivery["state"][] = ["received", "reading", "putting-away"];
export const atWork = (delivery: Pick<Delivery, "state">): boolean => BUSY.includes(delivery.state);

const POLL_MS = 700;
const etag = (version: number) => `"${version}"`;

/** The list of deliveries, asked again while one of them is at work. */
export const useDeliveries = (initial: DeliveryPage) =>
  useInfiniteQuery({
    queryKey: queryKeys.deliveries(),
    queryFn: async ({ pageParam, signal }) =>
      (await api.get<DeliveryPage>("/deliveries", { query: { cursor: pageParam }, signal })).data,
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.next,
    initialData: { pages: [initial], pageParams: [null] },
    refetchInterval: (query) =>
      query.state.data?.pages.some((page) => page.items.some(atWork)) ? 2 * POLL_MS : false,
  });

const rowsKey = (id: string) => [...queryKeys.delivery(id), "rows"] as const;

/** One delivery, asked again while it is at work; its rows are asked anew whenever its state has changed. */
export function useDelivery(initial: Delivery) {
  const cache = useQueryClient();
  const query = useQuery({
    queryKey: queryKeys.delivery(initial.id),
    queryFn: async ({ signal }) => (await api.get<Delivery>(`/deliveries/${initial.id}`, { signal })).data,
    initialData: initial,
    staleTime: 5_000,
    refetchInterval: (q) => (q.state.data !== undefined && atWork(q.state.data) ? POLL_MS : false),
  });
  const { state } = query.data;
  useEffect(() => {
    void cache.invalidateQueries({ queryKey: rowsKey(initial.id) });
  }, [cache, initial.id, state]);
  return query;
}

export type RowFilter = Readonly<{ verdict: string | null; cause: string | null; open: boolean }>;

/** Rows of a delivery, refused first; `version` makes a change of the delivery ask anew. */
export const useRows = (id: string, filter: RowFilter, enabled: boolean) =>
  useInfiniteQuery({
    queryKey: [...rowsKey(id), "list", filter],
    enabled,
    queryFn: async ({ pageParam, signal }) =>
      (
        await api.get<RowPage>(`/deliveries/${id}/rows`, {
          query: {
            verdict: filter.verdict,
            cause: filter.cause,
            open: filter.open ? "yes" : null,
            order: "worst",
            limit: 100,
            cursor: pageParam,
          },
          signal,
        })
      ).data,
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.next,
    placeholderData: keepPreviousData,
  });

export const useRow = (id: string, row: number | null) =>
  useQuery({
    queryKey: [...rowsKey(id), "one", row],
    enabled: row !== null,
    queryFn: async ({ signal }) =>
      (await api.get<RowDetail>(`/deliveries/${id}/rows/${row}`, { signal })).data,
    placeholderData: keepPreviousData,
  });

type Decide = Readonly<{ row: number; version: number; input: DecideRowInput }>;

/** Decides or mends a row; lists, counts and the row itself follow. */
export function useDecide(id: string) {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: async ({ row, version, input }: Decide) =>
      (await api.patch<DecidedRows>(`/deliveries/${id}/rows/${row}`, { body: input, ifMatch: etag(version) }))
        .data,
    onSuccess: (decided) => {
      cache.setQueryData([...rowsKey(id), "one", decided.row.number], decided.row);
      cache.setQueryData<Delivery>(
        queryKeys.delivery(id),
        (old) => old && { ...old, counts: decided.counts, version: decided.deliveryVersion },
      );
    },
    onSettled: () => cache.invalidateQueries({ queryKey: rowsKey(id) }),
  });
}

/** A deed on the delivery as a whole; its answer is the delivery's new state. */
export function useDeliveryDeed<Input>(
  id: string,
  send: (input: Input, version: number) => Promise<Delivery>,
) {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: ({ input, version }: { input: Input; version: number }) => send(input, version),
    onSuccess: (delivery) => cache.setQueryData(queryKeys.delivery(id), delivery),
    onSettled: async () => {
      await cache.invalidateQueries({ queryKey: queryKeys.deliveries() });
      await cache.invalidateQueries({ queryKey: ["shapes"] });
    },
  });
}

type ReadingAsk = Readonly<{ reading: Reading } | { encoding: Reading["encoding"] } | { readingId: string }>;

export const sendReading = (id: string) => async (input: ReadingAsk, version: number) =>
  (await api.put<Delivery>(`/deliveries/${id}/reading`, { body: input, ifMatch: etag(version) })).data;
export const sendPutAway = (id: string) => async (input: { leaveOutUndecided?: boolean }, version: number) =>
  (await api.post<Delivery>(`/deliveries/${id}/put-away`, { body: input, ifMatch: etag(version) })).data;
export const sendReturn = (id: string) => async (input: { reason: string }, version: number) =>
  (await api.post<Delivery>(`/deliveries/${id}/return`, { body: input, ifMatch: etag(version) })).data;
export const sendStop = (id: string) => async () => (await api.post<Delivery>(`/deliveries/${id}/stop`)).data;
export const discardDelivery = (id: string, version: number) =>
  api.delete(`/deliveries/${id}`, { ifMatch: etag(version) });

export const useReadings = (enabled: boolean) =>
  useQuery({
    queryKey: ["readings"],
    enabled,
    queryFn: async ({ signal }) => (await api.get<ReadingList>("/readings", { signal })).data.items,
  });

export function useKeepReading() {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: async ({
      name,
      reading,
      same,
    }: {
      name: string;
      reading: Reading;
      same: KeptReading | undefined;
    }) =>
      same === undefined
        ? (await api.post<KeptReading>("/readings", { body: { name, reading } })).data
        : (
            await api.patch<KeptReading>(`/readings/${same.id}`, {
              body: { reading },
              ifMatch: etag(same.version),
            })
          ).data,
    onSuccess: () => cache.invalidateQueries({ queryKey: ["readings"] }),
  });
}

type Upload = Readonly<{
  file: File;
  bayId: string;
  onProgress: (sentBytes: number) => void;
  signal: AbortSignal;
}>;

/** Announces a delivery and sends its file as it is, with progress. Fetch cannot tell how much was sent, XMLHttpRequest can. */
export async function bringIn({ file, bayId, onProgress, signal }: Upload): Promise<Delivery> {
  const made = (
    await api.post<Delivery>("/deliveries", { body: { bayId, fileName: file.name.slice(0, 200) }, signal })
  ).data;
  return sendFile(made, { file, onProgress, signal });
}

export function sendFile(
  to: Pick<Delivery, "id" | "version">,
  { file, onProgress, signal }: Omit<Upload, "bayId">,
): Promise<Delivery> {
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    request.open("PUT", `/api/v1/deliveries/${to.id}/file`);
    request.setRequestHeader("content-type", "text/csv");
    request.setRequestHeader("if-match", etag(to.version));
    request.upload.onprogress = (event) => onProgress(event.loaded);
    request.onload = () => {
      // Safe casts: the server's own tests hold its answers to their schemas.
      const answer: unknown = request.responseText === "" ? null : JSON.parse(request.responseText);
      if (request.status < 300) resolve(answer as Delivery);
      else reject(new ApiProblem({ ...(answer as Problem | null), status: request.status }));
    };
    request.onerror = () =>
      reject(
        new ApiProblem({
          status: 0,
          detail: "The file did not arrive: the connection was cut. Send it again.",
        }),
      );
    request.onabort = () => reject(new ApiProblem({ status: 0, detail: "Stopped. The file was not kept." }));
    signal.addEventListener("abort", () => request.abort(), { once: true });
    request.send(file);
  });
}
