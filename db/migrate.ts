import "server-only";
import { join } from "node:path";
import type { Client } from "@libsql/client";
import { drizzle } from "drizzle-orm/libsql";
import { migrate } from "drizzle-orm/libsql/migrator";
import { readMigrationFiles } from "drizzle-orm/migrator";

/** Folder of the migrations: beside the program, whatever the bundler did with this file. */
export const MIGRATIONS = join(process.cwd(), "migrations");

/** A database written by a newer program: its newest migration is not among ours. */
export class NewerDatabase extends Error {}

const TABLE = "SELECT count(*) FROM sqlite_master WHERE type = 'table' AND name = '__drizzle_migrations'";

export const refuseNewer = async (client: Client, folder = MIGRATIONS): Promise<void> => {
  const known = new Set(readMigrationFiles({ migrationsFolder: folder }).map((m) => m.hash));
  if (Number((await client.execute(TABLE)).rows[0]?.[0]) === 0) return;
  const applied = await client.execute("SELECT hash FROM __drizzle_migrations ORDER BY created_at");
  const unknown = applied.rows.map((row) => String(row[0])).filter((hash) => !known.has(hash));
  if (unknown.length > 0) {
    throw new NewerDatabase(
      "the database was written by a newer version of the program; start that version, or restore a backup",
    );
  }
};

/** Brings the database to the newest schema; refuses one that is newer than the program. */
export const migrateDatabase = async (client: Client, folder = MIGRATIONS): Promise<void> => {
  await refuseNewer(client, folder);
  await migrate(drizzle(client), { migrationsFolder: folder });
};

/** Reads the whole file once for damage; throws with SQLite's first finding. */
export const checkIntegrity = async (client: Client): Promise<void> => {
  if (client.protocol !== "file") return;
  const found = String((await client.execute("PRAGMA quick_check(1)")).rows[0]?.[0]);
  if (found !== "ok") throw new Error(`the database is damaged (${found}); restore a backup`);
};
