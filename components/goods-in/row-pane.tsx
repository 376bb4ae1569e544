"use client";
import dynamic from "next/dynamic";
import { Count } from "@/components/display/quantity";
import { ComparisonTable } from "@/components/goods-in/comparison-table";
import { DateText } from "@/components/goods-in/date-text";
import { DecideForm } from "@/components/goods-in/decide-form";
import { Detail } from "@/components/goods-in/words";
import { Button } from "@/components/ui/button";
import { AcceptedSign, QueriedSign, RefusedSign } from "@/components/ui/signs";
import { Notice } from "@/components/ui/notice";
import { PaneHead } from "@/components/ui/table";
import { AwaitedLine } from "@/components/ui/waiting";
import { sentenceOf } from "@/lib/client/api";
import { useRow } from "@/lib/client/deliveries";
import type { FigureShow } from "@/lib/figure/compose-figure";
import type { Delivery, RowDetail } from "@/lib/schemas/delivery";

// The figure brings geometry and the clipper with it: late, so that the table stands first.
const ShapeFigure = dynamic(() => import("@/components/rack/shape-figure"), { ssr: false });
const SHOW: FigureShow = { dimensions: true, axes: true, balloons: false, centroidDimension: false };
const SIGN = { accepted: AcceptedSign, queried: QueriedSign, refused: RefusedSign } as const;

type RowPaneProps = Readonly<{
  delivery: Delivery;
  number: number | null;
  decidable: boolean;
  onNext: () => void;
  onRefused: (sentence: string | null) => void;
}>;

/** The row in hand: drawn, every figure against its gauge, what may have happened, and the decision. */
export function RowPane({ delivery, number, decidable, onNext, onRefused }: RowPaneProps) {
  const query = useRow(delivery.id, number);
  const row = query.data;
  if (number === null) return <aside aria-label="Row in hand" className="border-l border-frame" />;
  return (
    <aside
      aria-label="Row in hand"
      className="flex min-h-0 flex-col border-l border-frame max-lg:border-t max-lg:border-l-0"
    >
      {row === undefined || row.number !== number ? (
        query.isError ? (
          <Notice
            kind="lost"
            head="The row could not be fetched."
            className="m-4"
            actions={<Button onClick={() => void query.refetch()}>Try again</Button>}
          >
            {sentenceOf(query.error)}
          </Notice>
        ) : (
          <AwaitedLine className="p-4">fetching the row</AwaitedLine>
        )
      ) : (
        <>
          <RowHead row={row} undecided={delivery.counts?.undecided ?? 0} />
          <div
            role="region"
            aria-label="The row in hand"
            tabIndex={0}
            className="min-h-0 flex-1 overflow-y-auto max-lg:overflow-visible"
          >
            {row.drawing !== null && (
              <div className="flex justify-center border-b border-rule">
                <ShapeFigure
                  drawing={row.drawing}
                  properties={row.properties}
                  fit={{ width: 396, height: 188 }}
                  show={SHOW}
                  label={`Section of ${row.designation === "" ? `row ${row.number}` : row.designation}`}
                />
              </div>
            )}
            <ComparisonTable row={row} />
            <Happened row={row} />
          </div>
          {decidable && <DecideForm delivery={delivery} row={row} onNext={onNext} onRefused={onRefused} />}
        </>
      )}
    </aside>
  );
}

function RowHead({ row, undecided }: Readonly<{ row: RowDetail; undecided: number }>) {
  const Sign = SIGN[row.verdict];
  return (
    <PaneHead>
      <Sign />
      <span className="truncate font-num">{row.designation === "" ? "no designation" : row.designation}</span>
      <span className="text-note font-regular text-ink-3">
        row {row.number}, line {row.line}
      </span>
      <span className="flex-1" />
      {undecided > 0 && (
        <span className="text-note font-regular text-ink-3">
          <Count value={undecided} /> to decide
        </span>
      )}
    </PaneHead>
  );
}

function Happened({ row }: Readonly<{ row: RowDetail }>) {
  const said =
    row.reasons.length + row.built.length + row.mends.length > 0 ||
    row.standing !== "" ||
    row.decision !== null;
  if (!said) return null;
  return (
    <div className="grid gap-2 border-t border-frame px-3 py-2.5 text-[13px] leading-[18px]">
      {row.reasons.length > 0 && (
        <div>
          <b>What may have happened.</b>{" "}
          {row.reasons.map((reason, i) => (
            <span key={i} className="text-ink-2">
              <Detail text={reason.detail} />
              {reason.column !== undefined && (
                <span className="text-ink-3"> (column {reason.column})</span>
              )}{" "}
            </span>
          ))}
        </div>
      )}
      {row.standing !== "" && (
        <div>
          <b>On the Rack.</b> <span className="text-ink-2">{row.standing}</span>
        </div>
      )}
      {row.built.length > 0 && (
        <div>
          <b>Drawn with.</b> <span className="text-ink-2">{row.built.join("; ")}.</span>
        </div>
      )}
      {row.mends.map((mend, i) => (
        <div key={i}>
          <b>Mended.</b>{" "}
          <span className="text-ink-2">
            Column {mend.column}:{" "}
            <span className="font-num">{mend.before === "" ? "blank" : mend.before}</span> to{" "}
            <span className="font-num">{mend.after === "" ? "blank" : mend.after}</span>, {mend.by},{" "}
            <DateText iso={mend.at} time />.
          </span>
        </div>
      ))}
      {row.decision !== null && row.decidedBy !== null && row.decidedAt !== null && (
        <div>
          <b>Decided.</b>{" "}
          <span className="text-ink-2">
            {row.decision === "leave-out" ? "Left out" : `${row.decision} figures kept`} by{" "}
            {row.decidedBy.name}, <DateText iso={row.decidedAt} time />
            {row.decisionReason === "" ? "." : `: ${row.decisionReason}`}
          </span>
        </div>
      )}
    </div>
  );
}
