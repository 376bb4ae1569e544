"use client";
import type { ComponentProps, ReactNode } from "react";
import { DropdownMenu as Radix } from "radix-ui";
import { cx } from "@/components/ui/cx";
import { Kbd } from "@/components/ui/marks";

type MenuProps = Readonly<{
  trigger: ReactNode;
  children: ReactNode;
  align?: "start" | "end";
  /** Opens at once: for a menu that was fetched by the press on its trigger. */
  defaultOpen?: boolean;
}>;

export function Menu({ trigger, children, align = "start", defaultOpen = false }: MenuProps) {
  return (
    <Radix.Root defaultOpen={defaultOpen}>
      <Radix.Trigger asChild>{trigger}</Radix.Trigger>
      <Radix.Portal>
        <Radix.Content
          align={align}
          sideOffset={2}
          className="z-50 min-w-48 border-2 border-ink bg-sheet py-1"
        >
          {children}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

const ITEM =
  "flex min-h-7 items-center gap-3 px-3 outline-none select-none no-underline data-disabled:text-ink-3 data-highlighted:bg-wash data-highlighted:shadow-[inset_3px_0_0_var(--fb-oxide-ink)] max-md:min-h-11";

type ItemProps = ComponentProps<typeof Radix.Item> & Readonly<{ keys?: string }>;

export const MenuItem = ({ keys, children, className, asChild, ...rest }: ItemProps) => (
  <Radix.Item className={cx(ITEM, className)} {...(asChild && { asChild })} {...rest}>
    {asChild ? (
      children
    ) : (
      <>
        <span className="flex-1">{children}</span>
        {keys && <Kbd>{keys}</Kbd>}
      </>
    )}
  </Radix.Item>
);

type ChoiceProps<V extends string> = Readonly<{
  label: string;
  value: V;
  choices: readonly Readonly<{ value: V; label: string }>[];
  onChange: (value: V) => void;
}>;

/** A choice of few inside a menu; the one that counts carries the filled pin. */
export function MenuChoice<V extends string>({ label, value, choices, onChange }: ChoiceProps<V>) {
  return (
    <Radix.RadioGroup
      value={value}
      onValueChange={(next) => {
        const chosen = choices.find((c) => c.value === next);
        if (chosen) onChange(chosen.value);
      }}
    >
      <Radix.Label className="px-3 pt-1.5 pb-0.5 text-micro text-ink-2">{label}</Radix.Label>
      {choices.map((choice) => (
        <Radix.RadioItem
          key={choice.value}
          value={choice.value}
          onSelect={(event) => event.preventDefault()}
          className={cx(ITEM, "group")}
        >
          <span
            aria-hidden
            className="size-3.5 rounded-pin border border-edge bg-field group-data-[state=checked]:border-4 group-data-[state=checked]:border-oxide-ink"
          />
          {choice.label}
        </Radix.RadioItem>
      ))}
    </Radix.RadioGroup>
  );
}

export const MenuRule = () => <Radix.Separator className="my-1 border-t border-rule" />;
