import { spawn } from "node:child_process";
import { copyFileSync, existsSync, mkdtempSync, readdirSync, rmSync, statSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { createClient } from "@libsql/client";
import { afterAll, beforeAll, expect, test } from "vitest";
import { expectStatus, signedIn } from "@/tests/helpers/api-client";
import { startServer } from "@/tests/helpers/server";
import { ROOT } from "@/tests/helpers/source-files";
import { copyTemplate } from "@/tests/helpers/template";

let folder: string;

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "flitchbook-backup-"));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

type Ended = Readonly<{ status: number | null; stdout: string; stderr: string }>;

const npm = (script: "backup" | "restore", database: string, ...args: string[]): Promise<Ended> =>
  new Promise((resolve) => {
    const child = spawn("npm", ["run", "--silent", script, "--", ...args], {
      cwd: ROOT,
      env: { ...process.env, DATABASE_URL: `file:${database}` },
    });
    let [stdout, stderr] = ["", ""];
    child.stdout.on("data", (chunk: Buffer) => (stdout += chunk.toString()));
    child.stderr.on("data", (chunk: Buffer) => (stderr += chunk.toString()));
    child.once("close", (status) => resolve({ status, stdout, stderr }));
  });

/** Read from a copy: this process must not keep the file itself open. */
const bayNames = async (database: string): Promise<unknown[]> => {
  const copy = `${database}.read-${Math.random()}`;
  copyFileSync(database, copy);
  const client = createClient({ url: `file:${copy}` });
  const { rows } = await client.execute("SELECT name FROM bays ORDER BY ordinal");
  client.close();
  return rows.map((row) => row.name);
};

test("a backup made while the server writes is whole, private, and restores exactly its moment", async () => {
  const database = join(folder, "used.db");
  copyTemplate(database);
  const server = await startServer({ database });
  const admin = await signedIn(server.url, "admin");
  expectStatus(await admin.send("POST", "/bays", { body: { name: "Before" } }), 201);

  let writing = true;
  let written = 0;
  const writer = (async () => {
    for (; writing && written < 400; written += 1)
      await admin.send("POST", "/bays", { body: { name: `While ${written}` } });
  })();
  const copy = join(folder, "copy.db");
  const child = await npm("backup", database, copy);
  writing = false;
  await writer;
  expect(written).toBeGreaterThan(0);
  expect(child.stderr).toBe("");
  expect(child.stdout.trim()).toBe(copy);
  expect(statSync(copy).mode & 0o777).toBe(0o600);
  const saved = await bayNames(copy);
  expect(saved).toContain("Before");

  const inUse = await npm("restore", database, copy);
  expect(inUse.status).toBe(1);
  expect(inUse.stderr.trim()).toBe(`${database} is in use: end the server first.`);

  expectStatus(await admin.send("POST", "/bays", { body: { name: "After" } }), 201);
  expect(await server.stop()).toBe(0);
  expect(await bayNames(database)).toContain("After");
  const restored = await npm("restore", database, copy);
  expect(restored.stderr).toBe("");
  expect(await bayNames(database)).toEqual(saved);
  const kept = readdirSync(folder).filter((name) => name.startsWith("used.db.before-") && name.endsWith("Z"));
  expect(kept).toHaveLength(1);

  const again = await startServer({ database });
  const back = await signedIn(again.url, "admin");
  expectStatus(await back.get("/bays"), 200);
  await again.stop();
});

test("a damaged backup replaces nothing", async () => {
  const database = join(folder, "kept.db");
  copyTemplate(database);
  const size = statSync(database).size;
  const bad = join(folder, "bad.db");
  writeFileSync(bad, "no database".repeat(2000));
  const refused = await npm("restore", database, bad);
  expect(refused.status).toBe(1);
  expect(refused.stderr).toContain("damaged or is no database of this program");
  expect(statSync(database).size).toBe(size);
  const missing = await npm("restore", database, join(folder, "nowhere.db"));
  expect(missing.status).toBe(1);
  expect(existsSync(join(folder, "nowhere.db"))).toBe(false);
});
