"use client";
import { useTable } from "@tanstack/react-table";
import { useVirtualizer } from "@tanstack/react-virtual";
import { useEffect, useMemo, useRef } from "react";
import { useDisplay } from "@/components/display/display-provider";
import { COLUMN_FACTS, rackFeatures, shapeColumns } from "@/components/rack/shape-columns";
import { columnDecimalsOf } from "@/components/rack/column-decimals";
import { commonScale } from "@/components/rack/silhouette";
import { nextSort, readSort } from "@/components/rack/sort-names";
import { useMedia } from "@/components/sheet/use-media";
import { cx } from "@/components/ui/cx";
import { Table, Td, Th, Tr } from "@/components/ui/table";
import { WaitingDots } from "@/components/ui/waiting";
import type { FinderRow } from "@/lib/schemas/find-shapes";

export type ShapeTableProps = Readonly<{
  rows: readonly FinderRow[];
  /** Hits of the whole search, null while they are counted. */
  total: number | null;
  minSx: number | null;
  sort: string;
  onSort: (sort: string) => void;
  inHand: string | null;
  onTakeInHand: (id: string) => void;
  onOpen: (id: string) => void;
  /** Called when the last loaded rows come into sight. */
  onNearEnd: () => void;
  more: boolean;
}>;

const ROW_PX = 32;
const ROW_TOUCH_PX = 44;

/** The rows of the Rack: a virtual table that stands as an ordinary one for those who hear it. */
export function ShapeTable(props: ShapeTableProps) {
  const { rows, total, minSx, sort, onSort, inHand, onTakeInHand, onOpen, onNearEnd, more } = props;
  const { settings } = useDisplay();
  const rowPx = useMedia("(width < 820px)") ? ROW_TOUCH_PX : ROW_PX;
  const scroller = useRef<HTMLDivElement>(null);
  const columns = useMemo(
    () =>
      shapeColumns({
        pxPerMm: commonScale(rows, 30, 28),
        decimals: columnDecimalsOf(rows, settings.system),
        minSx,
      }),
    [rows, settings.system, minSx],
  );
  const table = useTable({ features: rackFeatures, columns, data: rows, getRowId: (row) => row.id });
  const virtual = useVirtualizer({
    count: rows.length + (more ? 1 : 0),
    getScrollElement: () => scroller.current,
    estimateSize: () => rowPx,
    initialRect: { width: 1000, height: 700 },
    overscan: 12,
  });
  const items = virtual.getVirtualItems();
  const last = items.at(-1)?.index ?? 0;
  useEffect(() => {
    if (more && last >= rows.length - 15) onNearEnd();
  }, [more, last, rows.length, onNearEnd]);

  const index = rows.findIndex((row) => row.id === inHand);
  useEffect(() => {
    if (index >= 0) virtual.scrollToIndex(index, { align: "auto" });
  }, [index, virtual]);

  const allRows = table.getRowModel().rows;
  const sorted = readSort(sort);
  const before = items[0]?.start ?? 0;
  const after = virtual.getTotalSize() - (items.at(-1)?.end ?? 0);
  const span = columns.length;
  return (
    <div ref={scroller} className="relative min-h-0 flex-1 overflow-auto [scrollbar-gutter:stable]">
      <Table
        role="grid"
        aria-label="Shapes"
        aria-rowcount={total === null ? -1 : total + 1}
        className="[&_td]:px-[7px] [&_th]:px-[7px]"
      >
        <thead className="sticky top-0 z-10 bg-panel">
          {table.getHeaderGroups().map((group) => (
            <tr key={group.id} aria-rowindex={1}>
              {group.headers.map((header) => {
                const facts = COLUMN_FACTS[header.column.id];
                if (!facts) return null;
                const here = facts.sort !== undefined && facts.sort === sorted.column;
                return (
                  <Th
                    key={header.id}
                    numeric={facts.numeric ?? false}
                    unit={facts.unit}
                    sorted={here ? (sorted.falling ? "descending" : "ascending") : undefined}
                    className={cx("h-9 bg-panel", facts.className)}
                  >
                    {facts.sort ? (
                      <button
                        type="button"
                        className="min-h-[18px] [font:inherit] hover:underline"
                        onClick={() => facts.sort && onSort(nextSort(sort, facts.sort))}
                      >
                        {facts.head}
                      </button>
                    ) : (
                      facts.head
                    )}
                  </Th>
                );
              })}
            </tr>
          ))}
        </thead>
        <tbody>
          {before > 0 && <Spacer height={before} span={span} />}
          {items.map((item) => {
            const row = allRows[item.index];
            if (!row) return <WaitingRow key="waiting" span={span} />;
            const chosen = row.id === inHand;
            return (
              <Tr
                key={row.id}
                inHand={chosen}
                aria-rowindex={item.index + 2}
                aria-selected={chosen}
                tabIndex={chosen || (index < 0 && item.index === 0) ? 0 : -1}
                data-row={row.id}
                onClick={(event) => {
                  if (!(event.target instanceof Element && event.target.closest("a"))) onTakeInHand(row.id);
                }}
                onDoubleClick={() => onOpen(row.id)}
                className="hover:[&>td]:bg-wash focus-visible:-outline-offset-2"
              >
                {row.getAllCells().map((cell) => {
                  const facts = COLUMN_FACTS[cell.column.id];
                  return (
                    <Td
                      key={cell.id}
                      numeric={facts?.numeric ?? false}
                      className={cx(
                        "h-8",
                        cell.column.id === "silhouette" && "align-bottom",
                        facts?.className,
                      )}
                    >
                      <table.FlexRender cell={cell} />
                    </Td>
                  );
                })}
              </Tr>
            );
          })}
          {after > 0 && <Spacer height={after} span={span} />}
        </tbody>
      </Table>
    </div>
  );
}

const Spacer = ({ height, span }: { height: number; span: number }) => (
  <tr aria-hidden>
    <td colSpan={span} style={{ height }} className="p-0" />
  </tr>
);

const WaitingRow = ({ span }: { span: number }) => (
  <tr>
    <Td colSpan={span} className="h-8">
      <WaitingDots className="pl-12" />
      <span className="sr-only">more rows are on their way</span>
    </Td>
  </tr>
);
