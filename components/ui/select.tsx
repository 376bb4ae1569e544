"use client";
import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";
import { Field, fieldClass } from "@/components/ui/field";

export type Choice<V extends string> = Readonly<{ value: V; label: string; disabled?: boolean }>;

type SelectProps<V extends string> = Readonly<{
  value: V;
  choices: readonly Choice<V>[];
  onChange: (value: V) => void;
  /** Draws the heavy oxide rule of a filter that is set. */
  set?: boolean;
  disabled?: boolean;
  id?: string;
  "aria-label"?: string;
  "aria-describedby"?: string | undefined;
  "aria-invalid"?: true | undefined;
  className?: string;
}>;

/**
 * A choice of one: the browser's own control, which phones and screen readers know, with its list drawn like all things on
 * top where the browser allows it.
 */
export function Select<V extends string>({
  value,
  choices,
  onChange,
  set,
  className,
  ...rest
}: SelectProps<V>) {
  return (
    <select
      {...rest}
      value={value}
      onChange={(event) => {
        const chosen = choices.find((choice) => choice.value === event.target.value);
        if (chosen) onChange(chosen.value);
      }}
      className={cx(
        fieldClass({ ...(set && { set }), refused: !!rest["aria-invalid"] }),
        "choice h-7 max-md:h-11 disabled:border-dotted disabled:text-ink-3",
        className,
      )}
    >
      {choices.map((choice) => (
        <option key={choice.value} value={choice.value} disabled={choice.disabled}>
          {choice.label}
        </option>
      ))}
    </select>
  );
}

type SelectFieldProps<V extends string> = SelectProps<V> &
  Readonly<{ label: ReactNode; note?: ReactNode; error?: string | null }>;

export function SelectField<V extends string>({
  label,
  note,
  error,
  className,
  ...rest
}: SelectFieldProps<V>) {
  return (
    <Field label={label} note={note} error={error} {...(className && { className })}>
      {(ids) => <Select {...rest} {...ids} className="w-full" />}
    </Field>
  );
}
