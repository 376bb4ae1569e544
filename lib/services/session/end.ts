import "server-only";
import { and, eq } from "drizzle-orm";
import { sessions } from "@/db/schema/sessions";
import { mayAtAll } from "@/lib/permissions";
import type { Ctx } from "../context";
import { logDeed } from "../log-deed";
import { found } from "../not-found";

/** Ends one of one's own sessions, say on a computer left behind. */
export const endSession = async ({ ctx, publicId }: { ctx: Ctx; publicId: string }): Promise<void> => {
  mayAtAll(ctx.actor, "session.end");
  await ctx.db.write(async (tx) => {
    const own = and(eq(sessions.publicId, publicId), eq(sessions.userId, ctx.actor.userId));
    found((await tx.select({ id: sessions.publicId }).from(sessions).where(own))[0]);
    await tx.delete(sessions).where(own);
    await logDeed(tx, ctx, {
      verb: "session.end",
      entity: "session",
      entityId: publicId,
      subject: ctx.actor.name,
    });
  });
};
