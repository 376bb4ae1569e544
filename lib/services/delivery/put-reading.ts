import "server-only";
import { and, eq, sql } from "drizzle-orm";
import type { z } from "zod";
import { deliveries } from "@/db/schema/deliveries";
import { readings } from "@/db/schema/readings";
import { AppError } from "@/lib/errors";
import { Reading } from "@/lib/intake/schema";
import { mayAtAll, requireRight } from "@/lib/permissions";
import { PutReadingInput, type Delivery, type DeliveryState } from "@/lib/schemas/delivery";
import type { VerbArgs, Versioned } from "../context";
import { logDeed } from "../log-deed";
import { found } from "../not-found";
import { parseInput } from "../parse-input";
import { requireSameVersion } from "../stale";
import { deliveryView } from "./delivery-view";
import { addJob } from "./job";
import { layoutJson, layoutOf } from "./layout";
import { codeOf, deliveryOf } from "./load-delivery";
import { startJobs } from "./run-jobs";

const MAY_BE_READ_AGAIN: readonly DeliveryState[] = ["read", "failed", "stopped"];

/** Corrects how a delivery's file is read and reads it again at once; mended cells stay mended, decisions are taken anew. */
export const putReading = async ({
  ctx,
  deliveryId,
  version,
  input,
}: VerbArgs<z.input<typeof PutReadingInput>, { deliveryId: string } & Versioned>): Promise<Delivery> => {
  mayAtAll(ctx.actor, "delivery.putReading");
  const { reading, encoding, readingId } = parseInput(PutReadingInput, input);
  const view = await ctx.db.write(async (tx) => {
    const before = await deliveryOf(tx, ctx.actor, deliveryId);
    requireRight(ctx.actor, "revision.release", before.bayId);
    requireSameVersion(before.version, version);
    if (!MAY_BE_READ_AGAIN.includes(before.state) || before.sizeBytes === 0)
      throw new AppError("conflict", {
        user: `${codeOf(before.number)} is ${before.state}: it cannot be read again.`,
      });
    const layout = layoutOf(before.layout);
    const kept =
      readingId === undefined
        ? null
        : found(
            (
              await tx
                .select({ layout: readings.layout })
                .from(readings)
                .where(and(eq(readings.id, readingId), eq(readings.organisationId, ctx.actor.organisationId)))
            )[0],
          );
    const corrected = reading ?? (kept === null ? null : Reading.parse(JSON.parse(kept.layout)));
    await tx
      .update(deliveries)
      .set({
        state: "received",
        layout: layoutJson({ ...layout, corrected, encoding: encoding ?? layout.encoding }),
        counts: "{}",
        failure: "",
        version: sql`${deliveries.version} + 1`,
        updatedAt: ctx.now,
      })
      .where(eq(deliveries.id, deliveryId));
    await addJob(tx, {
      kind: "delivery.read",
      deliveryId,
      actor: ctx.actor,
      requestId: ctx.requestId,
      now: ctx.now,
    });
    await logDeed(tx, ctx, {
      verb: "delivery.putReading",
      entity: "delivery",
      entityId: deliveryId,
      subject: `${codeOf(before.number)} ${before.fileName}`,
      before: { reading: layout.corrected },
      after: { reading: corrected, ...(encoding === undefined ? {} : { encoding }) },
    });
    return deliveryView(tx, await deliveryOf(tx, ctx.actor, deliveryId));
  });
  await startJobs(ctx.db);
  return view;
};
