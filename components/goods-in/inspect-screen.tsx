"use client";
import { useQueryStates } from "nuqs";
import { useCallback, useMemo } from "react";
import { RowPane } from "@/components/goods-in/row-pane";
import { RowTable } from "@/components/goods-in/row-table";
import { deliveryParsers } from "@/components/goods-in/search-params";
import { Tally } from "@/components/goods-in/tally";
import { useRowKeys } from "@/components/goods-in/use-row-keys";
import { Button } from "@/components/ui/button";
import { EmptyBay } from "@/components/ui/empty-bay";
import { Notice } from "@/components/ui/notice";
import { AwaitedLine } from "@/components/ui/waiting";
import { sentenceOf } from "@/lib/client/api";
import { useRows } from "@/lib/client/deliveries";
import type { Delivery } from "@/lib/schemas/delivery";

type InspectScreenProps = Readonly<{ delivery: Delivery; onRefused: (sentence: string | null) => void }>;

/** Inspection: rows by verdict and cause at the left, the row in hand with its gauge and its decision at the right. */
export function InspectScreen({ delivery, onRefused }: InspectScreenProps) {
  const [state, setState] = useQueryStates(deliveryParsers, { history: "replace" });
  const filter = useMemo(
    () => ({ verdict: state.verdict, cause: state.cause, open: state.open === "yes" }),
    [state.verdict, state.cause, state.open],
  );
  const list = useRows(delivery.id, filter, true);
  const rows = useMemo(() => list.data?.pages.flatMap((page) => page.items) ?? [], [list.data]);
  const inHand = state.row ?? rows.find((row) => row.open !== null)?.number ?? rows[0]?.number ?? null;
  const take = useCallback((row: number | null) => void setState({ row }), [setState]);
  useRowKeys({ rows, inHand, onTake: take });
  const nextOpen = useCallback(() => {
    const at = rows.findIndex((row) => row.number === inHand);
    const after = [...rows.slice(at + 1), ...rows.slice(0, Math.max(0, at))].find((row) => row.open !== null);
    if (after !== undefined) take(after.number);
  }, [rows, inHand, take]);
  const decidable = delivery.state === "read";
  return (
    <div className="grid min-h-0 grid-cols-[minmax(0,1fr)_420px] max-lg:grid-cols-1">
      <section aria-label="Rows" className="flex min-h-0 flex-col max-lg:max-h-[60dvh]">
        {delivery.counts && (
          <Tally
            counts={delivery.counts}
            tolerance={delivery.recognised?.reading.tolerance ?? null}
            state={state}
            onState={(next) => void setState({ ...next, row: null })}
          />
        )}
        {list.isError ? (
          <Notice
            kind="lost"
            head="The rows could not be fetched."
            className="m-4"
            actions={<Button onClick={() => void list.refetch()}>Try again</Button>}
          >
            {sentenceOf(list.error)}
          </Notice>
        ) : list.isPending ? (
          <AwaitedLine className="p-4">fetching the rows</AwaitedLine>
        ) : rows.length === 0 ? (
          <EmptyBay
            head={filter.open ? "Every row is decided." : "No row is like that."}
            actions={
              <Button onClick={() => void setState({ verdict: null, cause: null, open: null, row: null })}>
                Show all rows
              </Button>
            }
          />
        ) : (
          <RowTable
            rows={rows}
            total={delivery.counts?.rows ?? null}
            inHand={inHand}
            onTake={take}
            more={list.hasNextPage}
            onNearEnd={() => {
              if (!list.isFetchingNextPage) void list.fetchNextPage();
            }}
          />
        )}
      </section>
      <RowPane
        key={inHand ?? 0}
        delivery={delivery}
        number={inHand}
        decidable={decidable}
        onNext={nextOpen}
        onRefused={onRefused}
      />
    </div>
  );
}
