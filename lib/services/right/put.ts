import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import type { Tx } from "@/db/client";
import { rights } from "@/db/schema/rights";
import { AppError } from "@/lib/errors";
import { mayAtAll } from "@/lib/permissions";
import { PutRightInput, type RightList } from "@/lib/schemas/member";
import { bayOf } from "../bay/load-bay";
import type { Ctx, VerbArgs } from "../context";
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
  return ctx.db.write(async (tx) => {
    await writeGrant(tx, ctx, { memberId, bayId, right, until });
    return { items: await grantsOf(tx, ctx) };
  });
};

type NewGrant = Required<z.output<typeof PutRightInput>>;

const momentOf = (until: string | null | undefined, now: number): number | null => {
  if (until === null || until === undefined) return null;
  const ends = Date.parse(until);
  if (ends > now) return ends;
  throw new AppError("invalid", {
    user: "until: the end date has passed already.",
    issues: [{ code: "right.past", detail: "The end date has passed already.", pointer: "/until" }],
  });
};

/** Writes one grant and its log row in the caller's transaction; the one before for the same member and bay is replaced. */
export const writeGrant = async (
  tx: Tx,
  ctx: Ctx,
  { memberId, bayId, right, until }: NewGrant,
): Promise<void> => {
  const { organisationId, userId } = ctx.actor;
  const ends = momentOf(until, ctx.now);
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
      grantedBy: userId,
      createdAt: ctx.now,
    });
  }
  await logDeed(tx, ctx, {
    verb: "right.put",
    entity: "member",
    entityId: memberId,
    subject: `${member.name}, ${bay?.name ?? "all bays"}`,
    before: before ?? null,
    after: { bayId, right, until: until ?? null },
  });
};
