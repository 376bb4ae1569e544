import "server-only";
import { database, type Db } from "@/db/client";
import { NewerDatabase } from "@/db/migrate";
import { AppError } from "@/lib/errors";
import { environment } from "@/lib/env";

/** A refusal of a command: its message is the one line that is printed. */
export class CommandRefusal extends Error {}

const codeOf = (error: unknown): string => {
  if (typeof error !== "object" || error === null) return "";
  const own = "code" in error ? String(error.code) : "";
  return own.startsWith("SQLITE") || !("cause" in error) ? own : codeOf(error.cause) || own;
};

/** One clear line for whatever ended a command; an unexpected error keeps its stack. */
export const lineOf = (error: unknown, databaseUrl: string): string => {
  const said = error instanceof Error ? error.message : String(error);
  if (error instanceof CommandRefusal) return said;
  if (error instanceof NewerDatabase)
    return `The database ${databaseUrl} was written by a newer version of the program. Start that version, or restore a backup.`;
  if (error instanceof AppError) return error.user;
  const code = codeOf(error);
  if (/NOTADB|CORRUPT/.test(code) || /malformed|not a database|is damaged/.test(said))
    return `The database ${databaseUrl} is damaged. Restore a backup, or move the file away to begin anew.`;
  if (
    /READONLY|CANTOPEN|EACCES|EROFS|EPERM|ENOTDIR|ENOENT/.test(code) ||
    /readonly|unable to open/i.test(said)
  )
    return `The database ${databaseUrl} cannot be opened for writing. Give this user write access to the file and its folder.`;
  if (/^Environment: /.test(said)) return said;
  return error instanceof Error ? (error.stack ?? said) : said;
};

/** Runs a command with the configured database, closes it, and sets the exit code: 0, or 1 with one line on stderr. */
export const runCommand = async (work: (db: Db) => Promise<void>): Promise<void> => {
  let url = "";
  try {
    url = environment().DATABASE_URL;
    const db = await database();
    try {
      await work(db);
    } finally {
      await db.close();
    }
  } catch (error) {
    process.stderr.write(`${lineOf(error, url)}\n`);
    process.exitCode = 1;
  }
};
