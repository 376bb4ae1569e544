import { afterAll, beforeAll, expect, test } from "vitest";
import * as session from "@/app/api/v1/session/route";
import { hashPassword, verifyPassword } from "@/lib/auth/password";
import { hashSecret } from "@/lib/auth/secret";
import { readSession } from "@/lib/auth/sessions";
import { changePassword } from "@/lib/services/me/change-password";
import { openSession } from "@/lib/services/session/open";
import { updateMember } from "@/lib/services/member/update";
import { newId } from "@/lib/services/new-id";
import { callRoute, serveFrom, stopServing } from "@/tests/helpers/http";
import { expectLogged } from "@/tests/helpers/refuses";
import { addMember, testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";

const PASSWORD = "seven wet spanners on the bench";
let org: TestOrganisation;
let passwordHash: string;

beforeAll(async () => {
  org = await testOrganisation();
  serveFrom(org.db);
  passwordHash = await hashPassword(PASSWORD);
});
afterAll(async () => {
  stopServing();
  await org.close();
});

const person = async () => {
  const actor = await org.db.write((tx) => addMember(tx, org.organisationId, "engineer", passwordHash));
  return { actor, email: `engineer.${actor.userId}@test.example` };
};

let addresses = 0;
const signIn = (
  email: string,
  password = PASSWORD,
  from: Partial<Parameters<typeof openSession>[0]["from"]> = {},
  now = Date.now(),
) =>
  openSession({
    ctx: { db: org.db, now, requestId: newId() },
    input: { email, password },
    from: { address: `10.0.0.${(addresses += 1)}`, userAgent: "test", oldToken: null, device: null, ...from },
  });

test("the right password opens a session that is stored only as a hash, and the deed is logged", async () => {
  const { actor, email } = await person();
  const opened = await signIn(email.toUpperCase());
  expect(opened.actor.userId).toBe(actor.userId);
  const { rows } = await org.db.reader.execute({
    sql: "SELECT * FROM sessions WHERE user_id = ?",
    args: [actor.userId],
  });
  expect(rows).toHaveLength(1);
  expect(rows[0]?.id).toBe(hashSecret(opened.token));
  expect(JSON.stringify(rows)).not.toContain(opened.token);
  await expectLogged(org.db, "session.open", String(rows[0]?.public_id), actor.userId);
});

test("wrong password, unknown account, account without password and suspended member answer alike", async () => {
  const { actor, email } = await person();
  const without = await org.db.write((tx) => addMember(tx, org.organisationId, "designer"));
  await updateMember({
    ctx: org.as("admin"),
    memberId: actor.membershipId,
    version: 1,
    input: { suspended: true },
  });
  const answers = await Promise.all(
    [
      signIn(email, "not the password at all"),
      signIn("nobody@test.example"),
      signIn(`designer.${without.userId}@test.example`),
      signIn(email),
    ].map((attempt) => attempt.catch((error: Error) => error.message)),
  );
  expect(new Set(answers).size).toBe(1);
  expect(answers[0]).toMatch(/^signedOut/);
});

test("an account that does not exist costs the same work as one that does", async () => {
  const time = async (stored: string | null) => {
    const begin = performance.now();
    expect(await verifyPassword(stored, "not the password at all")).toBe(false);
    return performance.now() - begin;
  };
  // Taken in turns, and the least of each, so that what else runs on the machine falls out.
  const [known, unknown]: [number[], number[]] = [[], []];
  for (let i = 0; i < 15; i += 1) {
    known.push(await time(passwordHash));
    unknown.push(await time(null));
  }
  const ratio = Math.min(...unknown) / Math.min(...known);
  // Without the decoy hash the ratio is below a hundredth.
  expect(ratio).toBeGreaterThan(0.5);
  expect(ratio).toBeLessThan(2);
});

test("after twenty wrong tries the next is 429 with the time to wait, even with the right password", async () => {
  const { email } = await person();
  for (let i = 0; i < 20; i += 1)
    await expect(signIn(email, "wrong wrong wrong")).rejects.toMatchObject({ code: "signedOut" });
  await expect(signIn(email)).rejects.toMatchObject({
    code: "tooMany",
    retryAfterSeconds: expect.any(Number),
  });
  await expect(signIn(email, PASSWORD, {}, Date.now() + 16 * 60_000)).resolves.toBeDefined();
});

test("a stranger's tries do not lock somebody out of the browser they signed in with before", async () => {
  const { email } = await person();
  const { device } = await signIn(email);
  for (let i = 0; i < 21; i += 1) await signIn(email, "wrong wrong wrong").catch(() => undefined);
  await expect(signIn(email)).rejects.toMatchObject({ code: "tooMany" });
  await expect(signIn(email, PASSWORD, { device })).resolves.toBeDefined();
});

test("one address may not try accounts without end, but what succeeds does not count", async () => {
  const { email } = await person();
  const from = { address: "10.9.9.9" };
  for (let i = 0; i < 25; i += 1) await expect(signIn(email, PASSWORD, from)).resolves.toBeDefined();
  for (let i = 0; i < 20; i += 1)
    await signIn(`guess${i}@test.example`, "wrong wrong wrong", from).catch(() => undefined);
  await expect(signIn("guess20@test.example", "wrong wrong wrong", from)).rejects.toMatchObject({
    code: "tooMany",
  });
});

test("the session ends at the idle limit, and at the absolute limit however much it is used", async () => {
  const { email } = await person();
  const { token } = await signIn(email);
  expect(await readSession(org.db, token)).not.toBeNull();
  const set = (column: string, at: number) =>
    org.db.write((tx) =>
      tx.raw.execute({
        sql: `UPDATE sessions SET ${column} = ? WHERE id = ?`,
        args: [at, hashSecret(token)],
      }),
    );
  await set("idle_until", Date.now() - 1);
  expect(await readSession(org.db, token)).toBeNull();
  await set("idle_until", Date.now() + 60_000);
  expect(await readSession(org.db, token)).not.toBeNull();
  await set("absolute_until", Date.now() - 1);
  expect(await readSession(org.db, token)).toBeNull();
});

test("reading a session writes nothing, and last seen moves at most once a minute", async () => {
  const { email } = await person();
  const { token } = await signIn(email);
  const cookie = `flitchbook=${token}`;
  const row = async () =>
    (
      await org.db.reader.execute({
        sql: "SELECT last_seen_at, idle_until FROM sessions WHERE id = ?",
        args: [hashSecret(token)],
      })
    ).rows[0];
  const before = await row();
  expect((await callRoute(session.GET, { cookie })).status).toBe(200);
  expect(await row()).toEqual(before);
  await org.db.write((tx) =>
    tx.raw.execute({
      sql: "UPDATE sessions SET last_seen_at = last_seen_at - 61000, idle_until = idle_until - 61000 WHERE id = ?",
      args: [hashSecret(token)],
    }),
  );
  const old = await row();
  await callRoute(session.GET, { cookie });
  await org.db.write(async () => undefined);
  expect(Number((await row())?.idle_until)).toBeGreaterThan(Number(old?.idle_until));
});

test("over HTTP: the cookie is HttpOnly and Lax, a new one each time, and the old one is dead", async () => {
  const { email } = await person();
  const open = (cookie?: string) =>
    callRoute(session.POST, {
      method: "POST",
      body: { email, password: PASSWORD },
      ...(cookie && { cookie }),
    });
  const first = await open();
  expect(first.status).toBe(201);
  const [set] = first.headers.getSetCookie();
  expect(set).toMatch(/^flitchbook=[\w-]{43}; Path=\/; HttpOnly; SameSite=Lax; Max-Age=43200$/);
  const cookie = set?.split(";")[0] ?? "";
  const second = await open(cookie);
  expect(second.headers.getSetCookie()[0]).not.toBe(set);
  expect((await callRoute(session.GET, { cookie })).status).toBe(401);
  const now = second.headers.getSetCookie()[0]?.split(";")[0] ?? "";
  const out = await callRoute(session.DELETE, { method: "DELETE", cookie: now });
  expect(out.status).toBe(204);
  expect(out.headers.get("clear-site-data")).toContain("cache");
  expect((await callRoute(session.GET, { cookie: now })).status).toBe(401);
});

test("signing in from another origin is refused before the password is looked at", async () => {
  const { email } = await person();
  const response = await callRoute(session.POST, {
    method: "POST",
    body: { email, password: PASSWORD },
    headers: { origin: "http://evil.example" },
  });
  expect(response.status).toBe(403);
  expect(response.headers.getSetCookie()).toEqual([]);
});

test("a changed password ends the person's other sessions and keeps this one", async () => {
  const { actor, email } = await person();
  const [here, there] = [await signIn(email), await signIn(email)];
  const mine = await readSession(org.db, here.token);
  const change = (next: string) =>
    changePassword({
      ctx: { actor, db: org.db, now: Date.now(), requestId: newId() },
      sessionId: mine?.publicId ?? null,
      input: { current: PASSWORD, next },
    });
  for (const weak of [
    "short",
    "a".repeat(20),
    "passwordpassword123",
    "123456789012345678",
    email,
    "abababababababab",
  ]) {
    await expect(change(weak), weak).rejects.toMatchObject({ code: "invalid" });
  }
  await change("eleven dry spanners in a drawer");
  expect(await readSession(org.db, here.token)).not.toBeNull();
  expect(await readSession(org.db, there.token)).toBeNull();
  await expect(signIn(email)).rejects.toMatchObject({ code: "signedOut" });
});
