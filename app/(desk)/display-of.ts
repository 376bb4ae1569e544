import type { Me } from "@/lib/schemas/session";
import type { DisplaySettings } from "@/lib/units/settings";

/** How figures are shown to a person: their own settings, else the firm's. */
export const displayOf = ({ effective }: Pick<Me, "effective">): DisplaySettings => ({
  system: effective.units === "mm" ? "metric" : "inch",
  decimal: effective.decimal === "point" ? "." : ",",
  notation: effective.notation,
});
