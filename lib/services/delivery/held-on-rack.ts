import "server-only";
import { and, eq, inArray } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { bays } from "@/db/schema/bays";
import { alias } from "drizzle-orm/sqlite-core";
import { figures } from "@/db/schema/figures";
import { finder } from "@/db/schema/finder";
import { revisions } from "@/db/schema/revisions";
import { shapes } from "@/db/schema/shapes";
import type { Held, TabulatedSet } from "@/lib/intake/delivery-plan";
import { COMPARED_KEYS, UNCOMPARED_KEYS, type FigureKey } from "@/lib/intake/fields";
import { letterOf } from "../shape/letter";
import type { Standing as ShapeStanding } from "../shape/write-shapes";

export type OnRack = Readonly<{ held: Held; standing: ShapeStanding; bayId: string }>;

const tabulated = alias(figures, "tabulated");
const computed = alias(figures, "computed");

const setOf = (row: Readonly<Partial<Record<FigureKey, number | null>>> | null): TabulatedSet =>
  Object.fromEntries(
    [...COMPARED_KEYS, ...UNCOMPARED_KEYS].flatMap((key) => {
      const value = row?.[key] ?? null;
      return value === null ? [] : [[key, value]];
    }),
  );

/** What the Rack holds under these designation keys (at most 250), by key. */
export const heldOnRack = async (
  read: Pick<Reader | Tx, "select">,
  organisationId: string,
  keys: readonly string[],
): Promise<ReadonlyMap<string, OnRack>> => {
  if (keys.length === 0) return new Map();
  const rows = await read
    .select({
      id: shapes.id,
      key: shapes.designationKey,
      bayId: shapes.bayId,
      bay: bays.name,
      lastOrdinal: shapes.lastOrdinal,
      releasedOrdinal: shapes.releasedOrdinal,
      workingOrdinal: shapes.workingOrdinal,
      contentHash: revisions.contentHash,
      deliveryId: revisions.deliveryId,
      state: revisions.state,
      jobs: finder.jobs,
      tabulated,
      computed,
    })
    .from(shapes)
    .innerJoin(bays, eq(bays.id, shapes.bayId))
    .leftJoin(revisions, and(eq(revisions.shapeId, shapes.id), eq(revisions.ordinal, shapes.releasedOrdinal)))
    .leftJoin(tabulated, and(eq(tabulated.revisionId, revisions.id), eq(tabulated.source, "tabulated")))
    .leftJoin(computed, and(eq(computed.revisionId, revisions.id), eq(computed.source, "computed")))
    .leftJoin(finder, eq(finder.id, revisions.id))
    .where(and(eq(shapes.organisationId, organisationId), inArray(shapes.designationKey, [...keys])));
  return new Map(
    rows.map((row) => {
      const held: Held = {
        shapeId: row.id,
        bayId: row.bayId,
        bay: row.bay,
        revision: letterOf(row.releasedOrdinal ?? row.lastOrdinal),
        fromTable: row.deliveryId !== null,
        // A withdrawn revision is never "unchanged": bringing the same table again releases it anew.
        contentHash: row.state === "released" ? (row.contentHash ?? "") : "",
        tabulated: setOf(row.tabulated),
        computed: setOf(row.computed),
        inWork: row.workingOrdinal !== null,
      };
      const { id, lastOrdinal, releasedOrdinal, workingOrdinal } = row;
      return [
        row.key,
        {
          held,
          bayId: row.bayId,
          standing: { id, lastOrdinal, releasedOrdinal, workingOrdinal, jobs: row.jobs ?? 0 },
        },
      ];
    }),
  );
};
