import { parseAsInteger, parseAsStringLiteral } from "nuqs/server";
import { CAUSE_CODES, VERDICTS } from "@/lib/intake/row-reason";

/** The state of a delivery's sheet in its address. */
export const deliveryParsers = {
  step: parseAsStringLiteral(["columns", "inspect"] as const),
  verdict: parseAsStringLiteral(VERDICTS),
  cause: parseAsStringLiteral(CAUSE_CODES),
  open: parseAsStringLiteral(["yes"] as const),
  /** The row in hand. */
  row: parseAsInteger,
};
