"use client";
import dynamic from "next/dynamic";
import { useState } from "react";
import { When } from "@/components/display/when";
import { BothFigures } from "@/components/rack/both-figures";
import { Comments, Deeds } from "@/components/rack/comments";
import { MaterialsTable } from "@/components/rack/materials-table";
import { NearestOnRack } from "@/components/rack/nearest-on-rack";
import { hashWords, NotChecked } from "@/components/rack/not-checked";
import { PrintedLine } from "@/components/rack/printed-line";
import { PropertyTables } from "@/components/rack/property-tables";
import { RevisionList } from "@/components/rack/revision-list";
import { SheetActions } from "@/components/rack/sheet-actions";
import { SheetFigure } from "@/components/rack/sheet-figure";
import { SheetNotices } from "@/components/rack/sheet-notices";
import { TakeTable } from "@/components/rack/take-table";
import { Sheet } from "@/components/sheet/sheet";
import { Cell, TitleBlock } from "@/components/sheet/title-block";
import { useDisplay } from "@/components/display/display-provider";
import { RevisionMark, StateChip } from "@/components/ui/marks";
import { PaneHead } from "@/components/ui/table";
import { useLifeStep, useRevision } from "@/lib/client/revisions";
import { useShapeSheet, type SheetAnswer } from "@/lib/client/shapes";

const PartsTable = dynamic(() => import("@/components/rack/parts-table"), { ssr: false });

type ShapeSheetScreenProps = Readonly<{
  initial: SheetAnswer;
  revision: number | null;
  firm: string;
  me: Readonly<{ id: string; name: string }>;
}>;

/** The sheet of a shape: what it is, its figures, its life, and what was not checked. */
export function ShapeSheetScreen({ initial, revision: asked, firm, me }: ShapeSheetScreenProps) {
  const { settings } = useDisplay();
  const answer = useShapeSheet(initial.sheet.id, asked, initial);
  const sheet = answer.data?.sheet ?? initial.sheet;
  const { revision } = sheet;
  const life = useLifeStep(sheet.id, revision);
  const [against, setAgainst] = useState<number | null>(null);
  const under = useRevision(sheet.id, against);
  const figures = { computed: revision.computed, tabulated: revision.tabulated, counts: sheet.counts };
  return (
    <Sheet
      heading={`${sheet.designation}, revision ${revision.letter}`}
      zones
      className="grid grid-cols-[minmax(0,1fr)_412px_356px] max-xl:grid-cols-[minmax(0,1fr)_380px_320px] max-lg:grid-cols-[minmax(0,1fr)_380px] max-md:grid-cols-[minmax(0,1fr)] max-lg:auto-rows-max max-lg:overflow-auto print:grid-cols-[minmax(0,1fr)_308px_256px] print:overflow-visible"
      block={
        <TitleBlock>
          <Cell label="Firm" className="hidden print:flex">
            <b>{firm}</b>
          </Cell>
          <Cell label="Designation" big>
            {sheet.designation}
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
            {revision.checked ? (
              <>
                {revision.checked.by.name}, <When at={revision.checked.at} />
              </>
            ) : (
              <span className="text-ink-3">not yet</span>
            )}
          </Cell>
          <Cell label="Released" stays="xl">
            {revision.released ? (
              <>
                {revision.released.by.name}, <When at={revision.released.at} />
              </>
            ) : (
              <span className="text-ink-3">not yet</span>
            )}
          </Cell>
          <Cell label="Units" className="hidden print:flex">
            {settings.system === "metric" ? "mm, MPa" : "in, ksi"}
          </Cell>
          <span className="no-print contents">
            <SheetActions sheet={sheet} life={life} />
          </span>
        </TitleBlock>
      }
    >
      <div className="flex min-h-0 flex-col">
        <SheetNotices
          sheet={sheet}
          life={life}
          onRefresh={() => void answer.refetch()}
          failed={answer.error}
        />
        <div className="grid min-h-0 flex-1 max-lg:min-h-[520px]">
          <SheetFigure
            designation={sheet.designation}
            revision={revision}
            under={under.data?.drawing ?? null}
          />
        </div>
      </div>
      <div
        role="region"
        aria-label="Properties and life of the revision"
        tabIndex={0}
        className="min-h-0 min-w-0 overflow-y-auto border-l border-frame max-lg:overflow-visible max-md:border-t max-md:border-l-0 print:overflow-visible print:[zoom:.78]"
      >
        <PaneHead>
          Properties
          <span className="text-note font-regular text-ink-3">
            {sheet.counts === "tabulated" && revision.tabulated
              ? "tabulated, the rest computed"
              : "gross section, no welds"}
          </span>
        </PaneHead>
        <PropertyTables figures={figures} />
        <BothFigures figures={figures} bay={sheet.bay.name} />
        <PartsTable drawing={revision.drawing} />
        <MaterialsTable drawing={revision.drawing} />
      </div>
      <div className="flex min-h-0 min-w-0 flex-col overflow-y-auto border-l border-frame max-lg:col-span-full max-lg:overflow-visible max-lg:border-t max-lg:border-l-0 print:col-span-1 print:overflow-visible print:[zoom:.78]">
        <RevisionList
          shapeId={sheet.id}
          revisions={sheet.revisions}
          shown={revision}
          against={against}
          onAgainst={setAgainst}
        />
        <TakeTable shapeId={sheet.id} designation={sheet.designation} shown={revision} me={me.id} />
        {revision.note && (
          <section aria-label="Note">
            <PaneHead className="border-t border-frame">Note</PaneHead>
            <p className="px-3 py-2 text-table break-words whitespace-pre-wrap">{revision.note}</p>
          </section>
        )}
        {revision.checked?.note && (
          <p className="border-t border-rule px-3 py-2 text-table">
            <b>Checked by {revision.checked.how}:</b> {revision.checked.note}
          </p>
        )}
        <NearestOnRack shapeId={sheet.id} Sx={revision.computed.Sx} />
        <Comments shapeId={sheet.id} />
        <Deeds shapeId={sheet.id} />
        <span className="flex-1" />
        <NotChecked>
          <p>
            Speaks of revision {revision.letter} only, content{" "}
            <span className="font-num">{hashWords(revision.contentHash)}</span>, engine{" "}
            {revision.engineVersion}.
          </p>
          <PrintedLine by={me.name} />
        </NotChecked>
      </div>
    </Sheet>
  );
}
