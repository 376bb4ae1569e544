"use client";
import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import type { StepDialogProps } from "@/components/rack/check-dialog";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { TextField } from "@/components/ui/field";
import { api, sentenceOf } from "@/lib/client/api";
import { useTakes } from "@/lib/client/takes";
import type { FinderPage } from "@/lib/schemas/find-shapes";

/** Withdraws a released revision: shows who took it first, asks for a reason and, if there is one, what to use instead. */
export function WithdrawDialog({ open, onClose, sheet, life }: StepDialogProps) {
  const takes = useTakes(sheet.id);
  const [reason, setReason] = useState("");
  const [typed, setTyped] = useState("");
  const [replacement, setReplacement] = useState<Readonly<{ id: string; designation: string }> | null>(null);
  const found = useQuery({
    queryKey: ["shapes", "search", { q: typed.trim(), for: "replacement" }],
    enabled: open && typed.trim().length > 1 && replacement === null,
    queryFn: async ({ signal }) =>
      (await api.get<FinderPage>("/shapes", { query: { q: typed.trim(), limit: 6 }, signal })).data.items,
  });
  const name = `${sheet.designation} ${sheet.revision.letter}`;
  const jobs = [...new Set(takes.data?.map((take) => take.jobNumber) ?? [])];
  return (
    <Dialog
      open={open}
      onOpenChange={(next) => !next && onClose()}
      title={`Withdraw ${name}?`}
      text={
        jobs.length === 0
          ? "No job took it. No job can take it afterwards."
          : `${jobs.join(", ")} took it. Their pieces keep their revision; no job can take it again.`
      }
      actions={
        <>
          <Button
            kind="main"
            atWork={life.isPending}
            disabled={!reason.trim()}
            onClick={() =>
              life.mutate(
                {
                  step: "withdraw",
                  body: { reason: reason.trim(), ...(replacement && { replacementShapeId: replacement.id }) },
                },
                { onSuccess: onClose },
              )
            }
          >
            Withdraw
          </Button>
          <Button onClick={onClose}>Leave it</Button>
        </>
      }
    >
      <TextField
        label="Reason, for the log"
        value={reason}
        maxLength={2000}
        autoFocus
        onChange={(event) => setReason(event.target.value)}
        error={life.isError ? sentenceOf(life.error) : null}
      />
      <TextField
        label="To use instead, if there is one"
        value={replacement?.designation ?? typed}
        placeholder="type a designation"
        onChange={(event) => {
          setReplacement(null);
          setTyped(event.target.value);
        }}
        className="mt-2"
      />
      {replacement === null && found.data && found.data.length > 0 && (
        <ul aria-label="Shapes that fit" className="border border-t-0 border-rule">
          {found.data
            .filter((row) => row.id !== sheet.id)
            .map((row) => (
              <li key={row.id}>
                <button
                  type="button"
                  className="min-h-7 w-full px-2 text-left hover:bg-wash focus-visible:-outline-offset-2 max-md:min-h-11"
                  onClick={() => setReplacement({ id: row.id, designation: row.designation })}
                >
                  {row.designation} <span className="text-note text-ink-3">{row.title}</span>
                </button>
              </li>
            ))}
        </ul>
      )}
    </Dialog>
  );
}
