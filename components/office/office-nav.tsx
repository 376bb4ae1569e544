"use client";
import Link from "next/link";
import { usePathname } from "next/navigation";
import type { ReactNode } from "react";
import { cx } from "@/components/ui/cx";

export type OfficePage = Readonly<{ href: string; name: string }>;

/** The pages of the Office that this person may open, and what the current one shows at the right. */
export function OfficeNav({ pages, children }: { pages: readonly OfficePage[]; children?: ReactNode }) {
  const path = usePathname();
  return (
    <div className="flex min-h-9 flex-wrap items-stretch border-b border-frame bg-panel pr-3.5">
      <nav aria-label="Office" className="flex flex-wrap items-stretch">
        {pages.map(({ href, name }) => {
          const current = path === href;
          return (
            <Link
              key={href}
              href={href}
              aria-current={current ? "page" : undefined}
              className={cx(
                "flex min-h-9 items-center border-r border-rule px-4 no-underline max-md:min-h-11",
                current
                  ? "bg-sheet font-[640] text-ink shadow-[inset_0_-3px_0_var(--fb-oxide-ink)]"
                  : "text-ink-2 hover:text-ink",
              )}
            >
              {name}
            </Link>
          );
        })}
      </nav>
      {children && (
        <div className="ml-auto flex flex-wrap items-center gap-x-[18px] gap-y-1 py-1 pl-3 text-table text-ink-2">
          {children}
        </div>
      )}
    </div>
  );
}
