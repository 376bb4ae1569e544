"use client";
import { useId, useState, type ReactNode } from "react";
import { cx } from "@/components/ui/cx";
import { ChevronSign } from "@/components/ui/signs";

const KEPT = "flitchbook.bench.folded";

const foldedBlocks = (): ReadonlySet<string> => {
  if (typeof window === "undefined") return new Set();
  return new Set((window.localStorage.getItem(KEPT) ?? "").split(" ").filter(Boolean));
};

type BlockProps = Readonly<{
  id: string;
  title: string;
  note?: ReactNode;
  /** Controls at the right of the head, shown while it is open. */
  tools?: ReactNode;
  children: ReactNode;
}>;

/** A block of the panel that folds to its head; what was folded stays so on this computer. */
export const Block = ({ id, title, note, tools, children }: BlockProps) => {
  const region = useId();
  const [open, setOpen] = useState(() => !foldedBlocks().has(id));
  const toggle = () => {
    const folded = new Set(foldedBlocks());
    if (open) folded.add(id);
    else folded.delete(id);
    window.localStorage.setItem(KEPT, [...folded].join(" "));
    setOpen(!open);
  };
  return (
    <section aria-labelledby={`${region}-head`}>
      <div className="flex min-h-8 items-center gap-3 border-b border-frame bg-panel pr-3 whitespace-nowrap [section+section>&]:border-t">
        <h2 id={`${region}-head`} className="min-w-0">
          <button
            type="button"
            aria-expanded={open}
            aria-controls={region}
            onClick={toggle}
            className="flex h-8 items-center gap-2 pl-3 font-[640] max-md:h-11"
          >
            <ChevronSign className={cx("text-ink-2", !open && "-rotate-90")} />
            {title}
          </button>
        </h2>
        <span className="min-w-0 flex-1 truncate text-note text-ink-3">{note}</span>
        {open && tools}
      </div>
      <div id={region} hidden={!open}>
        {children}
      </div>
    </section>
  );
};
