"use client";
import { useId, useState } from "react";
import { useDisplay } from "@/components/display/display-provider";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { TextField } from "@/components/ui/field";
import { QuantityField } from "@/components/display/quantity-field";
import { ApiProblem, sentenceOf } from "@/lib/client/api";
import { useRecordTake } from "@/lib/client/takes";

type TakeDialogProps = Readonly<{
  open: boolean;
  onOpenChange: (open: boolean) => void;
  shapeId: string;
  name: string;
  ordinal: number;
}>;

/** Records that a job takes pieces of a revision. */
export function TakeDialog({ open, onOpenChange, shapeId, name, ordinal }: TakeDialogProps) {
  const { settings } = useDisplay();
  const record = useRecordTake(shapeId);
  const lengthId = useId();
  const [jobNumber, setJobNumber] = useState("");
  const [jobName, setJobName] = useState("");
  const [pieceMark, setPieceMark] = useState("");
  const [quantity, setQuantity] = useState("1");
  const [lengthMm, setLengthMm] = useState<number | null>(null);
  const pieces = /^\d{1,6}$/.test(quantity.trim()) ? Number(quantity) : NaN;
  const missing = !jobNumber.trim() ? "a job number" : !(pieces >= 1) ? "a whole number of pieces" : null;
  const issue = (pointer: string) =>
    record.error instanceof ApiProblem ? record.error.issueAt(pointer) : null;
  return (
    <Dialog
      open={open}
      onOpenChange={onOpenChange}
      title={`Take ${name} for a job`}
      text="The record stays with this revision: when it is superseded or withdrawn, the job is named."
      actions={
        <>
          <Button
            kind="main"
            atWork={record.isPending}
            disabled={missing !== null}
            title={missing ? `needs ${missing}` : undefined}
            onClick={() =>
              record.mutate(
                {
                  ordinal,
                  jobNumber: jobNumber.trim(),
                  jobName: jobName.trim(),
                  pieceMark: pieceMark.trim(),
                  quantity: pieces,
                  lengthMm,
                },
                { onSuccess: () => onOpenChange(false) },
              )
            }
          >
            Record
          </Button>
          <Button onClick={() => onOpenChange(false)}>Leave it</Button>
          {missing && <span className="text-note text-ink-3">needs {missing}</span>}
        </>
      }
    >
      <div className="grid grid-cols-2 gap-3">
        <TextField
          label="Job number"
          value={jobNumber}
          maxLength={60}
          autoFocus
          onChange={(e) => setJobNumber(e.target.value)}
          error={issue("/jobNumber")}
        />
        <TextField
          label="Job name"
          value={jobName}
          maxLength={120}
          onChange={(e) => setJobName(e.target.value)}
          error={issue("/jobName")}
        />
        <TextField
          label="Piece mark"
          value={pieceMark}
          maxLength={60}
          onChange={(e) => setPieceMark(e.target.value)}
          error={issue("/pieceMark")}
        />
        <TextField
          label="Pieces"
          inputMode="numeric"
          value={quantity}
          onChange={(e) => setQuantity(e.target.value)}
          error={issue("/quantity")}
        />
        <div>
          <label htmlFor={lengthId} className="mb-1 block text-micro text-ink-2">
            Length of a piece{settings.system === "inch" && ", also as 12 ft 6 in"}
          </label>
          <QuantityField
            id={lengthId}
            dimension="length"
            value={lengthMm}
            optional
            placeholder="not given"
            refuse={(mm) => (mm <= 0 ? "A length is above 0." : null)}
            onCommit={setLengthMm}
            inputClassName="w-[120px]"
          />
        </div>
      </div>
      {record.isError && (
        <p role="alert" className="mt-2 text-note text-oxide-ink">
          {sentenceOf(record.error)}
        </p>
      )}
    </Dialog>
  );
}
