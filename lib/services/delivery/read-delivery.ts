import "server-only";
import { asc, eq, sql } from "drizzle-orm";
import type { Db, Tx } from "@/db/client";
import { bulkInsert, type Row } from "@/db/bulk-insert";
import { deliveries, deliveryFiles, deliveryRows } from "@/db/schema/deliveries";
import { readings } from "@/db/schema/readings";
import { decodeBytes, type DecodedText } from "@/lib/intake/decode-bytes";
import type { FileFault } from "@/lib/intake/file-fault";
import { inspectFile, type InspectedRow } from "@/lib/intake/inspect-file";
import { recogniseFile, type Recognition } from "@/lib/intake/recognise-file";
import { Reading } from "@/lib/intake/schema";
import { ok, type Result } from "@/lib/result";
import { bayOf } from "../bay/load-bay";
import { ColumnAgreement } from "./column-agreement";
import { countRows } from "./count-rows";
import { beat, endJob, type Job } from "./job";
import { layoutJson, layoutOf, mendedCells, type Layout } from "./layout";
import { deliveryOf, type DeliveryRecord } from "./load-delivery";
import { againstRack, ROW_COLUMNS, rowValues } from "./store-rows";

const BATCH = 250;

/**
 * Reads a delivery's file, inspects every row and stores the rows, in transactions of 250. May run again from its start at any
 * time: it begins by clearing its rows. Stops between two batches when asked to.
 */
export const readDelivery = async (db: Db, job: Job): Promise<void> => {
  const delivery = await deliveryOf(db.read, job, job.deliveryId);
  const layout = layoutOf(delivery.layout);
  const decoded = decode(await fileOf(db, delivery.id), layout);
  if (!decoded.ok) return fail(db, job, decoded.error);
  const bay = await bayOf(db.read, job.actor, delivery.bayId);
  const recognised = recogniseFile(decoded.value, {
    corrected: layout.corrected,
    saved: await savedReadings(db, job.organisationId),
  });
  if (!recognised.ok) return fail(db, job, recognised.error);
  const recognition =
    layout.corrected !== null || recognised.value.evidence.reading !== null
      ? recognised.value
      : { ...recognised.value, reading: { ...recognised.value.reading, tolerance: bay.tolerance } };
  await begin(db, job, delivery, layout, recognition);
  const agreement = new ColumnAgreement();
  const fault = await storeRows(db, job, delivery, layout, recognition, agreement);
  if (fault === "stopped") return;
  if (fault !== null) return fail(db, job, fault);
  await db.write(async (tx) => {
    const now = Date.now();
    const counts = await countRows(tx, delivery.id);
    await tx
      .update(deliveries)
      .set({
        state: "read",
        counts: JSON.stringify(counts),
        layout: layoutJson({ ...layout, recognised: recognisedOf(recognition, layout, agreement) }),
        failure: "",
        version: sql`${deliveries.version} + 1`,
        updatedAt: now,
      })
      .where(eq(deliveries.id, delivery.id));
    await endJob(tx, job.id, "done");
  }, "a delivery is being read");
};

/** The bytes as text: as recognised, unless a person has confirmed or chosen an encoding. */
function decode(bytes: Uint8Array, layout: Layout): Result<DecodedText, FileFault> {
  const wanted = layout.corrected?.encoding ?? layout.encoding;
  const plain = decodeBytes(bytes);
  if (wanted === null || (plain.ok && plain.value.encoding === wanted)) return plain;
  const chosen = decodeBytes(bytes, wanted);
  return chosen.ok ? ok(chosen.value) : chosen;
}

const fileOf = async (db: Db, deliveryId: string): Promise<Uint8Array> => {
  const pieces = await db.read
    .select({ bytes: deliveryFiles.bytes })
    .from(deliveryFiles)
    .where(eq(deliveryFiles.deliveryId, deliveryId))
    .orderBy(asc(deliveryFiles.ordinal));
  return Buffer.concat(pieces.map((p) => p.bytes));
};

