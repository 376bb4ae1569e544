import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import { bays } from "@/db/schema/bays";
import { memberships } from "@/db/schema/memberships";
import { organisations } from "@/db/schema/organisations";
import { users } from "@/db/schema/users";
import { mayAtAll, rightIn } from "@/lib/permissions";
import type { Me } from "@/lib/schemas/session";
import type { Ctx } from "../context";
import { found } from "../not-found";

/** Who is signed in, with the right in every bay as it counts now and the settings that count. */
export const showMe = async ({ ctx }: { ctx: Ctx }): Promise<Me> => {
  const { actor, db } = ctx;
  mayAtAll(actor, "me.show");
  const user = found(
    (
      await db.read
        .select({
          id: users.id,
          name: users.name,
          email: users.email,
          units: users.units,
          decimal: users.decimal,
          theme: users.theme,
          version: users.version,
        })
        .from(users)
        .where(eq(users.id, actor.userId))
    )[0],
  );
  const { notation, units, decimal, ...firm } = found(
    (
      await db.read
        .select({
          id: organisations.id,
          name: organisations.name,
          address: organisations.address,
          fourEyes: organisations.fourEyes,
          notation: organisations.notation,
          units: organisations.units,
          decimal: organisations.decimal,
        })
        .from(organisations)
        .where(eq(organisations.id, actor.organisationId))
    )[0],
  );
  const mine = await db.read
    .select({ id: organisations.id, name: organisations.name })
    .from(memberships)
    .innerJoin(organisations, eq(organisations.id, memberships.organisationId))
    .where(and(eq(memberships.userId, actor.userId), isNull(memberships.suspendedAt)));
  const own = await db.read
    .select({ id: bays.id })
    .from(bays)
    .where(eq(bays.organisationId, actor.organisationId));
  return {
    user: { id: user.id, name: user.name, email: user.email },
    organisation: firm,
    organisations: mine,
    role: actor.role,
    rights: Object.fromEntries(own.map(({ id }) => [id, rightIn(actor, id)])),
    settings: { units: user.units, decimal: user.decimal, theme: user.theme },
    effective: { units: user.units ?? units, decimal: user.decimal ?? decimal, notation },
    version: user.version,
  };
};
