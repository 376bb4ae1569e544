import "server-only";
import { and, eq } from "drizzle-orm";
import type { Reader, Tx } from "@/db/client";
import { uniqueViolation } from "@/db/retry";
import { readings } from "@/db/schema/readings";
import { AppError } from "@/lib/errors";
import { Reading } from "@/lib/intake/schema";
import type { Actor } from "@/lib/schemas/access";
import type { KeptReading } from "@/lib/schemas/reading";
import { iso } from "../moments";
import { found } from "../not-found";
import { peopleOf } from "../people";

type Read = Pick<Reader | Tx, "select">;
export type ReadingRecord = typeof readings.$inferSelect;

/** A kept reading of the actor's organisation, or not found. */
export const readingOf = async (read: Read, actor: Actor, id: string): Promise<ReadingRecord> =>
  found(
    (
      await read
        .select()
        .from(readings)
        .where(and(eq(readings.id, id), eq(readings.organisationId, actor.organisationId)))
    )[0],
  );

export const readingViews = async (read: Read, rows: readonly ReadingRecord[]): Promise<KeptReading[]> => {
  const person = await peopleOf(
    read,
    rows.map((r) => r.createdBy),
  );
  return rows.map((row) => ({
    id: row.id,
    name: row.name,
    reading: Reading.parse(JSON.parse(row.layout)),
    createdBy: person(row.createdBy),
    updatedAt: iso(row.updatedAt),
    version: row.version,
  }));
};

/** Headings folded together: how a reading is found again for the next file of the same supplier. */
export const headingKeyOf = (reading: Reading): string =>
  reading.columns
    .map((c) => c.heading.trim().toLowerCase())
    .join("|")
    .slice(0, 4000);

export const refuseTakenReading = (error: unknown): never => {
  if (uniqueViolation(error) === null) throw error;
  const detail = "There is a reading of that name already: choose another, or change that one.";
  throw new AppError("conflict", {
    user: detail,
    issues: [{ code: "reading.nameTaken", detail, pointer: "/name" }],
    cause: error,
  });
};
