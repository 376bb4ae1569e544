"use client";
import { useState } from "react";
import { fieldClass } from "@/components/ui/field";
import { cx } from "@/components/ui/cx";
import { FIELDS } from "@/lib/intake/fields";
import type { Reading } from "@/lib/intake/schema";
import type { RowDetail } from "@/lib/schemas/delivery";

type MendFieldsProps = Readonly<{
  row: RowDetail;
  reading: Reading | null;
  /** Columns the reasons name, shown first. */
  marks: readonly (number | undefined)[];
  onCell: (cell: Readonly<{ column: number; value: string }> | null) => void;
}>;

/** The cells of the row as they were written; the first one changed is the one that is mended. */
export function MendFields({ row, reading, marks, onCell }: MendFieldsProps) {
  const [changed, setChanged] = useState<Readonly<{ column: number; value: string }> | null>(null);
  const columns = reading?.columns ?? [];
  const named = columns
    .map((column, i) => ({ column, number: i + 1 }))
    .filter(({ column }) => column.field !== "note");
  const ordered = [
    ...named.filter((n) => marks.includes(n.number)),
    ...named.filter((n) => !marks.includes(n.number)),
  ];
  const change = (column: number, value: string) => {
    const before = row.cells[column - 1] ?? "";
    const next = value === before ? null : { column, value };
    setChanged(next);
    onCell(next);
  };
  return (
    <div className="grid max-h-60 grid-cols-2 gap-x-3 gap-y-2 overflow-y-auto px-3 pb-2 max-sm:grid-cols-1">
      {ordered.map(({ column, number }) => {
        const before = row.cells[number - 1] ?? "";
        const own = changed?.column === number;
        return (
          <label key={number} className="block min-w-0">
            <span className="mb-0.5 block truncate text-micro text-ink-2">
              {column.heading}, {FIELDS[column.field].label}
            </span>
            <input
              value={own ? changed.value : before}
              readOnly={changed !== null && !own}
              onChange={(event) => change(number, event.target.value)}
              className={cx(
                fieldClass({ set: own, refused: marks.includes(number), locked: changed !== null && !own }),
                "h-7 w-full font-num max-md:h-11",
              )}
            />
            {own && <span className="text-micro text-ink-3">was {before === "" ? "blank" : before}</span>}
          </label>
        );
      })}
    </div>
  );
}
