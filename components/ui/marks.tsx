import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

export type LifeState = "draft" | "submitted" | "released" | "superseded" | "withdrawn";

const STATE: Record<LifeState, string> = {
  draft: "border-dashed border-edge text-ink-2",
  submitted: "border-ink border-l-[5px]",
  released: "border-ink bg-ink text-sheet",
  superseded: "border-double border-4 border-edge text-ink-2 h-5",
  withdrawn: "border-edge text-ink-2 line-through gap-[5px]",
};

/** States differ by outline, fill and sign, so that they survive a photocopier. */
export const StateChip = ({ state, className }: { state: LifeState; className?: string }) => (
  <span
    className={cx(
      "inline-flex h-[18px] items-center border px-1.5 text-note font-[540] whitespace-nowrap",
      STATE[state],
      className,
    )}
  >
    {state === "withdrawn" && (
      <svg width="9" height="9" viewBox="0 0 9 9" aria-hidden>
        <path d="M.5 .5l8 8M8.5 .5l-8 8" stroke="currentColor" strokeWidth="1.4" />
      </svg>
    )}
    {state}
  </span>
);

/** The letter of a revision in the drawing office's triangle. */
export const RevisionMark = ({ letter, className }: { letter: string; className?: string }) => (
  <span
    className={cx(
      "relative inline-flex h-[18px] w-5 items-center justify-center pt-[5px] align-[-4px] font-num text-[10.5px] leading-none font-[600]",
      className,
    )}
  >
    <svg viewBox="0 0 20 18" aria-hidden className="absolute inset-0 h-[18px] w-5">
      <path d="M10 1.2 19 17H1z" fill="none" stroke="currentColor" />
    </svg>
    <span className="sr-only">revision </span>
    {letter}
  </span>
);

/** Item balloon: the same number on the canvas, in the parts table and in the tabulation. */
export const Balloon = ({ children, inHand }: { children: ReactNode; inHand?: boolean }) => (
  <span
    className={cx(
      "inline-flex h-[19px] min-w-[19px] items-center justify-center rounded-pin border px-px font-num text-[11.5px] leading-none font-[560]",
      inHand ? "border-oxide bg-oxide text-on-oxide" : "border-ink bg-sheet text-ink",
    )}
  >
    {children}
  </span>
);

export const Kbd = ({ children, className }: { children: ReactNode; className?: string }) => (
  <kbd
    className={cx(
      "inline-flex h-[17px] min-w-4 items-center justify-center border border-edge px-1 font-num text-[11px] leading-[15px] font-[480] text-ink-2",
      className,
    )}
  >
    {children}
  </kbd>
);

/** The only thing not square to the sheet. */
export const Stamp = ({
  word,
  lines,
  className,
}: {
  word: string;
  lines: readonly ReactNode[];
  className?: string;
}) => (
  <div className={cx("stamp bg-sheet px-5 pt-2.5 pb-[9px] text-center", className)}>
    <b className="block text-[25px] leading-[27px] font-[760] tracking-[.09em] uppercase">{word}</b>
    {lines.map((line, i) => (
      <span key={i} className="block font-num text-[12px] leading-[17px] font-[500]">
        {line}
      </span>
    ))}
  </div>
);
