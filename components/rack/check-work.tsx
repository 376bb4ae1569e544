"use client";
import dynamic from "next/dynamic";
import Link from "next/link";
import { useState, type ReactNode } from "react";
import { When } from "@/components/display/when";
import { ChangeTable } from "@/components/rack/change-table";
import { CHECKED_KEYS, CheckFigures, type OwnFigures } from "@/components/rack/check-figures";
import type { WaitingItem } from "@/components/rack/check-list-rows";
import { checkNote } from "@/components/rack/check-note";
import { NOT_CHECKED } from "@/components/rack/not-checked";
import { SendBackDialog } from "@/components/rack/send-back-dialog";
import { SheetFigure } from "@/components/rack/sheet-figure";
import { SheetNotices } from "@/components/rack/sheet-notices";
import { Sheet } from "@/components/sheet/sheet";
import { ActionCell, Cell, TitleBlock } from "@/components/sheet/title-block";
import { useDisplay } from "@/components/display/display-provider";
import { Button } from "@/components/ui/button";
import { Radios } from "@/components/ui/choice";
import { TextField } from "@/components/ui/field";
import { RevisionMark, StateChip } from "@/components/ui/marks";
import { WarningSign } from "@/components/ui/signs";
import { PaneHead } from "@/components/ui/table";
import { useLifeStep } from "@/lib/client/revisions";

const CheckTabulation = dynamic(() => import("@/components/rack/check-tabulation"), { ssr: false });

type How = "independent calculation" | "hand check" | "review";
type CheckWorkProps = Readonly<{
  item: WaitingItem;
  me: Readonly<{ id: string; name: string }>;
  list: ReactNode;
}>;

