import type { OwnFigures } from "@/components/rack/check-figures";
import { percentChange, propertyValue } from "@/components/rack/property-value";
import type { Properties } from "@/lib/schemas/properties";
import { propertyRule } from "@/lib/units/display-units";
import { bareText, setNumber, setStored } from "@/lib/units/format";
import { symbolOf, symbolText } from "@/lib/units/notation";
import type { PropertyKey } from "@/lib/units/property-units";
import type { DisplaySettings } from "@/lib/units/settings";
import { unitText } from "@/lib/units/unit-text";

type CheckNoteInput = Readonly<{
  filed: string;
  remark: string;
  own: OwnFigures;
  computed: Properties;
  settings: DisplaySettings;
}>;

/** What goes with the revision: where the check is filed, the remark, and the checker's own figures with their difference. */
export function checkNote({ filed, remark, own, computed, settings }: CheckNoteInput): string {
  const figures = (Object.entries(own) as [PropertyKey, number][]).map(([key, value]) => {
    const rule = propertyRule(key, settings.system);
    const off = percentChange(propertyValue(computed, key), value);
    const difference = off === null ? "" : ` (${bareText(setNumber(off, 2, settings.decimal))} %)`;
    const symbol = symbolText(symbolOf(key, settings.notation));
    return `${symbol} ${bareText(setStored(value, rule, settings.decimal))} ${unitText(rule.unit)}${difference}`;
  });
  return [
    filed.trim() && `Filed: ${filed.trim()}.`,
    remark.trim(),
    figures.length > 0 && `Own figures: ${figures.join("; ")}.`,
  ]
    .filter(Boolean)
    .join(" ");
}
