"use client";
import { useMemo } from "react";
import { useDisplay } from "@/components/display/display-provider";
import { fromStored } from "@/lib/units/conversion";
import { displayRule } from "@/lib/units/display-units";
import { fieldText } from "@/lib/units/format";
import { parseLength, type LengthOptions } from "@/lib/units/parse-length";

/** Lengths as this person types and reads them on the drawing. */
export const useLengths = () => {
  const { settings } = useDisplay();
  return useMemo(() => {
    const rule = displayRule("length", settings.system);
    const options: LengthOptions = { unit: rule.unit, decimal: settings.decimal };
    return {
      options,
      unitMm: settings.system === "metric" ? 1 : 25.4,
      readLength: (text: string): number | null => {
        const read = parseLength(text, options);
        return read.ok ? read.value.mm : null;
      },
      formatLength: (mm: number): string =>
        fieldText(fromStored(mm, rule.unit), rule.decimals, settings.decimal).replace("-", "\u2212"),
    };
  }, [settings]);
};