/** The work of checking one revision: figure, change, tabulation, own figures, how it was checked. */
export function CheckWork({ item, me, list }: CheckWorkProps) {
  const { sheet, before } = item;
  const { revision } = sheet;
  const { settings } = useDisplay();
  const life = useLifeStep(sheet.id, revision);
  const [ticked, setTicked] = useState<ReadonlySet<string>>(new Set());
  const [own, setOwn] = useState<OwnFigures>({});
  const [how, setHow] = useState<How | "">("");
  const [filed, setFiled] = useState("");
  const [remark, setRemark] = useState("");
  const [sendingBack, setSendingBack] = useState(false);
  const tick = (row: string, on: boolean) =>
    setTicked((now) => {
      const next = new Set(now);
      if (on) next.add(row);
      else next.delete(row);
      return next;
    });
  const rows = revision.drawing.parts.filter((part) => !part.cutout).length + 1 + CHECKED_KEYS.length;
  const record = () => {
    if (how === "") return;
    const note = checkNote({ filed, remark, own, computed: revision.computed, settings });
    life.mutate({ step: "check", body: { how, ...(note && { note }) } });
  };
  return (
    <Sheet
      heading={`Check ${sheet.designation}, revision ${revision.letter}`}
      className="grid grid-cols-[340px_minmax(0,1fr)_minmax(0,1.2fr)] max-xl:grid-cols-[280px_minmax(0,1fr)_minmax(0,1.3fr)] max-lg:auto-rows-max max-lg:grid-cols-[minmax(0,1fr)]"
      block={
        <TitleBlock>
          <Cell label="Designation" big>
            <Link
              href={`/rack/${sheet.id}?revision=${revision.ordinal}`}
              className="no-underline hover:underline"
            >
              {sheet.designation}
            </Link>
          </Cell>
          <Cell label="Title" fill stays="md">
            {sheet.title}
          </Cell>
          <Cell label="Bay" stays="lg">
            {sheet.bay.ordinal} {sheet.bay.name}
          </Cell>
          <Cell label="Revision" className="max-sm:hidden">
            <RevisionMark letter={revision.letter} /> <StateChip state={revision.state} />
          </Cell>
          <Cell label="Drawn" stays="xl">
            {revision.author.name}, <When at={revision.createdAt} />
          </Cell>
          <Cell label="Checked" stays="xl">
            {revision.checked
              ? revision.checked.by.name
              : revision.may.check
                ? `${me.name}, in hand`
                : "not yet"}
          </Cell>
          <Cell label="Rows ticked" stays="lg">
            {ticked.size} of {rows}
          </Cell>
          <ActionCell>
            {revision.may.sendBack && (
              <Button kind="plain" className="px-[18px]" onClick={() => setSendingBack(true)}>
                Send back
              </Button>
            )}
            {revision.may.check && !revision.may.release && (
              <Button
                kind="main"
                className="px-[18px]"
                disabled={how === ""}
                title={how === "" ? "say how it was checked" : undefined}
                atWork={life.isPending}
                onClick={record}
              >
                Check revision {revision.letter}
              </Button>
            )}
            {revision.may.release && (
              <Button
                kind="main"
                className="px-[18px]"
                atWork={life.isPending}
                onClick={() => life.mutate({ step: "release" })}
              >
                Release
              </Button>
            )}
          </ActionCell>
        </TitleBlock>
      }
    >
      <div className="min-h-0 border-r border-frame max-lg:border-r-0 max-lg:border-b xl:grid">{list}</div>
      <div className="flex min-h-0 flex-col overflow-y-auto border-r border-frame max-lg:overflow-visible max-lg:border-r-0">
        <SheetNotices sheet={sheet} life={life} onRefresh={() => life.reset()} failed={null} />
        <PaneHead>
          {sheet.designation} <RevisionMark letter={revision.letter} />
          {before && (
            <span className="text-note font-regular text-ink-3">double-dot: revision {before.letter}</span>
          )}
        </PaneHead>
        <div className="grid min-h-[420px] flex-1">
          <SheetFigure designation={sheet.designation} revision={revision} under={before?.drawing ?? null} />
        </div>
        {before && <ChangeTable from={before} to={revision} />}
      </div>
      <div className="flex min-h-0 flex-col overflow-y-auto max-lg:overflow-visible max-lg:border-t max-lg:border-frame">
        <CheckTabulation drawing={revision.drawing} ticked={ticked} onTick={tick} />
        <CheckFigures
          properties={revision.computed}
          own={own}
          onOwn={(key, value) =>
            setOwn((now) => {
              const { [key]: _old, ...rest } = now;
              return value === null ? rest : { ...rest, [key]: value };
            })
          }
          ticked={ticked}
          onTick={tick}
        />
        {revision.may.check && (
          <section aria-label="How it was checked">
            <PaneHead className="border-t border-frame">
              How it was checked
              <span className="text-note font-regular text-ink-3">{me.name}, who has edited none of it</span>
            </PaneHead>
            <div className="px-3 py-2">
              <Radios
                label="How it was checked"
                value={how}
                onChange={(next) => next !== "" && setHow(next)}
                choices={[
                  { value: "independent calculation", label: "independent calculation" },
                  { value: "hand check", label: "hand check" },
                  { value: "review", label: "review" },
                ]}
              />
              <div className="mt-2 grid grid-cols-[1fr_2fr] gap-3 max-sm:grid-cols-1">
                <TextField
                  label="Where it is filed"
                  value={filed}
                  maxLength={200}
                  onChange={(event) => setFiled(event.target.value)}
                />
                <TextField
                  label="Remark, goes with the revision"
                  value={remark}
                  maxLength={1000}
                  onChange={(event) => setRemark(event.target.value)}
                />
              </div>
            </div>
          </section>
        )}
        <p className="mt-auto flex gap-2 border-t border-rule px-3 py-2 text-table">
          <WarningSign className="mt-0.5" />
          <span>Checks the figures of the section only. Not part of it: {NOT_CHECKED}</span>
        </p>
      </div>
      <SendBackDialog open={sendingBack} onClose={() => setSendingBack(false)} sheet={sheet} life={life} />
    </Sheet>
  );
}
