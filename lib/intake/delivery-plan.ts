import { COMPARED_KEYS, SYMBOL, UNCOMPARED_KEYS, type FigureKey } from "@/lib/intake/fields";
import type { Inspection } from "@/lib/intake/inspect-row";

export const DECISIONS = ["tabulated", "computed", "leave-out"] as const;
export type Decision = (typeof DECISIONS)[number];

/** Figures of a table in stored units, under the keys of the property record. */
export type TabulatedSet = Readonly<Partial<Record<FigureKey, number>>>;

/** What the Rack holds under a designation already. */
export type Held = Readonly<{
  shapeId: string;
  bayId: string;
  bay: string;
  /** Letter of the revision that is released, or of the last one. */
  revision: string;
  /** Whether its released revision came with a delivery; a shape drawn on the Bench is never overwritten by a table. */
  fromTable: boolean;
  /** Hash of the released drawing as the Rack keeps it. */
  contentHash: string;
  tabulated: TabulatedSet;
  /** What was computed for it: an export of the Rack prints these. */
  computed: TabulatedSet;
  inWork: boolean;
}>;

export type Against = "new" | "unchanged" | "changed" | "held";

export type Standing = Readonly<{
  against: Against;
  detail: string;
  differences: readonly Readonly<{ key: FigureKey; before: number | null; after: number | null }>[];
}>;

/** Values that differ by less than this share are the same printed figure after conversion of units. */
const SAME_FIGURE_REL = 1e-9;

const same = (a: number, b: number | undefined): boolean =>
  b !== undefined && Math.abs(a - b) <= SAME_FIGURE_REL * Math.abs(b);

/**
 * A row against the Rack: nothing there (new), the same drawing and figures (unchanged), other ones (changed: a further
 * revision), or held by a shape that a table must not touch. One function for preview and putting away.
 */
export function standingOf(
  next: Readonly<{ contentHash: string; tabulated: TabulatedSet; bayId: string }>,
  held: Held | null,
): Standing {
  if (held === null) return { against: "new", detail: "", differences: [] };
  if (!held.fromTable)
    return {
      against: "held",
      detail: `Drawn in the firm and kept in ${held.bay} at revision ${held.revision}: a table does not replace it.`,
      differences: [],
    };
  if (held.bayId !== next.bayId)
    return {
      against: "held",
      detail: `Kept in ${held.bay} at revision ${held.revision}: bring it into that bay, or choose another designation.`,
      differences: [],
    };
  if (held.inWork)
    return {
      against: "held",
      detail: `A revision of it is in work in ${held.bay}: release or discard that first.`,
      differences: [],
    };
  const keys: readonly FigureKey[] = [...COMPARED_KEYS, ...UNCOMPARED_KEYS];
  const differences = keys.flatMap((key) => {
    const after = next.tabulated[key];
    // A table that does not print a figure says nothing about it.
    if (after === undefined || same(after, held.tabulated[key]) || same(after, held.computed[key])) return [];
    return [{ key, before: held.tabulated[key] ?? held.computed[key] ?? null, after }];
  });
  const outline = held.contentHash !== next.contentHash;
  if (!outline && differences.length === 0)
    return {
      against: "unchanged",
      detail: `Already in ${held.bay} at revision ${held.revision}, the same figures.`,
      differences,
    };
  const names = differences
    .slice(0, 4)
    .map((d) => SYMBOL[d.key])
    .join(", ");
  const what = [outline ? "the dimensions" : "", names].filter((s) => s !== "").join(", ");
  return {
    against: "changed",
    detail: `In ${held.bay} at revision ${held.revision}; differs in ${what}: a further revision.`,
    differences,
  };
}

/** What a person may decide about a row; a mended cell is read again and needs no decision. */
export function choicesFor(
  inspection: Pick<Inspection, "verdict" | "reasons" | "properties" | "designation">,
): readonly Decision[] {
  if (inspection.verdict === "accepted") return ["leave-out"];
  const unreadable = inspection.properties === null || inspection.designation === "";
  const structural = inspection.reasons.some(
    (r) =>
      r.cause === "duplicate" ||
      (r.verdict === "refused" && (r.field === undefined || r.field === "designation")),
  );
  if (unreadable || structural) return ["leave-out"];
  const refused = inspection.reasons.some((r) => r.verdict === "refused");
  return refused ? ["computed", "leave-out"] : ["computed", "tabulated", "leave-out"];
}

/** Why a row is not put away as it stands, or null when it is: the rule for the server and for the button. */
export function openQuestion(
  inspection: Pick<Inspection, "verdict" | "reasons" | "properties" | "designation">,
  decision: Decision | null,
): string | null {
  if (decision === "leave-out") return null;
  if (inspection.verdict === "accepted") return null;
  if (decision === null) return inspection.reasons[0]?.detail ?? "Not decided.";
  return choicesFor(inspection).includes(decision)
    ? null
    : "It cannot be read: mend a figure or refuse the row.";
}

/** Figures that are kept from the table: all that were read, less those outside the gauge when the computed ones are kept. */
export function tabulatedFigures(
  inspection: Pick<Inspection, "comparisons" | "uncompared">,
  decision: Decision | null,
): TabulatedSet {
  const kept = inspection.comparisons.filter((c) => c.within || decision !== "computed");
  return Object.fromEntries([
    ...kept.map((c) => [c.key, c.tabulated]),
    ...inspection.uncompared.map((u) => [u.key, u.tabulated]),
  ]);
}
