"use client";
import { Fragment, type ReactNode } from "react";
import { useDisplay } from "@/components/display/display-provider";
import { cx } from "@/components/ui/cx";
import type { UnitName } from "@/lib/units/conversion";
import { displayRule, propertyRule } from "@/lib/units/display-units";
import type { Dimension } from "@/lib/units/conversion";
import { setNumber, setStored, type SetNumber } from "@/lib/units/format";
import { symbolOf } from "@/lib/units/notation";
import type { PropertyKey } from "@/lib/units/property-units";
import { unitPieces } from "@/lib/units/unit-text";

/** A set number: the thousands gap is padding and the true minus is drawn, so that a copied figure pastes as a number. */
export const SetFigure = ({ number, className }: { number: SetNumber; className?: string }) => (
  <span className={cx("figure", className)}>
    {number.negative && <span className="minus">-</span>}
    {number.groups.map((group, i) =>
      i === 0 ? <Fragment key={i}>{group}</Fragment> : <i key={i}>{group}</i>,
    )}
    {number.fraction && number.mark + number.fraction}
  </span>
);

type ByProperty = Readonly<{ property: PropertyKey }>;
type ByDimension = Readonly<{ dimension: Dimension }>;
type Which = ByProperty | ByDimension;

const useRule = (which: Which) => {
  const { settings } = useDisplay();
  return "property" in which
    ? propertyRule(which.property, settings.system)
    : displayRule(which.dimension, settings.system);
};

type QuantityProps = Which &
  Readonly<{
    /** In the stored unit; null where it was not computed or not asked. */
    value: number | null | undefined;
    /** Decimals of the column it stands in. */
    decimals?: number;
    /** What stands for a missing value; an empty cell by default, since 0 and "not asked" differ. */
    absent?: ReactNode;
    className?: string;
  }>;

/** A stored figure in the person's units, without the unit: that stands in the heading. */
export function Quantity({ value, decimals, absent = "", className, ...which }: QuantityProps) {
  const { settings } = useDisplay();
  const rule = useRule(which);
  if (value === null || value === undefined) return <>{absent}</>;
  return (
    <SetFigure
      number={setStored(value, rule, settings.decimal, decimals)}
      {...(className && { className })}
    />
  );
}

type CountProps = Readonly<{ value: number; decimals?: number; className?: string }>;

/** A number without a unit: counts, per cent, ratios. */
export function Count({ value, decimals = 0, className }: CountProps) {
  const { settings } = useDisplay();
  return (
    <SetFigure number={setNumber(value, decimals, settings.decimal)} {...(className && { className })} />
  );
}

/** A unit with its powers raised. */
export const UnitText = ({ unit, className }: { unit: UnitName; className?: string }) => (
  <span className={cx("text-ink-3", className)}>
    {unitPieces(unit).map((piece, i) =>
      piece.raised ? <sup key={i}>{piece.text}</sup> : <Fragment key={i}>{piece.text}</Fragment>,
    )}
  </span>
);

/** The unit a property or a dimension is shown in for this person. */
export function UnitOf({ className, ...which }: Which & Readonly<{ className?: string }>) {
  const rule = useRule(which);
  return <UnitText unit={rule.unit} {...(className && { className })} />;
}

/** Combining macron: the UI face sets it beside the letter, so the bar is drawn. */
const MACRON = "\u0304";

/** The symbol of a property in the firm's notation: italic letter, lowered index. */
export function SymbolOf({ property, className }: ByProperty & Readonly<{ className?: string }>) {
  const { settings } = useDisplay();
  const { letter, index } = symbolOf(property, settings.notation);
  return (
    <span className={cx("whitespace-nowrap", className)}>
      <span className="font-[480] italic">
        {letter.endsWith(MACRON) ? (
          <span className="inline-block border-t border-current leading-none">{letter.slice(0, -1)}</span>
        ) : (
          letter
        )}
      </span>
      {index && <sub>{index}</sub>}
    </span>
  );
}
