import "server-only";
import { accessSync, constants, existsSync, statSync } from "node:fs";
import { filePathOf, type Db } from "./client";
import { checkIntegrity, migrateDatabase, NewerDatabase } from "./migrate";

/** Files up to this size are read through for damage at every start; larger ones when a backup is made. */
const CHECKED_AT_START_BYTES = 256 * 1024 * 1024;

/** Looks for damage, refuses a newer database, brings the schema up to date. */
export const prepareDatabase = async (db: Db): Promise<void> => {
  const path = filePathOf(db.url);
  if (path !== null && existsSync(path) && statSync(path).size <= CHECKED_AT_START_BYTES) {
    await checkIntegrity(db.writer);
  }
  await migrateDatabase(db.writer);
};

/** Why a database cannot be used, in one line that says what to do. */
export const databaseRefusal = (error: unknown, url: string): string => {
  const path = filePathOf(url);
  const name = path ?? "the database server";
  const text = error instanceof Error ? `${error.message} ${String(error.cause ?? "")}` : String(error);
  if (error instanceof NewerDatabase) return `${name}: ${error.message}.`;
  if (/readonly|read-only|EACCES|EROFS|EPERM/i.test(text) || isReadOnly(path)) {
    return `${name} cannot be written to: give the program's user the right to write it and its folder.`;
  }
  if (/not a database|malformed|damaged|corrupt/i.test(text)) {
    return `${name} is damaged or is no database of this program: restore a backup with npm run restore.`;
  }
  if (/unable to open/i.test(text))
    return `${name} cannot be opened: check that its folder exists and may be written to.`;
  if (/locked|busy/i.test(text)) return `${name} is in use by another server: end that one first.`;
  return `${name} cannot be used: ${text.split("\n")[0]}`;
};

const isReadOnly = (path: string | null): boolean => {
  if (path === null || !existsSync(path)) return false;
  try {
    accessSync(path, constants.W_OK);
    return false;
  } catch {
    return true;
  }
};
