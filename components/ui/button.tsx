import type { ComponentProps } from "react";
import { Slot } from "radix-ui";
import { cx } from "@/components/ui/cx";

export type ButtonKind = "main" | "other" | "plain" | "danger";
export type ButtonSize = "body" | "small" | "large";

type Look = Readonly<{ kind?: ButtonKind; size?: ButtonSize }>;

const KIND: Record<ButtonKind, string> = {
  main: "snipe text-on-oxide font-[600] border-0",
  other: "border border-edge bg-transparent hover:bg-wash active:bg-wash",
  plain: "border border-transparent bg-transparent hover:bg-wash active:bg-wash",
  danger: "border border-oxide-ink text-oxide-ink bg-transparent hover:bg-oxide-wash",
};
const SIZE: Record<ButtonSize, string> = {
  body: "h-7 px-3 text-body max-md:h-11",
  small: "h-6 px-[9px] text-table max-md:h-11",
  large: "h-10 px-[34px] text-lead max-md:h-11",
};

/** Class of a button; exported so that links can look like one. */
export const buttonClass = ({ kind = "other", size = "body" }: Look = {}): string =>
  cx(
    "inline-flex items-center justify-center gap-2 whitespace-nowrap font-[540] no-underline select-none",
    "transition-colors duration-[var(--fb-motion-fast)] ease-shop focus-visible:outline-offset-2",
    "disabled:border disabled:border-dashed disabled:border-edge disabled:bg-none disabled:bg-transparent disabled:text-ink-3",
    "aria-disabled:border aria-disabled:border-dashed aria-disabled:border-edge aria-disabled:bg-none aria-disabled:bg-transparent aria-disabled:text-ink-3",
    KIND[kind],
    SIZE[size],
  );

type ButtonProps = ComponentProps<"button"> &
  Look & {
    /** Renders its only child (a link) with the look of a button. */
    asChild?: boolean;
    /** Says the work is going on: a dimension that grows, no spinner. */
    atWork?: boolean;
  };

export function Button({ kind, size, asChild, atWork, className, children, type, ...rest }: ButtonProps) {
  const classes = cx(buttonClass({ ...(kind && { kind }), ...(size && { size }) }), className);
  if (asChild)
    return (
      <Slot.Root className={classes} {...rest}>
        {children}
      </Slot.Root>
    );
  return (
    <button type={type ?? "button"} className={classes} aria-busy={atWork || undefined} {...rest}>
      {atWork && (
        <span aria-hidden className="relative inline-block h-[9px] w-11 border-x border-current">
          <span className="dim-grow absolute top-[3px] left-0 h-[3px] bg-current" />
        </span>
      )}
      {children}
    </button>
  );
}
