import { sql } from "drizzle-orm";
import { check, index, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { bays } from "./bays";
import { key, moment } from "./columns";
import { memberships } from "./memberships";
import { organisations } from "./organisations";
import { users } from "./users";

/** A right granted beside the role: in one bay, or (bay null) in all of them. */
export const rights = sqliteTable(
  "rights",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    membershipId: text("membership_id")
      .notNull()
      .references(() => memberships.id),
    bayId: text("bay_id").references(() => bays.id),
    right: text("right", { enum: ["read", "draft", "release"] }).notNull(),
    /** The grant ends then; null: it stays. */
    until: moment("until"),
    grantedBy: text("granted_by")
      .notNull()
      .references(() => users.id),
    createdAt: moment("created_at").notNull(),
  },
  (t) => [
    // One grant for a member and bay, and one for the whole Rack (nulls would not collide in a single index).
    uniqueIndex("rights_one").on(t.membershipId, t.bayId),
    uniqueIndex("rights_all")
      .on(t.membershipId)
      .where(sql`bay_id is null`),
    index("rights_of_organisation").on(t.organisationId),
    check("right_kind", sql`${t.right} in ('read', 'draft', 'release')`),
  ],
);
