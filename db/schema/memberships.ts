import { sql } from "drizzle-orm";
import { check, index, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { key, moment, version } from "./columns";
import { organisations } from "./organisations";
import { users } from "./users";

export const memberships = sqliteTable(
  "memberships",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    userId: text("user_id")
      .notNull()
      .references(() => users.id),
    role: text("role", { enum: ["designer", "engineer", "librarian", "admin"] }).notNull(),
    suspendedAt: moment("suspended_at"),
    lastSeenAt: moment("last_seen_at"),
    version: version(),
    createdAt: moment("created_at").notNull(),
  },
  (t) => [
    // One membership for a person in an organisation; also the lookup of every request.
    uniqueIndex("memberships_person").on(t.userId, t.organisationId),
    // The list of members, and the count of admins inside a change of role.
    index("memberships_of_organisation").on(t.organisationId, t.role),
    check("membership_role", sql`${t.role} in ('designer', 'engineer', 'librarian', 'admin')`),
  ],
);
