import "server-only";
import { and, asc, eq, sql } from "drizzle-orm";
import type { Tx } from "@/db/client";
import { deliveryRows } from "@/db/schema/deliveries";
import { verdictOf, type RowReason } from "@/lib/intake/row-reason";
import { designationKey } from "@/lib/schemas/designation";
import { causeOf, planOf, type RowRecord } from "./stored-row";

/** Rows of a delivery under one designation, those left out excepted, in the file's order. */
export const twinsOf = async (
  tx: Pick<Tx, "select">,
  deliveryId: string,
  designation: string,
): Promise<RowRecord[]> => {
  const key = designationKey(designation);
  if (key === "") return [];
  const rows = await tx
    .select()
    .from(deliveryRows)
    .where(
      and(
        eq(deliveryRows.deliveryId, deliveryId),
        // Lower case of SQLite covers ASCII; what else differs is settled by the key below.
        sql`length(${deliveryRows.designation}) = ${designation.length}`,
      ),
    )
    .orderBy(asc(deliveryRows.ordinal));
  return rows.filter((row) => row.decision !== "leave-out" && designationKey(row.designation) === key);
};

/** Says anew which rows under a designation are duplicates: of those not left out, all but the first. */
export const refreshTwins = async (tx: Tx, deliveryId: string, designation: string): Promise<void> => {
  const rows = await twinsOf(tx, deliveryId, designation);
  const first = rows[0];
  for (const row of rows) {
    const plan = planOf(row);
    const others = plan.inspection.reasons.filter((r) => r.cause !== "duplicate");
    const twin: RowReason[] =
      first === undefined || row === first
        ? []
        : [
            {
              verdict: "queried",
              cause: "duplicate",
              detail: `Row ${first.ordinal} has the same designation: refuse one of the two.`,
              field: "designation",
            },
          ];
    const reasons = [...others, ...twin];
    if (JSON.stringify(reasons) === JSON.stringify(plan.inspection.reasons)) continue;
    const inspection = { ...plan.inspection, reasons, verdict: verdictOf(reasons) };
    await tx
      .update(deliveryRows)
      .set({
        verdict: inspection.verdict,
        cause: causeOf(inspection),
        plan: JSON.stringify({ ...plan, inspection }),
        version: sql`${deliveryRows.version} + 1`,
      })
      .where(and(eq(deliveryRows.deliveryId, deliveryId), eq(deliveryRows.ordinal, row.ordinal)));
  }
};
