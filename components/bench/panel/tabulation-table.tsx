"use client";
import { useBench, useBenchActions, useItems } from "@/components/bench/bench-store";
import { useDisplay } from "@/components/display/display-provider";
import { SetFigure, UnitText } from "@/components/display/quantity";
import { Balloon } from "@/components/ui/marks";
import { Td, Th, Tr } from "@/components/ui/table";
import type { Tabulation } from "@/lib/drawing/tabulation";
import { fromStored, type UnitName } from "@/lib/units/conversion";
import { setNumber } from "@/lib/units/format";

/** Units and decimals of the columns: one more decimal in I than elsewhere, so that a checker's sums close. */
const COLUMNS = {
  metric: { length: ["mm", 1], area: ["mm2", 0], moment: ["E3 mm3", 1], inertia: ["E6 mm4", 2] },
  inch: { length: ["in", 3], area: ["in2", 3], moment: ["in3", 2], inertia: ["in4", 1] },
} as const satisfies Record<string, Record<string, readonly [UnitName, number]>>;

/** Parallel axes line by line, with the sums and how ȳ and I follow from them. */
export const TabulationTable = ({ table }: { table: Tabulation }) => {
  const { settings } = useDisplay();
  const items = useItems();
  const picked = useBench((s) => s.picked);
  const act = useBenchActions();
  const columns = COLUMNS[settings.system];
  const away = table.axis === "x" ? "y" : "x";
  const small = Math.max(...table.rows.map((r) => Math.abs(r.own)), 1) < 1e5;
  const set = (stored: number, column: keyof typeof columns) => {
    const [unit, decimals] = columns[column];
    const more = column === "inertia" && small ? 4 : 0;
    return <SetFigure number={setNumber(fromStored(stored, unit), decimals + more, settings.decimal)} />;
  };
  const unit = (column: keyof typeof columns) => <UnitText unit={columns[column][0]} />;
  const bar = <span className="inline-block border-t border-current leading-none">{away}</span>;
  return (
    <>
      <table className="w-full border-collapse text-table">
        <thead>
          <tr className="[&>th]:h-[34px] [&>th]:px-1.5 [&>th:first-child]:pl-3 [&>th:last-child]:pr-3">
            <Th className="w-9">
              <span className="sr-only">Item</span>
            </Th>
            {table.transformed && <Th numeric>n</Th>}
            <Th numeric unit={unit("area")}>
              <i>{table.transformed ? "n·A" : "A"}</i>
            </Th>
            <Th numeric unit={unit("length")}>
              <i>{away}</i>
            </Th>
            <Th numeric unit={unit("moment")}>
              <i>A·{away}</i>
            </Th>
            <Th numeric unit={unit("length")}>
              <i>
                d = {away} − {bar}
              </i>
            </Th>
            <Th numeric unit={unit("inertia")}>
              <i>A·d</i>
              <sup>2</sup>
            </Th>
            <Th numeric unit={unit("inertia")}>
              <i>I</i>
              <sub>0</sub>
            </Th>
          </tr>
        </thead>
        <tbody className="[&_td]:px-1.5 [&_td:first-child]:pl-3 [&_td:last-child]:pr-3">
          {table.rows.map((row) => {
            const inHand = picked.includes(row.part);
            return (
              <Tr
                key={row.part}
                inHand={inHand}
                onPointerEnter={() => act.hover(row.part)}
                onPointerLeave={() => act.hover(null)}
              >
                <Td>
                  <Balloon inHand={inHand}>{items.get(row.part)}</Balloon>
                </Td>
                {table.transformed && (
                  <Td numeric>
                    <SetFigure number={setNumber(row.n, 3, settings.decimal)} />
                  </Td>
                )}
                <Td numeric>{set(row.area, "area")}</Td>
                <Td numeric>{set(row.at, "length")}</Td>
                <Td numeric>{set(row.firstMoment, "moment")}</Td>
                <Td numeric>{set(row.distance, "length")}</Td>
                <Td numeric>{set(row.areaDistance2, "inertia")}</Td>
                <Td numeric>{set(row.own, "inertia")}</Td>
              </Tr>
            );
          })}
          <Tr total>
            <Td>Σ</Td>
            {table.transformed && <Td />}
            <Td numeric>{set(table.sum.area, "area")}</Td>
            <Td />
            <Td numeric>{set(table.sum.firstMoment, "moment")}</Td>
            <Td />
            <Td numeric>{set(table.sum.areaDistance2, "inertia")}</Td>
            <Td numeric>{set(table.sum.own, "inertia")}</Td>
          </Tr>
        </tbody>
      </table>
      <dl className="grid grid-cols-[auto_1fr_auto] gap-x-3.5 px-3 py-1 text-table leading-[21px]">
        <dt>
          <i>{bar}</i> = Σ<i>A·{away}</i> / Σ<i>A</i>
        </dt>
        <dd className="text-ink-2">
          {set(table.sum.firstMoment, "moment")} <UnitText unit={columns.moment[0]} /> /{" "}
          {set(table.sum.area, "area")}
        </dd>
        <dd className="text-right">
          = <b>{set(table.centroid, "length")}</b> {unit("length")}
        </dd>
        <dt>
          <i>I</i>
          <sub>{table.axis}</sub> = Σ<i>A·d</i>
          <sup>2</sup> + Σ<i>I</i>
          <sub>0</sub>
        </dt>
        <dd className="text-ink-2">
          {set(table.sum.areaDistance2, "inertia")} + {set(table.sum.own, "inertia")}
        </dd>
        <dd className="text-right">
          = <b>{set(table.inertia, "inertia")}</b> {unit("inertia")}
        </dd>
      </dl>
    </>
  );
};
