import { expect, test } from "vitest";
import { fakeMailServer } from "@/lib/mail/fake-server";
import { enqueueLetter } from "@/lib/mail/enqueue";
import { sendDueLetters } from "@/lib/mail/send-letters";
import { testOrganisation } from "@/tests/helpers/test-organisation";

const letter = (to: string) => ({
  organisationId: null,
  to,
  subject: "Grüße aus der Werkstatt ½",
  text: "Zeile 1\n\nZeile 2: × ²",
});

test("a letter arrives with every character it was written with, and only once", async () => {
  const org = await testOrganisation({ closesItself: true });
  const now = Date.now();
  await org.db.write((tx) => enqueueLetter(tx, letter("a@test.example"), now));
  const sent = await Promise.all([sendDueLetters(org.db, now), sendDueLetters(org.db, now)]);
  expect(sent.reduce((a, b) => a + b)).toBe(1);
  const caught = (await fakeMailServer()).letters.filter((l) => l.to === "a@test.example");
  expect(caught).toMatchObject([{ subject: "Grüße aus der Werkstatt ½", text: "Zeile 1\n\nZeile 2: × ²" }]);
});

test("with the mail server down a letter waits, longer each time, and leaves when it is back", async () => {
  const org = await testOrganisation({ closesItself: true });
  const store = globalThis as typeof globalThis & { flitchbookMail?: Promise<unknown> };
  const working = await fakeMailServer();
  // A port that nobody listens on stands in for a server that is down.
  store.flitchbookMail = Promise.resolve({ port: 1, letters: [] });
  const now = Date.now();
  await org.db.write((tx) => enqueueLetter(tx, letter("b@test.example"), now));
  expect(await sendDueLetters(org.db, now)).toBe(0);
  const row = async () =>
    (await org.db.reader.execute('SELECT state, attempts, next_at, failure, "text" FROM outbox')).rows[0];
  expect(await row()).toMatchObject({ state: "waiting", attempts: 1 });
  expect(String((await row())?.failure)).toMatch(/ECONNREFUSED|refused/i);
  expect(Number((await row())?.next_at)).toBeGreaterThan(now + 20_000);
  store.flitchbookMail = Promise.resolve(working);
  expect(await sendDueLetters(org.db, now)).toBe(0);
  expect(await sendDueLetters(org.db, now + 10 * 60_000)).toBe(1);
  expect(await row()).toMatchObject({ state: "sent", attempts: 2, text: "" });
});
