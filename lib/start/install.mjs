import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { Refusal, ROOT, run, say } from "./run.mjs";

const packagesOf = (file) => {
  if (!existsSync(file)) return undefined;
  return JSON.parse(readFileSync(file, "utf8")).packages;
};

/** Whether every package of the lock is installed in its version; optional ones (other platforms) may be absent. */
export const isInstalled = (root = ROOT) => {
  const wanted = packagesOf(join(root, "package-lock.json"));
  // npm writes this file last, so that a broken install leaves none.
  const present = packagesOf(join(root, "node_modules", ".package-lock.json"));
  if (wanted === undefined || present === undefined) return false;
  return Object.entries(wanted).every(([path, entry]) => {
    if (path === "") return true;
    const found = present[path];
    return found === undefined
      ? Boolean(entry.optional || entry.peer || entry.extraneous)
      : found.version === entry.version;
  });
};

/** Installs exactly the lock file, development packages included, unless that is already so. */
export const install = async () => {
  if (isInstalled()) return;
  say("Installing packages (a minute or two) …");
  const npm = process.env.npm_execpath;
  const [command, args] = npm?.endsWith(".js") ? [process.execPath, [npm]] : ["npm", []];
  const { NODE_ENV: _dropped, ...env } = process.env;
  const done = await run(command, [...args, "ci", "--include=dev", "--no-audit", "--no-fund"], { env });
  if (done.code !== 0) throw new Refusal(`The packages could not be installed.\n${done.output.trim()}`);
};
