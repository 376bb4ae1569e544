import "server-only";
import { eq } from "drizzle-orm";
import { organisations } from "@/db/schema/organisations";
import { mayAtAll } from "@/lib/permissions";
import type { Organisation } from "@/lib/schemas/organisation";
import type { Ctx } from "../context";
import { found } from "../not-found";

export const organisationColumns = {
  id: organisations.id,
  name: organisations.name,
  address: organisations.address,
  notation: organisations.notation,
  units: organisations.units,
  decimal: organisations.decimal,
  fourEyes: organisations.fourEyes,
  version: organisations.version,
};

export const showOrganisation = async ({ ctx }: { ctx: Ctx }): Promise<Organisation> => {
  mayAtAll(ctx.actor, "organisation.show");
  const rows = await ctx.db.read
    .select(organisationColumns)
    .from(organisations)
    .where(eq(organisations.id, ctx.actor.organisationId));
  return found(rows[0]);
};
