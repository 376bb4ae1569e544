import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import type { Tx } from "@/db/client";
import { memberships } from "@/db/schema/memberships";
import { rightRequests } from "@/db/schema/right-requests";
import { users } from "@/db/schema/users";
import { AppError } from "@/lib/errors";
import { enqueueLetter } from "@/lib/mail/enqueue";
import { requestLetter } from "@/lib/mail/letters";
import { atLeast, mayAtAll, rightIn, rolesThatMay } from "@/lib/permissions";
import { CreateRightRequestInput, type RightRequest } from "@/lib/schemas/right-request";
import { bayOf } from "../bay/load-bay";
import type { Ctx, VerbArgs } from "../context";
import { logDeed } from "../log-deed";
import { newId } from "../new-id";
import { found } from "../not-found";
import { parseInput } from "../parse-input";
import { rightRequestsOf } from "./list";

export const RIGHT_WORDS = {
  read: "read",
  draft: "draft and submit",
  release: "release and withdraw",
} as const;

/** Asks for a right in a bay or on the whole Rack, with a reason; who can grant it gets a letter. */
export const createRightRequest = async ({
  ctx,
  input,
}: VerbArgs<z.input<typeof CreateRightRequestInput>>): Promise<RightRequest> => {
  mayAtAll(ctx.actor, "rightRequest.create");
  const { bayId, right, reason } = parseInput(CreateRightRequestInput, input);
  const { organisationId, membershipId } = ctx.actor;
  return ctx.db.write(async (tx) => {
    const bay = bayId === null ? null : await bayOf(tx, ctx.actor, bayId);
    if (atLeast(rightIn(ctx.actor, bayId ?? "all"), right)) {
      throw new AppError("conflict", { user: "You have this right already." });
    }
    const same = and(
      eq(rightRequests.membershipId, membershipId),
      eq(rightRequests.state, "open"),
      bayId === null ? isNull(rightRequests.bayId) : eq(rightRequests.bayId, bayId),
    );
    const [open] = await tx.select({ id: rightRequests.id }).from(rightRequests).where(same);
    if (open)
      throw new AppError("conflict", {
        user: "You have asked for this bay already; the answer is still open.",
      });
    const id = newId();
    await tx
      .insert(rightRequests)
      .values({ id, organisationId, membershipId, bayId, right, reason, createdAt: ctx.now });
    const words = requestLetter({
      name: ctx.actor.name,
      right: RIGHT_WORDS[right],
      bay: bay?.name ?? "all bays",
      reason,
    });
    for (const to of await whoDecides(tx, ctx))
      await enqueueLetter(tx, { organisationId, to, ...words }, ctx.now);
    await logDeed(tx, ctx, {
      verb: "rightRequest.create",
      entity: "rightRequest",
      entityId: id,
      subject: `${ctx.actor.name}, ${bay?.name ?? "all bays"}`,
      after: { right, reason },
    });
    return found((await rightRequestsOf(tx, ctx)).find((row) => row.id === id));
  });
};

const whoDecides = async (tx: Tx, { actor }: Ctx): Promise<string[]> => {
  const roles = rolesThatMay("rightRequest.decide");
  const rows = await tx
    .select({ email: users.email, role: memberships.role })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(memberships.organisationId, actor.organisationId), isNull(memberships.suspendedAt)));
  return rows.filter((row) => roles.includes(row.role)).map((row) => row.email);
};
