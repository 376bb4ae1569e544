import { z } from "zod";
import { Id, plainText, Version } from "./common";

/** S · Z · r with axes x–y, or Wel · Wpl · i with axes y–z and u–v. */
export const Notation = z.enum(["S-Z-r", "Wel-Wpl-i"]);
export type Notation = z.infer<typeof Notation>;
export const DisplayUnits = z.enum(["mm", "in"]);
export type DisplayUnits = z.infer<typeof DisplayUnits>;
export const Decimal = z.enum(["point", "comma"]);
export type Decimal = z.infer<typeof Decimal>;

export const Organisation = z.strictObject({
  id: Id,
  name: z.string(),
  address: z.string(),
  notation: Notation,
  units: DisplayUnits,
  decimal: Decimal,
  fourEyes: z.boolean(),
  version: Version,
});
export type Organisation = z.infer<typeof Organisation>;

export const UpdateOrganisationInput = z.strictObject({
  name: plainText(120, 1).optional(),
  address: plainText(500).optional(),
  notation: Notation.optional(),
  units: DisplayUnits.optional(),
  decimal: Decimal.optional(),
  fourEyes: z.boolean().optional(),
});
export type UpdateOrganisationInput = z.infer<typeof UpdateOrganisationInput>;
