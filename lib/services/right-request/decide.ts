import "server-only";
import { and, eq } from "drizzle-orm";
import type { z } from "zod";
import { rightRequests } from "@/db/schema/right-requests";
import { AppError } from "@/lib/errors";
import { enqueueLetter } from "@/lib/mail/enqueue";
import { decisionLetter } from "@/lib/mail/letters";
import { mayAtAll } from "@/lib/permissions";
import { DecideRightRequestInput, type RightRequest } from "@/lib/schemas/right-request";
import { bayOf } from "../bay/load-bay";
import type { VerbArgs, Versioned } from "../context";
import { logDeed } from "../log-deed";
import { memberOf } from "../member/load-member";
import { found } from "../not-found";
import { parseInput } from "../parse-input";
import { writeGrant } from "../right/put";
import { requireSameVersion } from "../stale";
import { RIGHT_WORDS } from "./create";
import { rightRequestsOf } from "./list";

/** Grants a request, with the grant in the same transaction, or refuses it; who asked gets a letter. */
export const decideRightRequest = async ({
  ctx,
  requestId,
  version,
  input,
}: VerbArgs<
  z.input<typeof DecideRightRequestInput>,
  { requestId: string } & Versioned
>): Promise<RightRequest> => {
  mayAtAll(ctx.actor, "rightRequest.decide");
  const { granted, until = null, answer = "" } = parseInput(DecideRightRequestInput, input);
  const { organisationId } = ctx.actor;
  return ctx.db.write(async (tx) => {
    const own = and(eq(rightRequests.id, requestId), eq(rightRequests.organisationId, organisationId));
    const request = found((await tx.select().from(rightRequests).where(own))[0]);
    requireSameVersion(request.version, version);
    if (request.state !== "open")
      throw new AppError("conflict", { user: `This request was ${request.state} already.` });
    const member = await memberOf(tx, ctx.actor, request.membershipId);
    const bay = request.bayId === null ? null : await bayOf(tx, ctx.actor, request.bayId);
    const { bayId, right } = request;
    if (granted) await writeGrant(tx, ctx, { memberId: member.id, bayId, right, until });
    await tx
      .update(rightRequests)
      .set({
        state: granted ? "granted" : "refused",
        answer,
        decidedBy: ctx.actor.userId,
        decidedAt: ctx.now,
        version: version + 1,
      })
      .where(own);
    const words = decisionLetter({
      decidedBy: ctx.actor.name,
      right: RIGHT_WORDS[right],
      bay: bay?.name ?? "all bays",
      granted,
      answer,
    });
    await enqueueLetter(tx, { organisationId, to: member.email, ...words }, ctx.now);
    await logDeed(tx, ctx, {
      verb: "rightRequest.decide",
      entity: "rightRequest",
      entityId: requestId,
      subject: `${member.name}, ${bay?.name ?? "all bays"}`,
      after: { granted, right, until, answer },
    });
    return found((await rightRequestsOf(tx, ctx)).find((row) => row.id === requestId));
  });
};
