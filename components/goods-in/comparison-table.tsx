import { Gauge } from "@/components/goods-in/gauge";
import { FileFigure, OffFigure } from "@/components/goods-in/file-figure";
import { FieldSymbol, FileUnit } from "@/components/goods-in/words";
import { cx } from "@/components/ui/cx";
import { Table, Td, Th, Tr } from "@/components/ui/table";
import type { RowDetail } from "@/lib/schemas/delivery";

/** Tabulated beside computed, figure by figure, in the file's units; what was not compared stands below and says so. */
export const ComparisonTable = ({ row, gauge = true }: Readonly<{ row: RowDetail; gauge?: boolean }>) => {
  if (row.comparisons.length === 0) return null;
  return (
    <Table
      aria-label={`Figures of ${row.designation === "" ? `row ${row.number}` : row.designation}`}
      className="[&_th]:h-[34px]"
    >
      <thead>
        <tr>
          <Th>
            <span className="sr-only">Figure</span>
          </Th>
          <Th>
            <span className="sr-only">Unit</span>
          </Th>
          <Th numeric>Tabulated</Th>
          <Th numeric>Computed</Th>
          <Th numeric unit="%">
            Off
          </Th>
          {gauge && (
            <Th>
              <span className="sr-only">Gauge</span>
            </Th>
          )}
        </tr>
      </thead>
      <tbody>
        {row.comparisons.map((c) => (
          <Tr key={c.key} className={cx(!c.within && "[&>td]:bg-oxide-wash")}>
            <Td className="pl-3">
              <FieldSymbol field={c.key} />
            </Td>
            <Td>
              <FileUnit unit={c.unit} />
            </Td>
            <Td numeric>
              <FileFigure value={c.tabulated} unit={c.unit} like={c.written} />
            </Td>
            <Td numeric>
              <FileFigure value={c.computed} unit={c.unit} like={c.written} />
            </Td>
            <Td numeric>
              <OffFigure off={c.off} className={c.within ? "" : "font-[640] text-oxide-ink"} />
            </Td>
            {gauge && (
              <Td className="w-[100px] py-0 pr-2 pl-0 leading-none">
                <Gauge off={c.off} allowed={c.allowed} within={c.within} />
              </Td>
            )}
          </Tr>
        ))}
        {row.uncompared.map((u) => (
          <Tr key={u.key} className="text-ink-3">
            <Td className="pl-3">
              <FieldSymbol field={u.key} />
            </Td>
            <Td>
              <FileUnit unit={u.unit} />
            </Td>
            <Td numeric>
              <FileFigure value={u.tabulated} unit={u.unit} like={u.written} />
            </Td>
            <Td colSpan={gauge ? 3 : 2} className="text-right text-note">
              not compared: a formula’s value
            </Td>
          </Tr>
        ))}
      </tbody>
    </Table>
  );
};
