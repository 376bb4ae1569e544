import "server-only";
import { and, eq, gt, inArray, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Tx } from "@/db/client";
import { deliveries } from "@/db/schema/deliveries";
import { drawingUses } from "@/db/schema/drawing-uses";
import { revisions } from "@/db/schema/revisions";
import { shapes } from "@/db/schema/shapes";
import { takes } from "@/db/schema/takes";
import { AppError } from "@/lib/errors";
import type { Fault } from "@/lib/result";
import { mayAtAll, requireRight } from "@/lib/permissions";
import { ReturnDeliveryInput, type Delivery } from "@/lib/schemas/delivery";
import type { Ctx, VerbArgs, Versioned } from "../context";
import { logDeed } from "../log-deed";
import { parseInput } from "../parse-input";
import { rewriteFinder } from "../shape/rewrite-finder";
import { letterOf } from "../shape/letter";
import { requireSameVersion } from "../stale";
import { deliveryView } from "./delivery-view";
import { codeOf, deliveryOf } from "./load-delivery";

const LISTED = 50;

/**
 * Takes a whole delivery back: the revisions it brought are withdrawn with the reason, and what they superseded is released
 * again. Refused, with a list, when something was built on one of them: a take, a drawing, a later revision.
 */
export const returnDelivery = async ({
  ctx,
  deliveryId,
  version,
  input,
}: VerbArgs<z.input<typeof ReturnDeliveryInput>, { deliveryId: string } & Versioned>): Promise<Delivery> => {
  mayAtAll(ctx.actor, "delivery.return");
  const { reason } = parseInput(ReturnDeliveryInput, input);
  return ctx.db.write(async (tx) => {
    const before = await deliveryOf(tx, ctx.actor, deliveryId);
    requireRight(ctx.actor, "revision.withdraw", before.bayId);
    requireSameVersion(before.version, version);
    if (before.state !== "put-away")
      throw new AppError("conflict", {
        user: `${codeOf(before.number)} is ${before.state}: only a delivery that was put away can be returned.`,
      });
    const brought = await broughtBy(tx, ctx, deliveryId);
    await refuseBuiltUpon(tx, brought);
    await takeBack(tx, ctx, before.number, brought, reason);
    await tx
      .update(deliveries)
      .set({
        state: "returned",
        returnedBy: ctx.actor.userId,
        returnedAt: ctx.now,
        returnReason: reason,
        version: sql`${deliveries.version} + 1`,
        updatedAt: ctx.now,
      })
      .where(eq(deliveries.id, deliveryId));
    await logDeed(tx, ctx, {
      verb: "delivery.return",
      entity: "delivery",
      entityId: deliveryId,
      subject: `${codeOf(before.number)} ${before.fileName}`,
      before: { state: "put-away" },
      after: { state: "returned", reason, revisions: brought.length },
    });
    return deliveryView(tx, await deliveryOf(tx, ctx.actor, deliveryId));
  }, "a delivery is being returned");
};

type Brought = Readonly<{
  id: string;
  shapeId: string;
  ordinal: number;
  designation: string;
  lastOrdinal: number;
}>;

const broughtBy = (tx: Tx, ctx: Ctx, deliveryId: string): Promise<Brought[]> =>
  tx
    .select({
      id: revisions.id,
      shapeId: revisions.shapeId,
      ordinal: revisions.ordinal,
      designation: shapes.designation,
      lastOrdinal: shapes.lastOrdinal,
    })
    .from(revisions)
    .innerJoin(shapes, eq(shapes.id, revisions.shapeId))
    .where(and(eq(revisions.deliveryId, deliveryId), eq(revisions.organisationId, ctx.actor.organisationId)));

async function refuseBuiltUpon(tx: Tx, brought: readonly Brought[]): Promise<void> {
  const built: Fault[] = [];
  const say = (b: Brought, what: string) =>
    built.push({
      code: "return.builtUpon",
      detail: `${b.designation}, revision ${letterOf(b.ordinal)}: ${what}`,
      pointer: `/shapes/${b.shapeId}`,
    });
  for (const chunk of chunks(brought)) {
    const ids = chunk.map((b) => b.shapeId);
    const taken = await tx
      .select({ shapeId: takes.shapeId, ordinal: takes.ordinal, job: takes.jobNumber })
      .from(takes)
      .where(inArray(takes.shapeId, ids));
    const used = await tx
      .select({ shapeId: drawingUses.shapeId, ordinal: drawingUses.ordinal })
      .from(drawingUses)
      .where(inArray(drawingUses.shapeId, ids));
    for (const b of chunk) {
      const jobs = taken.filter((t) => t.shapeId === b.shapeId && t.ordinal === b.ordinal).map((t) => t.job);
      if (jobs.length > 0) say(b, `taken for ${[...new Set(jobs)].join(", ")}`);
      if (used.some((u) => u.shapeId === b.shapeId && u.ordinal === b.ordinal)) say(b, "used in a drawing");
      if (b.lastOrdinal > b.ordinal) say(b, "has a later revision");
    }
  }
  if (built.length === 0) return;
  throw new AppError("conflict", {
    user: `Something was built on ${built.length === 1 ? "1 shape" : `${built.length} shapes`} of this delivery. Withdraw those one by one, or undo what was built.`,
    issues: built.slice(0, LISTED),
  });
}

async function takeBack(
  tx: Tx,
  ctx: Ctx,
  number: number,
  brought: readonly Brought[],
  reason: string,
): Promise<void> {
  for (const chunk of chunks(brought)) {
    await tx
      .update(revisions)
      .set({
        state: "withdrawn",
        withdrawnAt: ctx.now,
        withdrawnBy: ctx.actor.userId,
        withdrawnReason: `${codeOf(number)} returned: ${reason}`,
        version: sql`${revisions.version} + 1`,
        updatedAt: ctx.now,
      })
      .where(
        inArray(
          revisions.id,
          chunk.map((b) => b.id),
        ),
      );
    for (const b of chunk) {
      if (b.ordinal > 1) await releaseAgain(tx, ctx, b);
      await rewriteFinder(tx, ctx.actor, { shapeId: b.shapeId });
    }
  }
}

/** The revision that the delivery's superseded counts again, when it was released. */
async function releaseAgain(tx: Tx, ctx: Ctx, b: Brought): Promise<void> {
  const [earlier] = await tx
    .select({ ordinal: sql<number | null>`max(${revisions.ordinal})` })
    .from(revisions)
    .where(
      and(
        eq(revisions.shapeId, b.shapeId),
        eq(revisions.state, "superseded"),
        gt(sql`${b.ordinal}`, revisions.ordinal),
      ),
    );
  const ordinal = earlier?.ordinal ?? null;
  if (ordinal === null) return;
  await tx
    .update(revisions)
    .set({
      state: "released",
      supersededAt: null,
      version: sql`${revisions.version} + 1`,
      updatedAt: ctx.now,
    })
    .where(and(eq(revisions.shapeId, b.shapeId), eq(revisions.ordinal, ordinal)));
  await tx
    .update(shapes)
    .set({ releasedOrdinal: ordinal, version: sql`${shapes.version} + 1`, updatedAt: ctx.now })
    .where(eq(shapes.id, b.shapeId));
}

function* chunks<T>(items: readonly T[], size = 250): Generator<readonly T[]> {
  for (let from = 0; from < items.length; from += size) yield items.slice(from, from + size);
}
