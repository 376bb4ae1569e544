import "server-only";
import type { z } from "zod";
import { readings } from "@/db/schema/readings";
import { mayAtAll } from "@/lib/permissions";
import { CreateReadingInput, type KeptReading } from "@/lib/schemas/reading";
import type { VerbArgs } from "../context";
import { logDeed } from "../log-deed";
import { newId } from "../new-id";
import { parseInput } from "../parse-input";
import { headingKeyOf, readingOf, readingViews, refuseTakenReading } from "./load-reading";

/** Keeps how a supplier's table is read, by name. */
export const createReading = async ({
  ctx,
  input,
}: VerbArgs<z.input<typeof CreateReadingInput>>): Promise<KeptReading> => {
  mayAtAll(ctx.actor, "reading.create");
  const { name, reading } = parseInput(CreateReadingInput, input);
  const id = newId();
  return ctx.db
    .write(async (tx) => {
      await tx.insert(readings).values({
        id,
        organisationId: ctx.actor.organisationId,
        name,
        layout: JSON.stringify(reading),
        headingKey: headingKeyOf(reading),
        createdBy: ctx.actor.userId,
        createdAt: ctx.now,
        updatedAt: ctx.now,
      });
      await logDeed(tx, ctx, {
        verb: "reading.create",
        entity: "reading",
        entityId: id,
        subject: name,
        after: { reading },
      });
      const [view] = await readingViews(tx, [await readingOf(tx, ctx.actor, id)]);
      if (view === undefined) throw new Error("a reading was not kept");
      return view;
    })
    .catch(refuseTakenReading);
};
