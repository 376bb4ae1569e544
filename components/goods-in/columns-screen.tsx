"use client";
import { useEffect, useEffectEvent, useState } from "react";
import { ColumnRow } from "@/components/goods-in/column-row";
import { FirstPiece } from "@/components/goods-in/first-piece";
import { ReadingFacts } from "@/components/goods-in/reading-facts";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Table, Th } from "@/components/ui/table";
import { sentenceOf } from "@/lib/client/api";
import { atWork, sendReading, useDeliveryDeed } from "@/lib/client/deliveries";
import type { Reading } from "@/lib/intake/schema";
import type { Delivery, Recognised } from "@/lib/schemas/delivery";

type ColumnsScreenProps = Readonly<{
  delivery: Delivery;
  recognised: Recognised;
  onRefused: (sentence: string | null) => void;
}>;

/** What was recognised, column by column, with its evidence; a correction reads the file again at once. */
export function ColumnsScreen({ delivery, recognised, onRefused }: ColumnsScreenProps) {
  const again = useDeliveryDeed(delivery.id, sendReading(delivery.id));
  // What was asked for stands until the delivery has been read by it, so that the field in hand keeps its place and its focus;
  // what is changed meanwhile waits its turn.
  const [asked, setAsked] = useState<Reading | null>(null);
  const [waiting, setWaiting] = useState<Reading | null>(null);
  const busy = again.isPending || atWork(delivery);
  const draft = busy ? (waiting ?? asked ?? recognised.reading) : recognised.reading;
  const fixed = delivery.putAwayAt !== null || delivery.state === "putting-away";
  const send = (reading: Reading) => {
    setAsked(reading);
    onRefused(null);
    again.mutate(
      { input: { reading }, version: delivery.version },
      { onError: (cause) => onRefused(sentenceOf(cause)) },
    );
  };
  const read = (reading: Reading) => {
    if (fixed) return;
    if (busy) setWaiting(reading);
    else send(reading);
  };
  const next = useEffectEvent(() => {
    if (waiting === null) return;
    setWaiting(null);
    send(waiting);
  });
  useEffect(() => {
    if (busy) return undefined;
    const turn = setTimeout(() => next());
    return () => clearTimeout(turn);
  }, [busy]);
  const change = (index: number, next: Partial<Reading["columns"][number]>) =>
    read({ ...draft, columns: draft.columns.map((c, i) => (i === index ? { ...c, ...next } : c)) });
  return (
    <div className="grid min-h-0 grid-cols-[minmax(0,1fr)_380px] max-lg:grid-cols-1">
      <section aria-label="Columns" className="min-h-0 overflow-auto max-lg:overflow-visible">
        <p
          role="status"
          className={busy ? "border-b border-rule px-3 py-1.5 text-note text-ink-2" : "sr-only"}
        >
          {busy ? "Reading again by what you changed." : ""}
        </p>
        {recognised.questions.length > 0 && (
          <Notice kind="conflict" head="Only you can say:" className="border-b border-rule p-3">
            {recognised.questions.join(" ")}
          </Notice>
        )}
        <Table aria-label="Columns of the file" className="[&_td]:px-1.5 [&_th]:h-9 [&_th]:bg-panel">
          <thead className="sticky top-0 z-10">
            <tr>
              <Th numeric>Col</Th>
              <Th>Heading in file</Th>
              <Th className="max-sm:hidden">Rows 1, 2 as written</Th>
              <Th>Goes to</Th>
              <Th>Unit in file</Th>
              <Th numeric className="max-xl:hidden">
                Factor
              </Th>
              <Th numeric unit="% off computed" className="max-sm:hidden">
                Worst of 50
              </Th>
              <Th className="max-md:hidden">Remark</Th>
            </tr>
          </thead>
          <tbody>
            {recognised.columns.map((column, i) => (
              <ColumnRow
                key={i}
                index={i}
                column={{ ...column, ...draft.columns[i] }}
                disabled={fixed}
                onChange={(next) => change(i, next)}
              />
            ))}
          </tbody>
        </Table>
      </section>
      <aside
        aria-label="How the file is read"
        className="min-h-0 overflow-y-auto border-l border-frame max-lg:overflow-visible max-lg:border-t max-lg:border-l-0"
      >
        <FirstPiece deliveryId={delivery.id} />
        <ReadingFacts recognised={recognised} reading={draft} disabled={fixed} onRead={read} />
        {recognised.corrected && (
          <p className="px-3 pb-3 text-note text-ink-3">
            Corrected by hand.{" "}
            <Button size="small" kind="plain" disabled={fixed} onClick={() => read(recognised.reading)}>
              Read again
            </Button>
          </p>
        )}
      </aside>
    </div>
  );
}
