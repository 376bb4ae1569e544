import "server-only";
import { and, asc, eq, gt, ne } from "drizzle-orm";
import { deliveryRows } from "@/db/schema/deliveries";
import { QUERIES_HEAD, queryLine, type QueryRow } from "@/lib/intake/queries-csv";
import { mayAtAll } from "@/lib/permissions";
import type { Ctx } from "../context";
import { layoutOf } from "./layout";
import { codeOf, deliveryOf } from "./load-delivery";
import { cellsOf, planOf, type RowRecord } from "./stored-row";

const CHUNK = 250;

/** Queried and refused rows of a delivery as CSV for the supplier, with reasons, piece by piece. */
export const exportQueries = async ({
  ctx,
  deliveryId,
}: {
  ctx: Ctx;
  deliveryId: string;
}): Promise<Readonly<{ fileName: string; pieces: AsyncGenerator<string> }>> => {
  mayAtAll(ctx.actor, "delivery.rows");
  const delivery = await deliveryOf(ctx.db.read, ctx.actor, deliveryId);
  const headings = layoutOf(delivery.layout).recognised?.reading.columns.map((c) => c.heading) ?? [];
  return { fileName: `${codeOf(delivery.number)}-queries.csv`, pieces: pieces(ctx, deliveryId, headings) };
};

async function* pieces(ctx: Ctx, deliveryId: string, headings: readonly string[]): AsyncGenerator<string> {
  yield queryLine([...QUERIES_HEAD, ...headings]);
  for (let after = 0; ;) {
    const rows = await ctx.db.read
      .select()
      .from(deliveryRows)
      .where(
        and(
          eq(deliveryRows.deliveryId, deliveryId),
          ne(deliveryRows.verdict, "accepted"),
          gt(deliveryRows.ordinal, after),
        ),
      )
      .orderBy(asc(deliveryRows.ordinal))
      .limit(CHUNK);
    const last = rows.at(-1);
    if (last === undefined) return;
    yield rows.map((row) => queryLine(toQueryRow(row))).join("");
    after = last.ordinal;
  }
}

const toQueryRow = (row: RowRecord): QueryRow => ({
  number: row.ordinal,
  line: row.line,
  verdict: row.verdict,
  decision: [row.decision ?? "", row.decisionReason].filter((s) => s !== "").join(": "),
  reasons: planOf(row).inspection.reasons,
  cells: cellsOf(row),
});
