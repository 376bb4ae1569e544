import "server-only";
import type { Row } from "@/db/bulk-insert";
import type { Reader, Tx } from "@/db/client";
import { standingOf, tabulatedFigures, type Standing } from "@/lib/intake/delivery-plan";
import type { InspectedRow } from "@/lib/intake/inspect-file";
import { drawingOf, type Inspection } from "@/lib/intake/inspect-row";
import { verdictOf, type RowReason } from "@/lib/intake/row-reason";
import type { Reading } from "@/lib/intake/schema";
import type { Mend } from "@/lib/schemas/delivery";
import { designationKey } from "@/lib/schemas/designation";
import { contentHashOf } from "../shape/write-shapes";
import { heldOnRack } from "./held-on-rack";
import type { DeliveryRecord } from "./load-delivery";
import { causeOf } from "./stored-row";

export const ROW_COLUMNS =
  "delivery_id ordinal line verdict cause designation against cells plan mends version".split(" ");

export type ComparedRow = InspectedRow & Readonly<{ standing: Standing | null }>;

/** Inspected rows held against the Rack: new, unchanged, changed, or refused because a shape must not be replaced by a table. */
export const againstRack = async (
  read: Pick<Reader | Tx, "select">,
  delivery: Pick<DeliveryRecord, "organisationId" | "bayId">,
  reading: Pick<Reading, "material">,
  rows: readonly InspectedRow[],
): Promise<readonly ComparedRow[]> => {
  const keys = [
    ...new Set(rows.map((r) => designationKey(r.inspection.designation)).filter((k) => k !== "")),
  ];
  const rack = await heldOnRack(read, delivery.organisationId, keys);
  return rows.map((row) => {
    const { inspection } = row;
    if (inspection.profile === null || inspection.designation === "") return { ...row, standing: null };
    const drawing = drawingOf(inspection.profile, inspection.designation, reading);
    const next = {
      bayId: delivery.bayId,
      contentHash: contentHashOf(JSON.stringify(drawing)),
      tabulated: tabulatedFigures(inspection, null),
    };
    const standing = standingOf(next, rack.get(designationKey(inspection.designation))?.held ?? null);
    return standing.against === "held"
      ? { ...row, inspection: refusedFor(inspection, standing.detail), standing }
      : { ...row, standing };
  });
};

const refusedFor = (inspection: Inspection, detail: string): Inspection => {
  const reason: RowReason = { verdict: "refused", cause: "on-rack", detail, field: "designation" };
  const reasons = [...inspection.reasons, reason];
  return { ...inspection, reasons, verdict: verdictOf(reasons) };
};

export const againstOf = (standing: Standing | null): "" | "new" | "unchanged" | "changed" =>
  standing === null || standing.against === "held" ? "" : standing.against;

/** A row's values in the order of ROW_COLUMNS. */
export const rowValues = (
  deliveryId: string,
  { cells, inspection, standing }: ComparedRow,
  mends: readonly Mend[],
): Row => [
  deliveryId,
  inspection.number,
  inspection.line,
  inspection.verdict,
  causeOf(inspection),
  inspection.designation,
  againstOf(standing),
  JSON.stringify(cells),
  JSON.stringify({ inspection, standing }),
  JSON.stringify(mends),
  1,
];
