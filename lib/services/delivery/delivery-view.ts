import "server-only";
import { and, desc, eq, inArray, ne } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { bays } from "@/db/schema/bays";
import { deliveries } from "@/db/schema/deliveries";
import { jobs } from "@/db/schema/jobs";
import { FileFault, type Delivery, type DeliverySummary } from "@/lib/schemas/delivery";
import { iso, isoOrNull } from "../moments";
import { peopleOf } from "../people";
import { countsOf } from "./count-rows";
import { layoutOf } from "./layout";
import { codeOf, type DeliveryRecord } from "./load-delivery";

type Read = Pick<Reader | Tx, "select">;

/** Deliveries as lists and sheets show them, with the progress of the job that is at each. */
export const summariesOf = async (
  read: Read,
  rows: readonly DeliveryRecord[],
): Promise<DeliverySummary[]> => {
  if (rows.length === 0) return [];
  const person = await peopleOf(
    read,
    rows.flatMap((r) => [r.createdBy, r.putAwayBy, r.returnedBy]),
  );
  const names = await read
    .select({ id: bays.id, name: bays.name })
    .from(bays)
    .where(inArray(bays.id, [...new Set(rows.map((r) => r.bayId))]));
  const busy = await read
    .select({ deliveryId: jobs.subjectId, progress: jobs.progress })
    .from(jobs)
    .where(
      and(
        inArray(
          jobs.subjectId,
          rows.map((r) => r.id),
        ),
        inArray(jobs.state, ["waiting", "running"]),
      ),
    );
  return rows.map((row) => ({
    id: row.id,
    number: row.number,
    code: codeOf(row.number),
    fileName: row.fileName,
    sizeBytes: row.sizeBytes,
    state: row.state,
    bay: { id: row.bayId, name: names.find((b) => b.id === row.bayId)?.name ?? "" },
    counts: countsOf(row.counts),
    progress: busy.find((j) => j.deliveryId === row.id)?.progress ?? null,
    createdBy: person(row.createdBy),
    createdAt: iso(row.createdAt),
    updatedAt: iso(row.updatedAt),
    putAwayBy: row.putAwayBy === null ? null : person(row.putAwayBy),
    putAwayAt: isoOrNull(row.putAwayAt),
    returnedBy: row.returnedBy === null ? null : person(row.returnedBy),
    returnedAt: isoOrNull(row.returnedAt),
    returnReason: row.returnReason,
    version: row.version,
  }));
};

export const deliveryView = async (read: Read, row: DeliveryRecord): Promise<Delivery> => {
  const [summary] = await summariesOf(read, [row]);
  if (summary === undefined) throw new Error("a delivery has a summary");
  const same =
    row.contentHash === null
      ? []
      : await read
          .select({ id: deliveries.id, number: deliveries.number, state: deliveries.state })
          .from(deliveries)
          .where(
            and(
              eq(deliveries.organisationId, row.organisationId),
              eq(deliveries.contentHash, row.contentHash),
              ne(deliveries.id, row.id),
            ),
          )
          .orderBy(desc(deliveries.number))
          .limit(5);
  return {
    ...summary,
    recognised: layoutOf(row.layout).recognised,
    fault: row.failure === "" ? null : FileFault.parse(JSON.parse(row.failure)),
    sameFile: same.map(({ id, number, state }) => ({ id, code: codeOf(number), state })),
  };
};
