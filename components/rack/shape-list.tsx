"use client";
import { useVirtualizer } from "@tanstack/react-virtual";
import { useEffect, useMemo, useRef } from "react";
import { useDisplay } from "@/components/display/display-provider";
import { Quantity, SymbolOf, UnitOf } from "@/components/display/quantity";
import { columnDecimalsOf } from "@/components/rack/column-decimals";
import { TransformedMark } from "@/components/rack/transformed-mark";
import { UnsymmetricalFactor } from "@/components/rack/shape-columns";
import type { ShapeTableProps } from "@/components/rack/shape-table";
import { commonScale, RowSilhouette } from "@/components/rack/silhouette";
import { sortWords } from "@/components/rack/sort-names";
import { cx } from "@/components/ui/cx";
import { RevisionMark } from "@/components/ui/marks";

type ShapeListProps = Pick<ShapeTableProps, "rows" | "sort" | "inHand" | "onOpen" | "onNearEnd" | "more">;

/** The rows on a phone: designation and mass, below them S, I and depth; a press opens the sheet. */
export function ShapeList({ rows, sort, inHand, onOpen, onNearEnd, more }: ShapeListProps) {
  const { settings } = useDisplay();
  const scroller = useRef<HTMLDivElement>(null);
  const decimals = useMemo(() => columnDecimalsOf(rows, settings.system), [rows, settings.system]);
  const scale = useMemo(() => commonScale(rows, 44, 46), [rows]);
  const virtual = useVirtualizer({
    count: rows.length,
    getScrollElement: () => scroller.current,
    estimateSize: () => 66,
    initialRect: { width: 390, height: 700 },
    overscan: 8,
  });
  const items = virtual.getVirtualItems();
  const last = items.at(-1)?.index ?? 0;
  useEffect(() => {
    if (more && last >= rows.length - 10) onNearEnd();
  }, [more, last, rows.length, onNearEnd]);
  return (
    <>
      <div className="flex h-7 flex-none items-center gap-3 border-b border-rule bg-panel px-3.5 text-note text-ink-2">
        <span className="flex-1">{sortWords(sort)}</span>
        <span>
          <SymbolOf property="Sx" /> <UnitOf property="Sx" />, <SymbolOf property="Ix" />{" "}
          <UnitOf property="Ix" />
        </span>
        <UnitOf property="mass" />
      </div>
      <div ref={scroller} className="min-h-0 flex-1 overflow-y-auto">
        <ul aria-label="Shapes" className="relative" style={{ height: virtual.getTotalSize() }}>
          {items.map((item) => {
            const row = rows[item.index];
            if (!row) return null;
            return (
              <li
                key={row.id}
                className="absolute inset-x-0 h-[66px]"
                style={{ transform: `translateY(${item.start}px)` }}
              >
                <button
                  type="button"
                  onClick={() => onOpen(row.id)}
                  className={cx(
                    "grid h-full w-full grid-cols-[52px_minmax(0,1fr)_auto] gap-x-3 border-b border-rule px-3.5 text-left focus-visible:-outline-offset-2",
                    row.id === inHand && "bg-wash shadow-[inset_3px_0_0_var(--fb-oxide-ink)]",
                  )}
                >
                  <span className="row-span-2 self-end">
                    <RowSilhouette
                      drawing={row.drawing}
                      pxPerMm={scale}
                      width={44}
                      height={46}
                      inHand={row.id === inHand}
                    />
                  </span>
                  <span className="self-end truncate text-[15px] font-[640]">
                    {row.designation} <RevisionMark letter={row.letter} />
                    <UnsymmetricalFactor row={row} />
                    <TransformedMark drawing={row.drawing} />
                  </span>
                  <span className="self-end text-[17px]">
                    <Quantity
                      property="mass"
                      value={row.mass}
                      decimals={decimals.mass}
                      className="font-[640]"
                    />
                  </span>
                  <span className="col-start-2 flex gap-2.5 overflow-hidden whitespace-nowrap text-ink-2">
                    <span>
                      <SymbolOf property="Sx" />{" "}
                      <Quantity property="Sx" value={row.Sx} decimals={decimals.Sx} className="text-ink" />
                    </span>
                    <span>
                      <SymbolOf property="Ix" />{" "}
                      <Quantity property="Ix" value={row.Ix} decimals={decimals.Ix} className="text-ink" />
                    </span>
                    <span>
                      deep{" "}
                      <Quantity
                        dimension="length"
                        value={row.depth}
                        decimals={decimals.depth}
                        className="text-ink"
                      />
                    </span>
                  </span>
                </button>
              </li>
            );
          })}
        </ul>
      </div>
    </>
  );
}
