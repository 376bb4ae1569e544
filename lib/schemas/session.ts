import { z } from "zod";
import { Right, Role } from "./access";
import { Id, Moment, Person, plainText, Version } from "./common";
import { Decimal, DisplayUnits, Notation } from "./organisation";

export const SignInInput = z.strictObject({
  email: z.string().trim().min(3).max(254),
  password: z.string().min(1).max(1024),
  /** Which organisation, for somebody who belongs to several; without it the one used last. */
  organisation: Id.optional(),
});
export type SignInInput = z.infer<typeof SignInInput>;

export const Theme = z.enum(["day", "night", "system"]);

/** Who is signed in, what they may do, and how they like to see it. */
export const Me = z.strictObject({
  user: Person.extend({ email: z.string() }),
  organisation: z.strictObject({ id: Id, name: z.string(), address: z.string(), fourEyes: z.boolean() }),
  organisations: z.array(z.strictObject({ id: Id, name: z.string() })),
  role: Role,
  /** Right in every bay, as it counts now. */
  rights: z.record(z.string(), Right),
  settings: z.strictObject({
    units: DisplayUnits.nullable(),
    decimal: Decimal.nullable(),
    theme: Theme,
  }),
  /** What counts: one's own setting, else the firm's. */
  effective: z.strictObject({ units: DisplayUnits, decimal: Decimal, notation: Notation }),
  version: Version,
});
export type Me = z.infer<typeof Me>;

export const UpdateMeInput = z.strictObject({
  name: plainText(120, 1).optional(),
  units: DisplayUnits.nullable().optional(),
  decimal: Decimal.nullable().optional(),
  theme: Theme.optional(),
});
export type UpdateMeInput = z.infer<typeof UpdateMeInput>;

export const MIN_PASSWORD = 15;
export const NewPassword = z
  .string()
  .min(MIN_PASSWORD, `at least ${MIN_PASSWORD} characters`)
  .max(1024, "at most 1024 characters");

export const ChangePasswordInput = z.strictObject({
  current: z.string().min(1).max(1024),
  next: NewPassword,
});
export type ChangePasswordInput = z.infer<typeof ChangePasswordInput>;

export const SessionItem = z.strictObject({
  id: Id,
  createdAt: Moment,
  lastSeenAt: Moment,
  userAgent: z.string(),
  current: z.boolean(),
});
export type SessionItem = z.infer<typeof SessionItem>;

export const SessionList = z.strictObject({ items: z.array(SessionItem) });
export type SessionList = z.infer<typeof SessionList>;
