import "server-only";
import { eq } from "drizzle-orm";
import type { z } from "zod";
import { users } from "@/db/schema/users";
import { mayAtAll } from "@/lib/permissions";
import { type Me, UpdateMeInput } from "@/lib/schemas/session";
import type { VerbArgs, Versioned } from "../context";
import { logDeed } from "../log-deed";
import { found } from "../not-found";
import { parseInput } from "../parse-input";
import { requireSameVersion } from "../stale";
import { given } from "../given";
import { showMe } from "./show";

/** Changes one's own name and settings. */
export const updateMe = async ({
  ctx,
  input,
  version,
}: VerbArgs<z.input<typeof UpdateMeInput>, Versioned>): Promise<Me> => {
  mayAtAll(ctx.actor, "me.update");
  const changes = given(parseInput(UpdateMeInput, input));
  await ctx.db.write(async (tx) => {
    const before = found(
      (
        await tx
          .select({
            name: users.name,
            units: users.units,
            decimal: users.decimal,
            theme: users.theme,
            version: users.version,
          })
          .from(users)
          .where(eq(users.id, ctx.actor.userId))
      )[0],
    );
    requireSameVersion(before.version, version);
    await tx
      .update(users)
      .set({ ...changes, version: version + 1 })
      .where(eq(users.id, ctx.actor.userId));
    await logDeed(tx, ctx, {
      verb: "me.update",
      entity: "user",
      entityId: ctx.actor.userId,
      subject: changes.name ?? before.name,
      before,
      after: changes,
    });
  });
  return showMe({ ctx });
};