const savedReadings = async (db: Db, organisationId: string) => {
  const kept = await db.read
    .select({ name: readings.name, layout: readings.layout })
    .from(readings)
    .where(eq(readings.organisationId, organisationId));
  return kept.flatMap(({ name, layout }) => {
    const parsed = Reading.safeParse(JSON.parse(layout));
    return parsed.success ? [{ name, reading: parsed.data }] : [];
  });
};

const begin = (db: Db, job: Job, delivery: DeliveryRecord, layout: Layout, recognition: Recognition) =>
  db.write(async (tx) => {
    await tx.delete(deliveryRows).where(eq(deliveryRows.deliveryId, delivery.id));
    await tx
      .update(deliveries)
      .set({
        state: "reading",
        counts: "{}",
        layout: layoutJson({ ...layout, recognised: recognisedOf(recognition, layout, null) }),
        updatedAt: Date.now(),
      })
      .where(eq(deliveries.id, delivery.id));
    await beat(tx, job.id, 0);
  }, "a delivery is being read");

async function storeRows(
  db: Db,
  job: Job,
  delivery: DeliveryRecord,
  layout: Layout,
  recognition: Recognition,
  agreement: ColumnAgreement,
): Promise<FileFault | "stopped" | null> {
  const { text, lineOffset, reading } = recognition;
  const rows = inspectFile({
    text,
    lineOffset,
    reading,
    mended: (row, cells) => mendedCells(layout, row, cells),
  });
  const lines = countLines(text);
  let batch: InspectedRow[] = [];
  for (;;) {
    const next = rows.next();
    if (next.done !== true) {
      agreement.add(next.value.inspection);
      batch.push(next.value);
    }
    if (batch.length >= BATCH || (next.done === true && batch.length > 0)) {
      const done = (batch.at(-1)?.inspection.line ?? 0) / lines;
      if (await storeBatch(db, job, delivery, layout, recognition, batch, done)) return "stopped";
      batch = [];
    }
    if (next.done === true) return next.value;
  }
}

const countLines = (text: string): number => {
  let lines = 1;
  for (let at = text.indexOf("\n"); at !== -1; at = text.indexOf("\n", at + 1)) lines += 1;
  return lines;
};

const storeBatch = (
  db: Db,
  job: Job,
  delivery: DeliveryRecord,
  layout: Layout,
  recognition: Recognition,
  batch: readonly InspectedRow[],
  progress: number,
): Promise<boolean> =>
  db.write(async (tx: Tx) => {
    const compared = await againstRack(tx, delivery, recognition.reading, batch);
    const values: Row[] = compared.map((row) =>
      rowValues(delivery.id, row, layout.mends[String(row.inspection.number)] ?? []),
    );
    await bulkInsert(tx, "delivery_rows", ROW_COLUMNS, values);
    if (!(await beat(tx, job.id, progress))) return false;
    await tx
      .update(deliveries)
      .set({ state: "stopped", updatedAt: Date.now() })
      .where(eq(deliveries.id, delivery.id));
    await endJob(tx, job.id, "stopped");
    return true;
  }, "a delivery is being read");

const fail = (db: Db, job: Job, fault: FileFault): Promise<void> =>
  db.write(async (tx) => {
    await tx.delete(deliveryRows).where(eq(deliveryRows.deliveryId, job.deliveryId));
    await tx
      .update(deliveries)
      .set({ state: "failed", failure: JSON.stringify(fault), counts: "{}", updatedAt: Date.now() })
      .where(eq(deliveries.id, job.deliveryId));
    await endJob(tx, job.id, "failed", fault.code);
  });

const recognisedOf = (
  recognition: Recognition,
  layout: Layout,
  agreement: ColumnAgreement | null,
): Layout["recognised"] => ({
  reading: recognition.reading,
  columns: recognition.columns.map(({ heading, field, unit, samples, evidence, question }) => ({
    heading,
    field,
    unit,
    samples: [...samples],
    evidence,
    question,
    ...(agreement?.of(field, unit) ?? { worst: null, compared: 0, suggestion: null }),
  })),
  evidence: recognition.evidence,
  questions: recognition.questions,
  corrected: layout.corrected !== null,
});
