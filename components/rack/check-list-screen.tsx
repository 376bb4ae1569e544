"use client";
import Link from "next/link";
import { useMemo, useState } from "react";
import { CheckListRows, type WaitingItem } from "@/components/rack/check-list-rows";
import { CheckWork } from "@/components/rack/check-work";
import { Sheet } from "@/components/sheet/sheet";
import { ActionCell, Cell, TitleBlock } from "@/components/sheet/title-block";
import { buttonClass } from "@/components/ui/button";
import { EmptyBay } from "@/components/ui/empty-bay";
import { Notice } from "@/components/ui/notice";
import { PaneHead } from "@/components/ui/table";
import { AwaitedLine } from "@/components/ui/waiting";
import { sentenceOf } from "@/lib/client/api";
import { useRevisionsBefore, useSheetsOf, useSubmitted } from "@/lib/client/to-check";
import type { Bay } from "@/lib/schemas/bay";
import type { FinderPage } from "@/lib/schemas/find-shapes";

type CheckListScreenProps = Readonly<{
  rows: FinderPage;
  bays: readonly Bay[];
  me: Readonly<{ id: string; name: string }>;
}>;

const waitsSince = ({ sheet }: WaitingItem) => sheet.revision.submitted?.at ?? sheet.revision.updatedAt;

/** The checker's list: what was submitted, longest waiting first; the work of checking beside it. */
export function CheckListScreen({ rows, bays, me }: CheckListScreenProps) {
  const submitted = useSubmitted(rows);
  const answers = useSheetsOf(submitted.data.items);
  const sheets = useMemo(
    () => answers.flatMap((a) => (a.data?.sheet.revision.state === "submitted" ? [a.data.sheet] : [])),
    [answers],
  );
  const befores = useRevisionsBefore(sheets);
  const items = sheets
    .map((sheet, i): WaitingItem => ({ sheet, before: befores[i]?.data ?? null }))
    .sort((a, b) => waitsSince(a).localeCompare(waitsSince(b)));
  const mine = items.filter(({ sheet: { revision } }) => revision.may.check || revision.may.release);
  const others = items.filter((item) => !mine.includes(item));
  const [chosen, setChosen] = useState<string | null>(null);
  const inHand = items.find(({ sheet }) => sheet.id === chosen) ?? mine[0] ?? others[0] ?? null;
  const failed = answers.find((a) => a.isError)?.error;
  const list = (
    <section aria-label="Waiting revisions" className="min-h-0 overflow-y-auto max-lg:overflow-visible">
      <PaneHead>
        To check
        <span className="text-note font-regular text-ink-3">submitted, longest waiting first</span>
        <span className="flex-1" />
        <span className="font-num">{mine.length}</span>
      </PaneHead>
      {failed && (
        <Notice kind="lost" head="Not all of the list came through." className="m-3">
          {sentenceOf(failed)}
        </Notice>
      )}
      <CheckListRows items={mine} inHand={inHand?.sheet.id ?? null} onTakeInHand={setChosen} />
      {others.length > 0 && (
        <>
          <PaneHead>
            Somebody else’s to check
            <span className="text-note font-regular text-ink-3">
              you edited it, or your right here is to read
            </span>
          </PaneHead>
          <CheckListRows items={others} inHand={inHand?.sheet.id ?? null} onTakeInHand={setChosen} />
        </>
      )}
    </section>
  );
  if (inHand === null)
    return (
      <Sheet
        heading="To check"
        block={
          <TitleBlock>
            <Cell label="Sheet" big>
              To check
            </Cell>
            <Cell label="Bays" fill stays="md">
              {bays.length}
            </Cell>
            <ActionCell>
              <Link href="/rack" className={`${buttonClass({ kind: "main" })} px-[18px]`}>
                To the Rack
              </Link>
            </ActionCell>
          </TitleBlock>
        }
      >
        {answers.some((a) => a.isPending) ? (
          <AwaitedLine className="p-4">fetching what was submitted</AwaitedLine>
        ) : (
          <EmptyBay head="Nothing waits for a check.">
            <p>What is submitted on the Bench or on a sheet stands here until it is released or sent back.</p>
          </EmptyBay>
        )}
      </Sheet>
    );
  return (
    <CheckWork
      key={`${inHand.sheet.id} ${inHand.sheet.revision.ordinal}`}
      item={inHand}
      me={me}
      list={list}
    />
  );
}
