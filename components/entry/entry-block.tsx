"use client";
import { useId, type ComponentProps, type FormEvent, type ReactNode } from "react";
import { BrandMark } from "@/components/sheet/brand";
import { Button } from "@/components/ui/button";
import { cx } from "@/components/ui/cx";
import { fieldClass } from "@/components/ui/field";
import { RefusedSign } from "@/components/ui/signs";

const CELL = "border-b border-frame px-3.5 pt-[7px] pb-[9px]";
const RIGHT = "border-l max-sm:border-l-0";

/** A ruled cell that says something. */
export const EntryFact = ({
  label,
  right,
  children,
}: Readonly<{ label: string; right?: boolean; children: ReactNode }>) => (
  <div className={cx(CELL, "flex min-w-0 flex-col justify-between", right && RIGHT)}>
    <span className="text-micro text-ink-2">{label}</span>
    <b className="text-[17px] leading-[22px] break-words">{children}</b>
  </div>
);

type EntryFieldProps = Omit<ComponentProps<"input">, "id" | "className"> &
  Readonly<{ label: string; note?: string; refused: boolean; refusedId: string; right?: boolean }>;

/** A ruled cell to type in; the rule that a value must keep stands under it from the start. */
export function EntryField({ label, note, refused, refusedId, right, ...rest }: EntryFieldProps) {
  const id = useId();
  return (
    <div className={cx(CELL, "min-w-0", right && RIGHT)}>
      <label htmlFor={id} className="mb-[3px] block text-note text-ink-2">
        {label}
      </label>
      <input
        {...rest}
        id={id}
        aria-invalid={refused || undefined}
        aria-describedby={cx(note && `${id}-note`, refusedId)}
        className={cx(fieldClass({ refused }), "h-[34px] w-full px-2 text-lead max-md:h-11")}
      />
      {note && (
        <p id={`${id}-note`} className="mt-1 text-note text-ink-2">
          {note}
        </p>
      )}
    </div>
  );
}

type EntryBlockProps = Readonly<{
  /** The cell beside the name of the book. */
  beside: ReactNode;
  children?: ReactNode;
  /** What was refused, or null. */
  refused: ReactNode;
  refusedId: string;
  /** Stands where a refusal would, while there is none. */
  word?: ReactNode;
  /** What the button says; without it the block only tells something. */
  action?: string;
  atWork?: boolean;
  onSubmit?: (event: FormEvent) => void;
}>;

/** The title block of the entry sheets: what it is about, cells to fill in, one button. */
export const EntryBlock = ({
  beside,
  children,
  refused,
  refusedId,
  word,
  action,
  atWork = false,
  onSubmit,
}: EntryBlockProps) => (
  <form
    noValidate
    onSubmit={onSubmit}
    className="grid w-full max-w-[620px] flex-none grid-cols-2 border-t-2 border-l-2 border-frame bg-sheet max-lg:max-w-none max-lg:border-l-0 max-sm:grid-cols-1"
  >
    <div className="flex items-center gap-3.5 border-b border-frame p-3.5 text-[30px] leading-9 font-[700] tracking-[-.01em]">
      <BrandMark className="size-11" />
      Flitchbook
    </div>
    {beside}
    {children}
    <div className="col-span-full flex min-h-16 flex-wrap items-center gap-x-2.5 gap-y-2 px-3.5 py-3">
      <div className="min-w-0 flex-1 basis-52 text-table">
        <p id={refusedId} role="alert" className="flex gap-1.5 text-oxide-ink">
          {refused && (
            <>
              <RefusedSign className="mt-0.5" />
              <span>{refused}</span>
            </>
          )}
        </p>
        {!refused && <div role="status">{word}</div>}
      </div>
      {action && (
        <Button type="submit" kind="main" size="large" atWork={atWork}>
          {action}
        </Button>
      )}
    </div>
  </form>
);
