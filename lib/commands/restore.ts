import {
  closeSync,
  copyFileSync,
  existsSync,
  fsyncSync,
  mkdirSync,
  openSync,
  renameSync,
  rmSync,
} from "node:fs";
import { dirname, resolve } from "node:path";
import { createClient } from "@libsql/client";
import { CommandRefusal, guarded } from "./command";
import { configuredFile, stampOf, verifyFile } from "./database-file";

/** Folds the write-ahead log in and lets it go, which only works when nobody else has the file open. */
const requireAlone = async (path: string): Promise<void> => {
  const client = createClient({ url: `file:${path}`, concurrency: 1 });
  try {
    const mode = (await client.execute("PRAGMA journal_mode = DELETE")).rows[0]?.[0];
    if (mode === "delete") return;
  } catch (error) {
    // A damaged file is what a restore is for: it is moved aside as it is.
    if (/not a database|malformed/i.test(String(error))) return;
    if (!/locked|busy/i.test(String(error))) throw error;
  } finally {
    client.close();
  }
  throw new CommandRefusal(`${path} is in use: end the server first.`);
};

const settle = (path: string): void => {
  const handle = openSync(path, "r+");
  fsyncSync(handle);
  closeSync(handle);
};

/** Puts a backup in the place of the database. It is verified first, and what stood there is kept beside it. */
const restore = async (): Promise<void> => {
  const given = process.argv[2];
  if (given === undefined) throw new CommandRefusal("Use: npm run restore -- path/to/backup.db");
  const source = resolve(given);
  const target = configuredFile();
  await verifyFile(source);
  mkdirSync(dirname(target), { recursive: true });
  const fresh = `${target}.restore-${process.pid}`;
  try {
    copyFileSync(source, fresh);
    await verifyFile(fresh);
    settle(fresh);
    if (existsSync(target)) {
      await requireAlone(target);
      const kept = `${target}.before-${stampOf(new Date())}`;
      renameSync(target, kept);
      for (const ending of ["-wal", "-shm"])
        if (existsSync(target + ending)) renameSync(target + ending, kept + ending);
      process.stdout.write(`What stood there is kept as ${kept}.\n`);
    }
    renameSync(fresh, target);
  } finally {
    for (const ending of ["", "-wal", "-shm"]) rmSync(fresh + ending, { force: true });
  }
  process.stdout.write(`${target} is now as ${source} was.\n`);
};

void guarded(restore);
