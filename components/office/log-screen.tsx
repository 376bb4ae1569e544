"use client";
import { useInfiniteQuery } from "@tanstack/react-query";
import { parseAsString, useQueryStates } from "nuqs";
import { DEED_CHOICES } from "@/components/office/deed-words";
import { LogTable } from "@/components/office/log-table";
import { officeKeys } from "@/components/office/office-keys";
import { OfficeNav, type OfficePage } from "@/components/office/office-nav";
import { ScrollAcross } from "@/components/office/scroll-across";
import { Sheet } from "@/components/sheet/sheet";
import { Cell, TitleBlock } from "@/components/sheet/title-block";
import { Button } from "@/components/ui/button";
import { EmptyBay } from "@/components/ui/empty-bay";
import { TextField } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { SelectField } from "@/components/ui/select";
import { AwaitedLine } from "@/components/ui/waiting";
import { api, sentenceOf } from "@/lib/client/api";
import type { LogPage } from "@/lib/schemas/log";
import type { Member } from "@/lib/schemas/member";

type LogScreenProps = Readonly<{
  pages: readonly OfficePage[];
  people: readonly Pick<Member, "userId" | "name">[];
}>;

const text = parseAsString.withDefault("");

/** The log of deeds with its filter in the address, newest first, more on demand. */
export function LogScreen({ pages, people }: LogScreenProps) {
  const [filter, setFilter] = useQueryStates({ q: text, actor: text, verb: text, from: text, to: text });
  const set = Object.fromEntries(Object.entries(filter).filter(([, value]) => value !== ""));
  const query = useInfiniteQuery({
    queryKey: officeKeys.log(set),
    queryFn: async ({ pageParam, signal }) =>
      (await api.get<LogPage>("/log", { query: { ...set, cursor: pageParam, limit: 100 }, signal })).data,
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.next,
  });
  const entries = query.data?.pages.flatMap((page) => page.items) ?? [];
  const change = (name: keyof typeof filter) => (value: string) => void setFilter({ [name]: value || null });

  const block = (
    <TitleBlock>
      <Cell label="Office" big fill>
        Log
      </Cell>
      <Cell label="Shown">{query.hasNextPage ? `the newest ${entries.length}` : entries.length}</Cell>
    </TitleBlock>
  );
  return (
    <Sheet heading="Office: log of deeds" block={block}>
      <OfficeNav pages={pages} />
      <div className="grid grid-cols-[repeat(auto-fit,minmax(150px,1fr))] items-end gap-3 border-b border-frame p-3">
        <TextField
          label="On what or who"
          type="search"
          value={filter.q}
          onChange={(e) => change("q")(e.target.value)}
        />
        <SelectField
          label="Who"
          value={filter.actor}
          set={filter.actor !== ""}
          onChange={change("actor")}
          choices={[
            { value: "", label: "anybody" },
            ...people.map(({ userId, name }) => ({ value: userId, label: name })),
          ]}
        />
        <SelectField
          label="Deed"
          value={filter.verb}
          set={filter.verb !== ""}
          onChange={change("verb")}
          choices={[{ value: "", label: "any" }, ...DEED_CHOICES]}
        />
        <TextField
          label="From (UTC)"
          type="date"
          value={filter.from}
          onChange={(e) => change("from")(e.target.value)}
        />
        <TextField
          label="To (UTC)"
          type="date"
          value={filter.to}
          onChange={(e) => change("to")(e.target.value)}
        />
        <Button onClick={() => void setFilter(null)} disabled={Object.keys(set).length === 0}>
          Clear
        </Button>
      </div>
      {query.error && (
        <Notice
          kind="lost"
          head="The log could not be read."
          className="p-3"
          actions={<Button onClick={() => void query.refetch()}>Try again</Button>}
        >
          {sentenceOf(query.error)}
        </Notice>
      )}
      {query.isPending && <AwaitedLine className="p-3">Reading the log</AwaitedLine>}
      {query.isSuccess && entries.length === 0 && (
        <EmptyBay
          head="No deed fits."
          actions={<Button onClick={() => void setFilter(null)}>Show all</Button>}
        >
          Widen the days, or clear the filter.
        </EmptyBay>
      )}
      {entries.length > 0 && (
        <ScrollAcross label="Deeds">
          <LogTable entries={entries} show="both" headed />
        </ScrollAcross>
      )}
      {query.hasNextPage && (
        <div className="p-3">
          <Button onClick={() => void query.fetchNextPage()} atWork={query.isFetchingNextPage}>
            Show older ones
          </Button>
        </div>
      )}
    </Sheet>
  );
}
