"use client";
import { useBench, useBenchActions } from "@/components/bench/bench-store";
import { cx } from "@/components/ui/cx";

type ViewButtonsProps = Readonly<{ fit: () => void; zoom: (factor: number) => void }>;

const BUTTON =
  "-ml-px flex h-[26px] min-w-[26px] items-center justify-center border border-edge bg-sheet px-1.5 text-note hover:bg-wash max-md:h-11 max-md:min-w-11";

/** Zoom, fit and the detail glass for those who use no wheel and no keys. */
export const ViewButtons = ({ fit, zoom }: ViewButtonsProps) => {
  const glass = useBench((s) => s.glass);
  const act = useBenchActions();
  return (
    <div
      role="group"
      aria-label="View"
      className="absolute top-7 right-3 flex max-sm:hidden"
      onPointerDown={(event) => event.stopPropagation()}
    >
      <button type="button" className={BUTTON} aria-label="Smaller" onClick={() => zoom(0.8)}>
        −
      </button>
      <button type="button" className={BUTTON} aria-label="Larger" onClick={() => zoom(1.25)}>
        +
      </button>
      <button type="button" className={BUTTON} aria-keyshortcuts="0" onClick={fit}>
        fit
      </button>
      <button
        type="button"
        className={cx(BUTTON, glass && "border-ink bg-ink text-sheet hover:bg-ink")}
        aria-pressed={glass}
        aria-keyshortcuts="G"
        onClick={() => act.set({ glass: !glass })}
      >
        detail
      </button>
    </div>
  );
};
