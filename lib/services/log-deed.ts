import "server-only";
import { newId } from "./new-id";
import type { Tx } from "@/db/client";
import { log } from "@/db/schema/log";
import type { Verb } from "@/lib/permissions";
import type { Ctx } from "./context";

export type Deed = Readonly<{
  verb: Verb;
  entity: string;
  entityId: string;
  /** What people call it. */
  subject: string;
  before?: Readonly<Record<string, unknown>> | null;
  after?: Readonly<Record<string, unknown>> | null;
}>;

const jsonOf = (value: Deed["before"]): string | null => (value ? JSON.stringify(value) : null);

/** Writes a deed into the log, in the transaction that does it. */
export const logDeed = async (tx: Tx, ctx: Omit<Ctx, "db">, deed: Deed): Promise<void> => {
  await tx.insert(log).values({
    id: newId(),
    organisationId: ctx.actor.organisationId,
    at: ctx.now,
    actorId: ctx.actor.userId,
    actorName: ctx.actor.name,
    verb: deed.verb,
    entity: deed.entity,
    entityId: deed.entityId,
    subject: deed.subject,
    before: jsonOf(deed.before),
    after: jsonOf(deed.after),
    requestId: ctx.requestId,
  });
};
