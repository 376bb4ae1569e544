import { sql } from "drizzle-orm";
import { check, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { key, moment, version } from "./columns";

/** A person. What they may do stands in their memberships; null in a setting means "as the firm has it". */
export const users = sqliteTable(
  "users",
  {
    id: key(),
    /** Lower case; compared as it is. */
    email: text("email").notNull(),
    name: text("name").notNull(),
    /** argon2id, or null for somebody who has not set a password yet: nobody can sign in with null. */
    passwordHash: text("password_hash"),
    units: text("units", { enum: ["mm", "in"] }),
    decimal: text("decimal", { enum: ["point", "comma"] }),
    theme: text("theme", { enum: ["day", "night", "system"] })
      .notNull()
      .default("system"),
    version: version(),
    createdAt: moment("created_at").notNull(),
  },
  (t) => [
    // Sign-in looks a person up by address; one account for each address.
    uniqueIndex("users_email").on(t.email),
    check("user_email_lower", sql`${t.email} = lower(${t.email}) and length(${t.email}) between 3 and 254`),
    check("user_units", sql`${t.units} is null or ${t.units} in ('mm', 'in')`),
    check("user_decimal", sql`${t.decimal} is null or ${t.decimal} in ('point', 'comma')`),
    check("user_theme", sql`${t.theme} in ('day', 'night', 'system')`),
  ],
);
