import { Fragment } from "react";
import { cx } from "@/components/ui/cx";
import { FILE_UNITS, type FileUnitKey } from "@/lib/intake/file-units";
import type { FieldKey } from "@/lib/intake/fields";
import { SYMBOL, isCompared } from "@/lib/intake/fields";

const RAISED: Record<string, string> = { "²": "2", "³": "3", "⁴": "4", "⁶": "6", "⁹": "9" };

/** A sentence whose raised digits are set raised: neither font has them all. */
export const Detail = ({ text }: { text: string }) => (
  <>
    {text.split(/([²³⁴⁶⁹])/).map((piece, i) => {
      const raised = RAISED[piece];
      return raised === undefined ? <Fragment key={i}>{piece}</Fragment> : <sup key={i}>{raised}</sup>;
    })}
  </>
);

/** The unit of a column as the table writes it. */
export const FileUnit = ({ unit, className }: { unit: FileUnitKey; className?: string }) => (
  <span className={cx("text-ink-3", className)}>
    <Detail text={FILE_UNITS[unit].label} />
  </span>
);

/** Symbol of a figure or dimension: italic letter, lowered index. */
export const FieldSymbol = ({ field }: { field: FieldKey }) => {
  const text = SYMBOL[field];
  if (!isCompared(field) && field !== "Cw" && !/^t[wf]$/.test(text))
    return <span className="italic">{text}</span>;
  return (
    <span className="whitespace-nowrap">
      <span className="font-[480] italic">{text.slice(0, 1)}</span>
      {text.length > 1 && <sub>{text.slice(1)}</sub>}
    </span>
  );
};
