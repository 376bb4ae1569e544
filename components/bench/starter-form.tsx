"use client";
import { useState } from "react";
import { QuantityField } from "@/components/display/quantity-field";
import { Button } from "@/components/ui/button";
import { RefusedSign } from "@/components/ui/signs";
import { starterParts } from "@/lib/drawing/starters/apply-starter";
import { firstValues } from "@/lib/drawing/starters/starters";
import type { Starter, StarterValues } from "@/lib/drawing/starters/starter";

type StarterFormProps = Readonly<{
  starter: Starter;
  values?: StarterValues;
  action: string;
  onDone: (values: StarterValues) => void;
}>;

/** The sizes of a starter; a set that does not fit together says why and is not put on the sheet. */
export const StarterForm = ({ starter, values: given, action, onDone }: StarterFormProps) => {
  const [values, setValues] = useState<StarterValues>(given ?? firstValues(starter));
  const made = starterParts(starter, values);
  return (
    <form
      className="flex flex-wrap items-end gap-x-3 gap-y-2"
      onSubmit={(event) => {
        event.preventDefault();
        if (made.ok) onDone(values);
      }}
    >
      {starter.fields.map(({ key, label }) => (
        <label key={key} className="block text-micro text-ink-2">
          <span className="mb-1 block">{label}</span>
          <QuantityField
            value={values[key] ?? null}
            onCommit={(mm) => mm !== null && setValues((v) => ({ ...v, [key]: mm }))}
          />
        </label>
      ))}
      <span className="flex-1" />
      <Button type="submit" kind="main" disabled={!made.ok}>
        {action}
      </Button>
      {!made.ok && (
        <p role="alert" className="flex basis-full gap-1.5 text-note text-oxide-ink">
          <RefusedSign className="mt-px" /> {made.error.detail}
        </p>
      )}
    </form>
  );
};
