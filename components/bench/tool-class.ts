import { cx } from "@/components/ui/cx";

/** A tool of the sheet's head; the one in hand carries the oxide bar. */
export const toolClass = (on: boolean): string =>
  cx(
    "flex h-full flex-none items-center gap-1.5 px-2 whitespace-nowrap outline-offset-[-2px] hover:bg-wash  max-xl:px-[7px] max-md:h-11",
    "aria-disabled:text-ink-3 aria-disabled:hover:bg-transparent",
    on && "bg-wash font-[600] shadow-[inset_0_-3px_0_var(--fb-oxide-ink)]",
  );
