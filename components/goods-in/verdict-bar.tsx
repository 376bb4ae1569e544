import type { DeliveryCounts } from "@/lib/schemas/delivery";

/** Shares of a delivery by verdict: ink, chalk, oxide hatch. */
export const VerdictBar = ({
  counts,
}: {
  counts: Pick<DeliveryCounts, "accepted" | "queried" | "refused">;
}) => (
  <span
    role="img"
    aria-label={`${counts.accepted} accepted, ${counts.queried} queried, ${counts.refused} refused`}
    className="flex h-3 w-[150px] border border-frame bg-sheet"
  >
    {counts.accepted > 0 && <span className="bg-ink" style={{ flex: counts.accepted }} />}
    {counts.queried > 0 && (
      <span className="min-w-2 border-l border-frame bg-chalk" style={{ flex: counts.queried }} />
    )}
    {counts.refused > 0 && (
      <span className="gutter-lost min-w-2 border-l border-frame" style={{ flex: counts.refused }} />
    )}
  </span>
);
