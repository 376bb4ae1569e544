import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

type SheetProps = Readonly<{
  /** Subject of the sheet for those who do not see the title block first. */
  heading: string;
  children: ReactNode;
  /** The title block along the foot. */
  block?: ReactNode;
  /** Border with zones A–F and 1–8 around the work. */
  zones?: boolean;
  /** Layout of the work inside the frame. */
  className?: string;
}>;

/** One sheet: a frame, ruled areas, and a title block along its foot. */
export const Sheet = ({ heading, children, block, zones, className }: SheetProps) => (
  <main
    id="sheet"
    className="relative mx-2 mb-2 grid min-h-0 min-w-0 grid-rows-[minmax(0,1fr)_auto] border border-frame bg-sheet [grid-area:sheet] max-md:mx-0 max-md:mb-0 max-md:border-x-0 print:m-0 print:block print:border-0"
  >
    <h1 className="sr-only">{heading}</h1>
    {zones ? (
      <ZoneBorder>
        <div className={cx("min-h-0 min-w-0", className)}>{children}</div>
      </ZoneBorder>
    ) : (
      <div className={cx("relative min-h-0 min-w-0 overflow-auto", className)}>{children}</div>
    )}
    {block}
  </main>
);

const COLUMNS = ["1", "2", "3", "4", "5", "6", "7", "8"];
const ROWS = ["A", "B", "C", "D", "E", "F"];

const ZONE =
  "absolute flex font-num text-micro leading-5 text-ink-2 select-none max-md:hidden [&>span]:flex [&>span]:flex-1 [&>span]:items-center [&>span]:justify-center";
const ACROSS = `${ZONE} left-5 right-5 h-5 [&>span+span]:border-l [&>span+span]:border-edge`;
const DOWN = `${ZONE} top-5 bottom-5 w-5 flex-col [&>span+span]:border-t [&>span+span]:border-edge`;

/** The border of a drawing sheet: zones for reference, and the 2 px frame inside. Below 820 px only the work stays. */
export const ZoneBorder = ({ children }: { children: ReactNode }) => (
  <div className="relative grid min-h-0 min-w-0 p-5 max-md:p-0">
    {(["top-0", "bottom-0"] as const).map((side) => (
      <div key={side} aria-hidden className={cx(ACROSS, side)}>
        {COLUMNS.map((c) => (
          <span key={c}>{c}</span>
        ))}
      </div>
    ))}
    {(["left-0", "right-0"] as const).map((side) => (
      <div key={side} aria-hidden className={cx(DOWN, side)}>
        {ROWS.map((r) => (
          <span key={r}>{r}</span>
        ))}
      </div>
    ))}
    <div className="grid min-h-0 min-w-0 border-2 border-frame max-md:overflow-auto max-md:border-0">
      {children}
    </div>
  </div>
);
