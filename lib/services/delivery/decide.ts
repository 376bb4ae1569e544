import "server-only";
import { and, eq, isNull, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Tx } from "@/db/client";
import { deliveries, deliveryRows } from "@/db/schema/deliveries";
import { AppError } from "@/lib/errors";
import { choicesFor, type Decision } from "@/lib/intake/delivery-plan";
import { mayAtAll, requireRight } from "@/lib/permissions";
import { DecideRowInput, type DecidedRows, type Mend } from "@/lib/schemas/delivery";
import type { Ctx, VerbArgs, Versioned } from "../context";
import { logDeed } from "../log-deed";
import { iso } from "../moments";
import { found } from "../not-found";
import { parseInput } from "../parse-input";
import { peopleOf } from "../people";
import { requireSameVersion } from "../stale";
import { countRows } from "./count-rows";
import { layoutJson, layoutOf, materialOf } from "./layout";
import { codeOf, deliveryOf, type DeliveryRecord } from "./load-delivery";
import { mendedRow, type Mended } from "./mend-row";
import { againstOf, againstRack } from "./store-rows";
import { causeOf, mendsOf, planOf, rowDetail, type RowRecord } from "./stored-row";
import { refreshTwins } from "./twins";

type Address = { deliveryId: string; row: number } & Versioned;

/** Decides a queried or refused row (and, when asked, all like it), takes a decision back, or mends a cell and inspects the row anew. */
export const decideRow = async ({
  ctx,
  deliveryId,
  row,
  version,
  input,
}: VerbArgs<z.input<typeof DecideRowInput>, Address>): Promise<DecidedRows> => {
  mayAtAll(ctx.actor, "delivery.decide");
  const ask = parseInput(DecideRowInput, input);
  const delivery = await deliveryOf(ctx.db.read, ctx.actor, deliveryId);
  const mended = ask.mend === undefined ? null : await mendNow(ctx, delivery, row, ask.mend);
  return ctx.db.write(async (tx) => {
    const now = await deliveryOf(tx, ctx.actor, deliveryId);
    requireRight(ctx.actor, "revision.release", now.bayId);
    if (now.state !== "read")
      throw new AppError("conflict", {
        user: `${codeOf(now.number)} is ${now.state}: its rows are not decided now.`,
      });
    const record = await recordOf(tx, deliveryId, row);
    requireSameVersion(record.version, version);
    const changed =
      mended === null ? await decide(tx, ctx, record, ask) : await mend(tx, ctx, now, record, ask, mended);
    return answer(tx, ctx, now, row, changed);
  });
};

const recordOf = async (tx: Pick<Tx, "select">, deliveryId: string, ordinal: number): Promise<RowRecord> =>
  found(
    (
      await tx
        .select()
        .from(deliveryRows)
        .where(and(eq(deliveryRows.deliveryId, deliveryId), eq(deliveryRows.ordinal, ordinal)))
    )[0],
  );

const mendNow = async (
  ctx: Ctx,
  delivery: DeliveryRecord,
  row: number,
  cell: NonNullable<DecideRowInput["mend"]>,
): Promise<Mended> => {
  const { recognised } = layoutOf(delivery.layout);
  if (recognised === null) throw new AppError("conflict", { user: "This delivery has not been read yet." });
  return mendedRow(ctx.db.read, await recordOf(ctx.db.read, delivery.id, row), recognised.reading, cell);
};

async function decide(tx: Tx, ctx: Ctx, record: RowRecord, ask: DecideRowInput): Promise<number> {
  const decision = ask.decision ?? null;
  if (decision !== null && !choicesFor(planOf(record).inspection).includes(decision))
    throw notPossible(record, decision);
  const rows = ask.alike === true ? await alike(tx, record, decision) : [record];
  const values = {
    decision,
    decisionReason: decision === null ? "" : (ask.reason ?? ""),
    decidedBy: decision === null ? null : ctx.actor.userId,
    decidedAt: decision === null ? null : ctx.now,
    version: sql`${deliveryRows.version} + 1`,
  };
  for (const row of rows)
    await tx
      .update(deliveryRows)
      .set(values)
      .where(and(eq(deliveryRows.deliveryId, record.deliveryId), eq(deliveryRows.ordinal, row.ordinal)));
  const designations = new Set(
    rows.filter((r) => decision === "leave-out" || r.decision === "leave-out").map((r) => r.designation),
  );
  for (const designation of designations) await refreshTwins(tx, record.deliveryId, designation);
  await logDeed(tx, ctx, {
    verb: "delivery.decide",
    entity: "delivery",
    entityId: record.deliveryId,
    subject: `row ${record.ordinal} ${record.designation}`.trim(),
    before: { decision: record.decision, reason: record.decisionReason },
    after: { decision, reason: values.decisionReason, rows: rows.length },
  });
  return rows.length;
}

