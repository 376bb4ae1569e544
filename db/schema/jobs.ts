import { index, integer, real, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { key, moment } from "./columns";
import { organisations } from "./organisations";

/** Background work that survives a restart: whoever holds the lease does it; a lease that ran out is taken over. */
export const jobs = sqliteTable(
  "jobs",
  {
    id: key(),
    organisationId: text("organisation_id")
      .notNull()
      .references(() => organisations.id),
    kind: text("kind").notNull(),
    /** Id of what the work is about, say a delivery. */
    subjectId: text("subject_id").notNull(),
    state: text("state", { enum: ["waiting", "running", "done", "failed", "stopped"] }).notNull(),
    leaseUntil: moment("lease_until"),
    leaseHolder: text("lease_holder"),
    attempts: integer("attempts").notNull().default(0),
    /** 0 to 1. */
    progress: real("progress").notNull().default(0),
    stopAsked: integer("stop_asked", { mode: "boolean" }).notNull().default(false),
    payload: text("payload").notNull().default("{}"),
    failure: text("failure").notNull().default(""),
    createdAt: moment("created_at").notNull(),
    updatedAt: moment("updated_at").notNull(),
  },
  (t) => [
    // What is to be done next.
    index("jobs_next").on(t.state, t.leaseUntil),
    index("jobs_of_subject").on(t.subjectId),
  ],
);
