"use client";
import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { TextArea } from "@/components/ui/field";
import { ApiProblem, sentenceOf } from "@/lib/client/api";
import { sendReturn, useDeliveryDeed } from "@/lib/client/deliveries";
import type { Delivery } from "@/lib/schemas/delivery";

/** Returning withdraws what the delivery brought, so it asks first; what was built on it is listed. */
export function ReturnDialog({
  delivery,
  onRefused,
}: Readonly<{ delivery: Delivery; onRefused: (s: string | null) => void }>) {
  const [open, setOpen] = useState(false);
  const [reason, setReason] = useState("");
  const back = useDeliveryDeed(delivery.id, sendReturn(delivery.id));
  const issues = back.error instanceof ApiProblem ? back.error.issues : [];
  return (
    <>
      <Button kind="plain" onClick={() => setOpen(true)}>
        Return the delivery
      </Button>
      <Dialog
        open={open}
        onOpenChange={setOpen}
        title={`Return ${delivery.code} whole?`}
        text="What it brought is withdrawn with your reason; what it superseded is released again. The log keeps both."
        actions={
          <>
            <Button
              kind="danger"
              disabled={reason.trim() === "" || back.isPending}
              onClick={() =>
                back.mutate(
                  { input: { reason }, version: delivery.version },
                  {
                    onSuccess: () => {
                      onRefused(null);
                      setOpen(false);
                    },
                  },
                )
              }
            >
              {reason.trim() === "" ? "Return: say why" : "Return"}
            </Button>
            <Button onClick={() => setOpen(false)}>Keep it</Button>
          </>
        }
      >
        <TextArea
          label="Reason"
          value={reason}
          maxLength={500}
          onChange={(event) => setReason(event.target.value)}
          error={back.isError ? sentenceOf(back.error) : null}
        />
        {issues.length > 0 && (
          <ul className="mt-2 max-h-40 overflow-auto text-table">
            {issues.map((issue, i) => (
              <li key={i}>{issue.detail}</li>
            ))}
          </ul>
        )}
      </Dialog>
    </>
  );
}
