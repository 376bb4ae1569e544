import type { Flag } from "@/components/bench/canvas/overlay";
import type { Size } from "@/components/bench/canvas/use-size";
import { toScreen, type View } from "@/lib/figure/view";

const WIDTH_PX = 210;

/** The reason in words, beside what was met: on the side where there is room. */
export const CanvasFlag = ({ flag, view, size }: { flag: Flag; view: View; size: Size }) => {
  const p = toScreen(view, flag.at);
  const right = p.x + 54 + WIDTH_PX < size.width;
  const left = right ? p.x + 54 : Math.max(p.x - 54 - WIDTH_PX, 24);
  const top = Math.min(Math.max(p.y - 58, 26), size.height - 60);
  return (
    <div
      aria-hidden
      className="pointer-events-none absolute min-w-40 border border-oxide-ink bg-sheet px-2.5 py-1 text-table whitespace-nowrap"
      style={{ left, top }}
    >
      <div className="font-[540] text-oxide-ink">{flag.head}</div>
      <div className="text-note text-ink-2">{flag.note}</div>
    </div>
  );
};
