import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

/** An empty rack bay in elevation, with the ghost of what could stand there. */
export const EmptyBayDrawing = ({ className }: { className?: string }) => (
  <svg width="250" height="96" viewBox="0 0 250 96" aria-hidden className={cx("max-w-full", className)}>
    <g fill="none" stroke="var(--fb-frame)">
      <path d="M20 4V92M125 4V92M230 4V92" strokeWidth="4" />
      <path d="M18 32H232M18 62H232M18 90H232" strokeWidth="2" />
    </g>
    <path d="M46 32v-18M38 14h16M38 32h16" stroke="var(--fb-ghost)" strokeDasharray="4 3" fill="none" />
  </svg>
);

type EmptyBayProps = Readonly<{
  head: ReactNode;
  children?: ReactNode;
  actions?: ReactNode;
  className?: string;
}>;

/** Nothing found and first use: the empty bay, the ask in words, and what to do next. */
export function EmptyBay({ head, children, actions, className }: EmptyBayProps) {
  return (
    <div className={cx("max-w-xl p-6", className)}>
      <EmptyBayDrawing />
      <p className="mt-3 font-bold">{head}</p>
      {children && <div className="text-ink-2">{children}</div>}
      {actions && <div className="mt-3 flex flex-wrap gap-2">{actions}</div>}
    </div>
  );
}
