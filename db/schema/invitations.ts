import { sql } from "drizzle-orm";
import { check, index, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { key, moment } from "./columns";
import { organisations } from "./organisations";
import { users } from "./users";

export const invitations = sqliteTable(
  "invitations",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    email: text("email").notNull(),
    name: text("name").notNull(),
    role: text("role", { enum: ["designer", "engineer", "librarian", "admin"] }).notNull(),
    /** SHA-256 of the secret in the link, hex. */
    hash: text("hash").notNull(),
    expiresAt: moment("expires_at").notNull(),
    invitedBy: text("invited_by")
      .notNull()
      .references(() => users.id),
    acceptedAt: moment("accepted_at"),
    revokedAt: moment("revoked_at"),
    createdAt: moment("created_at").notNull(),
  },
  (t) => [
    uniqueIndex("invitations_hash").on(t.hash),
    // One open invitation for an address in an organisation.
    uniqueIndex("invitations_open")
      .on(t.organisationId, t.email)
      .where(sql`accepted_at is null and revoked_at is null`),
    index("invitations_of_organisation").on(t.organisationId, t.createdAt),
    check("invitation_role", sql`${t.role} in ('designer', 'engineer', 'librarian', 'admin')`),
    check("invitation_email", sql`${t.email} = lower(${t.email})`),
  ],
);
