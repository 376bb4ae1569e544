"use client";
import type { ReactNode } from "react";
import { niceStep } from "@/components/bench/canvas/ruler";
import { useBench } from "@/components/bench/bench-store";
import { useLengths } from "@/components/bench/use-lengths";
import type { View } from "@/lib/figure/view";

const Row = ({ sign, children }: { sign: ReactNode; children: ReactNode }) => (
  <div className="flex h-[22px] items-center gap-3">
    <svg width="30" height="16" viewBox="-15 -8 30 16" aria-hidden>
      {sign}
    </svg>
    <span>{children}</span>
  </div>
);

const dashed = (dash: string, stroke: string, width = 1.2) => (
  <path d="M-15 0H15" stroke={stroke} strokeWidth={width} strokeDasharray={dash} />
);

/** What the marks and lines mean; only those that are drawn now. Hidden below 820 px. */
export const CanvasKey = () => {
  const figures = useBench((s) => s.figures);
  if (!figures) return null;
  const { angle, pna, shearCentre } = figures.properties;
  const lean = Math.min(Math.abs(angle) % 90, 90 - (Math.abs(angle) % 90));
  return (
    <div className="pointer-events-none absolute right-3 bottom-3 border border-edge bg-sheet px-3 py-1.5 text-note max-md:hidden">
      <Row
        sign={
          <>
            <circle r="7" fill="var(--fb-sheet)" stroke="var(--fb-ink)" strokeWidth="1.3" />
            <path d="M0 0V-7A7 7 0 0 1 7 0ZM0 0V7A7 7 0 0 1 -7 0Z" fill="var(--fb-ink)" />
          </>
        }
      >
        C, centroid
      </Row>
      {shearCentre && (
        <Row
          sign={
            <path
              d="M-6 -6H6V6H-6ZM-6 -6 6 6M6 -6-6 6"
              fill="none"
              stroke="var(--fb-ink)"
              strokeWidth="1.3"
            />
          }
        >
          SC, shear centre
        </Row>
      )}
      <Row sign={dashed("14 3 2 3", "var(--fb-axis)")}>x–x, y–y, through C</Row>
      {lean > 0.1 && <Row sign={dashed("14 3 2 3 2 3", "var(--fb-mill)", 1)}>1–1, 2–2, principal</Row>}
      {pna && <Row sign={dashed("5 3", "var(--fb-axis)")}>PNA, bending about x–x</Row>}
    </div>
  );
};

const BAR_PX = 110;

export const ScaleBar = ({ view }: { view: View }) => {
  const { unitMm } = useLengths();
  const step = niceStep(view.pxPerMm * unitMm, BAR_PX * 0.6);
  const width = step * unitMm * view.pxPerMm;
  return (
    <div className="pointer-events-none absolute bottom-3 left-8 flex items-center gap-2 font-num text-note text-ink-2 max-sm:hidden">
      <svg width={width + 2} height="10" aria-hidden>
        <path d={`M1 0V10M${width + 1} 0V10M1 5H${width + 1}`} stroke="var(--fb-ink)" />
        <path d={`M1 5H${width / 2 + 1}M${width / 2 + 1} 1V9`} stroke="var(--fb-ink)" strokeWidth="3" />
      </svg>
      {Math.round(step * 1e6) / 1e6} {unitMm === 1 ? "mm" : "in"}
    </div>
  );
};
