import { sql } from "drizzle-orm";
import { check, index, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { bays } from "./bays";
import { key, moment, version } from "./columns";
import { memberships } from "./memberships";
import { organisations } from "./organisations";
import { users } from "./users";

/** A member asks for a right in a bay (null: the whole Rack), with a reason. */
export const rightRequests = sqliteTable(
  "right_requests",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    membershipId: text("membership_id")
      .notNull()
      .references(() => memberships.id),
    bayId: text("bay_id").references(() => bays.id),
    right: text("right", { enum: ["draft", "release"] }).notNull(),
    reason: text("reason").notNull(),
    state: text("state", { enum: ["open", "granted", "refused"] })
      .notNull()
      .default("open"),
    answer: text("answer").notNull().default(""),
    decidedBy: text("decided_by").references(() => users.id),
    decidedAt: moment("decided_at"),
    version: version(),
    createdAt: moment("created_at").notNull(),
  },
  (t) => [
    // The admin's list: open ones first, the newest first.
    index("right_requests_list").on(t.organisationId, t.state, t.createdAt),
    check("right_request_right", sql`${t.right} in ('draft', 'release')`),
    check("right_request_state", sql`${t.state} in ('open', 'granted', 'refused')`),
  ],
);
