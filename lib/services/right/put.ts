import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import { rights } from "@/db/schema/rights";
import { AppError } from "@/lib/errors";
import { mayAtAll } from "@/lib/permissions";
import { PutRightInput, type RightList } from "@/lib/schemas/member";
import { bayOf } from "../bay/load-bay";
import type { VerbArgs } from "../context";
import { logDeed } from "../log-deed";
import { memberOf } from "../member/load-member";
import { newId } from "../new-id";
import { parseInput } from "../parse-input";
import { grantsOf } from "./grants";

/** Raises, lowers or takes away a right beside the role, in one bay or on the whole Rack; it counts on the member's next request. */
export const putRight = async ({
  ctx,
  input,
}: VerbArgs<z.input<typeof PutRightInput>>): Promise<RightList> => {
  mayAtAll(ctx.actor, "right.put");
  const { memberId, bayId, right, until = null } = parseInput(PutRightInput, input);
  const ends = until === null ? null : Date.parse(until);
  if (ends !== null && ends <= ctx.now) {
    throw new AppError("invalid", {
      user: "until: the end date has passed already.",
      issues: [{ code: "right.past", detail: "The end date has passed already.", pointer: "/until" }],
    });
  }
  const { organisationId } = ctx.actor;
  return ctx.db.write(async (tx) => {
    const member = await memberOf(tx, ctx.actor, memberId);
    const bay = bayId === null ? null : await bayOf(tx, ctx.actor, bayId);
    const same = and(
      eq(rights.organisationId, organisationId),
      eq(rights.membershipId, memberId),
      bayId === null ? isNull(rights.bayId) : eq(rights.bayId, bayId),
    );
    const [before] = await tx.select({ right: rights.right, until: rights.until }).from(rights).where(same);
    await tx.delete(rights).where(same);
    if (right !== null) {
      await tx.insert(rights).values({
        id: newId(),
        organisationId,
        membershipId: memberId,
        bayId,
        right,
        until: ends,
        grantedBy: ctx.actor.userId,
        createdAt: ctx.now,
      });
    }
    await logDeed(tx, ctx, {
      verb: "right.put",
      entity: "member",
      entityId: memberId,
      subject: `${member.name}, ${bay?.name ?? "all bays"}`,
      before: before ?? null,
      after: { bayId, right, until },
    });
    return { items: await grantsOf(tx, ctx) };
  });
};
