import { spawn, spawnSync } from "node:child_process";
import { copyFileSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { createServer } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { createClient } from "@libsql/client";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { signedIn } from "@/tests/helpers/api-client";
import { freePort, startServer } from "@/tests/helpers/server";
import { ROOT } from "@/tests/helpers/source-files";
import { copyTemplate } from "@/tests/helpers/template";

let folder: string;

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "flitchbook-process-"));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

type Ended = Readonly<{ code: number | null; stdout: string; stderr: string }>;

/** Runs `npm start` to its end. */
const npmStart = (env: Record<string, string>): Ended => {
  const done = spawnSync("npm", ["start", "--silent"], {
    cwd: ROOT,
    env: { ...process.env, NODE_ENV: "production", ...env },
    encoding: "utf8",
    timeout: 60_000,
  });
  return { code: done.status, stdout: done.stdout, stderr: done.stderr };
};

const expectOneLine = ({ code, stdout, stderr }: Ended, words: RegExp) => {
  expect(stderr.trim().split("\n"), stderr).toHaveLength(1);
  expect(stderr).toMatch(words);
  expect(stdout.trim()).toBe("");
  expect(code).toBe(1);
};

const port = async () => String(await freePort());
const url = (file: string) => `file:${join(folder, file)}`;

describe("a start that cannot be ends with one line and exit code 1", () => {
  test("on a taken port", async () => {
    const holder = createServer().listen(0, "127.0.0.1");
    const taken = await new Promise<number>((resolve) =>
      holder.once("listening", () => {
        const address = holder.address();
        resolve(typeof address === "object" && address ? address.port : 0);
      }),
    );
    try {
      expectOneLine(npmStart({ PORT: String(taken), DATABASE_URL: url("port.db") }), /taken/);
    } finally {
      holder.close();
    }
  });

  test("with a port that is none", () => {
    expectOneLine(npmStart({ PORT: "80x", DATABASE_URL: url("port.db") }), /PORT is "80x"/);
  });

  test("on a file that is no database", async () => {
    writeFileSync(join(folder, "noise.db"), "This is no database, whatever its name says. ".repeat(300));
    expectOneLine(npmStart({ PORT: await port(), DATABASE_URL: url("noise.db") }), /damaged/);
  });

  test("on a database with torn pages", async () => {
    const file = join(folder, "torn.db");
    copyTemplate(file);
    const { open } = await import("node:fs/promises");
    const handle = await open(file, "r+");
    await handle.write(Buffer.alloc(3 * 4096, 0xa5), 0, 3 * 4096, 4 * 4096);
    await handle.close();
    expectOneLine(npmStart({ PORT: await port(), DATABASE_URL: `file:${file}` }), /damaged/);
  });

  test("on a database of a newer version", async () => {
    const file = join(folder, "newer.db");
    copyTemplate(file);
    const client = createClient({ url: `file:${file}` });
    await client.execute(
      "INSERT INTO __drizzle_migrations (hash, created_at) VALUES ('of the future', 9e12)",
    );
    client.close();
    expectOneLine(npmStart({ PORT: await port(), DATABASE_URL: `file:${file}` }), /newer version/);
  });

  test("in a folder that cannot be written", async () => {
    const ended = npmStart({ PORT: await port(), DATABASE_URL: "file:/sys/kernel/flitchbook.db" });
    expectOneLine(ended, /cannot be (opened|written)/);
  });
});

describe("npm start", () => {
  const started = async (env: Record<string, string> = {}) => {
    const address = await port();
    const child = spawn("npm", ["start", "--silent"], {
      cwd: ROOT,
      env: {
        ...process.env,
        NODE_ENV: "production",
        PORT: address,
        DATABASE_URL: url(`start-${address}.db`),
        ...env,
      },
      stdio: ["ignore", "pipe", "pipe"],
      detached: true,
    });
    let stdout = "";
    child.stdout.on("data", (chunk: Buffer) => (stdout += chunk.toString()));
    const ended = new Promise<number | null>((resolve) => child.once("close", resolve));
    while (!stdout.includes("\n")) await new Promise((resolve) => setTimeout(resolve, 50));
    return { child, address, ended, stdout: () => stdout };
  };
  /** Processes of the group that still live. */
  const living = (group: number): string => {
    const { stdout } = spawnSync("ps", ["-o", "pid=,args=", "-g", String(group)], { encoding: "utf8" });
    return stdout.trim();
  };

  test.each(["SIGTERM", "SIGINT"] as const)(
    "seeds an empty database, prints the address and nothing else, and leaves no process behind on %s",
    async (signal) => {
      const server = await started();
      const origin = `http://127.0.0.1:${server.address}`;
      expect(server.stdout()).toBe(`Flitchbook is at ${origin}\n`);
      const admin = await signedIn(origin, "admin");
      const { body } = await admin.get<{ items: unknown[] }>("/bays");
      expect(body.items).toHaveLength(8);
      const asked = Date.now();
      process.kill(-server.child.pid!, signal);
      await server.ended;
      expect(Date.now() - asked).toBeLessThan(8_000);
      expect(living(server.child.pid!)).toBe("");
      expect(server.stdout().trim().split("\n")).toHaveLength(1);
    },
  );

  test("with PUBLIC_ORIGIN seeds nothing, and the admin command makes the first account", async () => {
    const file = join(folder, "real.db");
    const env = { DATABASE_URL: `file:${file}`, PUBLIC_ORIGIN: "https://book.example.com" };
    const args = [
      "run",
      "--silent",
      "admin",
      "--",
      "create",
      "--organisation",
      "Firm",
      "--email",
      "First@firm.example",
    ];
    const made = spawnSync("npm", args, { cwd: ROOT, env: { ...process.env, ...env }, encoding: "utf8" });
    expect(made.stderr).toBe("");
    expect(made.stdout).toMatch(/first@firm\.example with the password [0-9a-f-]{20,}/);
    const client = createClient({ url: `file:${file}` });
    const rows = await client.execute("SELECT email FROM users");
    expect(rows.rows.map((row) => row.email)).toEqual(["first@firm.example"]);
    const again = spawnSync("npm", args, { cwd: ROOT, env: { ...process.env, ...env }, encoding: "utf8" });
    expect(again.status).toBe(1);
    expect(again.stderr.trim()).toBe("There is an account for first@firm.example already.");
    expect((await client.execute("SELECT count(*) AS n FROM organisations")).rows[0]?.n).toBe(1);
    client.close();
  });
});

test("a stopped server leaves the database whole in its one file", async () => {
  const file = join(folder, "whole.db");
  copyTemplate(file);
  const server = await startServer({ database: file });
  await signedIn(server.url, "admin");
  expect(await server.stop()).toBe(0);
  const alone = join(folder, "alone.db");
  copyFileSync(file, alone);
  const client = createClient({ url: `file:${alone}` });
  expect((await client.execute("PRAGMA integrity_check")).rows[0]?.[0]).toBe("ok");
  const deeds = await client.execute("SELECT count(*) AS n FROM log WHERE verb = 'session.open'");
  expect(deeds.rows[0]?.n).toBe(1);
  client.close();
});
