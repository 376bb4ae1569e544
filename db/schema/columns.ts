import { integer, text } from "drizzle-orm/sqlite-core";

/** A moment in UTC, milliseconds since 1970. */
export const moment = (name: string) => integer(name, { mode: "number" });

/** Primary key: a UUIDv7 as text, so that ids sort by their time of birth. */
export const key = () => text("id").primaryKey();

/** Raised by one at every change; what ETag and If-Match speak of. */
export const version = () => integer("version").notNull().default(1);
