import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync, statSync } from "node:fs";
import { join } from "node:path";
import { ROOT } from "./run.mjs";

/** What the build is made of; tests and documents are not. */
const SOURCES = [
  "app",
  "components",
  "db",
  "lib",
  "migrations",
  "public",
  "fixtures/demo",
  "instrumentation.ts",
  "instrumentation-client.ts",
  "proxy.ts",
  "next.config.ts",
  "postcss.config.mjs",
  "tsconfig.json",
  "package-lock.json",
];

/** Runs before the program and goes into no build. */
const NOT_BUILT = "lib/start";

const filesUnder = (path) => {
  if (path === NOT_BUILT) return [];
  const whole = join(ROOT, path);
  if (!existsSync(whole)) return [];
  if (!statSync(whole).isDirectory()) return [path];
  return readdirSync(whole)
    .sort()
    .flatMap((name) => filesUnder(`${path}/${name}`));
};

/**
 * Hash of names and contents of the sources, of the Node version and of `salt`.
 * @param {string} [salt] anything else the result depends on
 * @returns {string} 64 hex digits
 */
export const contentHash = (salt = "") => {
  const hash = createHash("sha256").update(`${process.version}\n${salt}\n`);
  for (const file of SOURCES.flatMap(filesUnder)) {
    const bytes = readFileSync(join(ROOT, file));
    hash.update(`${file}\n${bytes.length}\n`).update(bytes);
  }
  return hash.digest("hex");
};
