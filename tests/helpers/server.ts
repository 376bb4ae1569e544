import { spawn } from "node:child_process";
import { mkdtempSync, rmSync } from "node:fs";
import { createServer } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { ROOT } from "@/tests/helpers/source-files";
import { copyTemplate } from "@/tests/helpers/template";

export type BuiltServer = Readonly<{
  /** Origin, such as http://127.0.0.1:40123 */
  url: string;
  /** The database file, a copy of the demo template unless `database` was given. */
  databaseFile: string;
  pid: number;
  /** What the process wrote so far, stdout and stderr. */
  output: () => string;
  /** Sends the signal and waits for the end; answers the exit code, null when killed. */
  stop: (signal?: NodeJS.Signals) => Promise<number | null>;
}>;

export type ServerOptions = Readonly<{
  env?: Record<string, string>;
  /** An existing database file to serve instead of a fresh copy of the demo. */
  database?: string;
}>;

export const freePort = (): Promise<number> =>
  new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once("error", reject);
    probe.listen(0, "127.0.0.1", () => {
      const address = probe.address();
      probe.close(() =>
        typeof address === "object" && address ? resolve(address.port) : reject(new Error("no port")),
      );
    });
  });

const freshDatabase = () => {
  const folder = mkdtempSync(join(tmpdir(), "flitchbook-test-"));
  const file = join(folder, "flitchbook.db");
  copyTemplate(file);
  return { folder, file };
};

/**
 * Starts the built application on a free loopback port with a database of its own (the demo organisation).
 * Rejects with what the process wrote when it ends before it serves. Call `stop` in `afterAll`.
 */
export const startServer = async ({ env = {}, database }: ServerOptions = {}): Promise<BuiltServer> => {
  const own = database === undefined ? freshDatabase() : undefined;
  const databaseFile = database ?? own!.file;
  const port = await freePort();
  const { PUBLIC_ORIGIN: _demo, NODE_ENV: _mode, ...inherited } = process.env;
  const child = spawn(process.execPath, [join(ROOT, "lib", "start", "serve.mjs")], {
    cwd: ROOT,
    env: {
      ...inherited,
      NODE_ENV: "production",
      PORT: String(port),
      HOST: "127.0.0.1",
      DATABASE_URL: `file:${databaseFile}`,
      ...env,
    },
    stdio: ["ignore", "pipe", "pipe"],
  });
  let written = "";
  const killChild = () => child.kill("SIGKILL");
  process.once("exit", killChild);
  const ended = new Promise<number | null>((resolve) =>
    child.once("close", (code) => {
      process.off("exit", killChild);
      if (own) rmSync(own.folder, { recursive: true, force: true });
      resolve(code);
    }),
  );
  const url = `http://127.0.0.1:${port}`;
  await new Promise<void>((resolve, reject) => {
    const take = (chunk: Buffer) => {
      written += chunk.toString("utf8");
      if (written.includes(`is at ${url}`)) resolve();
    };
    child.stdout.on("data", take);
    child.stderr.on("data", take);
    void ended.then((code) =>
      reject(new Error(`The server ended with ${code} before it served.\n${written}`)),
    );
  });
  return {
    url,
    databaseFile,
    pid: child.pid!,
    output: () => written,
    stop: (signal = "SIGTERM") => {
      child.kill(signal);
      return ended;
    },
  };
};
