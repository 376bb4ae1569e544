"use client";
import { useRouter } from "next/navigation";
import Link from "next/link";
import { useQueryStates } from "nuqs";
import { useCallback, useMemo } from "react";
import { Count } from "@/components/display/quantity";
import { BayElevation } from "@/components/rack/bay-elevation";
import { FilterBar } from "@/components/rack/filter-bar";
import { NothingFound } from "@/components/rack/nothing-found";
import { PhoneFilter } from "@/components/rack/phone-filter";
import { PreviewPane } from "@/components/rack/preview-pane";
import { RackTitleBlock } from "@/components/rack/rack-title-block";
import {
  isNarrowed,
  MAX_COMPARED,
  queryOf,
  rackParsers,
  searchOf,
  type RackState,
  type SearchChange,
} from "@/components/rack/search-params";
import { ShapeList } from "@/components/rack/shape-list";
import { ShapeTable } from "@/components/rack/shape-table";
import { useRackKeys } from "@/components/rack/use-rack-keys";
import { useMedia } from "@/components/sheet/use-media";
import { Sheet } from "@/components/sheet/sheet";
import { Button, buttonClass } from "@/components/ui/button";
import { EmptyBay } from "@/components/ui/empty-bay";
import { Notice } from "@/components/ui/notice";
import { AwaitedLine } from "@/components/ui/waiting";
import { sentenceOf } from "@/lib/client/api";
import { useBays, useShapeSearch } from "@/lib/client/shapes";
import type { BayList } from "@/lib/schemas/bay";
import type { FinderPage } from "@/lib/schemas/find-shapes";

type RackScreenProps = Readonly<{
  /** The first page of the search in the address, and the bays, as the server found them. */
  first: FinderPage;
  firstQuery: Readonly<Record<string, string>>;
  bays: BayList;
  mayDraft: boolean;
  mayDeliver: boolean;
}>;

const keyOf = (query: Readonly<Record<string, string>>) => JSON.stringify(Object.entries(query).sort());

