import { Count } from "@/components/display/quantity";
import type { FinderRow } from "@/lib/schemas/find-shapes";

/** Per cent at which the bar is full. */
const FULL_PERCENT = 125;
const BAR_PX = 48;

/** The S that holds: for a section whose axes are not principal the one for free bending, which is less than I/c. */
export const holdingSx = (row: FinderRow): number =>
  row.unsymmetrical ? Math.min(row.Sx, row.unsymmetrical.SxFree) : row.Sx;

/** How far the S that holds lies over the minimum asked, as a bar and in per cent; below it stands in oxide. */
export function OverMinimum({ row, minSx }: { row: FinderRow; minSx: number }) {
  if (minSx <= 0) return null;
  const percent = (holdingSx(row) / minSx - 1) * 100;
  const width = Math.max(0, Math.min(1, percent / FULL_PERCENT)) * BAR_PX;
  return (
    <span className={percent < 0 ? "text-oxide-ink" : undefined}>
      <span aria-hidden className="mr-1.5 inline-block h-2 border-l border-frame" style={{ width: BAR_PX }}>
        <span className="hatched block h-2 border border-l-0 border-edge" style={{ width }} />
      </span>
      <Count value={percent > 0 && percent < 0.5 ? 0 : percent} />
    </span>
  );
}
