import { afterAll, beforeAll, expect, test } from "vitest";
import { loadActor } from "@/lib/auth/load-actor";
import { hashPassword } from "@/lib/auth/password";
import { acceptInvitation } from "@/lib/services/invitation/accept";
import { createInvitation } from "@/lib/services/invitation/create";
import { listInvitations } from "@/lib/services/invitation/list";
import { revokeInvitation } from "@/lib/services/invitation/revoke";
import { showInvitation } from "@/lib/services/invitation/show";
import { listLetters } from "@/lib/services/letter/list";
import { listMembers } from "@/lib/services/member/list";
import { completeReset } from "@/lib/services/password-reset/complete";
import { requestReset } from "@/lib/services/password-reset/request";
import { createSession, readSession } from "@/lib/auth/sessions";
import { newId } from "@/lib/services/new-id";
import { openSession } from "@/lib/services/session/open";
import { newestLetter, secretIn } from "@/tests/helpers/letters";
import { everything, expectLogged, expectRefused } from "@/tests/helpers/refuses";
import { addMember, testOrganisation, type TestOrganisation } from "@/tests/helpers/test-organisation";

const PASSWORD = "four green trucks at dawn";
let org: TestOrganisation;
beforeAll(async () => {
  org = await testOrganisation();
});
afterAll(() => org.close());

const admin = () => org.as("admin");
const open = (now = Date.now()) => ({ db: org.db, now, requestId: newId() });
let people = 0;
const newAddress = () => `new.person${(people += 1)}@test.example`;
const invite = async (email = newAddress()) => {
  const invitation = await createInvitation({
    ctx: admin(),
    input: { email, name: "I. Sato", role: "engineer" },
  });
  return { email, invitation, secret: secretIn((await newestLetter(org.db, email)).text) };
};
const signIn = (email: string, password: string) =>
  openSession({
    ctx: open(),
    input: { email, password },
    from: { address: newId(), userAgent: "t", oldToken: null, device: null },
  });

test("invited by letter, looked at as often as one likes, accepted once: a member who can sign in", async () => {
  const { email, secret, invitation } = await invite();
  await expectLogged(org.db, "invitation.create", invitation.id, admin().actor.userId);
  const before = await everything(org.db);
  for (let i = 0; i < 3; i += 1) {
    expect(await showInvitation({ ctx: open(), input: { token: secret } })).toMatchObject({
      organisation: "Test Works",
      email,
      role: "engineer",
      known: false,
    });
  }
  expect(await everything(org.db)).toBe(before);
  await acceptInvitation({ ctx: open(), input: { token: secret, password: PASSWORD } });
  const { actor } = await signIn(email, PASSWORD);
  expect(actor).toMatchObject({ role: "engineer", organisationId: org.organisationId, name: "I. Sato" });
  await expectRefused(org.db, "notFound", () =>
    acceptInvitation({ ctx: open(), input: { token: secret, password: PASSWORD } }),
  );
});

test("of sixteen who press the button at once one becomes a member", async () => {
  const { email, secret } = await invite();
  const results = await Promise.allSettled(
    Array.from({ length: 16 }, () =>
      acceptInvitation({ ctx: open(), input: { token: secret, password: PASSWORD } }),
    ),
  );
  expect(results.filter((r) => r.status === "fulfilled")).toHaveLength(1);
  const members = (await listMembers({ ctx: admin() })).items.filter((m) => m.email === email);
  expect(members).toHaveLength(1);
});

test("after 72 hours, taken back, or replaced by a newer one, a link no longer holds", async () => {
  const { secret } = await invite();
  await expect(
    showInvitation({ ctx: open(Date.now() + 73 * 3_600_000), input: { token: secret } }),
  ).rejects.toMatchObject({ code: "notFound" });
  const back = await invite();
  await revokeInvitation({ ctx: admin(), invitationId: back.invitation.id });
  await expectLogged(org.db, "invitation.revoke", back.invitation.id, admin().actor.userId);
  await expect(showInvitation({ ctx: open(), input: { token: back.secret } })).rejects.toMatchObject({
    code: "notFound",
  });
  const first = await invite();
  const second = await invite(first.email);
  await expect(showInvitation({ ctx: open(), input: { token: first.secret } })).rejects.toMatchObject({
    code: "notFound",
  });
  await expect(showInvitation({ ctx: open(), input: { token: second.secret } })).resolves.toBeDefined();
});

