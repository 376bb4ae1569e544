import "server-only";
import { and, desc, eq, gte, lt, or } from "drizzle-orm";
import type { z } from "zod";
import { log } from "@/db/schema/log";
import { mayAtAll } from "@/lib/permissions";
import { type LogEntry, type LogPage, LogQuery } from "@/lib/schemas/log";
import { contains } from "../contains";
import type { VerbArgs } from "../context";
import { decodeCursor, DEFAULT_PAGE, pageFrom } from "../cursor";
import { iso } from "../moments";
import { parseInput } from "../parse-input";

const DAY_MS = 86_400_000;

/** The moment a filter begins or ends: a bare day means the whole of it. */
const momentOf = (text: string, end: boolean): number =>
  Date.parse(text) + (end && /^\d{4}-\d\d-\d\d$/.test(text) ? DAY_MS : 0);

export const toLogEntry = (row: typeof log.$inferSelect): LogEntry => ({
  id: row.id,
  at: iso(row.at),
  actor: { id: row.actorId, name: row.actorName },
  verb: row.verb,
  entity: row.entity,
  entityId: row.entityId,
  subject: row.subject,
  before: recordOf(row.before),
  after: recordOf(row.after),
  requestId: row.requestId,
});

const recordOf = (text: string | null): Record<string, unknown> | null =>
  text === null ? null : (JSON.parse(text) as Record<string, unknown>);

/** The log of deeds, newest first. */
export const listLog = async ({ ctx, input }: VerbArgs<z.input<typeof LogQuery>>): Promise<LogPage> => {
  mayAtAll(ctx.actor, "log.list");
  const query = parseInput(LogQuery, input);
  const limit = query.limit ?? DEFAULT_PAGE;
  const after = query.cursor === undefined ? undefined : String(decodeCursor(query.cursor, 1)[0]);
  const rows = await ctx.db.read
    .select()
    .from(log)
    .where(
      and(
        eq(log.organisationId, ctx.actor.organisationId),
        after === undefined ? undefined : lt(log.id, after),
        query.actor === undefined ? undefined : eq(log.actorId, query.actor),
        query.verb === undefined ? undefined : eq(log.verb, query.verb),
        query.entity === undefined ? undefined : eq(log.entityId, query.entity),
        query.from === undefined ? undefined : gte(log.at, momentOf(query.from, false)),
        query.to === undefined ? undefined : lt(log.at, momentOf(query.to, true)),
        query.q === undefined
          ? undefined
          : or(contains(log.subject, query.q), contains(log.actorName, query.q)),
      ),
    )
    .orderBy(desc(log.id))
    .limit(limit + 1);
  return pageFrom(rows, limit, toLogEntry, (row) => [row.id]);
};
