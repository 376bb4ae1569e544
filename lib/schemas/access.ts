import { z } from "zod";

export const ROLES = ["designer", "engineer", "librarian", "admin"] as const;
export const Role = z.enum(ROLES);
export type Role = z.infer<typeof Role>;

/** In rising order: each right holds the ones before it. */
export const RIGHTS = ["read", "draft", "release"] as const;
export const Right = z.enum(RIGHTS);
export type Right = z.infer<typeof Right>;

/** Who acts: a membership with what it may do now. `all` is a grant for the whole Rack. */
export const Actor = z.strictObject({
  userId: z.string(),
  membershipId: z.string(),
  organisationId: z.string(),
  name: z.string(),
  role: Role,
  rights: z.record(z.string(), Right),
  via: z.enum(["session", "token", "command"]),
});
export type Actor = z.infer<typeof Actor>;
