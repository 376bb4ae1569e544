import "server-only";
import { createHash } from "node:crypto";
import type { Tx } from "@/db/client";
import { bulkInsert, type Row } from "@/db/bulk-insert";
import type { Drawing } from "@/lib/drawing/schema";
import type { FiguresSource } from "@/lib/schemas/bay";
import { designationKey } from "@/lib/schemas/designation";
import type { Properties, TabulatedFigures } from "@/lib/schemas/properties";
import type { CheckedHow, ShapeFamily } from "@/lib/schemas/shape";
import type { Ctx } from "../context";
import { newId } from "../new-id";
import { columnOf, PROPERTY_KEYS, restOf, scalarsOf, type Scalars } from "./figure-values";
import { FINDER_COLUMNS, finderRow } from "./finder-row";
import { rememberUses, type UserOfShapes } from "./remember-uses";

/** Where a shape stands that gets a further revision; read inside the same transaction. */
export type Standing = Readonly<{
  id: string;
  lastOrdinal: number;
  releasedOrdinal: number | null;
  workingOrdinal: number | null;
  jobs: number;
}>;

export type ShapeToWrite = Readonly<{
  /** Null: a new shape. */
  existing: Standing | null;
  bayId: string;
  /** Which figures count in that bay. */
  counts: FiguresSource;
  family: ShapeFamily;
  designation: string;
  title: string;
  series: string;
  drawing: Drawing;
  note: string;
  computed: Properties;
  engineVersion: string;
  tabulated: TabulatedFigures | null;
  /** A draft goes into the working lane; a released one supersedes what was released before. */
  state: "draft" | "released";
  /** How a released one was checked; the actor is recorded as checker and releaser. */
  checkedHow?: CheckedHow;
  checkNote?: string;
  deliveryId: string | null;
}>;

export type WrittenShape = Readonly<{ shapeId: string; revisionId: string; ordinal: number }>;

const SHAPE_COLUMNS =
  "id organisation_id bay_id family designation designation_key title series released_ordinal working_ordinal last_ordinal created_by version created_at updated_at".split(
    " ",
  );
const REVISION_COLUMNS =
  "id organisation_id shape_id ordinal state drawing content_hash note author_id editors checked_at checked_by checked_how check_note released_at released_by delivery_id version created_at updated_at".split(
    " ",
  );
const FIGURE_COLUMNS = [
  "revision_id",
  "organisation_id",
  "source",
  "engine_version",
  ...PROPERTY_KEYS.map(columnOf),
  "rest",
];

export const contentHashOf = (drawingJson: string): string =>
  createHash("sha256").update(drawingJson).digest("hex");

export const figureRow = (
  revisionId: string,
  organisationId: string,
  source: FiguresSource,
  engineVersion: string,
  values: Scalars,
  rest: object,
): Row => [
  revisionId,
  organisationId,
  source,
  engineVersion,
  ...PROPERTY_KEYS.map((key) => values[key] ?? null),
  JSON.stringify(rest),
];

export const insertFigures = (tx: Tx, rows: readonly Row[]) =>
  bulkInsert(tx, "figures", FIGURE_COLUMNS, rows);

const CHUNK = 250;

/**
 * The one place that writes many shapes: new ones and further revisions of existing ones, with their figures, finder
 * rows and uses, inside the caller's transaction, as hand-made multi-row inserts of 250 rows. A delivery puts 100,000
 * rows away with it; a single save uses it too. The caller has checked rights, designations and duplicates, scoped
 * `existing` to the organisation, computed the figures outside the transaction, and writes the log.
 * @returns one entry for each item, in order.
 */
export const writeShapes = async (
  tx: Tx,
  ctx: Pick<Ctx, "actor" | "now">,
  items: readonly ShapeToWrite[],
): Promise<WrittenShape[]> => {
  const written: WrittenShape[] = [];
  for (let from = 0; from < items.length; from += CHUNK) {
    written.push(...(await writeChunk(tx, ctx, items.slice(from, from + CHUNK))));
  }
  return written;
};

