"use client";
import { useId } from "react";
import { useDisplay } from "@/components/display/display-provider";
import { SymbolOf } from "@/components/display/quantity";
import { QuantityField } from "@/components/display/quantity-field";
import { RANGE } from "@/components/rack/ranges";
import { cx } from "@/components/ui/cx";
import type { RangeName } from "@/lib/schemas/find-shapes";
import { symbolOf, symbolText } from "@/lib/units/notation";

type RangeFieldProps = Readonly<{
  name: RangeName;
  value: number | null;
  onCommit: (value: number | null) => void;
  className?: string;
}>;

/** One range of the search: its symbol above, the number with the person's unit, a heavy rule when it is set. */
export function RangeField({ name, value, onCommit, className }: RangeFieldProps) {
  const id = useId();
  const { settings } = useDisplay();
  const facts = RANGE[name];
  const end = facts.end === "min" ? "Min" : "Max";
  const spoken = `${end} ${"property" in facts ? symbolText(symbolOf(facts.property, settings.notation)) : facts.name}`;
  return (
    <div className={cx("whitespace-nowrap", className)}>
      <label
        htmlFor={id}
        className={cx("mb-0.5 block text-micro", value === null ? "text-ink-2" : "font-[600] text-ink")}
      >
        {end} {"property" in facts ? <SymbolOf property={facts.property} /> : facts.name}
      </label>
      <QuantityField
        id={id}
        aria-label={spoken}
        {...("property" in facts ? { property: facts.property } : { dimension: facts.dimension })}
        value={value}
        onCommit={onCommit}
        optional
        set={value !== null}
        placeholder="any"
        refuse={(v) => (v < 0 ? "A limit cannot be below 0." : null)}
        className="max-w-[300px]"
        inputClassName="w-[70px]"
      />
    </div>
  );
}

/** A range in words for the ask and for what a filter says on a phone: "min S x". */
export const rangeWords = (name: RangeName, notation: "S-Z-r" | "Wel-Wpl-i"): string => {
  const facts = RANGE[name];
  const what = "property" in facts ? symbolText(symbolOf(facts.property, notation)) : facts.name;
  return `${facts.end} ${what}`;
};
