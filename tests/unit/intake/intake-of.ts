import { readFileSync } from "node:fs";
import { decodeBytes, type Encoding } from "@/lib/intake/decode-bytes";
import type { FileFault } from "@/lib/intake/file-fault";
import { inspectFile, type InspectedRow } from "@/lib/intake/inspect-file";
import { recogniseFile, type Recognition, type RecogniseOptions } from "@/lib/intake/recognise-file";
import type { Reading } from "@/lib/intake/schema";

export type Taken = Readonly<{
  fault: FileFault | null;
  recognition: Recognition | null;
  rows: readonly InspectedRow[];
}>;

export const bytesOf = (text: string): Uint8Array => new TextEncoder().encode(text);
export const stock = (name: string): Uint8Array => new Uint8Array(readFileSync(`fixtures/csv/${name}.csv`));

/** A file taken through the whole of Goods-in, as the server does it. */
export function takeIn(
  bytes: Uint8Array,
  options: RecogniseOptions & { confirmed?: Encoding; change?: (reading: Reading) => Reading } = {},
): Taken {
  const decoded = decodeBytes(bytes, options.confirmed ?? null);
  if (!decoded.ok) return { fault: decoded.error, recognition: null, rows: [] };
  const recognised = recogniseFile(decoded.value, options);
  if (!recognised.ok) return { fault: recognised.error, recognition: null, rows: [] };
  const { text, lineOffset, reading } = recognised.value;
  const rows: InspectedRow[] = [];
  const all = inspectFile({ text, lineOffset, reading: options.change?.(reading) ?? reading });
  for (;;) {
    const next = all.next();
    if (next.done === true) return { fault: next.value, recognition: recognised.value, rows };
    rows.push(next.value);
  }
}

export const verdicts = (taken: Taken) => taken.rows.map((r) => r.inspection.verdict);
