"use client";
import { Count } from "@/components/display/quantity";
import { VerdictBar } from "@/components/goods-in/verdict-bar";
import { cx } from "@/components/ui/cx";
import { Select } from "@/components/ui/select";
import { AcceptedSign, QueriedSign, RefusedSign } from "@/components/ui/signs";
import { CAUSE_CODES, CAUSES, type CauseCode, type Verdict } from "@/lib/intake/row-reason";
import type { DeliveryCounts } from "@/lib/schemas/delivery";
import { useDisplay } from "@/components/display/display-provider";
import { readText, setNumber } from "@/lib/units/format";

type Filter = Readonly<{ verdict: Verdict | null; cause: CauseCode | null; open: "yes" | null }>;
type TallyProps = Readonly<{
  counts: DeliveryCounts;
  tolerance: number | null;
  state: Filter;
  onState: (next: Filter) => void;
}>;

const ALL: Filter = { verdict: null, cause: null, open: null };

/** Rows by verdict, each count a filter; the causes of what is queried or refused; the gauge's tolerance. */
export function Tally({ counts, tolerance, state, onState }: TallyProps) {
  const { settings } = useDisplay();
  const causes = CAUSE_CODES.filter((code) => (counts.byCause[code] ?? 0) > 0);
  const is = (f: Filter) => f.verdict === state.verdict && f.open === state.open;
  return (
    <div className="flex min-h-10 flex-none flex-wrap items-stretch border-b border-frame bg-panel whitespace-nowrap">
      <TallyButton current={is(ALL)} onClick={() => onState({ ...ALL, cause: state.cause })}>
        All <Count value={counts.rows} className="text-[15px]! font-[640]!" />
      </TallyButton>
      {(
        [
          ["accepted", AcceptedSign],
          ["queried", QueriedSign],
          ["refused", RefusedSign],
        ] as const
      ).map(([verdict, Sign]) => (
        <TallyButton
          key={verdict}
          current={is({ ...ALL, verdict })}
          onClick={() => onState({ verdict, cause: verdict === "accepted" ? null : state.cause, open: null })}
        >
          <Sign label={null} />
          {verdict} <Count value={counts[verdict]} className="text-[15px]! font-[640]!" />
        </TallyButton>
      ))}
      <TallyButton
        current={is({ ...ALL, open: "yes" })}
        onClick={() => onState({ ...ALL, open: "yes", cause: state.cause })}
      >
        to decide <Count value={counts.undecided} className="text-[15px]! font-[640]!" />
      </TallyButton>
      {causes.length > 0 && (
        <span className="flex items-center px-3">
          <Select
            aria-label="Cause"
            value={state.cause ?? ""}
            set={state.cause !== null}
            choices={[
              { value: "", label: "every cause" },
              ...causes.map((code) => ({
                value: code as string,
                label: `${CAUSES[code]}, ${counts.byCause[code] ?? 0}`,
              })),
            ]}
            onChange={(value) =>
              onState({ ...state, cause: CAUSE_CODES.find((code) => code === value) ?? null })
            }
            className="max-w-[220px]"
          />
        </span>
      )}
      <span className="flex-1" />
      <span className="flex items-center gap-3 pr-3 max-xl:hidden">
        <VerdictBar counts={counts} />
        {tolerance !== null && (
          <span className="text-[13px] text-ink-2">
            Gauge{" "}
            <b className="font-num font-[560] text-ink">
              {readText(setNumber(tolerance * 100, 1, settings.decimal))}
            </b>{" "}
            <span className="text-micro text-ink-3">% off computed</span>
          </span>
        )}
      </span>
    </div>
  );
}

const TallyButton = ({
  current,
  onClick,
  children,
}: {
  current: boolean;
  onClick: () => void;
  children: React.ReactNode;
}) => (
  <button
    type="button"
    aria-pressed={current}
    onClick={onClick}
    className={cx(
      "flex min-h-10 items-center gap-2 border-r border-rule px-4 hover:bg-wash focus-visible:-outline-offset-2 max-md:min-h-11 max-sm:px-2.5",
      current && "bg-sheet shadow-[inset_0_-3px_0_var(--fb-oxide-ink)]",
    )}
  >
    {children}
  </button>
);
