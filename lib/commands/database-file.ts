import "server-only";
import { existsSync } from "node:fs";
import { createClient } from "@libsql/client";
import { filePathOf } from "@/db/client";
import { NewerDatabase, refuseNewer } from "@/db/migrate";
import { environment } from "@/lib/env";
import { CommandRefusal } from "./command";

/** The file of the configured database; a database server makes its own backups. */
export const configuredFile = (): string => {
  const path = filePathOf(environment().DATABASE_URL);
  if (path === null)
    throw new CommandRefusal("DATABASE_URL names a database server: use that server's own backups.");
  return path;
};

/** Reads a whole database file for damage, and refuses one that is not ours or newer than the program. */
export const verifyFile = async (path: string): Promise<void> => {
  // A missing file would silently become a new, empty database.
  if (!existsSync(path)) throw new CommandRefusal(`There is no file ${path}.`);
  const client = createClient({ url: `file:${path}`, concurrency: 1 });
  try {
    const found = String((await client.execute("PRAGMA integrity_check(1)")).rows[0]?.[0]);
    if (found !== "ok") throw new CommandRefusal(`${path} is damaged (${found}).`);
    await client.execute("SELECT count(*) FROM organisations");
    await refuseNewer(client);
  } catch (error) {
    if (error instanceof CommandRefusal) throw error;
    if (error instanceof NewerDatabase) throw new CommandRefusal(`${path}: ${error.message}.`);
    throw new CommandRefusal(`${path} is damaged or is no database of this program.`);
  } finally {
    client.close();
  }
};

/** A moment as part of a file name: 2026-03-12T14-22-10Z. */
export const stampOf = (now: Date): string => now.toISOString().replace(/\.\d+/, "").replaceAll(":", "-");
