import { createClient } from "@libsql/client";
import { expect, test } from "vitest";
import { WriteQueue } from "@/db/write-queue";
import { bays } from "@/db/schema/bays";
import { newId } from "@/lib/services/new-id";
import { testOrganisation } from "@/tests/helpers/test-organisation";

const insertBay = (org: Awaited<ReturnType<typeof testOrganisation>>, name: string) =>
  org.db.write((tx) =>
    tx
      .insert(bays)
      .values({ id: newId(), organisationId: org.organisationId, name, ordinal: 9, createdAt: Date.now() }),
  );

const bayCount = async (org: Awaited<ReturnType<typeof testOrganisation>>) =>
  Number((await org.db.reader.execute("SELECT count(*) FROM bays")).rows[0]?.[0]);

test("sixteen writers at once all get their turn, in order, and nothing is lost", async () => {
  const org = await testOrganisation({ closesItself: true });
  const before = await bayCount(org);
  await Promise.all(Array.from({ length: 16 }, (_, i) => insertBay(org, `Bay ${i}`)));
  expect(await bayCount(org)).toBe(before + 16);
});

test("locked from outside: reads go on, the write waits, and lands once the lock is gone", async () => {
  const org = await testOrganisation({ closesItself: true });
  const outside = createClient({ url: `file:${org.path}`, concurrency: 1 });
  const lock = await outside.transaction("write");
  const before = await bayCount(org);
  const writing = insertBay(org, "Patient bay");
  await new Promise((resolve) => setTimeout(resolve, 600));
  expect(await bayCount(org)).toBe(before);
  await lock.rollback();
  outside.close();
  await writing;
  expect(await bayCount(org)).toBe(before + 1);
});

test("locked for longer than the limit: 503 that says nothing was saved, and later writes work", async () => {
  const org = await testOrganisation({ limitMs: 400, closesItself: true });
  const outside = createClient({ url: `file:${org.path}`, concurrency: 1 });
  const lock = await outside.transaction("write");
  const before = await bayCount(org);
  const results = await Promise.allSettled(["a", "b", "c"].map((name) => insertBay(org, name)));
  for (const result of results) {
    expect(result).toMatchObject({ status: "rejected", reason: { code: "busy", retryAfterSeconds: 5 } });
  }
  await lock.rollback();
  outside.close();
  await insertBay(org, "after");
  expect(await bayCount(org)).toBe(before + 1);
  const pragma = await org.db.writer.execute("PRAGMA foreign_keys");
  expect(pragma.rows[0]?.[0]).toBe(1);
});

test("a BUSY throws the connection away before the next try", async () => {
  const calls: string[] = [];
  const queue = new WriteQueue({
    reconnect: async () => {
      calls.push("reconnect");
    },
    sleep: async () => undefined,
  });
  let tries = 0;
  const answer = await queue.run("", async () => {
    calls.push("try");
    tries += 1;
    if (tries < 3) throw Object.assign(new Error("database is locked"), { code: "SQLITE_BUSY" });
    return "done";
  });
  expect(answer).toBe("done");
  expect(calls).toEqual(["try", "reconnect", "try", "reconnect", "try"]);
});

test("who waits is told what holds the slot", async () => {
  const queue = new WriteQueue({ reconnect: async () => undefined, limitMs: 60 });
  const long = queue.run(
    "D-0147 is being put away",
    () => new Promise((resolve) => setTimeout(resolve, 200)),
  );
  await expect(queue.run("", async () => 1)).rejects.toThrow(/D-0147 is being put away/);
  await long;
  expect(await queue.run("", async () => 2)).toBe(2);
});

test("an error of the work itself is passed on and leaves nothing behind", async () => {
  const org = await testOrganisation({ closesItself: true });
  const before = await bayCount(org);
  const failing = org.db.write(async (tx) => {
    await tx
      .insert(bays)
      .values({ id: newId(), organisationId: org.organisationId, name: "half", ordinal: 3, createdAt: 1 });
    throw new Error("stop");
  });
  await expect(failing).rejects.toThrow("stop");
  expect(await bayCount(org)).toBe(before);
});
