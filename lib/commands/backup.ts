import { chmodSync, existsSync, mkdirSync, renameSync, rmSync } from "node:fs";
import { dirname, join, resolve } from "node:path";
import { createClient } from "@libsql/client";
import { CommandRefusal, guarded } from "./command";
import { configuredFile, stampOf, verifyFile } from "./database-file";

/** A copy of one exact moment, while the server may be writing; readable by this user only, checked before it gets its name. */
const backup = async (): Promise<void> => {
  const source = configuredFile();
  if (!existsSync(source)) throw new CommandRefusal(`There is no database ${source} yet.`);
  const target = resolve(
    process.argv[2] ?? join(dirname(source), "backups", `flitchbook-${stampOf(new Date())}.db`),
  );
  if (existsSync(target)) throw new CommandRefusal(`${target} exists already; choose another name.`);
  process.umask(0o077);
  mkdirSync(dirname(target), { recursive: true });
  const part = `${target}.part`;
  rmSync(part, { force: true });
  try {
    const client = createClient({ url: `file:${source}`, concurrency: 1 });
    try {
      await client.execute({ sql: "VACUUM INTO ?", args: [part] });
    } finally {
      client.close();
    }
    chmodSync(part, 0o600);
    await verifyFile(part);
    renameSync(part, target);
  } finally {
    for (const ending of ["", "-wal", "-shm"]) rmSync(part + ending, { force: true });
  }
  process.stdout.write(`${target}\n`);
};

void guarded(backup);
