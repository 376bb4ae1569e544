import "server-only";
import { sql } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { deliveryRows } from "@/db/schema/deliveries";
import type { DeliveryCounts } from "@/lib/schemas/delivery";

const NONE: DeliveryCounts = {
  rows: 0,
  accepted: 0,
  queried: 0,
  refused: 0,
  undecided: 0,
  leftOut: 0,
  new: 0,
  changed: 0,
  unchanged: 0,
  byCause: {},
  openLike: {},
};

/** Rows of a delivery by verdict, cause and decision, from the covering index `delivery_rows_counts`. */
export const countRows = async (tx: Pick<Tx, "select">, deliveryId: string): Promise<DeliveryCounts> => {
  const groups = await tx
    .select({
      verdict: deliveryRows.verdict,
      cause: deliveryRows.cause,
      decision: deliveryRows.decision,
      against: deliveryRows.against,
      rows: sql<number>`count(*)`,
    })
    .from(deliveryRows)
    .where(sql`${deliveryRows.deliveryId} = ${deliveryId}`)
    .groupBy(deliveryRows.verdict, deliveryRows.cause, deliveryRows.decision, deliveryRows.against);
  return groups.reduce<DeliveryCounts>((sum, { verdict, cause, decision, against, rows }) => {
    const leftOut = decision === "leave-out";
    const like = `${verdict} ${cause}`;
    const open = verdict !== "accepted" && decision === null;
    return {
      ...sum,
      rows: sum.rows + rows,
      [verdict]: sum[verdict] + rows,
      undecided: sum.undecided + (open ? rows : 0),
      leftOut: sum.leftOut + (leftOut ? rows : 0),
      ...(against === "" || leftOut ? {} : { [against]: sum[against] + rows }),
      byCause: verdict === "accepted" ? sum.byCause : added(sum.byCause, cause, rows),
      openLike: open ? added(sum.openLike, like, rows) : sum.openLike,
    };
  }, NONE);
};

const added = (counts: Readonly<Record<string, number>>, key: string, rows: number) => ({
  ...counts,
  [key]: (counts[key] ?? 0) + rows,
});

// Safe cast: the column is only ever written from `countRows`.
export const countsOf = (json: string): DeliveryCounts | null =>
  json === "{}" ? null : (JSON.parse(json) as DeliveryCounts);
