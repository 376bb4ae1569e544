import "server-only";
import { and, asc, eq, gt, sql } from "drizzle-orm";
import type { Db, Tx } from "@/db/client";
import { deliveries, deliveryRows } from "@/db/schema/deliveries";
import { AppError } from "@/lib/errors";
import { openQuestion, tabulatedFigures } from "@/lib/intake/delivery-plan";
import { drawingOf } from "@/lib/intake/inspect-row";
import type { Reading } from "@/lib/intake/schema";
import type { Bay } from "@/lib/schemas/bay";
import { designationKey } from "@/lib/schemas/designation";
import { bayOf } from "../bay/load-bay";
import { ENGINE_VERSION } from "../compute/engine-version";
import { logDeed } from "../log-deed";
import { peopleOf } from "../people";
import { writeShapes, type ShapeToWrite } from "../shape/write-shapes";
import { countRows } from "./count-rows";
import { heldOnRack } from "./held-on-rack";
import { beat, endJob, type Job } from "./job";
import { layoutOf } from "./layout";
import { codeOf, deliveryOf, type DeliveryRecord } from "./load-delivery";
import { againstOf, againstRack } from "./store-rows";
import { cellsOf, planOf, type RowRecord } from "./stored-row";

const CHUNK = 250;

type Tally = { new: number; changed: number; unchanged: number; leftOut: number };

/**
 * Puts a delivery's rows away as released shapes and further revisions, in one transaction: all of it with the log, or nothing.
 * Every row is held against the Rack once more inside it, by the same plan that inspection showed. May run again after a crash:
 * a delivery that is put away already is left as it is.
 */
export const putAwayDelivery = async (db: Db, job: Job): Promise<void> => {
  try {
    await db.write((tx) => putAway(tx, job), "a delivery is being put away");
  } catch (error) {
    if (!(error instanceof AppError) || error.code === "busy" || error.code === "full") throw error;
    await db.write(async (tx) => {
      const failure = JSON.stringify({ code: "putAway.refused", detail: error.user });
      await tx
        .update(deliveries)
        .set({ state: "read", failure, version: sql`${deliveries.version} + 1`, updatedAt: Date.now() })
        .where(eq(deliveries.id, job.deliveryId));
      await endJob(tx, job.id, "failed", error.user);
    });
  }
};

async function putAway(tx: Tx, job: Job): Promise<void> {
  const delivery = await deliveryOf(tx, job.actor, job.deliveryId);
  if (delivery.state !== "putting-away") {
    await endJob(tx, job.id, "done");
    return;
  }
  const { recognised } = layoutOf(delivery.layout);
  if (recognised === null) throw new AppError("conflict", { user: "This delivery has not been read." });
  const bay = await bayOf(tx, job.actor, delivery.bayId);
  const now = Date.now();
  const tally: Tally = { new: 0, changed: 0, unchanged: 0, leftOut: 0 };
  const seen = new Map<string, number>();
  for (let after = 0; ;) {
    const rows = await tx
      .select()
      .from(deliveryRows)
      .where(and(eq(deliveryRows.deliveryId, delivery.id), gt(deliveryRows.ordinal, after)))
      .orderBy(asc(deliveryRows.ordinal))
      .limit(CHUNK);
    if (rows.length === 0) break;
    await putChunkAway(tx, job, { delivery, bay, reading: recognised.reading, now, tally, seen }, rows);
    after = rows.at(-1)?.ordinal ?? after;
  }
  await tx
    .update(deliveries)
    .set({
      state: "put-away",
      counts: JSON.stringify(await countRows(tx, delivery.id)),
      failure: "",
      putAwayBy: job.actor.userId,
      putAwayAt: now,
      version: sql`${deliveries.version} + 1`,
      updatedAt: now,
    })
    .where(eq(deliveries.id, delivery.id));
  await logDeed(
    tx,
    { actor: job.actor, now, requestId: job.requestId },
    {
      verb: "delivery.putAway",
      entity: "delivery",
      entityId: delivery.id,
      subject: `${codeOf(delivery.number)} ${delivery.fileName}`,
      after: { bay: bay.name, ...tally },
    },
  );
  await beat(tx, job.id, 1);
  await endJob(tx, job.id, "done");
}

