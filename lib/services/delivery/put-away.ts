import "server-only";
import { setTimeout } from "node:timers/promises";
import { and, asc, eq, isNull, ne, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Tx } from "@/db/client";
import { deliveries, deliveryRows } from "@/db/schema/deliveries";
import { AppError } from "@/lib/errors";
import { mayAtAll, requireRight } from "@/lib/permissions";
import { PutAwayInput, type Delivery } from "@/lib/schemas/delivery";
import type { Ctx, VerbArgs, Versioned } from "../context";
import { parseInput } from "../parse-input";
import { requireSameVersion } from "../stale";
import { addJob } from "./job";
import { deliveryView } from "./delivery-view";
import { codeOf, deliveryOf } from "./load-delivery";
import { startJobs } from "./run-jobs";
import { planOf } from "./stored-row";

/** A small delivery is put away before the answer leaves; a large one goes on and is asked for. */
const WAIT_MS = 8_000;
const POLL_MS = 40;
const LISTED = 50;

/**
 * Begins to put a delivery away. Rows that are not decided stop it, listed, unless they are to be left out by name. Pressed
 * twice, or by two people, it happens once: the second finds the state changed.
 */
export const putAway = async ({
  ctx,
  deliveryId,
  version,
  input,
}: VerbArgs<z.input<typeof PutAwayInput>, { deliveryId: string } & Versioned>): Promise<Delivery> => {
  mayAtAll(ctx.actor, "delivery.putAway");
  const { leaveOutUndecided = false } = parseInput(PutAwayInput, input);
  await ctx.db.write(async (tx) => {
    const before = await deliveryOf(tx, ctx.actor, deliveryId);
    requireRight(ctx.actor, "revision.release", before.bayId);
    requireSameVersion(before.version, version);
    if (before.state !== "read")
      throw new AppError("conflict", { user: stateRefusal(before.number, before.state) });
    if (leaveOutUndecided) await leaveOut(tx, ctx, deliveryId);
    else await refuseUndecided(tx, deliveryId);
    await tx
      .update(deliveries)
      .set({
        state: "putting-away",
        failure: "",
        version: sql`${deliveries.version} + 1`,
        updatedAt: ctx.now,
      })
      .where(eq(deliveries.id, deliveryId));
    await addJob(tx, {
      kind: "delivery.putAway",
      deliveryId,
      actor: ctx.actor,
      requestId: ctx.requestId,
      now: ctx.now,
    });
  });
  await startJobs(ctx.db);
  return ended(ctx, deliveryId);
};

const stateRefusal = (number: number, state: string): string =>
  state === "put-away" || state === "putting-away"
    ? `${codeOf(number)} is put away already.`
    : `${codeOf(number)} is ${state}: it can be put away once it has been read.`;

async function refuseUndecided(tx: Tx, deliveryId: string): Promise<void> {
  const undecided = and(
    eq(deliveryRows.deliveryId, deliveryId),
    ne(deliveryRows.verdict, "accepted"),
    isNull(deliveryRows.decision),
  );
  const rows = await tx
    .select()
    .from(deliveryRows)
    .where(undecided)
    .orderBy(asc(deliveryRows.ordinal))
    .limit(LISTED);
  if (rows.length === 0) return;
  throw new AppError("conflict", {
    user: `${rows.length === LISTED ? `${LISTED} rows or more are` : rows.length === 1 ? "1 row is" : `${rows.length} rows are`} not decided. Decide them, or leave them out by name.`,
    issues: rows.map((row) => ({
      code: `row.${row.cause}`,
      detail: `Row ${row.ordinal}, ${row.designation === "" ? "no designation" : row.designation}: ${planOf(row).inspection.reasons[0]?.detail ?? "not decided"}`,
      pointer: `/rows/${row.ordinal}`,
    })),
  });
}

const leaveOut = (tx: Tx, ctx: Ctx, deliveryId: string) =>
  tx
    .update(deliveryRows)
    .set({
      decision: "leave-out",
      decisionReason: "Left out when the delivery was put away.",
      decidedBy: ctx.actor.userId,
      decidedAt: ctx.now,
      version: sql`${deliveryRows.version} + 1`,
    })
    .where(
      and(
        eq(deliveryRows.deliveryId, deliveryId),
        ne(deliveryRows.verdict, "accepted"),
        isNull(deliveryRows.decision),
      ),
    );

/** The delivery once its job has ended, or as it stands after a few seconds. A refusal inside the job is an error here too. */
async function ended(ctx: Ctx, deliveryId: string): Promise<Delivery> {
  const until = Date.now() + WAIT_MS;
  for (;;) {
    const row = await deliveryOf(ctx.db.read, ctx.actor, deliveryId);
    if (row.state === "putting-away" && Date.now() < until) {
      await setTimeout(POLL_MS);
      continue;
    }
    const view = await deliveryView(ctx.db.read, row);
    if (row.state === "read" && view.fault !== null)
      throw new AppError("conflict", { user: view.fault.detail });
    return view;
  }
}
