"use client";
import { useState } from "react";
import { Count } from "@/components/display/quantity";
import { TakeDialog } from "@/components/rack/take-dialog";
import { Button } from "@/components/ui/button";
import { RevisionMark } from "@/components/ui/marks";
import { QueriedSign } from "@/components/ui/signs";
import { PaneHead, Table, Td, Th } from "@/components/ui/table";
import { sentenceOf } from "@/lib/client/api";
import { useTakeOff, useTakes } from "@/lib/client/takes";
import type { RevisionRecord } from "@/lib/schemas/shape";

type TakeTableProps = Readonly<{ shapeId: string; designation: string; shown: RevisionRecord; me: string }>;

/** Where a shape is used: jobs with pieces and lengths; what took another revision stands on chalk. */
export function TakeTable({ shapeId, designation, shown, me }: TakeTableProps) {
  const takes = useTakes(shapeId);
  const takeOff = useTakeOff(shapeId);
  const [recording, setRecording] = useState(false);
  const items = takes.data ?? [];
  const late = items.filter((take) => take.ordinal !== shown.ordinal);
  return (
    <section aria-label="Where used">
      <PaneHead className="border-t border-frame">
        Where used
        <span className="flex-1" />
        {shown.state === "released" && (
          <Button size="small" className="no-print" onClick={() => setRecording(true)}>
            Record a take
          </Button>
        )}
      </PaneHead>
      {takes.isError ? (
        <p className="px-3 py-1.5 text-note text-oxide-ink">{sentenceOf(takes.error)}</p>
      ) : items.length === 0 ? (
        <p className="px-3 py-1.5 text-note text-ink-3">
          {takes.isPending ? "asking" : "No job took it yet."}
        </p>
      ) : (
        <Table>
          <thead>
            <tr>
              <Th className="pl-3">Job</Th>
              <Th numeric>Pieces</Th>
              <Th numeric unit="m">
                Length
              </Th>
              <Th>Took</Th>
              <Th className="no-print">
                <span className="sr-only">Take off</span>
              </Th>
            </tr>
          </thead>
          <tbody>
            {items.map((take) => (
              <tr key={take.id} className={take.ordinal === shown.ordinal ? "" : "bg-chalk-wash"}>
                <Td className="max-w-[150px] truncate pl-3" title={`${take.jobNumber} ${take.jobName}`}>
                  <b className="font-[560]">{take.jobNumber}</b> {take.jobName}{" "}
                  <span className="text-ink-3">{take.pieceMark}</span>
                </Td>
                <Td numeric>
                  <Count value={take.quantity} />
                </Td>
                <Td numeric>
                  {take.lengthMm !== null && <Count value={take.lengthMm / 1000} decimals={2} />}
                </Td>
                <Td>
                  <RevisionMark letter={take.letter} />
                </Td>
                <Td className="no-print pr-2 text-right">
                  {take.by.id === me && (
                    <button
                      type="button"
                      className="link min-h-6 text-note text-ink-2"
                      onClick={() => takeOff.mutate(take.id)}
                    >
                      take off
                    </button>
                  )}
                </Td>
              </tr>
            ))}
          </tbody>
        </Table>
      )}
      {late.length > 0 && (
        <p className="flex gap-2 px-3 py-1.5 text-table">
          <QueriedSign label="note" className="mt-0.5" />
          <span>
            <b>
              {late.map((t) => t.jobNumber).join(", ")} took{" "}
              {[...new Set(late.map((t) => t.letter))].join(", ")}.
            </b>{" "}
            <span className="text-ink-2">
              Their pieces keep that revision; a new piece takes the released one.
            </span>
          </span>
        </p>
      )}
      {takeOff.isError && (
        <p role="alert" className="px-3 py-1 text-note text-oxide-ink">
          {sentenceOf(takeOff.error)}
        </p>
      )}
      <TakeDialog
        open={recording}
        onOpenChange={setRecording}
        shapeId={shapeId}
        name={`${designation} ${shown.letter}`}
        ordinal={shown.ordinal}
      />
    </section>
  );
}
