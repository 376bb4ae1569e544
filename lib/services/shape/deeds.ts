import "server-only";
import { and, desc, eq, inArray } from "drizzle-orm";
import { log } from "@/db/schema/log";
import { mayAtAll, type Verb } from "@/lib/permissions";
import type { ShapeDeedList } from "@/lib/schemas/comment";
import type { Ctx } from "../context";
import { iso } from "../moments";
import { seesWork, shapeOf } from "./load-shape";

const MOST = 300;

/** Deeds of a shape in words, and whether everybody hears of them or only who sees work in progress. */
const WORDS: Partial<Record<Verb, readonly [words: string, everybody: boolean]>> = {
  "shape.create": ["drafted", false],
  "shape.update": ["changed the heading of", true],
  "revision.create": ["began", false],
  "revision.update": ["saved", false],
  "revision.discard": ["threw away", false],
  "revision.submit": ["submitted", false],
  "revision.check": ["checked", false],
  "revision.sendBack": ["sent back", false],
  "revision.release": ["released", true],
  "revision.withdraw": ["withdrew", true],
  "delivery.putAway": ["put away", true],
  "delivery.return": ["returned", true],
  "take.create": ["took", true],
  "take.delete": ["took off a take of", true],
  "shape.tag": ["tagged", true],
};

/** The sentence after the subject: reason, note, how it was checked, which job. */
const detailOf = (subject: string, text: string | null): string => {
  const told = text === null ? {} : (JSON.parse(text) as Record<string, unknown>);
  const said = ["reason", "how", "note", "jobNumber", "jobName", "quantity", "title"].flatMap((key) => {
    const value = told[key];
    return typeof value === "string" && value !== ""
      ? [value]
      : typeof value === "number"
        ? [`${value} pieces`]
        : [];
  });
  return [subject, ...said].join(" · ");
};

/** The deeds of a shape, newest first (the last 300). */
export const listShapeDeeds = async ({
  ctx,
  shapeId,
}: {
  ctx: Ctx;
  shapeId: string;
}): Promise<ShapeDeedList> => {
  mayAtAll(ctx.actor, "shape.deeds");
  const shape = await shapeOf(ctx.db.read, ctx.actor, shapeId);
  const work = seesWork(ctx.actor, shape.bay.id);
  const told = Object.entries(WORDS)
    .filter(([, [, everybody]]) => everybody || work)
    .map(([verb]) => verb);
  const rows = await ctx.db.read
    .select()
    .from(log)
    .where(
      and(
        eq(log.organisationId, ctx.actor.organisationId),
        eq(log.entityId, shape.id),
        inArray(log.verb, told),
      ),
    )
    .orderBy(desc(log.id))
    .limit(MOST);
  return {
    items: rows.map((row) => ({
      id: row.id,
      verb: WORDS[row.verb as Verb]?.[0] ?? row.verb,
      by: row.actorName,
      at: iso(row.at),
      detail: detailOf(row.subject, row.after ?? row.before),
    })),
  };
};
