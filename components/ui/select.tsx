"use client";
import { Select as Radix } from "radix-ui";
import { getNonce } from "get-nonce";
import { cx } from "@/components/ui/cx";
import { Field, fieldClass } from "@/components/ui/field";
import { ChevronSign } from "@/components/ui/signs";

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

/** Radix keeps "" for "nothing chosen"; a choice with an empty value travels under this name. */
const EMPTY = "\u0000";

/** A choice of one. The list lies on top with the 2 px ink line. */
export function Select<V extends string>({
  value,
  choices,
  onChange,
  set,
  disabled,
  className,
  ...rest
}: SelectProps<V>) {
  const current = choices.find((c) => c.value === value);
  return (
    <Radix.Root
      value={value === "" ? EMPTY : value}
      onValueChange={(next) => {
        const chosen = choices.find((c) => c.value === (next === EMPTY ? "" : next));
        if (chosen) onChange(chosen.value);
      }}
      {...(disabled && { disabled })}
    >
      <Radix.Trigger
        {...rest}
        className={cx(
          fieldClass({ ...(set && { set }), refused: !!rest["aria-invalid"] }),
          "inline-flex h-7 items-center justify-between gap-2 text-left whitespace-nowrap max-md:h-11 disabled:border-dotted disabled:text-ink-3",
          className,
        )}
      >
        <span className="overflow-hidden text-ellipsis">
          <Radix.Value>{current?.label}</Radix.Value>
        </span>
        <ChevronSign className="text-ink-2" />
      </Radix.Trigger>
      <Radix.Portal>
        <Radix.Content
          position="popper"
          sideOffset={2}
          className="z-50 max-h-(--radix-select-content-available-height) min-w-(--radix-select-trigger-width) border-2 border-ink bg-sheet"
        >
          <Radix.Viewport nonce={getNonce() ?? undefined}>
            {choices.map((choice) => (
              <Radix.Item
                key={choice.value}
                value={choice.value === "" ? EMPTY : choice.value}
                {...(choice.disabled && { disabled: true })}
                className="flex h-7 items-center gap-2 px-2.5 whitespace-nowrap outline-none select-none data-disabled:text-ink-3 data-highlighted:bg-wash data-highlighted:shadow-[inset_3px_0_0_var(--fb-oxide-ink)] data-[state=checked]:font-[640] max-md:h-11"
              >
                <Radix.ItemText>{choice.label}</Radix.ItemText>
              </Radix.Item>
            ))}
          </Radix.Viewport>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

type SelectFieldProps<V extends string> = SelectProps<V> &
  Readonly<{ label: React.ReactNode; note?: React.ReactNode; error?: string | null }>;

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
