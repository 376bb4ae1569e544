import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

/** Status bar, page head and action bar in one: ruled cells under a 2 px line. */
export const TitleBlock = ({ children, label = "Title block" }: { children: ReactNode; label?: string }) => (
  <footer
    aria-label={label}
    className="flex min-h-(--fb-block) min-w-0 border-t-2 border-frame bg-sheet [&>*]:border-r [&>*]:border-frame [&>*:last-child]:border-r-0"
  >
    {children}
  </footer>
);

/** Which cells stay when the sheet gets narrow: the designation, the title, the revision and the main action. */
export type CellStays = "always" | "md" | "lg" | "xl";

const STAYS: Record<CellStays, string> = {
  always: "",
  md: "max-md:hidden",
  lg: "max-lg:hidden",
  xl: "max-xl:hidden",
};

type CellProps = Readonly<{
  label: ReactNode;
  children: ReactNode;
  /** The subject of the sheet. */
  big?: boolean;
  /** Takes the width that is left. */
  fill?: boolean;
  stays?: CellStays;
  className?: string;
}>;

export const Cell = ({ label, children, big, fill, stays = "always", className }: CellProps) => (
  <div
    className={cx(
      "flex min-w-0 flex-col justify-between pt-[5px] pr-3 pb-1 pl-2.5 whitespace-nowrap",
      fill && "flex-1",
      !fill && !big && "flex-none",
      STAYS[stays],
      className,
    )}
  >
    <span className="block text-micro text-ink-2">{label}</span>
    <span className={cx("truncate", big ? "text-[17px] leading-[21px] font-bold" : "text-body")}>
      {children}
    </span>
  </div>
);

/** The actions at the right end; the one main action stands in with a gap of 5 px around it. */
export const ActionCell = ({ children }: { children: ReactNode }) => (
  <div className="flex flex-none items-stretch max-md:ml-auto [&>.snipe]:m-[5px] [&>*]:h-auto [&>*:not(.snipe)]:border-0">
    {children}
  </div>
);
