import { z } from "zod";
import { Right, Role } from "./access";
import { Id, Moment, Person, Version } from "./common";

export const Grant = z.strictObject({
  /** Null: the whole Rack. */
  bayId: Id.nullable(),
  right: Right,
  until: Moment.nullable(),
  grantedBy: Person,
  at: Moment,
});
export type Grant = z.infer<typeof Grant>;

export const Member = z.strictObject({
  id: Id,
  userId: Id,
  name: z.string(),
  email: z.string(),
  role: Role,
  suspendedAt: Moment.nullable(),
  lastSeenAt: Moment.nullable(),
  createdAt: Moment,
  openSessions: z.number().int(),
  tokens: z.number().int(),
  /** Grants beside the role; the rest is inherited from it. */
  grants: z.array(Grant),
  version: Version,
});
export type Member = z.infer<typeof Member>;

export const MemberList = z.strictObject({ items: z.array(Member) });
export type MemberList = z.infer<typeof MemberList>;

export const UpdateMemberInput = z.strictObject({
  role: Role.optional(),
  suspended: z.boolean().optional(),
});
export type UpdateMemberInput = z.infer<typeof UpdateMemberInput>;

/** `PUT /rights`: one grant for a member and a bay (null: the whole Rack); right null takes the grant away. */
export const PutRightInput = z.strictObject({
  memberId: Id,
  bayId: Id.nullable(),
  right: Right.nullable(),
  until: z.iso.datetime().nullable().optional(),
});
export type PutRightInput = z.infer<typeof PutRightInput>;

export const RightList = z.strictObject({ items: z.array(Grant.extend({ memberId: Id })) });
export type RightList = z.infer<typeof RightList>;
