"use client";
import type { ReactNode } from "react";
import { useDisplay } from "@/components/display/display-provider";
import { UnitText } from "@/components/display/quantity";
import { NumericField } from "@/components/ui/numeric-field";
import { err } from "@/lib/result";
import { fromStored, UNITS, type Dimension } from "@/lib/units/conversion";
import { displayRule, propertyRule } from "@/lib/units/display-units";
import { fieldText } from "@/lib/units/format";
import { parseQuantity } from "@/lib/units/parse-quantity";
import type { PropertyKey } from "@/lib/units/property-units";

type QuantityFieldProps = Readonly<{
  /** What is typed: a property (its unit, its dimension) or a bare dimension. */
  property?: PropertyKey;
  dimension?: Dimension;
  /** In the stored unit; null is empty. */
  value: number | null;
  onCommit: (value: number | null) => void;
  /** A sentence where the value is not allowed, else null: "A plate needs a thickness above 0." */
  refuse?: (value: number) => string | null;
  optional?: boolean;
  placeholder?: string;
  set?: boolean;
  readOnly?: boolean;
  /** Leaves the unit out where it stands in a heading. */
  bare?: boolean;
  unit?: ReactNode;
  id?: string;
  className?: string;
  inputClassName?: string;
  "aria-label"?: string;
  "aria-describedby"?: string | undefined;
}>;

/** Longest decimals kept at rest beyond the display rule, so that a typed 12.125 does not turn into 12.1. */
const EXTRA_DECIMALS = 4;

/** A quantity in the person's units: takes sums, fractions and other units of the same dimension, keeps the stored unit. */
export function QuantityField(props: QuantityFieldProps) {
  const { property, dimension = "length", refuse, bare, unit, ...field } = props;
  const { settings } = useDisplay();
  const rule = property ? propertyRule(property, settings.system) : displayRule(dimension, settings.system);
  return (
    <NumericField
      {...field}
      unit={unit ?? (bare ? undefined : <UnitText unit={rule.unit} />)}
      format={(stored) =>
        fieldText(fromStored(stored, rule.unit), rule.decimals + EXTRA_DECIMALS, settings.decimal)
      }
      parse={(text) => {
        const read = parseQuantity(text, {
          dimension: UNITS[rule.unit].dimension,
          unit: rule.unit,
          decimal: settings.decimal,
        });
        const reason = read.ok ? refuse?.(read.value) : null;
        return reason ? err({ code: "field.refused", detail: reason }) : read;
      }}
    />
  );
}
