import "server-only";
import { sql } from "drizzle-orm";
import { attempts } from "@/db/schema/attempts";
import type { OpenCtx } from "../context";

const KEY = "health:ready";

/** Tries a read and a write; a database that takes neither answers as an error does. */
export const tryDatabase = async ({ ctx }: { ctx: OpenCtx }): Promise<{ status: "ok" }> => {
  await ctx.db.read.run(sql`select 1`);
  await ctx.db.write((tx) =>
    tx
      .insert(attempts)
      .values({ key: KEY, points: 0, expiresAt: ctx.now })
      .onConflictDoUpdate({ target: attempts.key, set: { expiresAt: ctx.now } }),
  );
  return { status: "ok" };
};
