import "server-only";
import { and, desc, eq, gt } from "drizzle-orm";
import { sessions } from "@/db/schema/sessions";
import { mayAtAll } from "@/lib/permissions";
import type { SessionList } from "@/lib/schemas/session";
import type { Ctx } from "../context";
import { iso } from "../moments";

/** One's own open sessions, the one last used first. */
export const listSessions = async ({
  ctx,
  sessionId,
}: {
  ctx: Ctx;
  sessionId: string | null;
}): Promise<SessionList> => {
  mayAtAll(ctx.actor, "session.list");
  const rows = await ctx.db.read
    .select({
      id: sessions.publicId,
      createdAt: sessions.createdAt,
      lastSeenAt: sessions.lastSeenAt,
      userAgent: sessions.userAgent,
    })
    .from(sessions)
    .where(
      and(
        eq(sessions.userId, ctx.actor.userId),
        gt(sessions.idleUntil, ctx.now),
        gt(sessions.absoluteUntil, ctx.now),
      ),
    )
    .orderBy(desc(sessions.lastSeenAt));
  return {
    items: rows.map((row) => ({
      ...row,
      createdAt: iso(row.createdAt),
      lastSeenAt: iso(row.lastSeenAt),
      current: row.id === sessionId,
    })),
  };
};
