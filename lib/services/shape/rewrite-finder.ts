import "server-only";
import { and, countDistinct, eq, gt, inArray, or } from "drizzle-orm";
import { alias } from "drizzle-orm/sqlite-core";
import { bulkInsert } from "@/db/bulk-insert";
import type { Tx } from "@/db/client";
import { bays } from "@/db/schema/bays";
import { figures } from "@/db/schema/figures";
import { finder } from "@/db/schema/finder";
import { revisions } from "@/db/schema/revisions";
import { shapes } from "@/db/schema/shapes";
import { takes } from "@/db/schema/takes";
import type { Actor } from "@/lib/schemas/access";
import type { Properties } from "@/lib/schemas/properties";
import { FINDER_COLUMNS, finderRow } from "./finder-row";

const computed = alias(figures, "computed");
const tabulated = alias(figures, "tabulated");
const BATCH = 250;

/**
 * Makes the finder rows of one shape, or of all shapes of a bay, anew from what is stored, in the transaction that
 * changed it: the finder never says anything else than revisions, figures and bays do.
 */
export const rewriteFinder = async (
  tx: Tx,
  actor: Actor,
  which: Readonly<{ shapeId: string } | { bayId: string }>,
): Promise<void> => {
  for (let after = ""; ;) {
    const ids = await tx
      .select({ id: shapes.id })
      .from(shapes)
      .where(
        and(
          eq(shapes.organisationId, actor.organisationId),
          "shapeId" in which ? eq(shapes.id, which.shapeId) : eq(shapes.bayId, which.bayId),
          gt(shapes.id, after),
        ),
      )
      .orderBy(shapes.id)
      .limit(BATCH);
    const last = ids.at(-1);
    if (last === undefined) return;
    await rewriteBatch(
      tx,
      actor.organisationId,
      ids.map((row) => row.id),
    );
    if (ids.length < BATCH) return;
    after = last.id;
  }
};

const rewriteBatch = async (tx: Tx, organisationId: string, ids: readonly string[]): Promise<void> => {
  const rows = await tx
    .select({
      shape: shapes,
      revision: { id: revisions.id, ordinal: revisions.ordinal, state: revisions.state },
      counts: bays.counts,
      computed,
      tabulated,
    })
    .from(shapes)
    .innerJoin(bays, eq(bays.id, shapes.bayId))
    .innerJoin(
      revisions,
      and(
        eq(revisions.shapeId, shapes.id),
        or(eq(revisions.ordinal, shapes.releasedOrdinal), eq(revisions.ordinal, shapes.workingOrdinal)),
      ),
    )
    .innerJoin(computed, and(eq(computed.revisionId, revisions.id), eq(computed.source, "computed")))
    .leftJoin(tabulated, and(eq(tabulated.revisionId, revisions.id), eq(tabulated.source, "tabulated")))
    .where(and(eq(shapes.organisationId, organisationId), inArray(shapes.id, [...ids])));
  const jobs = await tx
    .select({ shapeId: takes.shapeId, jobs: countDistinct(takes.jobNumber) })
    .from(takes)
    .where(inArray(takes.shapeId, [...ids]))
    .groupBy(takes.shapeId);
  const jobsOf = new Map(jobs.map((row) => [row.shapeId, row.jobs]));

  await tx
    .delete(finder)
    .where(and(eq(finder.organisationId, organisationId), inArray(finder.shapeId, [...ids])));
  await bulkInsert(
    tx,
    "finder",
    FINDER_COLUMNS,
    rows.flatMap(({ shape, revision, counts, computed: values, tabulated: table }) => {
      const { state } = revision;
      if (state === "superseded") return [];
      const { unsymmetrical } = JSON.parse(values.rest) as Pick<Properties, "unsymmetrical">;
      return [
        finderRow({
          revisionId: revision.id,
          organisationId,
          bayId: shape.bayId,
          shapeId: shape.id,
          lane: revision.ordinal === shape.workingOrdinal ? "working" : "released",
          state,
          ordinal: revision.ordinal,
          family: shape.family,
          designation: shape.designation,
          title: shape.title,
          counts,
          computed: values,
          tabulated: table,
          unsymmetrical,
          jobs: jobsOf.get(shape.id) ?? 0,
        }),
      ];
    }),
  );
};