const writeChunk = async (
  tx: Tx,
  ctx: Pick<Ctx, "actor" | "now">,
  items: readonly ShapeToWrite[],
): Promise<WrittenShape[]> => {
  const { organisationId, userId } = ctx.actor;
  const { now } = ctx;
  const shapes: Row[] = [];
  const revisions: Row[] = [];
  const figures: Row[] = [];
  const finder: Row[] = [];
  const users: UserOfShapes[] = [];
  const again: Moved[] = [];
  const written: WrittenShape[] = [];

  for (const item of items) {
    const shapeId = item.existing?.id ?? newId();
    const revisionId = newId();
    const ordinal = (item.existing?.lastOrdinal ?? 0) + 1;
    const released = item.state === "released";
    written.push({ shapeId, revisionId, ordinal });

    const releasedOrdinal = released ? ordinal : (item.existing?.releasedOrdinal ?? null);
    const workingOrdinal = released ? (item.existing?.workingOrdinal ?? null) : ordinal;
    if (item.existing === null) {
      shapes.push([
        shapeId,
        organisationId,
        item.bayId,
        item.family,
        item.designation,
        designationKey(item.designation),
        item.title,
        item.series,
        releasedOrdinal,
        workingOrdinal,
        ordinal,
        userId,
        1,
        now,
        now,
      ]);
    } else {
      again.push({ shapeId, releasedOrdinal, workingOrdinal, ordinal, released });
    }

    const json = JSON.stringify(item.drawing);
    const doneAt = released ? now : null;
    const doneBy = released ? userId : null;
    revisions.push([
      revisionId,
      organisationId,
      shapeId,
      ordinal,
      item.state,
      json,
      contentHashOf(json),
      item.note,
      userId,
      JSON.stringify([userId]),
      doneAt,
      doneBy,
      released ? (item.checkedHow ?? "computation") : null,
      item.checkNote ?? "",
      doneAt,
      doneBy,
      item.deliveryId,
      1,
      now,
      now,
    ]);

    const computed = scalarsOf(item.computed);
    figures.push(
      figureRow(revisionId, organisationId, "computed", item.engineVersion, computed, restOf(item.computed)),
    );
    if (item.tabulated)
      figures.push(figureRow(revisionId, organisationId, "tabulated", "", item.tabulated, {}));
    finder.push(
      finderRow({
        revisionId,
        organisationId,
        bayId: item.bayId,
        shapeId,
        lane: released ? "released" : "working",
        state: item.state,
        ordinal,
        family: item.family,
        designation: item.designation,
        title: item.title,
        counts: item.counts,
        computed,
        tabulated: item.tabulated,
        unsymmetrical: item.computed.unsymmetrical,
        jobs: item.existing?.jobs ?? 0,
      }),
    );
    users.push({ kind: "revision", id: revisionId, drawing: item.drawing });
  }

  await bulkInsert(tx, "shapes", SHAPE_COLUMNS, shapes);
  await moveOn(tx, ctx, again);
  await bulkInsert(tx, "revisions", REVISION_COLUMNS, revisions);
  await insertFigures(tx, figures);
  await bulkInsert(tx, "finder", FINDER_COLUMNS, finder);
  await rememberUses(tx, ctx.actor, users);
  return written;
};

type Moved = Readonly<{
  shapeId: string;
  releasedOrdinal: number | null;
  workingOrdinal: number | null;
  ordinal: number;
  released: boolean;
}>;

const marks = (count: number, mark = "?"): string => Array.from({ length: count }, () => mark).join(",");

/** Existing shapes: the released revision is superseded, the lane's finder row goes, the ordinals move on. */
const moveOn = async (
  tx: Tx,
  { now, actor }: Pick<Ctx, "actor" | "now">,
  moved: readonly Moved[],
): Promise<void> => {
  if (moved.length === 0) return;
  const superseded = moved.filter((m) => m.released).map((m) => m.shapeId);
  const redrafted = moved.filter((m) => !m.released).map((m) => m.shapeId);
  await tx.raw.execute({
    sql: `UPDATE revisions SET state = 'superseded', superseded_at = ?, version = version + 1, updated_at = ?
          WHERE organisation_id = ? AND state = 'released' AND shape_id IN (${marks(superseded.length)})`,
    args: [now, now, actor.organisationId, ...superseded],
  });
  for (const [lane, ids] of [["released", superseded] as const, ["working", redrafted] as const]) {
    await tx.raw.execute({
      sql: `DELETE FROM finder WHERE organisation_id = ? AND lane = ? AND shape_id IN (${marks(ids.length)})`,
      args: [actor.organisationId, lane, ...ids],
    });
  }
  await tx.raw.execute({
    sql: `UPDATE shapes SET released_ordinal = v.column2, working_ordinal = v.column3, last_ordinal = v.column4,
            version = version + 1, updated_at = ?
          FROM (VALUES ${marks(moved.length, "(?,?,?,?)")}) AS v WHERE shapes.id = v.column1 AND organisation_id = ?`,
    args: [
      now,
      ...moved.flatMap((m) => [m.shapeId, m.releasedOrdinal, m.workingOrdinal, m.ordinal]),
      actor.organisationId,
    ],
  });
};
