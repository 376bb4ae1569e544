import type { Db } from "@/db/client";
import { fakeMailServer } from "@/lib/mail/fake-server";
import { sendDueLetters } from "@/lib/mail/send-letters";

/** Sends what is due into the fake and answers the newest letter to this address. */
export const newestLetter = async (db: Db, to: string) => {
  await sendDueLetters(db, Date.now() + 1000);
  const letter = (await fakeMailServer()).letters.find((l) => l.to === to);
  if (!letter) throw new Error(`no letter to ${to}`);
  return letter;
};

/** The secret of the link in a letter. */
export const secretIn = (text: string): string => {
  const secret = /token=([\w-]+)/.exec(text)?.[1];
  if (!secret) throw new Error("no link in the letter");
  return secret;
};
