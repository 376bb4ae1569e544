"use client";
import { useVirtualizer } from "@tanstack/react-virtual";
import { useEffect, useRef } from "react";
import { FileFigure, OffFigure } from "@/components/goods-in/file-figure";
import { Gauge } from "@/components/goods-in/gauge";
import { Detail, FieldSymbol, FileUnit } from "@/components/goods-in/words";
import { useMedia } from "@/components/sheet/use-media";
import { cx } from "@/components/ui/cx";
import { AcceptedSign, QueriedSign, RefusedSign } from "@/components/ui/signs";
import { Table, Td, Th, Tr } from "@/components/ui/table";
import { WaitingDots } from "@/components/ui/waiting";
import { SYMBOL } from "@/lib/intake/fields";
import type { RowSummary } from "@/lib/schemas/delivery";

type RowTableProps = Readonly<{
  rows: readonly RowSummary[];
  total: number | null;
  inHand: number | null;
  onTake: (row: number) => void;
  more: boolean;
  onNearEnd: () => void;
}>;

const ROW_PX = 34;
const ROW_TOUCH_PX = 56;
const COLUMNS = 9;

/** Rows of the delivery, refused first: a virtual table that stands as an ordinary one for those who hear it. */
export function RowTable({ rows, total, inHand, onTake, more, onNearEnd }: RowTableProps) {
  const scroller = useRef<HTMLDivElement>(null);
  const narrow = useMedia("(width < 820px)");
  const virtual = useVirtualizer({
    count: rows.length + (more ? 1 : 0),
    getScrollElement: () => scroller.current,
    estimateSize: () => (narrow ? ROW_TOUCH_PX : ROW_PX),
    initialRect: { width: 1000, height: 700 },
    overscan: 12,
  });
  const items = virtual.getVirtualItems();
  const last = items.at(-1)?.index ?? 0;
  useEffect(() => {
    if (more && last >= rows.length - 20) onNearEnd();
  }, [more, last, rows.length, onNearEnd]);
  const at = rows.findIndex((row) => row.number === inHand);
  useEffect(() => {
    if (at >= 0) virtual.scrollToIndex(at, { align: "auto" });
  }, [at, virtual]);
  const before = items[0]?.start ?? 0;
  const after = virtual.getTotalSize() - (items.at(-1)?.end ?? 0);
  return (
    <div ref={scroller} className="relative min-h-0 flex-1 overflow-auto [scrollbar-gutter:stable]">
      <Table
        role="grid"
        aria-label="Rows of the delivery"
        aria-rowcount={total === null ? -1 : total + 1}
        className="[&_td]:px-[7px] [&_th]:h-9 [&_th]:bg-panel [&_th]:px-[7px]"
      >
        <thead className="sticky top-0 z-10">
          <tr aria-rowindex={1}>
            <Th className="w-9">
              <span className="sr-only">Verdict</span>
            </Th>
            <Th numeric className="max-sm:hidden">
              Row
            </Th>
            <Th>Designation</Th>
            <Th className="max-md:hidden">Worst figure</Th>
            <Th numeric className="max-md:hidden">
              Tabulated
            </Th>
            <Th numeric className="max-md:hidden">
              Computed
            </Th>
            <Th numeric unit="%" className="max-md:hidden">
              Off
            </Th>
            <Th className="w-[100px] max-md:hidden">Gauge</Th>
            <Th>Reason</Th>
          </tr>
        </thead>
        <tbody>
          {before > 0 && <Spacer height={before} />}
          {items.map((item) => {
            const row = rows[item.index];
            if (row === undefined) return <WaitingRow key="waiting" />;
            return (
              <Tr
                key={row.number}
                inHand={row.number === inHand}
                aria-rowindex={item.index + 2}
                aria-selected={row.number === inHand}
                tabIndex={row.number === inHand || (at < 0 && item.index === 0) ? 0 : -1}
                data-row={row.number}
                onClick={() => onTake(row.number)}
                className="hover:[&>td]:bg-wash focus-visible:-outline-offset-2"
              >
                <RowCells row={row} narrow={narrow} />
              </Tr>
            );
          })}
          {after > 0 && <Spacer height={after} />}
        </tbody>
      </Table>
    </div>
  );
}

