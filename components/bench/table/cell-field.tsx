"use client";
import { QuantityField } from "@/components/display/quantity-field";
import type { Dimension } from "@/lib/units/conversion";

type CellFieldProps = Readonly<{
  label: string;
  value: number;
  onCommit: (value: number) => void;
  dimension?: Dimension;
  refuse?: (value: number) => string | null;
  readOnly?: boolean;
}>;

const IN_CELL = [
  "relative w-full flex-nowrap",
  "[&>span:not([role])]:pointer-events-none [&>span:not([role])]:absolute [&>span:not([role])]:top-full [&>span:not([role])]:right-0 [&>span:not([role])]:z-20 [&>span:not([role])]:bg-sheet [&>span:not([role])]:px-1",
  "[&>span[role]]:absolute [&>span[role]]:top-full [&>span[role]]:left-0 [&>span[role]]:z-20 [&>span[role]]:w-64 [&>span[role]]:border-2 [&>span[role]]:border-ink [&>span[role]]:bg-sheet [&>span[role]]:p-2",
].join(" ");

/** A number in a cell: the result of a sum and the reason of a refusal lie under it, so that the row keeps its height. */
export const CellField = ({
  label,
  value,
  onCommit,
  dimension = "length",
  refuse,
  readOnly,
}: CellFieldProps) => (
  <QuantityField
    bare
    aria-label={label}
    dimension={dimension}
    value={value}
    onCommit={(next) => next !== null && onCommit(next)}
    {...(refuse && { refuse })}
    {...(readOnly && { readOnly })}
    className={IN_CELL}
    inputClassName="w-full"
  />
);
