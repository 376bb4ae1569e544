import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

export type NoticeKind = "lost" | "conflict" | "word";

const GUTTER: Record<NoticeKind, string> = {
  lost: "w-2.5 gutter-lost",
  conflict: "w-2.5 gutter-conflict",
  word: "w-0.5 bg-edge",
};

type NoticeProps = Readonly<{
  kind: NoticeKind;
  /** What happened, in one sentence. */
  head: ReactNode;
  /** What is safe and what to do. */
  children?: ReactNode;
  actions?: ReactNode;
  className?: string;
}>;

/** Gone wrong (oxide hatch: lost), a conflict (chalk on ink), or a plain word about rights and undo. */
export function Notice({ kind, head, children, actions, className }: NoticeProps) {
  return (
    <div
      role={kind === "word" ? "status" : "alert"}
      className={cx("grid grid-cols-[10px_minmax(0,1fr)] gap-3 text-[13.5px] leading-[19px]", className)}
    >
      <span aria-hidden className={GUTTER[kind]} />
      <div className="min-w-0">
        <b>{head}</b> {children && <span className="text-ink-2">{children}</span>}
        {actions && <div className="mt-1.5 flex flex-wrap items-center gap-2">{actions}</div>}
      </div>
    </div>
  );
}