const notPossible = (record: RowRecord, decision: Decision): AppError =>
  new AppError("invalid", {
    user: `Row ${record.ordinal} cannot be kept as it is (${decision}): mend a cell or refuse the row.`,
    issues: [
      {
        code: "decision.notPossible",
        detail: "This row cannot be put away as it is: mend a cell or refuse it.",
        pointer: "/decision",
      },
    ],
  });

/** The row and every undecided row of the same verdict and cause for which the decision is possible. */
async function alike(tx: Tx, record: RowRecord, decision: Decision | null): Promise<readonly RowRecord[]> {
  const rows = await tx
    .select()
    .from(deliveryRows)
    .where(
      and(
        eq(deliveryRows.deliveryId, record.deliveryId),
        eq(deliveryRows.verdict, record.verdict),
        eq(deliveryRows.cause, record.cause),
        isNull(deliveryRows.decision),
      ),
    );
  const possible = rows.filter(
    (row) => decision === null || choicesFor(planOf(row).inspection).includes(decision),
  );
  return [record, ...possible.filter((row) => row.ordinal !== record.ordinal)];
}

async function mend(
  tx: Tx,
  ctx: Ctx,
  delivery: DeliveryRecord,
  record: RowRecord,
  ask: DecideRowInput,
  mended: Mended,
): Promise<number> {
  if (ask.mend === undefined) return 0;
  const layout = layoutOf(delivery.layout);
  if (layout.recognised === null)
    throw new AppError("conflict", { user: "This delivery has not been read yet." });
  const [row] = await againstRack(tx, delivery, layout.recognised.reading, [mended.row]);
  if (row === undefined) throw new Error("a mended row is one row");
  const { column, value } = ask.mend;
  const note: Mend = { column, before: mended.before, after: value, by: ctx.actor.name, at: iso(ctx.now) };
  const mends = [...mendsOf(record), note];
  await tx
    .update(deliveryRows)
    .set({
      verdict: row.inspection.verdict,
      cause: causeOf(row.inspection),
      designation: row.inspection.designation,
      against: againstOf(row.standing),
      cells: JSON.stringify(row.cells),
      plan: JSON.stringify({ inspection: row.inspection, standing: row.standing }),
      mends: JSON.stringify(mends),
      decision: null,
      decisionReason: "",
      decidedBy: null,
      decidedAt: null,
      version: sql`${deliveryRows.version} + 1`,
    })
    .where(and(eq(deliveryRows.deliveryId, delivery.id), eq(deliveryRows.ordinal, record.ordinal)));
  await refreshTwins(tx, delivery.id, record.designation);
  await refreshTwins(tx, delivery.id, row.inspection.designation);
  await tx
    .update(deliveries)
    .set({ layout: layoutJson({ ...layout, mends: { ...layout.mends, [String(record.ordinal)]: mends } }) })
    .where(eq(deliveries.id, delivery.id));
  await logDeed(tx, ctx, {
    verb: "delivery.decide",
    entity: "delivery",
    entityId: delivery.id,
    subject: `row ${record.ordinal} ${row.inspection.designation}`.trim(),
    before: { column, cell: mended.before },
    after: { column, cell: value },
  });
  return 1;
}

async function answer(
  tx: Tx,
  ctx: Ctx,
  delivery: DeliveryRecord,
  ordinal: number,
  changed: number,
): Promise<DecidedRows> {
  const counts = await countRows(tx, delivery.id);
  await tx
    .update(deliveries)
    .set({ counts: JSON.stringify(counts), version: sql`${deliveries.version} + 1`, updatedAt: ctx.now })
    .where(eq(deliveries.id, delivery.id));
  const record = await recordOf(tx, delivery.id, ordinal);
  const person = await peopleOf(tx, [record.decidedBy]);
  return {
    row: rowDetail(record, person, materialOf(layoutOf(delivery.layout))),
    changed,
    counts,
    deliveryVersion: delivery.version + 1,
  };
}
