import { spawnSync } from "node:child_process";
import { copyFileSync, existsSync, mkdirSync, readdirSync, renameSync, rmSync } from "node:fs";
import { join } from "node:path";
import { contentHash } from "@/lib/start/content-hash.mjs";
import { ROOT } from "@/tests/helpers/source-files";

const FOLDER = join(ROOT, "data", "test-templates");

/** A migrated database file holding the demo organisation; made once for each state of the sources. */
export const demoTemplate = (): string => {
  const file = join(FOLDER, `${contentHash("template").slice(0, 16)}.db`);
  if (existsSync(file)) return file;
  mkdirSync(FOLDER, { recursive: true });
  for (const old of readdirSync(FOLDER)) rmSync(join(FOLDER, old), { force: true });
  const fresh = `${file}.${process.pid}`;
  const script = join(ROOT, "lib", "commands", "prepare-database.ts");
  const done = spawnSync(process.execPath, ["--conditions=react-server", "--import", "tsx", script], {
    cwd: ROOT,
    env: { ...process.env, NODE_ENV: "production", DATABASE_URL: `file:${fresh}`, PUBLIC_ORIGIN: undefined },
    encoding: "utf8",
  });
  if (done.status !== 0)
    throw new Error(`The demo database could not be made.\n${done.stdout}${done.stderr}`);
  if (existsSync(`${fresh}-wal`)) throw new Error("prepare-database left a write-ahead log behind");
  renameSync(fresh, file);
  return file;
};

/** Copies the template to `file`; the copy is the test's own. */
export const copyTemplate = (file: string): void => copyFileSync(demoTemplate(), file);
