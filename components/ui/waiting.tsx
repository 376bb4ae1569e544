"use client";
import { useEffect, useState } from "react";
import { cx } from "@/components/ui/cx";

/** Dots where a figure will stand. */
export const WaitingDots = ({ className }: { className?: string }) => (
  <span aria-hidden className={cx("tracking-[1px] text-ink-3", className)}>
    ·····
  </span>
);

/** After 400 ms a line says what is awaited; before that nothing flickers. */
export function AwaitedLine({ children, className }: { children: string; className?: string }) {
  const [late, setLate] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setLate(true), 400);
    return () => clearTimeout(timer);
  }, []);
  return (
    <p role="status" className={cx("text-note text-ink-3", className)}>
      {late ? children : ""}
    </p>
  );
}

type ProgressProps = Readonly<{
  label: string;
  done: number;
  total: number;
  unit?: string;
  className?: string;
}>;

/** Progress is a dimension line that grows between its ticks, with counted units. */
export function ProgressDimension({ label, done, total, unit, className }: ProgressProps) {
  const share = total > 0 ? Math.min(1, Math.max(0, done / total)) : 0;
  const end = 6 + 238 * share;
  return (
    <div className={cx("flex flex-wrap items-center gap-3 text-table whitespace-nowrap", className)}>
      <span>{label}</span>
      <svg
        width="250"
        height="26"
        viewBox="0 0 250 26"
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={total}
        aria-valuenow={done}
      >
        <path d="M6 16H244" stroke="var(--fb-edge)" />
        <path d={`M6 16H${end}`} stroke="var(--fb-oxide-ink)" strokeWidth="3" />
        <path d={`M2 20l8-8M${end - 4} 20l8-8M240 20l8-8`} stroke="var(--fb-ink)" strokeWidth="1.6" />
        <path d="M6 8v16M244 8v16" stroke="var(--fb-edge)" />
      </svg>
      <span className="font-num">
        {done} of {total}
        {unit && ` ${unit}`}
      </span>
    </div>
  );
}