export function RackScreen({ first, firstQuery, bays, mayDraft, mayDeliver }: RackScreenProps) {
  const router = useRouter();
  const phone = useMedia("(width < 480px)");
  const [state, setState] = useQueryStates(rackParsers, { history: "replace" });
  const search = useMemo(() => searchOf(state), [state]);
  const query = useMemo(() => queryOf(search), [search]);
  const found = useShapeSearch(query, keyOf(query) === keyOf(firstQuery) ? first : null);
  const allBays = useBays(bays).data?.items ?? bays.items;
  const rows = useMemo(() => found.data?.pages.flatMap((page) => page.items) ?? [], [found.data]);
  const counts = found.data?.pages[0]?.counts ?? null;
  const compared = state.with ?? [];
  const inHand = rows.find((row) => row.id === state.at) ?? null;

  const change = useCallback(
    (next: SearchChange & Partial<Pick<RackState, "at" | "with">>) => void setState(next),
    [setState],
  );
  const takeInHand = useCallback((id: string | null) => change({ at: id }), [change]);
  // The address first takes the row in hand: a change of it that came after the way out would call that off.
  const open = useCallback(
    (id: string) => void setState({ at: id }).then(() => router.push(`/rack/${id}`)),
    [router, setState],
  );
  const toggleCompared = useCallback(
    (id: string) => {
      const now = state.with ?? [];
      const next = now.includes(id)
        ? now.filter((other) => other !== id)
        : [...now, id].slice(0, MAX_COMPARED);
      change({ with: next.length > 0 ? next : null });
    },
    [state.with, change],
  );
  useRackKeys({ rows, inHand: state.at, onTakeInHand: takeInHand, onOpen: open, onCompare: toggleCompared });

  const { fetchNextPage, isFetchingNextPage } = found;
  const nearEnd = useCallback(() => {
    if (!isFetchingNextPage) void fetchNextPage();
  }, [fetchNextPage, isFetchingNextPage]);

  const empty = !found.isPending && rows.length === 0;
  const firstUse = empty && counts?.of === 0 && !isNarrowed(search);
  return (
    <Sheet
      heading="The Rack"
      className="flex min-w-0 flex-col overflow-hidden max-md:overflow-auto"
      block={
        <RackTitleBlock
          phone={phone}
          sort={state.sort}
          onSort={(sort) => change({ sort })}
          rows={rows.length}
          total={counts?.total ?? null}
          query={query}
          compared={compared}
          rowsKnown={rows}
          onForget={() => change({ with: null })}
          mayDraft={mayDraft}
        />
      }
    >
      {phone && <PhoneFilter search={search} counts={counts} onChange={change} />}
      <BayElevation
        bays={allBays}
        counts={counts}
        chosen={state.bay ?? []}
        onChoose={(bay) => change({ bay: bay === null ? null : [bay], at: null })}
      />
      {!phone && <FilterBar search={search} counts={counts} onChange={change} />}
      <div className="grid min-h-0 flex-1 grid-cols-[minmax(0,1fr)] lg:grid-cols-[minmax(0,1fr)_364px] max-md:min-h-[420px]">
        <section aria-label="Hits" aria-busy={found.isFetching} className="flex min-h-0 min-w-0 flex-col">
          {found.isError && (
            <Notice
              kind="lost"
              head="The search did not come through."
              className="m-3"
              actions={
                <Button size="small" onClick={() => void found.refetch()}>
                  Try again
                </Button>
              }
            >
              {sentenceOf(found.error)} {rows.length > 0 && "What stands below is from before."}
            </Notice>
          )}
          {firstUse ? (
            <EmptyBay
              head="This Rack is empty."
              actions={
                <>
                  {mayDraft && (
                    <Link prefetch={false} href="/bench" className={buttonClass({ kind: "main" })}>
                      Draw the first
                    </Link>
                  )}
                  {mayDeliver && (
                    <Link href="/goods-in" className={buttonClass()}>
                      Bring in a delivery
                    </Link>
                  )}
                </>
              }
            >
              <p>
                A shape comes here in two ways: drawn on the Bench and released by a second person, or taken
                in from a supplier’s table at Goods-in.
              </p>
            </EmptyBay>
          ) : empty ? (
            <NothingFound search={search} onChange={change} />
          ) : found.isPending ? (
            <AwaitedLine className="p-4">searching the Rack</AwaitedLine>
          ) : phone ? (
            <ShapeList
              rows={rows}
              sort={state.sort}
              inHand={state.at}
              onOpen={open}
              onNearEnd={nearEnd}
              more={found.hasNextPage}
            />
          ) : (
            <ShapeTable
              rows={rows}
              total={counts?.total ?? null}
              minSx={search.minSx}
              sort={state.sort}
              onSort={(sort) => change({ sort })}
              inHand={state.at}
              onTakeInHand={takeInHand}
              onOpen={open}
              onNearEnd={nearEnd}
              more={found.hasNextPage}
            />
          )}
          <p role="status" className="sr-only">
            {counts && `${counts.total} shapes fit`}
          </p>
        </section>
        {inHand ? (
          <PreviewPane
            row={inHand}
            bay={allBays.find((bay) => bay.id === inHand.bayId)}
            compared={compared.includes(inHand.id)}
            canCompare={compared.length < MAX_COMPARED}
            onCompare={() => toggleCompared(inHand.id)}
          />
        ) : (
          <aside className="border-l border-frame p-4 text-note text-ink-3 max-lg:hidden">
            {rows.length > 0 && (
              <>
                Take a shape in hand with the arrow keys or a press, and its figure stands here.{" "}
                <Count value={rows.length} /> rows are loaded; more follow as you go down.
              </>
            )}
          </aside>
        )}
      </div>
    </Sheet>
  );
}
