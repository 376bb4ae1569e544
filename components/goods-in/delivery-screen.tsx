"use client";
import { useQueryStates } from "nuqs";
import { useState } from "react";
import { ColumnsScreen } from "@/components/goods-in/columns-screen";
import { DeliveryBlock } from "@/components/goods-in/delivery-block";
import { FaultNotice } from "@/components/goods-in/fault-notice";
import { InspectScreen } from "@/components/goods-in/inspect-screen";
import { deliveryParsers } from "@/components/goods-in/search-params";
import { StepChain, type Step } from "@/components/goods-in/step-chain";
import { WorkingNotice } from "@/components/goods-in/working-notice";
import { Sheet } from "@/components/sheet/sheet";
import { Notice } from "@/components/ui/notice";
import { sentenceOf } from "@/lib/client/api";
import { atWork, useDelivery } from "@/lib/client/deliveries";
import type { Delivery } from "@/lib/schemas/delivery";

/** How far a delivery has come; a person may look back, not ahead. */
function reachOf(delivery: Delivery): Step {
  switch (delivery.state) {
    case "put-away":
    case "putting-away":
    case "returned":
      return "away";
    case "read":
      return "inspect";
    default:
      return delivery.recognised === null ? "unload" : "columns";
  }
}

/** One delivery from unloading to putting away; the step, the filter and the row in hand stand in the address. */
export function DeliveryScreen({ initial }: Readonly<{ initial: Delivery }>) {
  const query = useDelivery(initial);
  const delivery = query.data;
  const [state, setState] = useQueryStates(deliveryParsers, { history: "replace" });
  const [refusal, setRefusal] = useState<string | null>(null);
  const reach = reachOf(delivery);
  const wanted: Step = state.step ?? (reach === "away" || reach === "inspect" ? "inspect" : reach);
  const step: Step =
    reach === "away" && wanted === "inspect" ? "away" : reach === "unload" ? "unload" : wanted;
  const busy = atWork(delivery);
  return (
    <Sheet
      heading={`Delivery ${delivery.code}, ${delivery.fileName}`}
      className="grid grid-rows-[auto_auto_minmax(0,1fr)] overflow-hidden! max-lg:overflow-auto!"
      block={
        <DeliveryBlock
          delivery={delivery}
          step={step}
          onStep={(next) => void setState({ step: next, row: null })}
          onRefused={setRefusal}
        />
      }
    >
      <StepChain
        now={step}
        reach={reach}
        onStep={(next) => void setState({ step: next === "columns" ? "columns" : "inspect" })}
      />
      <div>
        {query.isError && (
          <Notice
            kind="conflict"
            head="The delivery could not be asked for again."
            className="border-b border-rule p-3"
          >
            {sentenceOf(query.error)} What you see is its last known state.
          </Notice>
        )}
        {refusal !== null && (
          <Notice kind="lost" head="Not done." className="border-b border-rule p-3">
            {refusal}
          </Notice>
        )}
        {delivery.sameFile.length > 0 && delivery.state === "read" && (
          <Notice kind="word" head="This file has been here before." className="border-b border-rule p-3">
            {delivery.sameFile.map((d) => `${d.code} (${d.state})`).join(", ")}. What is on the Rack already
            is not brought twice.
          </Notice>
        )}
        {delivery.fault !== null && !busy && <FaultNotice delivery={delivery} />}
      </div>
      {delivery.recognised !== null && step === "columns" && state.step === "columns" ? (
        <ColumnsScreen delivery={delivery} recognised={delivery.recognised} onRefused={setRefusal} />
      ) : busy ? (
        <WorkingNotice delivery={delivery} />
      ) : delivery.recognised !== null && step === "columns" ? (
        <ColumnsScreen delivery={delivery} recognised={delivery.recognised} onRefused={setRefusal} />
      ) : step === "inspect" || step === "away" ? (
        <InspectScreen delivery={delivery} onRefused={setRefusal} />
      ) : (
        <div />
      )}
    </Sheet>
  );
}
