import "server-only";
import { eq } from "drizzle-orm";
import type { z } from "zod";
import { readings } from "@/db/schema/readings";
import { mayAtAll } from "@/lib/permissions";
import { UpdateReadingInput, type KeptReading } from "@/lib/schemas/reading";
import type { VerbArgs, Versioned } from "../context";
import { logDeed } from "../log-deed";
import { parseInput } from "../parse-input";
import { requireSameVersion } from "../stale";
import { headingKeyOf, readingOf, readingViews, refuseTakenReading } from "./load-reading";

/** Renames a kept reading, or says anew how it reads. */
export const updateReading = async ({
  ctx,
  readingId,
  version,
  input,
}: VerbArgs<z.input<typeof UpdateReadingInput>, { readingId: string } & Versioned>): Promise<KeptReading> => {
  mayAtAll(ctx.actor, "reading.update");
  const { name, reading } = parseInput(UpdateReadingInput, input);
  return ctx.db
    .write(async (tx) => {
      const before = await readingOf(tx, ctx.actor, readingId);
      requireSameVersion(before.version, version);
      await tx
        .update(readings)
        .set({
          ...(name === undefined ? {} : { name }),
          ...(reading === undefined
            ? {}
            : { layout: JSON.stringify(reading), headingKey: headingKeyOf(reading) }),
          version: version + 1,
          updatedAt: ctx.now,
        })
        .where(eq(readings.id, readingId));
      await logDeed(tx, ctx, {
        verb: "reading.update",
        entity: "reading",
        entityId: readingId,
        subject: name ?? before.name,
        before: { name: before.name },
        after: { name: name ?? before.name, ...(reading === undefined ? {} : { reading }) },
      });
      const [view] = await readingViews(tx, [await readingOf(tx, ctx.actor, readingId)]);
      if (view === undefined) throw new Error("a reading was not kept");
      return view;
    })
    .catch(refuseTakenReading);
};
