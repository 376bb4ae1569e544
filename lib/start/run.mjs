import { spawn } from "node:child_process";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

/** The folder that holds package.json. */
export const ROOT = join(dirname(fileURLToPath(import.meta.url)), "..", "..");

/** A failure whose message alone is the line the person reads. */
export class Refusal extends Error {}

/** Words for a person who waits; on stderr, so that stdout holds the address and nothing else. */
export const say = (line) => process.stderr.write(`${line}\n`);

/**
 * Runs a step to its end with its output held back.
 * @returns {Promise<{ code: number, output: string }>} the exit code and what the step wrote
 */
export const run = (command, args, { env = process.env, cwd = ROOT } = {}) =>
  new Promise((resolve, reject) => {
    const child = spawn(command, args, { cwd, env, stdio: ["ignore", "pipe", "pipe"] });
    const chunks = [];
    child.stdout.on("data", (chunk) => chunks.push(chunk));
    child.stderr.on("data", (chunk) => chunks.push(chunk));
    const pass = (signal) => child.kill(signal);
    process.once("SIGINT", pass).once("SIGTERM", pass);
    child.once("error", reject);
    child.once("close", (code, signal) => {
      process.off("SIGINT", pass).off("SIGTERM", pass);
      if (signal !== null) process.exit(1);
      resolve({ code: code ?? 1, output: Buffer.concat(chunks).toString("utf8") });
    });
  });

/** Runs the program's entry point: prints a refusal as one line, anything else whole, and exits with 1. */
export const main = (work) =>
  work().catch((error) => {
    say(error instanceof Refusal ? error.message : (error?.stack ?? String(error)));
    process.exit(1);
  });
