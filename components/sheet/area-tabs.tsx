"use client";
import Link from "next/link";
import { usePathname, useRouter } from "next/navigation";
import { useEffect } from "react";
import { AREAS, type AreaId } from "@/components/sheet/areas";
import { cx } from "@/components/ui/cx";
import { useWaiting } from "@/lib/client/waiting";
import type { Waiting } from "@/lib/schemas/work";

/** The words of what waits in an area. */
const waitingIn = (
  waiting: Waiting | undefined,
): Partial<Record<AreaId, Readonly<{ count: number; words?: string; title: string }>>> =>
  waiting
    ? {
        rack: {
          count: waiting.toCheck,
          words: "to check",
          title: "submitted revisions that wait for a check",
        },
        "goods-in": { count: waiting.deliveries, title: "deliveries that are not put away yet" },
      }
    : {};

/** Index tabs of the book; the current one is cut from the same paper as the sheet. Alt+1… open the areas. */
export function AreaTabs({ className }: Readonly<{ className?: string }>) {
  const waiting = waitingIn(useWaiting().data);
  const path = usePathname();
  const router = useRouter();
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (!event.altKey || event.ctrlKey || event.metaKey || event.shiftKey) return;
      const area = AREAS[Number(event.code.replace("Digit", "")) - 1];
      if (!area || !event.code.startsWith("Digit")) return;
      event.preventDefault();
      router.push(area.href);
    };
    window.addEventListener("keydown", onKey);
    return () => window.removeEventListener("keydown", onKey);
  }, [router]);

  return (
    <nav
      aria-label="Areas"
      className={cx("flex min-w-0 items-end gap-0.5 max-sm:items-stretch max-sm:gap-0", className)}
    >
      {AREAS.map((area) => {
        const current = path === area.href || path.startsWith(`${area.href}/`);
        const wait = waiting[area.id];
        return (
          <Link
            key={area.id}
            prefetch={false}
            href={area.href}
            aria-current={current ? "page" : undefined}
            className={cx(
              "relative flex h-9 items-center border border-b-0 px-[18px] text-[15px] font-medium whitespace-nowrap no-underline",
              "max-md:h-11 max-md:px-[15px] max-sm:h-13 max-sm:flex-1 max-sm:justify-center max-sm:border-t-0 max-sm:px-1",
              current
                ? "z-[2] -mb-px h-[37px] border-frame border-t-[3px] border-t-oxide-ink bg-sheet font-[640] text-ink max-md:h-[45px] max-sm:mb-0 max-sm:h-13 max-sm:border-t-[3px]"
                : "border-transparent text-ink-2 hover:text-ink",
            )}
          >
            {area.name}
            {wait && wait.count > 0 && (
              <span title={wait.title} className="ml-[7px] text-[12.5px] leading-4 font-[560] text-oxide-ink">
                {wait.count}
                {wait.words && <span className="max-sm:sr-only"> {wait.words}</span>}
              </span>
            )}
          </Link>
        );
      })}
    </nav>
  );
}
