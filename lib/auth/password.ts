import "server-only";
import { hash, verify } from "@node-rs/argon2";
import { AppError } from "@/lib/errors";
import { MIN_PASSWORD } from "@/lib/schemas/session";

/** argon2id with 19 MiB, 2 passes, 1 lane: OWASP Password Storage Cheat Sheet; the package's default algorithm is argon2id. */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;
/** Two at a time, so that a burst of sign-ins leaves the thread pool to files and the event loop to everybody. */
const AT_ONCE = 2;

let running = 0;
const waiting: (() => void)[] = [];

const inTurn = async <T>(work: () => Promise<T>): Promise<T> => {
  if (running >= AT_ONCE) await new Promise<void>((resolve) => waiting.push(resolve));
  else running += 1;
  try {
    return await work();
  } finally {
    const next = waiting.shift();
    if (next) next();
    else running -= 1;
  }
};

/** Hashes off the main thread. NFC first (NIST SP 800-63B-4), so that every keyboard types the same password. */
export const hashPassword = (password: string): Promise<string> =>
  inTurn(() => hash(password.normalize("NFC"), COST));

/** Hash of a random password nobody knows: an unknown account takes as long as a known one. */
let decoy: Promise<string> | undefined;

/** Whether the password fits; with a null hash it takes as long and is false. */
export const verifyPassword = async (passwordHash: string | null, password: string): Promise<boolean> => {
  decoy ??= hashPassword(crypto.randomUUID());
  const against = passwordHash ?? (await decoy);
  const fits = await inTurn(() => verify(against, password.normalize("NFC")));
  return fits && passwordHash !== null;
};

/** Words that long common passwords are made of; from memory, common practice. */
const COMMON_WORDS =
  /password|passwort|qwertyuiop|qwerty|asdfghjkl|asdfgh|zxcvbnm|zxcvbn|letmein|welcome|administrator|admin|iloveyou|test|user|login|master|dragon|monkey|football|changeme|secret|flitchbook/g;
/** With the common words, digits and signs gone, this many letters must be left. */
const MIN_OWN_LETTERS = 4;

const isCommon = (lower: string): boolean =>
  lower.replace(COMMON_WORDS, "").replace(/[\d\s\p{P}\p{S}]+/gu, "").length < MIN_OWN_LETTERS &&
  lower.search(COMMON_WORDS) >= 0;

/** A run such as abcdef… or 7890123…: every step the same, digits counted round. */
const isRun = (text: string): boolean => {
  const round = /^\d+$/.test(text) ? 10 : 0x110000;
  const steps = new Set<number>();
  for (let i = 1; i < text.length; i += 1) {
    steps.add((text.charCodeAt(i) - text.charCodeAt(i - 1) + round) % round);
  }
  return steps.size <= 1;
};

/** Refuses what attackers try first: common words in a row, one repeated pattern, runs, and one's own address or name. */
export const refuseWeakPassword = (password: string, about: readonly string[]): void => {
  const text = password.normalize("NFC");
  const lower = text.toLowerCase();
  const own = about
    .map((word) => word.toLowerCase().trim())
    .filter((word) => word.length >= 4)
    .some((word) => lower.replaceAll(word, "").length < MIN_PASSWORD / 2);
  const repeated = /^(.{1,8})\1+$/u.test(text);
  if (own || repeated || isRun(text) || isCommon(lower)) {
    throw new AppError("invalid", {
      user: "This password is too easy to guess: choose several unrelated words.",
      issues: [
        {
          code: "password.common",
          detail: "Too easy to guess: choose several unrelated words.",
          pointer: "/password",
        },
      ],
    });
  }
};
