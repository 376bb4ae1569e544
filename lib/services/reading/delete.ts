import "server-only";
import { eq } from "drizzle-orm";
import { readings } from "@/db/schema/readings";
import { mayAtAll } from "@/lib/permissions";
import type { Ctx, Versioned } from "../context";
import { logDeed } from "../log-deed";
import { requireSameVersion } from "../stale";
import { readingOf } from "./load-reading";

/** Forgets a kept reading; deliveries that were read by it stay as they are. */
export const deleteReading = async ({
  ctx,
  readingId,
  version,
}: { ctx: Ctx; readingId: string } & Versioned): Promise<void> => {
  mayAtAll(ctx.actor, "reading.delete");
  await ctx.db.write(async (tx) => {
    const before = await readingOf(tx, ctx.actor, readingId);
    requireSameVersion(before.version, version);
    await tx.delete(readings).where(eq(readings.id, readingId));
    await logDeed(tx, ctx, {
      verb: "reading.delete",
      entity: "reading",
      entityId: readingId,
      subject: before.name,
      before: { layout: before.layout },
    });
  });
};
