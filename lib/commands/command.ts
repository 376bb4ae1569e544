import "server-only";
import { closeDatabase, database, type Db } from "@/db/client";
import { databaseRefusal, prepareDatabase } from "@/db/prepare";
import { environment } from "@/lib/env";
import { AppError } from "@/lib/errors";

/** A refusal of a command: its message is the one line that is printed. */
export class CommandRefusal extends Error {}

const lineOf = (error: unknown): string => {
  if (error instanceof AppError) return error.user;
  if (!(error instanceof Error)) return String(error);
  return error instanceof CommandRefusal ? error.message : (error.stack ?? error.message);
};

/** Runs to its end, or writes one line on stderr and sets the exit code to 1. */
export const guarded = async (work: () => Promise<void>): Promise<void> => {
  try {
    await work();
  } catch (error) {
    process.stderr.write(`${lineOf(error)}\n`);
    process.exitCode = 1;
  }
};

const databaseUrl = (): string => {
  try {
    return environment().DATABASE_URL;
  } catch (error) {
    throw new CommandRefusal(error instanceof Error ? error.message : String(error));
  }
};

const opened = async (): Promise<Db> => {
  const url = databaseUrl();
  try {
    const db = await database();
    await prepareDatabase(db);
    return db;
  } catch (error) {
    throw new CommandRefusal(databaseRefusal(error, url));
  }
};

/** Runs a command with the configured database, whole, ours and migrated, and closes it. */
export const withDatabase = async (work: (db: Db) => Promise<void>): Promise<void> => {
  const db = await opened();
  try {
    await work(db);
  } finally {
    await closeDatabase();
  }
};
