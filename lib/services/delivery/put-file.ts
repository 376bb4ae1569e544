import "server-only";
import { createHash } from "node:crypto";
import { setImmediate } from "node:timers/promises";
import { eq, sql } from "drizzle-orm";
import { deliveries, deliveryFiles } from "@/db/schema/deliveries";
import { AppError } from "@/lib/errors";
import { MAX_FILE_BYTES } from "@/lib/intake/limits";
import { mayAtAll, requireRight } from "@/lib/permissions";
import type { Delivery, DeliveryState } from "@/lib/schemas/delivery";
import type { Ctx, Versioned } from "../context";
import { logDeed } from "../log-deed";
import { requireSameVersion } from "../stale";
import { deliveryView } from "./delivery-view";
import { addJob } from "./job";
import { EMPTY_LAYOUT, layoutJson } from "./layout";
import { codeOf, deliveryOf } from "./load-delivery";
import { startJobs } from "./run-jobs";

/** Pieces in which the file is kept, so that no statement holds the event loop for long. */
const PIECE_BYTES = 256 * 1024;
const TAKES_A_FILE: readonly DeliveryState[] = ["announced", "failed", "stopped"];

/** Keeps the raw file of a delivery and begins to read it. A file that was given back may be replaced by another. */
export const putDeliveryFile = async ({
  ctx,
  deliveryId,
  version,
  bytes,
}: { ctx: Ctx; deliveryId: string; bytes: Uint8Array } & Versioned): Promise<Delivery> => {
  mayAtAll(ctx.actor, "delivery.putFile");
  if (bytes.byteLength === 0)
    throw new AppError("unreadable", { user: "The file is empty: choose another." });
  if (bytes.byteLength > MAX_FILE_BYTES)
    throw new AppError("tooLarge", {
      user: "The file is larger than 25 MB: split it and bring it in as two deliveries.",
    });
  const contentHash = createHash("sha256").update(bytes).digest("hex");
  const view = await ctx.db.write(async (tx) => {
    const before = await deliveryOf(tx, ctx.actor, deliveryId);
    requireRight(ctx.actor, "revision.release", before.bayId);
    requireSameVersion(before.version, version);
    if (!TAKES_A_FILE.includes(before.state))
      throw new AppError("conflict", {
        user: `${codeOf(before.number)} has its file already: begin another delivery.`,
      });
    await tx.delete(deliveryFiles).where(eq(deliveryFiles.deliveryId, deliveryId));
    for (let from = 0, ordinal = 0; from < bytes.byteLength; from += PIECE_BYTES, ordinal += 1) {
      await tx
        .insert(deliveryFiles)
        .values({ deliveryId, ordinal, bytes: Buffer.from(bytes.subarray(from, from + PIECE_BYTES)) });
      await setImmediate();
    }
    await tx
      .update(deliveries)
      .set({
        state: "received",
        sizeBytes: bytes.byteLength,
        contentHash,
        layout: layoutJson(EMPTY_LAYOUT),
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
      verb: "delivery.putFile",
      entity: "delivery",
      entityId: deliveryId,
      subject: `${codeOf(before.number)} ${before.fileName}`,
      after: { sizeBytes: bytes.byteLength, contentHash },
    });
    return deliveryView(tx, await deliveryOf(tx, ctx.actor, deliveryId));
  }, "a delivery's file is being kept");
  await startJobs(ctx.db);
  return view;
};