test("an existing person is not taken over: only their own password accepts", async () => {
  const email = newAddress();
  const stranger = org.stranger("admin").actor;
  const userId = await org.db.write(async (tx) => {
    const actor = await addMember(tx, stranger.organisationId, "designer", await hashPassword(PASSWORD));
    await tx.raw.execute({ sql: "UPDATE users SET email = ? WHERE id = ?", args: [email, actor.userId] });
    return actor.userId;
  });
  const { secret } = await invite(email);
  expect(await showInvitation({ ctx: open(), input: { token: secret } })).toMatchObject({ known: true });
  await expectRefused(org.db, "invalid", () =>
    acceptInvitation({ ctx: open(), input: { token: secret, password: "a password of the attacker" } }),
  );
  await acceptInvitation({ ctx: open(), input: { token: secret, name: "Renamed", password: PASSWORD } });
  const actor = await loadActor(
    org.db.read,
    { userId, organisationId: org.organisationId, via: "session" },
    Date.now(),
  );
  expect(actor).toMatchObject({ role: "engineer", name: "Test designer" });
});

test("only admins invite, nobody who is a member already, and never with a weak password", async () => {
  const input = { email: newAddress(), name: "N", role: "designer" as const };
  await expectRefused(org.db, "forbidden", () => createInvitation({ ctx: org.as("librarian"), input }));
  await expectRefused(org.db, "invalid", () =>
    createInvitation({ ctx: admin(), input: { ...input, email: "nobody" } }),
  );
  const member = (await listMembers({ ctx: admin() })).items[0];
  await expectRefused(org.db, "conflict", () =>
    createInvitation({ ctx: admin(), input: { ...input, email: member?.email ?? "" } }),
  );
  const { secret, invitation } = await invite();
  for (const password of ["short", "aaaaaaaaaaaaaaaaaaaa", "password password password"]) {
    await expectRefused(org.db, "invalid", () =>
      acceptInvitation({ ctx: open(), input: { token: secret, password } }),
    );
  }
  await expectRefused(org.db, "notFound", () =>
    revokeInvitation({ ctx: org.stranger("admin"), invitationId: invitation.id }),
  );
  expect((await listInvitations({ ctx: org.stranger("admin") })).items).toEqual([]);
});

test("the secret is stored as a hash, and the letter's text is gone once it has left", async () => {
  const { secret } = await invite();
  for (const table of ["invitations", "outbox", "log"]) {
    const { rows } = await org.db.reader.execute(`SELECT * FROM ${table}`);
    expect(JSON.stringify(rows)).not.toContain(secret);
  }
  const letters = await listLetters({ ctx: admin() });
  expect(letters.items[0]).toMatchObject({ state: "sent" });
  expect(letters.mailbox?.[0]?.text).toContain(secret);
  await expect(listLetters({ ctx: org.as("librarian") })).rejects.toMatchObject({ code: "forbidden" });
});

test("a reset: the same answer for any address, a link for an hour and once, and every session ends", async () => {
  const { email, secret: invitation } = await invite();
  await acceptInvitation({ ctx: open(), input: { token: invitation, password: PASSWORD } });
  const { actor, token } = await signIn(email, PASSWORD);
  await createSession(org.db, { ...actor, userAgent: "other" }, Date.now());
  const ask = (to: string) => requestReset({ ctx: open(), input: { email: to }, address: newId() });
  await expect(ask("nobody@test.example")).resolves.toBeUndefined();
  await expect(ask(email)).resolves.toBeUndefined();
  const secret = secretIn((await newestLetter(org.db, email)).text);
  const choose = (password: string, now = Date.now()) =>
    completeReset({ ctx: open(now), input: { token: secret, password } });
  await expect(choose("nine blue ladders in rain", Date.now() + 3_601_000)).rejects.toMatchObject({
    code: "notFound",
  });
  await expect(choose("password password")).rejects.toMatchObject({ code: "invalid" });
  await choose("nine blue ladders in rain");
  await expectLogged(org.db, "passwordReset.complete", actor.userId, actor.userId);
  await expect(choose("ten blue ladders in rain")).rejects.toMatchObject({ code: "notFound" });
  expect(await readSession(org.db, token)).toBeNull();
  await expect(signIn(email, PASSWORD)).rejects.toMatchObject({ code: "signedOut" });
  await expect(signIn(email, "nine blue ladders in rain")).resolves.toBeDefined();
});

test("resets are limited for an account, whoever asks", async () => {
  const ask = () => requestReset({ ctx: open(), input: { email: "often@test.example" }, address: newId() });
  for (let i = 0; i < 5; i += 1) await ask();
  await expect(ask()).rejects.toMatchObject({ code: "tooMany" });
});
