"use client";
import type { ReactNode } from "react";
import { Dialog as Radix } from "radix-ui";
import { cx } from "@/components/ui/cx";
import { Kbd } from "@/components/ui/marks";

type DialogProps = Readonly<{
  open: boolean;
  onOpenChange: (open: boolean) => void;
  /** The question or the task, as a sentence. */
  title: ReactNode;
  /** What will happen and to whom. */
  text?: ReactNode;
  children?: ReactNode;
  /** Buttons along the foot, the main one first. */
  actions?: ReactNode;
  width?: "narrow" | "wide" | "sheet";
}>;

const WIDTH = { narrow: "max-w-[420px]", wide: "max-w-[720px]", sheet: "max-w-[1100px]" };

/** On top with the 2 px ink line: no shadow, no dimming. Escape leaves; focus returns to what opened it. */
export function Dialog({
  open,
  onOpenChange,
  title,
  text,
  children,
  actions,
  width = "narrow",
}: DialogProps) {
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-40 bg-transparent" />
        <Radix.Content
          {...(text ? {} : { "aria-describedby": undefined })}
          className={cx(
            "fixed top-1/2 left-1/2 z-50 max-h-[calc(100dvh-32px)] w-[calc(100vw-32px)] -translate-x-1/2 -translate-y-1/2 overflow-auto border-2 border-ink bg-sheet px-3.5 py-3",
            WIDTH[width],
          )}
        >
          <Radix.Title className="text-lead font-bold">{title}</Radix.Title>
          {text && (
            <Radix.Description asChild>
              <div className="mt-0.5 mb-2 text-[13.5px] text-ink-2">{text}</div>
            </Radix.Description>
          )}
          {children}
          <div className="mt-3 flex flex-wrap items-center gap-2">
            {actions}
            <span className="flex-1" />
            <Kbd className="max-md:hidden">Esc</Kbd>
          </div>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}
