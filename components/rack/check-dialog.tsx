"use client";
import { useState } from "react";
import type { SheetActionsProps } from "@/components/rack/sheet-actions";
import { NOT_CHECKED } from "@/components/rack/not-checked";
import { Button } from "@/components/ui/button";
import { Radios } from "@/components/ui/choice";
import { Dialog } from "@/components/ui/dialog";
import { TextArea } from "@/components/ui/field";
import { sentenceOf } from "@/lib/client/api";

export type StepDialogProps = SheetActionsProps & Readonly<{ open: boolean; onClose: () => void }>;
type How = "independent calculation" | "hand check" | "review";

/** Records a check: how it was made and where it is filed. Nothing is preselected. */
export function CheckDialog({ open, onClose, sheet, life }: StepDialogProps) {
  const [how, setHow] = useState<How | "">("");
  const [note, setNote] = useState("");
  return (
    <Dialog
      open={open}
      onOpenChange={(next) => !next && onClose()}
      title={`Check ${sheet.designation} ${sheet.revision.letter}`}
      text="Your name and the time are recorded. A checker has edited none of the revision."
      actions={
        <>
          <Button
            kind="main"
            atWork={life.isPending}
            disabled={how === ""}
            onClick={() =>
              life.mutate(
                { step: "check", body: { how, ...(note.trim() && { note: note.trim() }) } },
                { onSuccess: onClose },
              )
            }
          >
            Record the check
          </Button>
          <Button onClick={onClose}>Leave it</Button>
          {how === "" && <span className="text-note text-ink-3">say how it was checked</span>}
        </>
      }
    >
      <Radios
        label="How it was checked"
        value={how}
        onChange={(next) => next !== "" && setHow(next)}
        choices={[
          { value: "independent calculation", label: "independent calculation" },
          { value: "hand check", label: "hand check" },
          { value: "review", label: "review" },
        ]}
        className="mb-2"
      />
      <TextArea
        label="Where it is filed, and a remark that goes with the revision"
        value={note}
        maxLength={2000}
        onChange={(event) => setNote(event.target.value)}
        note={`Not part of a check of the figures: ${NOT_CHECKED}`}
        error={life.isError ? sentenceOf(life.error) : null}
      />
    </Dialog>
  );
}
