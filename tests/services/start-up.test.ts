import { copyFileSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { createClient } from "@libsql/client";
import { afterAll, beforeAll, expect, test } from "vitest";
import { assertPragmas, openDb, setPragmas } from "@/db/client";
import { NewerDatabase } from "@/db/migrate";
import { databaseRefusal, prepareDatabase } from "@/db/prepare";
import { testDatabase } from "@/tests/helpers/test-organisation";

let folder: string;
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "flitchbook-test-"));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const refusalOf = async (url: string): Promise<string> => {
  try {
    const db = await openDb(url);
    try {
      await prepareDatabase(db);
    } finally {
      await db.close();
    }
    return "";
  } catch (error) {
    return databaseRefusal(error, url);
  }
};

const oneLine = (text: string) => expect(text).toMatch(/^[^\n]+[.]$/);

test("a missing file becomes a migrated database, and a second start changes nothing", async () => {
  const url = `file:${join(folder, "deep", "new.db")}`;
  expect(await refusalOf(url)).toBe("");
  expect(await refusalOf(url)).toBe("");
});

test("a database of a newer program is refused in one line and left as it is", async () => {
  const { db, close } = await testDatabase();
  await db.write((tx) =>
    tx.raw.execute(
      "INSERT INTO __drizzle_migrations (hash, created_at) VALUES ('of the future', 9999999999999)",
    ),
  );
  await expect(prepareDatabase(db)).rejects.toThrow(NewerDatabase);
  const line = databaseRefusal(await prepareDatabase(db).catch((error: unknown) => error), db.url);
  oneLine(line);
  expect(line).toContain("newer version of the program");
  await close();
});

test("a file that is no database is refused in one line that says what to do", async () => {
  const path = join(folder, "noise.db");
  writeFileSync(path, "This is a letter, not a database. ".repeat(500));
  const line = await refusalOf(`file:${path}`);
  oneLine(line);
  expect(line).toMatch(/damaged or is no database.*restore a backup/);
});

test("a damaged page is found at start", async () => {
  const { path, close, db } = await testDatabase();
  await db.writer.execute("PRAGMA wal_checkpoint(TRUNCATE)");
  const broken = join(folder, "broken.db");
  copyFileSync(path, broken);
  const { openSync, writeSync, closeSync } = await import("node:fs");
  const file = openSync(broken, "r+");
  for (let page = 3; page < 40; page += 1) writeSync(file, Buffer.alloc(4096, 0x5a), 0, 4096, page * 4096);
  closeSync(file);
  const line = await refusalOf(`file:${broken}`);
  oneLine(line);
  expect(line).toMatch(/damaged/);
  await close();
});

test("pragmas are asserted, not hoped for: a connection without them ends the start", async () => {
  const { path, close } = await testDatabase();
  const client = createClient({ url: `file:${path}`, concurrency: 1 });
  await client.execute("PRAGMA foreign_keys = OFF");
  await expect(assertPragmas(client)).rejects.toThrow(/foreign_keys is 0, expected 1/);
  await setPragmas(client);
  await expect(assertPragmas(client)).resolves.toBeUndefined();
  client.close();
  await close();
});

test("the reader cannot write, whatever is asked of it", async () => {
  const { db, close } = await testDatabase();
  await expect(db.reader.execute("DELETE FROM bays")).rejects.toThrow(/readonly|read-only|query_only/i);
  await close();
});

test.each([
  ["attempt to write a readonly database", /cannot be written to/],
  ["EACCES: permission denied", /cannot be written to/],
  ["unable to open database file", /cannot be opened/],
  ["database is locked", /in use by another server/],
])("%s becomes a sentence for whoever starts the server", (message, sentence) => {
  const line = databaseRefusal(new Error(message), "file:/srv/book.db");
  oneLine(line);
  expect(line).toMatch(sentence);
});
