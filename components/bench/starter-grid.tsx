"use client";
import { useMemo } from "react";
import { cx } from "@/components/ui/cx";
import { newDrawing } from "@/lib/drawing/new-drawing";
import { placedRegions } from "@/lib/drawing/placed-part";
import { placeStarter } from "@/lib/drawing/starters/apply-starter";
import { firstValues, STARTERS } from "@/lib/drawing/starters/starters";
import type { Starter } from "@/lib/drawing/starters/starter";
import { ringsOf } from "@/lib/figure/compose-figure";
import { silhouetteOfRings } from "@/lib/figure/silhouette";

const HIGH_PX = 64;
const TALLEST_MM = 820;

/** Starters at one common scale, standing on the beam of a rack. */
export const StarterGrid = ({
  chosen,
  onChoose,
}: {
  chosen: Starter;
  onChoose: (starter: Starter) => void;
}) => {
  const drawn = useMemo(
    () =>
      STARTERS.map((starter) => {
        const placed = placeStarter(newDrawing(), starter, firstValues(starter));
        const rings = placed.ok ? placed.value.drawing.parts.flatMap((p) => ringsOf(placedRegions(p))) : [];
        return { starter, silhouette: silhouetteOfRings(rings) };
      }),
    [],
  );
  return (
    <div
      role="radiogroup"
      aria-label="Starters"
      className="grid grid-cols-4 max-md:grid-cols-3 max-sm:grid-cols-2"
    >
      {drawn.map(({ starter, silhouette }) => {
        const on = starter.id === chosen.id;
        const scale = HIGH_PX / TALLEST_MM;
        return (
          <button
            key={starter.id}
            type="button"
            role="radio"
            aria-checked={on}
            onClick={() => onChoose(starter)}
            className={cx(
              "grid grid-rows-[1fr_auto] border-r-4 border-frame text-left outline-offset-[-4px] hover:bg-wash [&:nth-child(4n)]:border-r-0",
              on && "bg-wash shadow-[inset_0_-3px_0_var(--fb-oxide-ink)]",
            )}
          >
            <span className="flex h-[76px] items-end justify-center border-b-[3px] border-frame">
              {silhouette && (
                <svg
                  width={silhouette.widthMm * scale + 2}
                  height={silhouette.heightMm * scale + 1}
                  viewBox={`-1 ${-silhouette.heightMm * scale} ${silhouette.widthMm * scale + 2} ${silhouette.heightMm * scale + 1}`}
                  aria-hidden
                >
                  <path
                    d={silhouette.path}
                    transform={`scale(${scale})`}
                    fill={on ? "var(--fb-oxide)" : "var(--fb-cut)"}
                    fillRule="evenodd"
                    vectorEffect="non-scaling-stroke"
                    stroke={on ? "var(--fb-oxide)" : "var(--fb-cut)"}
                  />
                </svg>
              )}
            </span>
            <span className={cx("px-3 py-1.5", !on && "bg-panel")}>
              <b className="block text-table font-[560]">{starter.name}</b>
              <span className="block text-note text-ink-2">{starter.note}</span>
            </span>
          </button>
        );
      })}
    </div>
  );
};
