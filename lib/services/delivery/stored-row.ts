import "server-only";
import type { deliveryRows } from "@/db/schema/deliveries";
import { choicesFor, openQuestion, type Standing } from "@/lib/intake/delivery-plan";
import { drawingOf, type Inspection } from "@/lib/intake/inspect-row";
import type { Reading } from "@/lib/intake/schema";
import type { Person } from "@/lib/schemas/common";
import type { Mend, RowDetail, RowSummary } from "@/lib/schemas/delivery";
import { isoOrNull } from "../moments";

export type RowRecord = typeof deliveryRows.$inferSelect;

/** What a row keeps of its inspection (JSON of `delivery_rows.plan`, written by this program only). */
export type StoredPlan = Readonly<{ inspection: Inspection; standing: Standing | null }>;

// Safe casts: the columns are only ever written by this program, from values of these types.
export const planOf = (row: Pick<RowRecord, "plan">): StoredPlan => JSON.parse(row.plan) as StoredPlan;
export const cellsOf = (row: Pick<RowRecord, "cells">): readonly string[] =>
  JSON.parse(row.cells) as string[];
export const mendsOf = (row: Pick<RowRecord, "mends">): readonly Mend[] => JSON.parse(row.mends) as Mend[];

/** The cause a row is listed and filtered under: its first refusal, else its first query. */
export const causeOf = (inspection: Inspection): string =>
  (inspection.reasons.find((r) => r.verdict === inspection.verdict) ?? inspection.reasons[0])?.cause ?? "";

export const rowSummary = (row: RowRecord, person: (id: string | null) => Person): RowSummary =>
  summaryOf(row, planOf(row), person);

const summaryOf = (
  row: RowRecord,
  { inspection, standing }: StoredPlan,
  person: (id: string | null) => Person,
): RowSummary => ({
  number: row.ordinal,
  line: row.line,
  verdict: row.verdict,
  cause: row.cause,
  designation: row.designation,
  reasons: inspection.reasons,
  worst: inspection.worst,
  against: row.against,
  standing: standing?.detail ?? "",
  decision: row.decision,
  decisionReason: row.decisionReason,
  decidedBy: row.decidedBy === null ? null : person(row.decidedBy),
  decidedAt: isoOrNull(row.decidedAt),
  choices: choicesFor(inspection),
  open: openQuestion(inspection, row.decision),
  version: row.version,
});

export const rowDetail = (
  row: RowRecord,
  person: (id: string | null) => Person,
  reading: Pick<Reading, "material">,
): RowDetail => {
  const plan = planOf(row);
  const { inspection, standing } = plan;
  return {
    ...summaryOf(row, plan, person),
    series: inspection.series,
    family: inspection.family,
    drawing:
      inspection.profile === null ? null : drawingOf(inspection.profile, inspection.designation, reading),
    properties: inspection.properties,
    built: inspection.built,
    nominalWallMm: inspection.nominalWallMm,
    comparisons: inspection.comparisons,
    uncompared: inspection.uncompared,
    consistency: inspection.consistency,
    differences: standing?.differences ?? [],
    cells: cellsOf(row),
    mends: [...mendsOf(row)],
    shapeId: row.shapeId,
  };
};
