import "server-only";
import { and, count, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import type { Tx } from "@/db/client";
import { memberships } from "@/db/schema/memberships";
import { sessions } from "@/db/schema/sessions";
import { AppError } from "@/lib/errors";
import { mayAtAll } from "@/lib/permissions";
import { type Member, UpdateMemberInput } from "@/lib/schemas/member";
import type { Ctx, VerbArgs, Versioned } from "../context";
import { logDeed } from "../log-deed";
import { found } from "../not-found";
import { parseInput } from "../parse-input";
import { requireSameVersion } from "../stale";
import { listMembers } from "./list";
import { memberOf } from "./load-member";

/** Changes a member's role, suspends or restores them; it counts on their next request, and an organisation keeps an admin. */
export const updateMember = async ({
  ctx,
  memberId,
  version,
  input,
}: VerbArgs<z.input<typeof UpdateMemberInput>, { memberId: string } & Versioned>): Promise<Member> => {
  mayAtAll(ctx.actor, "member.update");
  const { role, suspended } = parseInput(UpdateMemberInput, input);
  await ctx.db.write(async (tx) => {
    const before = await memberOf(tx, ctx.actor, memberId);
    requireSameVersion(before.version, version);
    const suspendedAt =
      suspended === undefined ? before.suspendedAt : suspended ? (before.suspendedAt ?? ctx.now) : null;
    const after = { role: role ?? before.role, suspendedAt };
    await tx
      .update(memberships)
      .set({ ...after, version: version + 1 })
      .where(eq(memberships.id, memberId));
    await requireAnAdmin(tx, ctx);
    if (suspendedAt !== null) {
      await tx
        .delete(sessions)
        .where(
          and(eq(sessions.userId, before.userId), eq(sessions.organisationId, ctx.actor.organisationId)),
        );
    }
    await logDeed(tx, ctx, {
      verb: "member.update",
      entity: "member",
      entityId: memberId,
      subject: before.name,
      before: { role: before.role, suspendedAt: before.suspendedAt },
      after,
    });
  });
  const { items } = await listMembers({ ctx });
  return found(items.find((member) => member.id === memberId));
};

/** Inside the writing transaction: what is left must hold an admin who is not suspended. */
const requireAnAdmin = async (tx: Tx, { actor }: Ctx): Promise<void> => {
  const [row] = await tx
    .select({ admins: count() })
    .from(memberships)
    .where(
      and(
        eq(memberships.organisationId, actor.organisationId),
        eq(memberships.role, "admin"),
        isNull(memberships.suspendedAt),
      ),
    );
  if ((row?.admins ?? 0) > 0) return;
  throw new AppError("conflict", { user: "The last admin stays an admin: make somebody else one first." });
};
