"use client";
import { OffFigure } from "@/components/goods-in/file-figure";
import { Detail, FileUnit } from "@/components/goods-in/words";
import { Button } from "@/components/ui/button";
import { cx } from "@/components/ui/cx";
import { Select } from "@/components/ui/select";
import { Arrow, QueriedSign } from "@/components/ui/signs";
import { Td, Tr } from "@/components/ui/table";
import { FIELD_KEYS, FIELDS, type FieldKey } from "@/lib/intake/fields";
import { FILE_UNITS, unitsOfKind, type FileUnitKey } from "@/lib/intake/file-units";
import type { RecognisedColumn } from "@/lib/schemas/delivery";

type ColumnRowProps = Readonly<{
  index: number;
  column: RecognisedColumn;
  disabled: boolean;
  onChange: (next: { field?: FieldKey; unit?: FileUnitKey | null }) => void;
}>;

const FIELD_CHOICES = FIELD_KEYS.map((key) => ({
  value: key,
  label: key === "note" ? "kept as a note" : FIELDS[key].label,
}));

/** Powers of ten a unit brings, as the table's factor; other units show their factor as it is. */
const factorText = (unit: FileUnitKey): string => {
  const { factor } = FILE_UNITS[unit];
  if (factor === 1) return "";
  const power = Math.log10(factor);
  return Number.isInteger(power) && power >= 3 ? `x10^${power}` : `x${Number(factor.toPrecision(5))}`;
};

/** One column of the file: what it is, where it goes, in which unit, and how it agrees. */
export function ColumnRow({ index, column, disabled, onChange }: ColumnRowProps) {
  const { field, unit, suggestion, question } = column;
  const kind = FIELDS[field].kind;
  const note = field === "note";
  const numeric = kind !== null;
  const queried = suggestion !== null || (question !== null && (note || unit === null));
  const power = unit === null ? "" : factorText(unit);
  const changeField = (next: FieldKey) => {
    const nextKind = FIELDS[next].kind;
    const keeps = unit !== null && nextKind !== null && FILE_UNITS[unit].kind === nextKind;
    onChange({
      field: next,
      unit: nextKind === null ? null : keeps ? unit : (unitsOfKind(nextKind)[0] ?? null),
    });
  };
  return (
    <Tr
      className={cx(
        queried && "[&>td]:bg-chalk-wash [&>td:first-child]:shadow-[inset_3px_0_0_var(--fb-chalk)]",
        note && "text-ink-3",
      )}
    >
      <Td numeric className="h-9 text-ink-2">
        {index + 1}
      </Td>
      <Td className={cx("max-w-[150px] truncate font-num", !note && "font-[600]")} title={column.heading}>
        {column.heading}
      </Td>
      <Td className="max-sm:hidden">
        <span className={cx("grid grid-cols-2 gap-3 font-num text-ink-2", numeric && "text-right")}>
          {column.samples.map((sample, i) => (
            <span key={i} className="max-w-[110px] truncate" title={sample}>
              {sample}
            </span>
          ))}
        </span>
      </Td>
      <Td>
        <span className="flex items-center gap-1">
          <Arrow to="right" className={note ? "opacity-40" : ""} />
          <Select
            aria-label={`Column ${index + 1}, ${column.heading}: goes to`}
            value={field}
            choices={FIELD_CHOICES}
            disabled={disabled}
            onChange={changeField}
            className="w-[180px] max-sm:w-[132px]"
          />
        </span>
      </Td>
      <Td>
        {kind !== null && (
          <Select
            aria-label={`Column ${index + 1}, ${column.heading}: unit`}
            value={unit ?? ""}
            choices={[
              ...(unit === null ? [{ value: "" as const, label: "choose", disabled: true }] : []),
              ...unitsOfKind(kind).map((key) => ({ value: key, label: FILE_UNITS[key].label })),
            ]}
            disabled={disabled}
            onChange={(next) => next !== "" && onChange({ unit: next })}
            className="w-[84px]"
          />
        )}
      </Td>
      <Td numeric className="text-ink-2 max-xl:hidden">
        {power.includes("^") ? (
          <>
            {power.split("^")[0]}
            <sup>{power.split("^")[1]}</sup>
          </>
        ) : (
          power
        )}
      </Td>
      <Td numeric className="max-sm:hidden">
        {column.worst === null ? (
          <span aria-label="not compared">·</span>
        ) : (
          <OffFigure
            off={column.worst}
            className={column.worst > 0.01 + 1e-9 && queried ? "font-[640] text-oxide-ink" : ""}
          />
        )}
      </Td>
      <Td className="text-[13px] max-md:hidden">
        <Remark column={column} disabled={disabled} onChange={onChange} />
      </Td>
    </Tr>
  );
}

function Remark({ column, disabled, onChange }: Pick<ColumnRowProps, "column" | "disabled" | "onChange">) {
  const { suggestion, question, evidence, field } = column;
  if (suggestion !== null)
    return (
      <span className="flex items-center gap-2">
        <QueriedSign label={null} />
        <b>
          Agrees in <FileUnit unit={suggestion} className="text-ink!" />
        </b>
        <Button
          size="small"
          className="bg-field"
          disabled={disabled}
          onClick={() => onChange({ unit: suggestion })}
        >
          Read so
        </Button>
      </span>
    );
  if (question !== null && (field === "note" || column.unit === null)) return <Detail text={question} />;
  const uncompared = field === "J" || field === "Cw";
  const axis = /the file's .*$/.exec(evidence)?.[0];
  return (
    <span className="text-ink-2" title={evidence}>
      {uncompared ? (
        "kept, not compared: printed values are formulas"
      ) : (
        <Detail text={axis ?? (/no unit written/.test(evidence) ? evidence : "")} />
      )}
    </span>
  );
}
