import "server-only";
import { and, asc, eq, lte } from "drizzle-orm";
import type { Db } from "@/db/client";
import { outbox } from "@/db/schema/outbox";
import { environment } from "@/lib/env";
import { logger } from "@/lib/logger";
import { mailTransport } from "./transport";

const MOST_ATTEMPTS = 10;
const FIRST_WAIT_MS = 30_000;
const LONGEST_WAIT_MS = 6 * 3_600_000;
/** Longer than a try can take: another instance leaves a letter alone that this one has in hand. */
const LEASE_MS = 60_000;

type Due = typeof outbox.$inferSelect;

/** Takes the next letter that is due, so that no other instance sends it too. */
const claim = (db: Db, now: number): Promise<Due | undefined> =>
  db.write(async (tx) => {
    const [due] = await tx
      .select()
      .from(outbox)
      .where(and(eq(outbox.state, "waiting"), lte(outbox.nextAt, now)))
      .orderBy(asc(outbox.nextAt))
      .limit(1);
    if (!due) return undefined;
    await tx
      .update(outbox)
      .set({ nextAt: now + LEASE_MS, attempts: due.attempts + 1 })
      .where(eq(outbox.id, due.id));
    return { ...due, attempts: due.attempts + 1 };
  });

const sent = (db: Db, id: string) =>
  db.write((tx) =>
    tx
      .update(outbox)
      .set({ state: "sent", sentAt: Date.now(), text: "", failure: "" })
      .where(eq(outbox.id, id)),
  );

const failed = (db: Db, letter: Due, error: unknown) => {
  const over = letter.attempts >= MOST_ATTEMPTS;
  const wait = Math.min(FIRST_WAIT_MS * 2 ** (letter.attempts - 1), LONGEST_WAIT_MS);
  return db.write((tx) =>
    tx
      .update(outbox)
      .set({
        state: over ? "failed" : "waiting",
        nextAt: Date.now() + wait,
        failure: String(error instanceof Error ? error.message : error).slice(0, 300),
        ...(over && { text: "" }),
      })
      .where(eq(outbox.id, letter.id)),
  );
};

/** Sends every letter that is due, one after another; what cannot be sent waits, longer each time. @returns how many left. */
export const sendDueLetters = async (db: Db, now = Date.now()): Promise<number> => {
  let count = 0;
  for (let letter = await claim(db, now); letter; letter = await claim(db, now)) {
    try {
      const transport = await mailTransport();
      try {
        await transport.sendMail({
          from: environment().MAIL_FROM,
          to: letter.to,
          subject: letter.subject,
          text: letter.text,
        });
      } finally {
        transport.close();
      }
      await sent(db, letter.id);
      count += 1;
    } catch (error) {
      await failed(db, letter, error);
      logger().warn(
        { letter: letter.id, attempts: letter.attempts, err: String(error) },
        "a letter could not be sent",
      );
    }
  }
  return count;
};

const EVERY_MS = 5_000;

/** Sends what is due now and every few seconds; nobody waits for it. */
export const keepSendingLetters = (db: Db): void => {
  let busy = false;
  const round = async () => {
    if (busy) return;
    busy = true;
    try {
      await sendDueLetters(db);
    } catch (error) {
      logger().warn({ err: String(error) }, "the outbox could not be read");
    } finally {
      busy = false;
    }
  };
  void round();
  setInterval(() => void round(), EVERY_MS).unref();
};
