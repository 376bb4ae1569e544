"use client";
import type { ReactNode } from "react";
import { Popover as Radix } from "radix-ui";
import { cx } from "@/components/ui/cx";

type PopoverProps = Readonly<{
  trigger: ReactNode;
  children: ReactNode;
  /** Spoken name of what opens. */
  label: string;
  align?: "start" | "center" | "end";
  open?: boolean;
  onOpenChange?: (open: boolean) => void;
  /** Opens at once: for a popover that was fetched by the press on its trigger. */
  defaultOpen?: boolean;
  className?: string;
}>;

export function Popover({
  trigger,
  children,
  label,
  align = "start",
  open,
  onOpenChange,
  defaultOpen = false,
  className,
}: PopoverProps) {
  return (
    <Radix.Root
      defaultOpen={defaultOpen}
      {...(open !== undefined && { open })}
      {...(onOpenChange && { onOpenChange })}
    >
      <Radix.Trigger asChild>{trigger}</Radix.Trigger>
      <Radix.Portal>
        <Radix.Content
          aria-label={label}
          align={align}
          sideOffset={2}
          collisionPadding={8}
          className={cx(
            "z-40 max-h-(--radix-popover-content-available-height) max-w-[calc(100vw-16px)] overflow-auto border-2 border-ink bg-sheet p-3",
            className,
          )}
        >
          {children}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

export const PopoverClose = Radix.Close;
