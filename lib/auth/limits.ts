import "server-only";
import { sql } from "drizzle-orm";
import type { Db } from "@/db/client";
import { attempts } from "@/db/schema/attempts";
import { AppError } from "@/lib/errors";

export type Limit = Readonly<{ points: number; seconds: number }>;

/** Limits of promises.md, counted in the database so that all instances share them. */
export const LIMITS = {
  signIn: { points: 20, seconds: 15 * 60 },
  passwordReset: { points: 5, seconds: 60 * 60 },
  invitation: { points: 50, seconds: 60 * 60 },
  token: { points: 30, seconds: 60 * 60 },
  delivery: { points: 60, seconds: 60 * 60 },
} as const satisfies Record<string, Limit>;

type Spent = Readonly<{ points: number; expiresAt: number }>;

/** Counts one try under each key and answers the fullest; a window that ran out begins anew. */
const spend = (db: Db, keys: readonly string[], { seconds }: Limit, now: number): Promise<Spent> =>
  db.write(async (tx) => {
    let fullest: Spent = { points: 0, expiresAt: now };
    for (const key of keys) {
      const until = now + seconds * 1000;
      const [row] = await tx
        .insert(attempts)
        .values({ key, points: 1, expiresAt: until })
        .onConflictDoUpdate({
          target: attempts.key,
          set: {
            points: sql`case when ${attempts.expiresAt} <= ${now} then 1 else ${attempts.points} + 1 end`,
            expiresAt: sql`case when ${attempts.expiresAt} <= ${now} then ${until} else ${attempts.expiresAt} end`,
          },
        })
        .returning({ points: attempts.points, expiresAt: attempts.expiresAt });
      const spent = { points: row?.points ?? 0, expiresAt: row?.expiresAt ?? until };
      if (spent.points > fullest.points) fullest = spent;
    }
    return fullest;
  });

/** Spends a try under each key, or refuses with 429 and the seconds to wait. */
export const requireTry = async (
  db: Db,
  keys: readonly string[],
  limit: Limit,
  now: number,
): Promise<void> => {
  const { points, expiresAt } = await spend(db, keys, limit, now);
  if (points <= limit.points) return;
  const retryAfterSeconds = Math.max(1, Math.ceil((expiresAt - now) / 1000));
  throw new AppError("tooMany", {
    user: `Too many tries. Wait ${Math.ceil(retryAfterSeconds / 60)} minutes and try again.`,
    retryAfterSeconds,
  });
};

/** Gives the tries back: what succeeded does not count. */
export const giveBackTries = async (db: Db, keys: readonly string[]): Promise<void> => {
  await db.write(async (tx) => {
    for (const key of keys) {
      await tx
        .update(attempts)
        .set({ points: sql`max(0, ${attempts.points} - 1)` })
        .where(sql`${attempts.key} = ${key}`);
    }
  });
};
