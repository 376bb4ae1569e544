import "server-only";
import { and, eq } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { bays } from "@/db/schema/bays";
import { revisions } from "@/db/schema/revisions";
import { shapes } from "@/db/schema/shapes";
import { atLeast, rightIn } from "@/lib/permissions";
import type { Actor } from "@/lib/schemas/access";
import { found, notFound } from "../not-found";

type Read = Pick<Reader | Tx, "select">;

/** A shape of the actor's organisation with its bay, or not found. One that was never released is there only for who may draft in its bay. */
export const shapeOf = async (read: Read, actor: Actor, shapeId: string) => {
  const [row] = await read
    .select({
      shape: shapes,
      bay: { id: bays.id, name: bays.name, ordinal: bays.ordinal, counts: bays.counts },
    })
    .from(shapes)
    .innerJoin(bays, eq(bays.id, shapes.bayId))
    .where(and(eq(shapes.id, shapeId), eq(shapes.organisationId, actor.organisationId)));
  const { shape, bay } = found(row);
  if (shape.releasedOrdinal === null && !seesWork(actor, bay.id)) throw notFound();
  return { ...shape, bay };
};

export type LoadedShape = Awaited<ReturnType<typeof shapeOf>>;

/** Who may draft in a bay sees its drafts; everybody else sees what is, or was, released. */
export const seesWork = (actor: Actor, bayId: string): boolean => atLeast(rightIn(actor, bayId), "draft");

/** A revision by its ordinal, or not found; work in progress only for who may see it. */
export const revisionOf = async (read: Read, actor: Actor, shape: LoadedShape, ordinal: number) => {
  const [row] = await read
    .select()
    .from(revisions)
    .where(
      and(
        eq(revisions.shapeId, shape.id),
        eq(revisions.ordinal, ordinal),
        eq(revisions.organisationId, actor.organisationId),
      ),
    );
  const revision = found(row);
  if ((revision.state === "draft" || revision.state === "submitted") && !seesWork(actor, shape.bay.id)) {
    throw notFound();
  }
  return revision;
};

export type LoadedRevision = typeof revisions.$inferSelect;
