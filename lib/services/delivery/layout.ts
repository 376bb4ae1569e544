import "server-only";
import type { Mend, Recognised } from "@/lib/schemas/delivery";
import type { Reading } from "@/lib/intake/schema";
import type { Encoding } from "@/lib/intake/decode-bytes";

/** What a delivery keeps of how its file is read (JSON of `deliveries.layout`, written by this program only). */
export type Layout = Readonly<{
  /** A person's correction; null as long as recognition stands. */
  corrected: Reading | null;
  /** An encoding a person confirmed before anything could be recognised. */
  encoding: Encoding | null;
  recognised: Recognised | null;
  /** Cells mended by people, by row number: applied again whenever the file is read again. */
  mends: Readonly<Record<string, readonly Mend[]>>;
}>;

export const EMPTY_LAYOUT: Layout = { corrected: null, encoding: null, recognised: null, mends: {} };

// Safe cast: the column is only ever written by `layoutJson`.
export const layoutOf = (json: string): Layout => ({
  ...EMPTY_LAYOUT,
  ...(JSON.parse(json) as Partial<Layout>),
});

export const layoutJson = (layout: Layout): string => JSON.stringify(layout);

/** Cells of a row with its mends in place. */
export const mendedCells = (layout: Layout, row: number, cells: readonly string[]): readonly string[] => {
  const mends = layout.mends[String(row)];
  if (mends === undefined) return cells;
  const next = [...cells];
  for (const mend of mends) {
    while (next.length < mend.column) next.push("");
    next[mend.column - 1] = mend.after;
  }
  return next;
};

/** The material the rows of a delivery are computed with. */
export const materialOf = (layout: Layout): Pick<Reading, "material"> => ({
  material: layout.recognised?.reading.material ?? "steel",
});
