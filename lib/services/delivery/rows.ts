import "server-only";
import { and, asc, eq, gt, isNull, ne } from "drizzle-orm";
import type { z } from "zod";
import { deliveryRows } from "@/db/schema/deliveries";
import { mayAtAll } from "@/lib/permissions";
import { FindRowsQuery, type RowDetail, type RowPage } from "@/lib/schemas/delivery";
import type { Ctx, VerbArgs } from "../context";
import { decodeCursor, DEFAULT_PAGE, pageFrom } from "../cursor";
import { found } from "../not-found";
import { parseInput } from "../parse-input";
import { peopleOf } from "../people";
import { deliveryOf } from "./load-delivery";
import { layoutOf, materialOf } from "./layout";
import { rowDetail, rowSummary, type RowRecord } from "./stored-row";

/** Rows of a delivery in the file's order, by verdict, cause, or what still asks for a decision. */
export const findDeliveryRows = async ({
  ctx,
  deliveryId,
  input,
}: VerbArgs<z.input<typeof FindRowsQuery>, { deliveryId: string }>): Promise<RowPage> => {
  mayAtAll(ctx.actor, "delivery.rows");
  const query = parseInput(FindRowsQuery, input);
  const delivery = await deliveryOf(ctx.db.read, ctx.actor, deliveryId);
  const limit = query.limit ?? DEFAULT_PAGE;
  const worst = query.order === "worst" && query.verdict === undefined;
  const [rank, after] = query.cursor === undefined ? [0, 0] : decodeCursor(query.cursor, 2).map(Number);
  const phases = worst ? WORST_FIRST.slice(rank ?? 0) : [query.verdict];
  const rows: RowRecord[] = [];
  for (const [i, verdict] of phases.entries()) {
    if (rows.length > limit) break;
    const from = i === 0 ? (after ?? 0) : 0;
    rows.push(...(await phaseOf(ctx, delivery.id, query, verdict, from, limit + 1 - rows.length)));
  }
  const person = await peopleOf(
    ctx.db.read,
    rows.map((r) => r.decidedBy),
  );
  return pageFrom(
    rows,
    limit,
    (row) => rowSummary(row, person),
    (row) => [worst ? WORST_FIRST.indexOf(row.verdict) : 0, row.ordinal],
  );
};

const WORST_FIRST: readonly (RowRecord["verdict"] | undefined)[] = ["refused", "queried", "accepted"];

const phaseOf = (
  ctx: Ctx,
  deliveryId: string,
  query: FindRowsQuery,
  verdict: RowRecord["verdict"] | undefined,
  after: number,
  limit: number,
): Promise<RowRecord[]> =>
  ctx.db.read
    .select()
    .from(deliveryRows)
    .where(
      and(
        eq(deliveryRows.deliveryId, deliveryId),
        verdict === undefined ? undefined : eq(deliveryRows.verdict, verdict),
        query.cause === undefined ? undefined : eq(deliveryRows.cause, query.cause),
        query.open === undefined
          ? undefined
          : and(ne(deliveryRows.verdict, "accepted"), isNull(deliveryRows.decision)),
        gt(deliveryRows.ordinal, after),
      ),
    )
    .orderBy(asc(deliveryRows.ordinal))
    .limit(limit);

/** One row with all its comparisons, cells and mends. */
export const showDeliveryRow = async ({
  ctx,
  deliveryId,
  row,
}: {
  ctx: Ctx;
  deliveryId: string;
  row: number;
}): Promise<RowDetail> => {
  mayAtAll(ctx.actor, "delivery.rows");
  const delivery = await deliveryOf(ctx.db.read, ctx.actor, deliveryId);
  const record = found(
    (
      await ctx.db.read
        .select()
        .from(deliveryRows)
        .where(and(eq(deliveryRows.deliveryId, delivery.id), eq(deliveryRows.ordinal, row)))
    )[0],
  );
  const person = await peopleOf(ctx.db.read, [record.decidedBy]);
  return rowDetail(record, person, materialOf(layoutOf(delivery.layout)));
};
