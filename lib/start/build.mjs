import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { contentHash } from "./content-hash.mjs";
import { Refusal, ROOT, run, say } from "./run.mjs";

const STAMP = join(ROOT, ".next", "built-from");

/** Builds the application when its sources differ from those of the last whole build. */
export const build = async () => {
  const hash = contentHash("build");
  if (existsSync(STAMP) && readFileSync(STAMP, "utf8") === hash) return;
  say("Building (about a minute) …");
  // Removed first, so that a build that breaks off leaves no stamp.
  rmSync(STAMP, { force: true });
  const { NODE_ENV: _dropped, ...env } = process.env;
  const next = join(ROOT, "node_modules", "next", "dist", "bin", "next");
  const done = await run(process.execPath, [next, "build"], {
    env: { ...env, NEXT_TELEMETRY_DISABLED: "1" },
  });
  if (done.code !== 0) throw new Refusal(`The application could not be built.\n${done.output.trim()}`);
  mkdirSync(join(ROOT, ".next"), { recursive: true });
  writeFileSync(STAMP, hash);
};
