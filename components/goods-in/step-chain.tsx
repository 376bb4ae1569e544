import { cx } from "@/components/ui/cx";

export const STEPS = ["unload", "columns", "inspect", "away"] as const;
export type Step = (typeof STEPS)[number];

const NAMES: Record<Step, string> = {
  unload: "Unload",
  columns: "Match columns",
  inspect: "Inspect",
  away: "Put away",
};

const SHORT: Record<Step, string> = { unload: "Unload", columns: "Match", inspect: "Inspect", away: "Away" };

type StepChainProps = Readonly<{ now: Step; reach: Step; onStep?: (step: Step) => void }>;

/** The four steps as a chain dimension: done in ink, the present one in oxide. */
export const StepChain = ({ now, reach, onStep }: StepChainProps) => {
  const at = STEPS.indexOf(now);
  const reached = STEPS.indexOf(reach);
  return (
    <ol className="grid h-[46px] flex-none grid-cols-4 border-b border-frame bg-sheet px-10 pt-1.5 max-sm:px-5">
      {STEPS.map((step, i) => {
        const open = onStep !== undefined && i <= reached && i !== at && step !== "unload" && step !== "away";
        return (
          <li
            key={step}
            aria-current={i === at ? "step" : undefined}
            className={cx(
              "relative h-7 pt-0.5 text-center text-ink-2 max-sm:text-note",
              i === at
                ? "border-b-[3px] border-oxide-ink font-[660] text-ink"
                : i < at || i <= reached
                  ? "border-b-[3px] border-frame text-ink"
                  : "border-b border-edge",
            )}
          >
            <Tick side="left" />
            {i === STEPS.length - 1 && <Tick side="right" />}
            {open ? (
              <button type="button" className="hover:underline" onClick={() => onStep(step)}>
                <StepName i={i} step={step} />
              </button>
            ) : (
              <StepName i={i} step={step} />
            )}
          </li>
        );
      })}
    </ol>
  );
};

const StepName = ({ i, step }: { i: number; step: Step }) => (
  <span>
    {i + 1}&ensp;<span className="max-sm:sr-only">{NAMES[step]}</span>
    <span aria-hidden className="sm:hidden">
      {SHORT[step]}
    </span>
  </span>
);

const Tick = ({ side }: { side: "left" | "right" }) => (
  <svg
    aria-hidden
    width="18"
    height="18"
    viewBox="0 0 18 18"
    className={cx("absolute -bottom-[10px]", side === "left" ? "-left-[9px]" : "-right-[9px]")}
  >
    <path d="M9 1v16" stroke="var(--fb-ink-2)" />
    <path d="M3.5 14.5l11-11" stroke="var(--fb-ink)" strokeWidth="2" />
  </svg>
);
