import "server-only";
import { eq } from "drizzle-orm";
import type { z } from "zod";
import { organisations } from "@/db/schema/organisations";
import { mayAtAll } from "@/lib/permissions";
import { type Organisation, UpdateOrganisationInput } from "@/lib/schemas/organisation";
import type { VerbArgs, Versioned } from "../context";
import { given } from "../given";
import { logDeed } from "../log-deed";
import { found } from "../not-found";
import { parseInput } from "../parse-input";
import { requireSameVersion } from "../stale";
import { organisationColumns } from "./show";

export const updateOrganisation = async ({
  ctx,
  input,
  version,
}: VerbArgs<z.input<typeof UpdateOrganisationInput>, Versioned>): Promise<Organisation> => {
  mayAtAll(ctx.actor, "organisation.update");
  const changes = given(parseInput(UpdateOrganisationInput, input));
  const own = eq(organisations.id, ctx.actor.organisationId);
  return ctx.db.write(async (tx) => {
    const before = found((await tx.select(organisationColumns).from(organisations).where(own))[0]);
    requireSameVersion(before.version, version);
    const after = { ...before, ...changes, version: version + 1 };
    await tx
      .update(organisations)
      .set({ ...changes, version: after.version })
      .where(own);
    await logDeed(tx, ctx, {
      verb: "organisation.update",
      entity: "organisation",
      entityId: before.id,
      subject: after.name,
      before,
      after: changes,
    });
    return after;
  });
};
