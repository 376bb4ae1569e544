"use client";
import { useId, type ReactNode } from "react";
import { Checkbox as RadixCheckbox, RadioGroup, ToggleGroup } from "radix-ui";
import { cx } from "@/components/ui/cx";
import { AcceptedSign } from "@/components/ui/signs";

type Few<V extends string> = Readonly<{
  label: string;
  value: V;
  choices: readonly Readonly<{ value: V; label: ReactNode }>[];
  onChange: (value: V) => void;
  className?: string;
}>;

/** A choice of few, side by side: the one that counts is inked. */
export function Segmented<V extends string>({ label, value, choices, onChange, className }: Few<V>) {
  return (
    <ToggleGroup.Root
      type="single"
      aria-label={label}
      value={value}
      onValueChange={(next) => {
        const chosen = choices.find((c) => c.value === next);
        if (chosen) onChange(chosen.value);
      }}
      className={cx("inline-flex", className)}
    >
      {choices.map((choice) => (
        <ToggleGroup.Item
          key={choice.value}
          value={choice.value}
          className="-ml-px h-6 border border-edge px-[9px] font-num text-[12px] leading-none font-[460] first:ml-0 hover:bg-wash focus-visible:z-10 data-[state=on]:border-ink data-[state=on]:bg-ink data-[state=on]:text-sheet max-md:h-11"
        >
          {choice.label}
        </ToggleGroup.Item>
      ))}
    </ToggleGroup.Root>
  );
}

/** One of several, each with its words; nothing need be preselected. */
export function Radios<V extends string>({
  label,
  value,
  choices,
  onChange,
  className,
}: Few<V | ""> & { value: V | "" }) {
  const id = useId();
  return (
    <RadioGroup.Root
      aria-label={label}
      value={value}
      onValueChange={(next) => {
        const chosen = choices.find((c) => c.value === next);
        if (chosen) onChange(chosen.value);
      }}
      className={cx("flex flex-wrap gap-x-4 gap-y-1", className)}
    >
      {choices.map((choice) => (
        <span
          key={choice.value}
          className="inline-flex min-h-6 items-center gap-1.5 text-table max-md:min-h-11"
        >
          <RadioGroup.Item
            id={`${id}-${choice.value}`}
            value={choice.value}
            className="size-3.5 rounded-pin border border-edge bg-field data-[state=checked]:border-4 data-[state=checked]:border-oxide-ink"
          />
          <label htmlFor={`${id}-${choice.value}`}>{choice.label}</label>
        </span>
      ))}
    </RadioGroup.Root>
  );
}

type CheckboxProps = Readonly<{
  label: ReactNode;
  checked: boolean;
  onChange: (checked: boolean) => void;
  disabled?: boolean;
  className?: string;
}>;

export function Checkbox({ label, checked, onChange, disabled, className }: CheckboxProps) {
  const id = useId();
  return (
    <span className={cx("inline-flex min-h-6 items-center gap-2.5 max-md:min-h-11", className)}>
      <RadixCheckbox.Root
        id={id}
        checked={checked}
        onCheckedChange={(next) => onChange(next === true)}
        {...(disabled && { disabled })}
        className="flex size-[18px] flex-none items-center justify-center border border-edge bg-field disabled:border-dashed"
      >
        <RadixCheckbox.Indicator>
          <AcceptedSign label={null} className="block" />
        </RadixCheckbox.Indicator>
      </RadixCheckbox.Root>
      <label htmlFor={id}>{label}</label>
    </span>
  );
}
