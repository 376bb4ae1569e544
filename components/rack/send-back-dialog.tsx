"use client";
import { useState } from "react";
import type { StepDialogProps } from "@/components/rack/check-dialog";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { TextArea } from "@/components/ui/field";
import { sentenceOf } from "@/lib/client/api";

/** Sends a submitted revision back to its author, as a draft again, with the reason. */
export function SendBackDialog({ open, onClose, sheet, life }: StepDialogProps) {
  const [reason, setReason] = useState("");
  return (
    <Dialog
      open={open}
      onOpenChange={(next) => !next && onClose()}
      title={`Send ${sheet.designation} ${sheet.revision.letter} back`}
      text={`It becomes a draft of ${sheet.revision.author.name} again.`}
      actions={
        <>
          <Button
            kind="main"
            atWork={life.isPending}
            disabled={!reason.trim()}
            onClick={() =>
              life.mutate({ step: "send-back", body: { reason: reason.trim() } }, { onSuccess: onClose })
            }
          >
            Send back
          </Button>
          <Button onClick={onClose}>Leave it</Button>
        </>
      }
    >
      <TextArea
        label="Reason, for the author and the log"
        value={reason}
        maxLength={2000}
        autoFocus
        onChange={(event) => setReason(event.target.value)}
        error={life.isError ? sentenceOf(life.error) : null}
      />
    </Dialog>
  );
}
