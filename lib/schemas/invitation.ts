import { z } from "zod";
import { Role } from "./access";
import { Id, Moment, Person, plainText } from "./common";
import { NewPassword } from "./session";

/** An e-mail address as it is stored: trimmed, lower case. */
export const Email = z
  .string()
  .transform((text) => text.trim().toLowerCase())
  .pipe(z.email("must be an e-mail address").max(254));

const secret = z.string().min(20).max(100);

export const CreateInvitationInput = z.strictObject({ email: Email, name: plainText(120, 1), role: Role });
export type CreateInvitationInput = z.infer<typeof CreateInvitationInput>;

export const Invitation = z.strictObject({
  id: Id,
  email: z.string(),
  name: z.string(),
  role: Role,
  invitedBy: Person,
  createdAt: Moment,
  expiresAt: Moment,
  state: z.enum(["open", "expired", "accepted", "revoked"]),
});
export type Invitation = z.infer<typeof Invitation>;
export const InvitationList = z.strictObject({ items: z.array(Invitation) });
export type InvitationList = z.infer<typeof InvitationList>;

/** Looking at an invitation changes nothing: mail scanners open links. */
export const ShowInvitationInput = z.strictObject({ token: secret });
export type ShowInvitationInput = z.infer<typeof ShowInvitationInput>;

export const ShownInvitation = z.strictObject({
  organisation: z.string(),
  email: z.string(),
  name: z.string(),
  role: Role,
  invitedBy: z.string(),
  /** The person has an account already and accepts with its password. */
  known: z.boolean(),
});
export type ShownInvitation = z.infer<typeof ShownInvitation>;

export const AcceptInvitationInput = z.strictObject({
  token: secret,
  name: plainText(120, 1).optional(),
  /** A new password, or for somebody who has an account the one they have. */
  password: z.string().min(1).max(1024),
});
export type AcceptInvitationInput = z.infer<typeof AcceptInvitationInput>;

export const RequestResetInput = z.strictObject({ email: Email });
export type RequestResetInput = z.infer<typeof RequestResetInput>;
export const CompleteResetInput = z.strictObject({ token: secret, password: NewPassword });
export type CompleteResetInput = z.infer<typeof CompleteResetInput>;
