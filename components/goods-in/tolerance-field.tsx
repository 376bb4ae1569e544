"use client";
import { useState } from "react";
import { TextField } from "@/components/ui/field";

type ToleranceProps = Readonly<{ value: number; disabled: boolean; onChange: (share: number) => void }>;

const MOST = 10;

/** The gauge's tolerance in per cent, taken when the field is left or Enter is pressed. */
export function NumericTolerance({ value, disabled, onChange }: ToleranceProps) {
  const [text, setText] = useState(String(Number((value * 100).toPrecision(4))));
  const percent = Number(text.replace(",", "."));
  const wrong = text.trim() === "" || !Number.isFinite(percent) || percent < 0 || percent > MOST;
  const take = () => {
    if (!wrong && Math.abs(percent / 100 - value) > 1e-12) onChange(percent / 100);
  };
  return (
    <TextField
      label="Gauge, % off computed"
      inputMode="decimal"
      value={text}
      readOnly={disabled}
      onChange={(event) => setText(event.target.value)}
      onBlur={take}
      onKeyDown={(event) => event.key === "Enter" && take()}
      error={
        wrong ? `A number from 0 to ${MOST}; ${Number((value * 100).toPrecision(4))} still counts.` : null
      }
      note="and the table’s own rounding"
    />
  );
}
