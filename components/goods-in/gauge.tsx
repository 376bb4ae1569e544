import { cx } from "@/components/ui/cx";

const MIDDLE = 46;
const JAW = 20;
const FARTHEST = 36;

type GaugeProps = Readonly<{
  /** (tabulated − computed) / computed, and what is allowed, as shares. */
  off: number;
  allowed: number;
  within: boolean;
  className?: string;
}>;

/** Two jaws at ± what is allowed, a needle between; outside, an arrow at the end it left by. */
export const Gauge = ({ off, allowed, within, className }: GaugeProps) => {
  const share = allowed > 0 ? off / allowed : 0;
  const at = MIDDLE + JAW * share;
  const ink = within ? "var(--fb-ink)" : "var(--fb-oxide)";
  const gone = Math.abs(at - MIDDLE) > FARTHEST;
  const side = share > 0 ? "above" : "below";
  return (
    <svg
      width="92"
      height="16"
      viewBox="0 0 92 16"
      role="img"
      aria-label={within ? "within the gauge" : `outside the gauge, ${side}`}
      className={cx("block", className)}
    >
      <path d="M2 8H90" stroke="var(--fb-rule)" />
      <rect x={MIDDLE - JAW} y="3.5" width={2 * JAW} height="9" fill="var(--fb-wash)" />
      <path d="M26 1v14M66 1v14" stroke="var(--fb-ink-2)" strokeWidth="1.5" />
      <path d="M46 5v6" stroke="var(--fb-edge)" />
      {gone ? (
        <path d={share > 0 ? "M89 8l-8 -5v10z" : "M3 8l8 -5v10z"} fill={ink} />
      ) : (
        <path d={`M${at.toFixed(1)} 2v12`} stroke={ink} strokeWidth="3" />
      )}
    </svg>
  );
};
