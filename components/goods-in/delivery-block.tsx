"use client";
import Link from "next/link";
import { useRouter } from "next/navigation";
import { Count } from "@/components/display/quantity";
import { DateText } from "@/components/goods-in/date-text";
import { ReturnDialog } from "@/components/goods-in/return-dialog";
import { stateWords } from "@/components/goods-in/state-words";
import type { Step } from "@/components/goods-in/step-chain";
import { ActionCell, Cell, TitleBlock } from "@/components/sheet/title-block";
import { Button, buttonClass } from "@/components/ui/button";
import { apiUrl, sentenceOf } from "@/lib/client/api";
import { discardDelivery, sendPutAway, useDeliveryDeed } from "@/lib/client/deliveries";
import { DELIMITER_NAME } from "@/lib/intake/delimiters";
import { ENCODING_NAME } from "@/lib/intake/decode-bytes";
import type { Delivery } from "@/lib/schemas/delivery";

type DeliveryBlockProps = Readonly<{
  delivery: Delivery;
  step: Step;
  onStep: (step: "columns" | "inspect") => void;
  onRefused: (sentence: string | null) => void;
}>;

const MARK = { ",": "comma decimals", ".": "point decimals" } as const;

/** Facts of the delivery and what can be done with it now. */
export function DeliveryBlock({ delivery, step, onStep, onRefused }: DeliveryBlockProps) {
  const { counts, recognised } = delivery;
  const reading = recognised?.reading ?? null;
  return (
    <TitleBlock>
      <Cell label="Delivery" big>
        <span className="font-num">{delivery.code}</span>
      </Cell>
      <Cell label="File" fill stays="md">
        {delivery.fileName}
      </Cell>
      {step === "columns" && reading && (
        <Cell label="Read as" stays="lg">
          {ENCODING_NAME[reading.encoding]}, {DELIMITER_NAME[reading.delimiter]}
          {reading.marks && `, ${MARK[reading.marks.decimal]}`}
        </Cell>
      )}
      <Cell label="Into bay" stays="lg">
        {delivery.bay.name}
      </Cell>
      {counts && (
        <Cell label={step === "columns" ? "Rows" : "Left to decide"} className="max-sm:hidden">
          <Count value={step === "columns" ? counts.rows : counts.undecided} />
        </Cell>
      )}
      <Cell label={delivery.putAwayAt === null ? "Brought by" : "Put away by"} stays="xl">
        {(delivery.putAwayBy ?? delivery.createdBy).name},{" "}
        <DateText iso={delivery.putAwayAt ?? delivery.createdAt} time />
      </Cell>
      <Cell label="State" className="sm:hidden" fill>
        {stateWords(delivery)}
      </Cell>
      <Actions delivery={delivery} step={step} onStep={onStep} onRefused={onRefused} />
    </TitleBlock>
  );
}

function Actions({ delivery, step, onStep, onRefused }: DeliveryBlockProps) {
  const router = useRouter();
  const putAway = useDeliveryDeed(delivery.id, sendPutAway(delivery.id));
  const { counts, state } = delivery;
  const undecided = counts?.undecided ?? 0;
  const kept = counts === null ? 0 : counts.rows - counts.leftOut - undecided;
  const press = (leaveOutUndecided: boolean) => {
    onRefused(null);
    putAway.mutate(
      { input: leaveOutUndecided ? { leaveOutUndecided } : {}, version: delivery.version },
      { onError: (cause) => onRefused(sentenceOf(cause)) },
    );
  };
  const discard = async () => {
    onRefused(null);
    try {
      await discardDelivery(delivery.id, delivery.version);
      router.push("/goods-in");
      router.refresh();
    } catch (cause) {
      onRefused(sentenceOf(cause));
    }
  };
  if (state === "put-away" || state === "returned")
    return (
      <ActionCell>
        <Link href="/goods-in" className={buttonClass({ kind: "plain" })}>
          All deliveries
        </Link>
        {state === "put-away" && <ReturnDialog delivery={delivery} onRefused={onRefused} />}
        <Link href={`/rack?bay=${delivery.bay.id}`} className={`${buttonClass({ kind: "main" })} px-[18px]`}>
          See them on the Rack
        </Link>
      </ActionCell>
    );
  if (state === "read" && step === "columns")
    return (
      <ActionCell>
        <Link href="/goods-in" className={`${buttonClass({ kind: "plain" })} max-sm:hidden`}>
          All deliveries
        </Link>
        <Button kind="main" className="px-[18px]" onClick={() => onStep("inspect")}>
          <span>
            Inspect <Count value={counts?.rows ?? 0} /> rows
          </span>
        </Button>
      </ActionCell>
    );
  if (state === "read")
    return (
      <ActionCell>
        <Button kind="plain" className="max-md:hidden" onClick={() => onStep("columns")}>
          Back
        </Button>
        {(counts?.queried ?? 0) + (counts?.refused ?? 0) > 0 && (
          <a
            className={`${buttonClass({ kind: "plain" })} max-lg:hidden`}
            href={apiUrl(`/deliveries/${delivery.id}/queries.csv`)}
            download
          >
            Export the queries
          </a>
        )}
        {undecided > 0 && (
          <Button
            kind="plain"
            className="max-sm:hidden"
            disabled={putAway.isPending || kept === 0}
            onClick={() => press(true)}
          >
            Leave them out by name
          </Button>
        )}
        <Button
          kind="main"
          className="px-[18px]"
          atWork={putAway.isPending}
          disabled={undecided > 0 || kept === 0 || putAway.isPending}
          onClick={() => press(false)}
        >
          <span>
            Put away <Count value={kept} />
            {undecided > 0 && (
              <>
                , <Count value={undecided} /> left to decide
              </>
            )}
          </span>
        </Button>
      </ActionCell>
    );
  return (
    <ActionCell>
      {(state === "failed" || state === "stopped" || state === "announced") && (
        <Button kind="plain" onClick={() => void discard()}>
          Discard the delivery
        </Button>
      )}
      <Link href="/goods-in" className={buttonClass({ kind: "plain" })}>
        All deliveries
      </Link>
    </ActionCell>
  );
}
