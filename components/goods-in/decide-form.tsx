"use client";
import { useId, useState } from "react";
import { MendFields } from "@/components/goods-in/mend-fields";
import { useShortcut } from "@/components/sheet/use-shortcut";
import { Button } from "@/components/ui/button";
import { cx } from "@/components/ui/cx";
import { TextField } from "@/components/ui/field";
import { Kbd } from "@/components/ui/marks";
import { ApiProblem, sentenceOf } from "@/lib/client/api";
import { useDecide } from "@/lib/client/deliveries";
import type { DecideRowInput, Delivery, RowDetail } from "@/lib/schemas/delivery";

type Choice = "computed" | "tabulated" | "mend" | "leave-out";
const CHOICES: readonly Readonly<{ value: Choice; label: string; key: string }>[] = [
  { value: "computed", label: "Keep computed", key: "K" },
  { value: "tabulated", label: "Keep tabulated, with a reason", key: "T" },
  { value: "mend", label: "Mend a figure", key: "M" },
  { value: "leave-out", label: "Refuse the row", key: "X" },
];

type DecideFormProps = Readonly<{
  delivery: Delivery;
  row: RowDetail;
  onNext: () => void;
  onRefused: (sentence: string | null) => void;
}>;

/** The decision about a row: nothing is preselected, keeping the table needs a reason, a mended cell is read anew. */
export function DecideForm({ delivery, row, onNext, onRefused }: DecideFormProps) {
  const name = useId();
  const [choice, setChoice] = useState<Choice | null>(null);
  const [reason, setReason] = useState("");
  const [cell, setCell] = useState<Readonly<{ column: number; value: string }> | null>(null);
  const decide = useDecide(delivery.id);
  const possible = (value: Choice) => value === "mend" || row.choices.includes(value);
  const pick = (value: Choice) => {
    if (!possible(value)) return;
    setChoice(value);
    decide.reset();
  };
  // The letter must not land in the field that its choice brings up.
  const byKey = (value: Choice) => (event: KeyboardEvent) => {
    event.preventDefault();
    pick(value);
  };
  useShortcut("k", byKey("computed"));
  useShortcut("t", byKey("tabulated"));
  useShortcut("m", byKey("mend"));
  useShortcut("x", byKey("leave-out"));

  const missing =
    choice === null
      ? "choose one"
      : choice === "tabulated" && reason.trim() === ""
        ? "say why"
        : choice === "mend" && cell === null
          ? "change a cell"
          : null;
  const like = delivery.counts?.openLike[`${row.verdict} ${row.cause}`] ?? 0;
  const send = (alike: boolean) => {
    if (choice === null || missing !== null) return;
    const input: DecideRowInput =
      choice === "mend" && cell !== null
        ? { mend: cell }
        : {
            decision: choice === "mend" ? null : choice,
            ...(reason.trim() === "" ? {} : { reason: reason.trim() }),
            ...(alike ? { alike } : {}),
          };
    decide.mutate(
      { row: row.number, version: row.version, input },
      {
        onSuccess: (decided) => {
          onRefused(null);
          setChoice(null);
          setReason("");
          setCell(null);
          if (decided.row.open === null) onNext();
        },
      },
    );
  };
  const takeBack = () => decide.mutate({ row: row.number, version: row.version, input: { decision: null } });
  const trouble = decide.error;
  return (
    <form
      aria-label={`Decide row ${row.number}`}
      className="flex-none border-t border-frame"
      onSubmit={(event) => {
        event.preventDefault();
        send(false);
      }}
    >
      <fieldset className="grid px-3 py-1.5">
        <legend className="sr-only">What is to be done with this row</legend>
        {CHOICES.filter(({ value }) => row.verdict !== "accepted" || possible(value)).map(
          ({ value, label, key }) => (
            <label
              key={value}
              className={cx(
                "flex h-[26px] items-center gap-[9px] max-md:h-11",
                choice === value && "font-[600]",
                !possible(value) && "text-ink-3",
              )}
            >
              <input
                type="radio"
                name={name}
                value={value}
                checked={choice === value}
                disabled={!possible(value)}
                onChange={() => pick(value)}
                className="size-[15px] flex-none appearance-none rounded-pin border border-edge bg-field checked:border-[4.5px] checked:border-oxide-ink disabled:border-dotted"
              />
              {label}
              {!possible(value) && <span className="text-note">not possible for this row</span>}
              <span className="flex-1" />
              <Kbd>{key}</Kbd>
            </label>
          ),
        )}
      </fieldset>
      {choice === "tabulated" && (
        <div className="px-3 pb-2">
          <TextField
            label="Reason, kept with the shape"
            value={reason}
            maxLength={500}
            autoFocus
            onChange={(event) => setReason(event.target.value)}
            error={trouble instanceof ApiProblem ? trouble.issueAt("/reason") : null}
          />
        </div>
      )}
      {choice === "mend" && (
        <MendFields
          row={row}
          reading={delivery.recognised?.reading ?? null}
          marks={row.reasons.map((r) => r.column)}
          onCell={setCell}
        />
      )}
      {trouble !== null && (
        <p role="alert" className="px-3 pb-1 text-note text-oxide-ink">
          {sentenceOf(trouble)}
          {trouble instanceof ApiProblem &&
            trouble.stale &&
            " Both states: what you see is now the stored one; decide again if it still holds."}
        </p>
      )}
      <div className="flex gap-2 px-3 pt-1 pb-2.5">
        <Button type="submit" className="h-8 flex-1" disabled={missing !== null || decide.isPending}>
          {choice === "mend"
            ? "Mend and read again"
            : missing === null
              ? "Decide and next"
              : `Decide: ${missing}`}
        </Button>
        {choice !== "mend" && like > 1 && (
          <Button
            className="h-8 flex-1"
            disabled={missing !== null || decide.isPending}
            onClick={() => send(true)}
          >
            Do so for {like} like it
          </Button>
        )}
        {row.decision !== null && (
          <Button className="h-8" disabled={decide.isPending} onClick={takeBack}>
            Take back
          </Button>
        )}
      </div>
    </form>
  );
}
