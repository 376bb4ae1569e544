import "server-only";
import { sql, type SQL, type Column } from "drizzle-orm";

/** Text anywhere in a column, with % and _ taken as they are. */
export const contains = (column: Column | SQL, text: string): SQL =>
  sql`${column} like ${`%${text.replace(/[\\%_]/g, "\\$&")}%`} escape '\\'`;
