import type { ComponentProps, ReactNode } from "react";
import { cx } from "@/components/ui/cx";

export const Table = ({ className, ...rest }: ComponentProps<"table">) => (
  <table className={cx("w-full border-collapse text-table", className)} {...rest} />
);

type ThProps = Omit<ComponentProps<"th">, "aria-sort"> & {
  /** The unit, below the name at 11 px: units stand once, in the head. */
  unit?: ReactNode;
  numeric?: boolean;
  sorted?: "ascending" | "descending" | undefined;
};

export function Th({ unit, numeric, sorted, className, children, scope, ...rest }: ThProps) {
  return (
    <th
      scope={scope ?? "col"}
      aria-sort={sorted}
      className={cx(
        "h-6 border-b border-frame px-2 pb-[3px] align-bottom font-medium whitespace-nowrap text-ink-2",
        numeric ? "text-right" : "text-left",
        sorted && "font-[640] text-ink",
        className,
      )}
      {...rest}
    >
      {children}
      {sorted && <SortTriangle direction={sorted} />}
      {unit && <span className="block text-micro leading-[13px] font-regular text-ink-3">{unit}</span>}
    </th>
  );
}

export const SortTriangle = ({ direction }: { direction: "ascending" | "descending" }) => (
  <svg width="8" height="6" viewBox="0 0 8 6" aria-hidden className="ml-1 inline-block align-[1px]">
    <path d={direction === "ascending" ? "M4 0 8 6H0z" : "M0 0h8L4 6z"} fill="var(--fb-oxide-ink)" />
  </svg>
);

type TdProps = ComponentProps<"td"> & { numeric?: boolean };

export const Td = ({ numeric, className, ...rest }: TdProps) => (
  <td
    className={cx(
      "h-6 border-b border-rule px-2 whitespace-nowrap max-md:h-11",
      numeric && "text-right font-num font-[440]",
      className,
    )}
    {...rest}
  />
);

type TrProps = ComponentProps<"tr"> & {
  /** The thing in hand: wash and a 3 px oxide bar at its left. */
  inHand?: boolean;
  /** Totals: ink rule above, double rule below. */
  total?: boolean;
};

export const Tr = ({ inHand, total, className, ...rest }: TrProps) => (
  <tr
    className={cx(
      inHand && "[&>td]:bg-wash [&>td:first-child]:shadow-[inset_3px_0_0_var(--fb-oxide-ink)]",
      total &&
        "[&>td]:border-t [&>td]:border-b-[3px] [&>td]:[border-bottom-style:double] [&>td]:border-frame [&>td]:font-[600]",
      className,
    )}
    {...rest}
  />
);

/** Head of a pane: 32 px on panel, ink rule below. */
export const PaneHead = ({ className, ...rest }: ComponentProps<"div">) => (
  <div
    className={cx(
      "flex min-h-8 flex-none items-center gap-3 border-b border-frame bg-panel px-3 font-[640] whitespace-nowrap",
      className,
    )}
    {...rest}
  />
);
/** Second head within a pane: 26 px. */
export const PaneSubhead = ({ className, ...rest }: ComponentProps<"div">) => (
  <div
    className={cx(
      "flex min-h-[26px] flex-none items-center gap-2.5 border-b border-rule bg-panel px-3 text-table font-[560] whitespace-nowrap text-ink-2",
      className,
    )}
    {...rest}
  />
);