const SIGN = { accepted: AcceptedSign, queried: QueriedSign, refused: RefusedSign } as const;

function RowCells({ row, narrow }: Readonly<{ row: RowSummary; narrow: boolean }>) {
  const Sign = SIGN[row.verdict];
  const first = row.reasons[0];
  // A row that is queried for one figure shows that figure; a refused cell shows its name alone.
  const worst =
    row.worst !== null && (first === undefined || first.field === row.worst.key || row.worst.within === false)
      ? row.worst
      : null;
  const decided = row.decision !== null;
  return (
    <>
      <Td className={cx("h-[34px] text-center", row.verdict === "refused" && !decided && "gutter-lost")}>
        <span className={cx("inline-flex", row.verdict === "refused" && "bg-sheet")}>
          <Sign />
        </span>
      </Td>
      <Td numeric className="text-ink-2 max-sm:hidden">
        {row.number}
      </Td>
      <Td className={cx("font-num", row.verdict === "accepted" ? "font-[480]" : "font-[600]")}>
        {row.designation === "" ? <span className="font-ui text-ink-3">none</span> : row.designation}
      </Td>
      {!narrow && (
        <>
          <Td>
            {worst !== null ? (
              <>
                <FieldSymbol field={worst.key} /> <FileUnit unit={worst.unit} className="text-note" />
              </>
            ) : (
              <span className="text-ink-2">{first?.field === undefined ? "" : SYMBOL[first.field]}</span>
            )}
          </Td>
          <Td numeric>
            {worst && <FileFigure value={worst.tabulated} unit={worst.unit} like={worst.written} />}
          </Td>
          <Td numeric>
            {worst && <FileFigure value={worst.computed} unit={worst.unit} like={worst.written} />}
          </Td>
          <Td numeric>
            {worst && (
              <OffFigure off={worst.off} className={worst.within ? "" : "font-[640] text-oxide-ink"} />
            )}
          </Td>
          <Td className="py-0 leading-none">
            {worst && <Gauge off={worst.off} allowed={worst.allowed} within={worst.within} />}
          </Td>
        </>
      )}
      <Td
        className={cx(
          "min-w-[180px] text-[13px] leading-4 whitespace-normal!",
          row.verdict === "accepted" && "text-ink-3",
        )}
      >
        <span className="line-clamp-2">
          <Reason row={row} />
        </span>
      </Td>
    </>
  );
}

const DECIDED = { computed: "computed kept", tabulated: "tabulated kept", "leave-out": "left out" } as const;

function Reason({ row }: Readonly<{ row: RowSummary }>) {
  const first = row.reasons[0];
  const more = row.reasons.length - 1;
  return (
    <>
      {row.decision !== null && <b className="font-[560]">{DECIDED[row.decision]}. </b>}
      {first !== undefined ? (
        <Detail text={first.detail} />
      ) : (
        <Detail text={conventionOf(row) ?? row.standing} />
      )}
      {more > 0 && <span className="text-ink-3"> and {more} more</span>}
    </>
  );
}

const conventionOf = (row: RowSummary): string | null =>
  row.worst?.convention !== null && row.worst?.convention !== undefined
    ? `${row.worst.convention.replaceAll("-", " ")}: convention of this reading`
    : null;

const Spacer = ({ height }: { height: number }) => (
  <tr aria-hidden>
    <td colSpan={COLUMNS} style={{ height }} className="p-0" />
  </tr>
);

const WaitingRow = () => (
  <tr>
    <Td colSpan={COLUMNS} className="h-8">
      <WaitingDots className="pl-12" />
      <span className="sr-only">more rows are on their way</span>
    </Td>
  </tr>
);
