"use client";
import { useDisplay } from "@/components/display/display-provider";
import { SetFigure } from "@/components/display/quantity";
import { FILE_UNITS, type FileUnitKey } from "@/lib/intake/file-units";
import { setNumber } from "@/lib/units/format";

const decimalsOf = (written: string): number =>
  Math.min(6, /[.,](\d+)\D*$/.exec(written.trim())?.[1]?.length ?? 0);

type FileFigureProps = Readonly<{ value: number; unit: FileUnitKey; like: string; className?: string }>;

/** A stored value in the unit and with the decimals the table writes it, so that the two can be read against each other. */
export function FileFigure({ value, unit, like, className }: FileFigureProps) {
  const { settings } = useDisplay();
  const shown = value / FILE_UNITS[unit].factor;
  return (
    <SetFigure
      number={setNumber(shown, decimalsOf(like), settings.decimal)}
      {...(className && { className })}
    />
  );
}

/** A deviation in per cent with its sign: two decimals near the gauge, fewer far from it. */
export function OffFigure({ off, className }: Readonly<{ off: number; className?: string }>) {
  const { settings } = useDisplay();
  const percent = off * 100;
  const size = Math.abs(percent);
  const number = setNumber(percent, size < 1 ? 2 : size < 100 ? 1 : 0, settings.decimal);
  return (
    <span className={className}>
      {!number.negative && Number(number.groups.join("") + number.fraction) !== 0 && "+"}
      <SetFigure number={number} />
    </span>
  );
}
