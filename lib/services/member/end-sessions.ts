import "server-only";
import { and, eq } from "drizzle-orm";
import { sessions } from "@/db/schema/sessions";
import { mayAtAll } from "@/lib/permissions";
import type { Ctx } from "../context";
import { logDeed } from "../log-deed";
import { memberOf } from "./load-member";

/** Signs a member out everywhere in this organisation. */
export const endMemberSessions = async ({ ctx, memberId }: { ctx: Ctx; memberId: string }): Promise<void> => {
  mayAtAll(ctx.actor, "member.endSessions");
  await ctx.db.write(async (tx) => {
    const member = await memberOf(tx, ctx.actor, memberId);
    await tx
      .delete(sessions)
      .where(and(eq(sessions.userId, member.userId), eq(sessions.organisationId, ctx.actor.organisationId)));
    await logDeed(tx, ctx, {
      verb: "member.endSessions",
      entity: "member",
      entityId: memberId,
      subject: member.name,
    });
  });
};
