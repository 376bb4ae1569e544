import "server-only";
import { and, asc, count, eq } from "drizzle-orm";
import type { z } from "zod";
import type { Tx } from "@/db/client";
import { bays } from "@/db/schema/bays";
import { finder } from "@/db/schema/finder";
import { mayAtAll, rightIn } from "@/lib/permissions";
import type { Actor } from "@/lib/schemas/access";
import { type Bay, UpdateBayInput } from "@/lib/schemas/bay";
import type { VerbArgs, Versioned } from "../context";
import { given } from "../given";
import { logDeed } from "../log-deed";
import { parseInput } from "../parse-input";
import { rewriteFinder } from "../shape/rewrite-finder";
import { requireSameVersion } from "../stale";
import { refuseTakenName } from "./create";
import { bayOf } from "./load-bay";

/** Renames a bay, moves it in the strip, or says which figures count; the search follows in the same transaction. */
export const updateBay = async ({
  ctx,
  bayId,
  version,
  input,
}: VerbArgs<z.input<typeof UpdateBayInput>, { bayId: string } & Versioned>): Promise<Bay> => {
  mayAtAll(ctx.actor, "bay.update");
  const { ordinal, ...changes } = given(parseInput(UpdateBayInput, input));
  return ctx.db
    .write(async (tx) => {
      const before = await bayOf(tx, ctx.actor, bayId);
      requireSameVersion(before.version, version);
      await tx
        .update(bays)
        .set({ ...changes, version: version + 1 })
        .where(eq(bays.id, bayId));
      if (ordinal !== undefined) await moveTo(tx, ctx.actor, bayId, ordinal);
      if (changes.counts !== undefined && changes.counts !== before.counts)
        await rewriteFinder(tx, ctx.actor, { bayId });
      const after = await bayOf(tx, ctx.actor, bayId);
      await logDeed(tx, ctx, {
        verb: "bay.update",
        entity: "bay",
        entityId: bayId,
        subject: after.name,
        before,
        after,
      });
      const [row] = await tx
        .select({ shapes: count() })
        .from(finder)
        .where(
          and(
            eq(finder.organisationId, ctx.actor.organisationId),
            eq(finder.state, "released"),
            eq(finder.bayId, bayId),
          ),
        );
      return { ...after, shapes: row?.shapes ?? 0, right: rightIn(ctx.actor, bayId) };
    })
    .catch(refuseTakenName);
};

/** Numbers the strip anew with the bay at its new place. */
const moveTo = async (tx: Tx, actor: Actor, bayId: string, ordinal: number): Promise<void> => {
  const rows = await tx
    .select({ id: bays.id, ordinal: bays.ordinal })
    .from(bays)
    .where(eq(bays.organisationId, actor.organisationId))
    .orderBy(asc(bays.ordinal), asc(bays.id));
  const others = rows.filter((row) => row.id !== bayId);
  const order = [...others.slice(0, ordinal - 1), { id: bayId, ordinal: 0 }, ...others.slice(ordinal - 1)];
  for (const [index, row] of order.entries()) {
    if (row.ordinal === index + 1) continue;
    await tx
      .update(bays)
      .set({ ordinal: index + 1 })
      .where(eq(bays.id, row.id));
  }
};
