"use client";
import { Checkbox } from "@/components/ui/choice";
import { Td } from "@/components/ui/table";

type TickCellProps = Readonly<{ label: string; checked: boolean; onChange: (on: boolean) => void }>;

/** A box at the end of a row that a checker ticks. */
export const TickCell = ({ label, checked, onChange }: TickCellProps) => (
  <Td className="w-9 pr-3 text-right">
    <Checkbox
      label={<span className="sr-only">{label}</span>}
      checked={checked}
      onChange={onChange}
      className="gap-0"
    />
  </Td>
);