type Scene = Readonly<{
  delivery: DeliveryRecord;
  bay: Pick<Bay, "id" | "name" | "counts">;
  reading: Reading;
  now: number;
  tally: Tally;
  seen: Map<string, number>;
}>;

async function putChunkAway(tx: Tx, job: Job, scene: Scene, rows: readonly RowRecord[]): Promise<void> {
  const { delivery, bay, reading, now, tally, seen } = scene;
  const kept = rows.filter((row) => row.decision !== "leave-out");
  tally.leftOut += rows.length - kept.length;
  const person = await peopleOf(
    tx,
    kept.map((row) => row.decidedBy),
  );
  const items: { row: RowRecord; shape: ShapeToWrite }[] = [];
  const inspected = kept.map((row) => ({
    row,
    cells: cellsOf(row),
    inspection: planOf(row).inspection,
    decision: row.decision,
  }));
  const compared = await againstRack(tx, delivery, reading, inspected);
  const rack = await heldOnRack(
    tx,
    delivery.organisationId,
    compared.map((c) => designationKey(c.inspection.designation)),
  );
  for (const [i, { inspection, standing }] of compared.entries()) {
    const row = inspected[i]?.row;
    if (row === undefined) continue;
    const key = designationKey(inspection.designation);
    const open = openQuestion(planOf(row).inspection, row.decision);
    if (open !== null) throw refused(row, open);
    if (standing === null || standing.against === "held")
      throw refused(row, standing?.detail ?? "It cannot be drawn.");
    const twin = seen.get(key);
    if (twin !== undefined)
      throw refused(row, `Row ${twin} has the same designation: refuse one of the two.`);
    seen.set(key, row.ordinal);
    if (standing.against === "unchanged") {
      tally.unchanged += 1;
      continue;
    }
    tally[standing.against] += 1;
    const { profile, properties } = inspection;
    if (profile === null || properties === null) throw refused(row, "It cannot be computed.");
    items.push({
      row,
      shape: {
        existing: rack.get(key)?.standing ?? null,
        bayId: bay.id,
        counts: bay.counts,
        family: profile.family,
        designation: inspection.designation,
        title: "",
        series: inspection.series,
        drawing: drawingOf(profile, inspection.designation, reading),
        note: noteOf(delivery, row),
        computed: withoutStrength(properties),
        engineVersion: ENGINE_VERSION,
        tabulated: tabulatedFigures(inspection, row.decision),
        state: "released",
        checkedHow: "computation",
        checkNote: checkNoteOf(row, person(row.decidedBy).name),
        deliveryId: delivery.id,
      },
    });
  }
  const written = await writeShapes(
    tx,
    { actor: job.actor, now },
    items.map((i) => i.shape),
  );
  for (const [i, { row }] of items.entries()) {
    const made = written[i];
    const standing = compared.find((c) => c.inspection.number === row.ordinal)?.standing ?? null;
    if (made === undefined) throw new Error("a shape was not written");
    await tx.raw.execute({
      sql: "UPDATE delivery_rows SET shape_id = ?, revision_ordinal = ?, against = ? WHERE delivery_id = ? AND ordinal = ?",
      args: [made.shapeId, made.ordinal, againstOf(standing), delivery.id, row.ordinal],
    });
  }
}

/** The strength of stock is not part of a table of sizes: what would follow from it is not stored. */
const withoutStrength = (properties: ShapeToWrite["computed"]): ShapeToWrite["computed"] => ({
  ...properties,
  Mp: null,
  squash: null,
  absent: [
    ...properties.absent,
    ...["Mp", "squash"].map((property) => ({
      property,
      code: "stock.noGrade",
      detail: "The table states no grade: choose one where the shape is used.",
    })),
  ],
});

/** Each query bears the name of who decided it. */
const checkNoteOf = (row: RowRecord, who: string): string =>
  row.decision === null
    ? ""
    : `Row ${row.ordinal}: ${row.decision} figures kept by ${who}. ${row.decisionReason}`.trim();

const noteOf = (delivery: DeliveryRecord, row: RowRecord): string =>
  `From delivery ${codeOf(delivery.number)}, row ${row.ordinal}`;

const refused = (row: RowRecord, why: string): AppError =>
  new AppError("conflict", {
    user: `Row ${row.ordinal} (${row.designation === "" ? "no designation" : row.designation}): ${why} Nothing was put away.`,
  });
