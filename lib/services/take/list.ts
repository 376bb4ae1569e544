import "server-only";
import { and, desc, eq } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { takes } from "@/db/schema/takes";
import { mayAtAll } from "@/lib/permissions";
import type { Actor } from "@/lib/schemas/access";
import type { Take, TakeList } from "@/lib/schemas/take";
import type { Ctx } from "../context";
import { iso } from "../moments";
import { peopleOf } from "../people";
import { letterOf } from "../shape/letter";
import { shapeOf } from "../shape/load-shape";

const MOST = 1000;

/** Which jobs took a shape, the newest first (the last thousand). */
export const listTakes = async ({ ctx, shapeId }: { ctx: Ctx; shapeId: string }): Promise<TakeList> => {
  mayAtAll(ctx.actor, "take.list");
  const shape = await shapeOf(ctx.db.read, ctx.actor, shapeId);
  return { items: await takesOf(ctx.db.read, ctx.actor, shape.id) };
};

export const takesOf = async (
  read: Pick<Reader | Tx, "select">,
  actor: Actor,
  shapeId: string,
): Promise<Take[]> => {
  const rows = await read
    .select()
    .from(takes)
    .where(and(eq(takes.shapeId, shapeId), eq(takes.organisationId, actor.organisationId)))
    .orderBy(desc(takes.id))
    .limit(MOST);
  const person = await peopleOf(
    read,
    rows.map((row) => row.takenBy),
  );
  return rows.map((row) => ({
    id: row.id,
    ordinal: row.ordinal,
    letter: letterOf(row.ordinal),
    jobNumber: row.jobNumber,
    jobName: row.jobName,
    pieceMark: row.pieceMark,
    quantity: row.quantity,
    lengthMm: row.lengthMm,
    by: person(row.takenBy),
    at: iso(row.createdAt),
  }));
};
