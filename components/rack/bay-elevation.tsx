import { Count } from "@/components/display/quantity";
import { cx } from "@/components/ui/cx";
import type { Bay } from "@/lib/schemas/bay";
import type { FinderCounts } from "@/lib/schemas/find-shapes";

type BayElevationProps = Readonly<{
  bays: readonly Bay[];
  counts: FinderCounts | null;
  chosen: readonly string[];
  /** Null opens all bays. */
  onChoose: (bayId: string | null) => void;
}>;

/** The rack in elevation: uprights and a beam; each bay shows how many fit the present filter. */
export function BayElevation({ bays, counts, chosen, onChoose }: BayElevationProps) {
  const all = chosen.length === 0;
  return (
    <nav
      aria-label="Bays"
      className="no-print relative flex min-w-0 overflow-x-auto border-b-4 border-frame bg-panel [scrollbar-width:thin]"
    >
      <BayButton
        name="All bays"
        fits={counts?.total ?? null}
        of={counts?.of ?? null}
        current={all}
        onClick={() => onChoose(null)}
      />
      {bays.map((bay) => (
        <BayButton
          key={bay.id}
          ordinal={bay.ordinal}
          name={bay.name}
          fits={counts ? (counts.byBay[bay.id] ?? 0) : null}
          of={counts ? (counts.ofByBay[bay.id] ?? 0) : null}
          current={chosen.includes(bay.id)}
          onClick={() => onChoose(bay.id)}
        />
      ))}
    </nav>
  );
}

type BayButtonProps = Readonly<{
  name: string;
  ordinal?: number;
  fits: number | null;
  of: number | null;
  current: boolean;
  onClick: () => void;
}>;

function BayButton({ name, ordinal, fits, of, current, onClick }: BayButtonProps) {
  const none = fits === 0;
  return (
    <button
      type="button"
      aria-current={current || undefined}
      onClick={onClick}
      className={cx(
        "grid min-w-[118px] flex-[1_0_auto] content-start gap-x-2 border-l-4 border-frame px-2.5 pt-[7px] pb-[5px] text-left first:flex-[.8_0_auto] first:border-l-0 focus-visible:-outline-offset-2",
        "max-sm:flex max-sm:h-11 max-sm:min-w-0 max-sm:items-center max-sm:py-0",
        ordinal !== undefined && "grid-cols-[auto_minmax(0,1fr)]",
        current ? "bg-sheet shadow-[inset_0_3px_0_var(--fb-oxide-ink)]" : "hover:bg-wash",
      )}
    >
      {ordinal !== undefined && (
        <span
          className={cx(
            "row-span-2 font-num text-[22px] leading-[38px] max-xl:text-[18px] max-sm:text-body",
            none ? "font-regular text-ink-3" : "font-[600] text-ink-2",
          )}
        >
          {ordinal}
        </span>
      )}
      <span className={cx("truncate text-[13.5px] leading-5", none ? "text-ink-3" : "font-[560]")}>
        {name}
      </span>
      <span className={cx("text-table leading-[18px]", none ? "text-ink-3" : "font-[560]")}>
        {fits === null ? <span className="text-ink-3">·····</span> : <Count value={fits} />}
        {of !== null && (
          <span className="text-note font-regular text-ink-3 max-sm:sr-only">
            {" of "}
            <Count value={of} />
          </span>
        )}
      </span>
    </button>
  );
}
