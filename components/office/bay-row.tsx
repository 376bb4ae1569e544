"use client";
import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { cx } from "@/components/ui/cx";
import { fieldClass } from "@/components/ui/field";
import { Select } from "@/components/ui/select";
import { Arrow } from "@/components/ui/signs";
import { Td } from "@/components/ui/table";
import type { Bay, UpdateBayInput } from "@/lib/schemas/bay";

const COUNTS = [
  { value: "computed", label: "computed" },
  { value: "tabulated", label: "tabulated" },
] as const;

type BayRowProps = Readonly<{
  bay: Bay;
  last: boolean;
  atWork: boolean;
  onChange: (change: UpdateBayInput) => void;
  onDelete: () => void;
}>;

const percentOf = (tolerance: number) => String(Number((tolerance * 100).toFixed(4)));

/** One bay: its place, name, which figures count, and what a delivery lets pass. What was typed is kept until it is saved or Escape. */
export function BayRow({ bay, last, atWork, onChange, onDelete }: BayRowProps) {
  const [name, setName] = useState(bay.name);
  const [percent, setPercent] = useState(percentOf(bay.tolerance));
  const [asking, setAsking] = useState(false);
  const share = Number(percent.replace(",", ".")) / 100;
  const percentFits = percent.trim() !== "" && share >= 0 && share <= 0.5;
  const changed = name.trim() !== bay.name || (percentFits && percent !== percentOf(bay.tolerance));

  const save = () => {
    if (!changed || !percentFits || name.trim() === "") return;
    onChange({ name, tolerance: share });
  };
  const keys = (event: React.KeyboardEvent) => {
    if (event.key === "Enter") save();
    if (event.key !== "Escape") return;
    setName(bay.name);
    setPercent(percentOf(bay.tolerance));
  };

  return (
    <tr>
      <Td className="h-9! pl-3.5!">
        <span className="inline-flex items-center gap-1">
          <b className="w-6 font-num">{bay.ordinal}</b>
          <Button
            size="small"
            kind="plain"
            aria-label={`Move ${bay.name} up`}
            disabled={bay.ordinal === 1 || atWork}
            onClick={() => onChange({ ordinal: bay.ordinal - 1 })}
          >
            <Arrow to="up" />
          </Button>
          <Button
            size="small"
            kind="plain"
            aria-label={`Move ${bay.name} down`}
            disabled={last || atWork}
            onClick={() => onChange({ ordinal: bay.ordinal + 1 })}
          >
            <Arrow to="down" />
          </Button>
        </span>
      </Td>
      <Td>
        <input
          aria-label={`Name of bay ${bay.ordinal}`}
          value={name}
          maxLength={60}
          onChange={(event) => setName(event.target.value)}
          onKeyDown={keys}
          className={cx(fieldClass({ set: name !== bay.name }), "h-7 w-52 max-md:h-11")}
        />
      </Td>
      <Td>
        <Select
          aria-label={`Figures that count in ${bay.name}`}
          value={bay.counts}
          choices={COUNTS}
          onChange={(counts) => onChange({ counts })}
          className="w-32"
        />
      </Td>
      <Td numeric>
        <input
          aria-label={`Tolerance of ${bay.name}, per cent`}
          aria-invalid={!percentFits}
          inputMode="decimal"
          value={percent}
          onChange={(event) => setPercent(event.target.value)}
          onKeyDown={keys}
          className={cx(fieldClass({ refused: !percentFits }), "h-7 w-16 text-right font-num max-md:h-11")}
        />
      </Td>
      <Td numeric>{bay.shapes}</Td>
      <Td className="pr-3! text-right">
        <Button
          size="small"
          disabled={!changed || !percentFits || name.trim() === ""}
          atWork={atWork}
          onClick={save}
        >
          Save
        </Button>{" "}
        <Button
          size="small"
          onClick={() => setAsking(true)}
          disabled={bay.shapes > 0}
          title={bay.shapes > 0 ? "Move or withdraw its shapes first." : undefined}
        >
          Delete
        </Button>
        <Dialog
          open={asking}
          onOpenChange={setAsking}
          title={`Delete the bay ${bay.name}?`}
          text="Only an empty bay can go. Rights granted in it go with it; the log keeps what happened."
          actions={
            <Button
              kind="danger"
              onClick={() => {
                setAsking(false);
                onDelete();
              }}
            >
              Delete the bay
            </Button>
          }
        />
      </Td>
    </tr>
  );
}
