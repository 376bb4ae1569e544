import type { Point, Region } from "@/lib/geometry/region";

/** A part to be arranged. `material` is a key: parts that overlap must share it. `strength` (fy, MPa) decides who keeps an
 * overlap; `stiff` is false for a part that counts for mass only. */
export type ArrangePart = Readonly<{
  id: string;
  name: string;
  material: string;
  strength: number;
  stiff: boolean;
  regions: readonly Region[];
}>;

/** What is taken away from every part. */
export type ArrangeCutout = Readonly<{ id: string; name: string; regions: readonly Region[] }>;

/** Something to say about parts, in words. */
export type Notice = Readonly<{ code: string; detail: string; parts: readonly string[] }>;

/** A stretch of boundary that two parts share, run with the material of the first part on its left. */
export type SharedLine = Readonly<{ from: Point; to: Point; bulge?: number }>;

/** Two parts, by index, and the lines along which they touch. */
export type SharedLines = Readonly<{ parts: readonly [number, number]; lines: readonly SharedLine[] }>;

/**
 * Parts that no longer overlap. `parts` holds the regions of each part in the order given, empty where nothing of it is
 * left; `outline` is their union; `bodies` are the groups of stiff parts that hang together along edges, by index, the
 * largest first, a part that was cut into separate pieces in each of its bodies.
 */
export type Arrangement = Readonly<{
  parts: readonly (readonly Region[])[];
  outline: readonly Region[];
  contacts: readonly SharedLines[];
  bodies: readonly (readonly number[])[];
  warnings: readonly Notice[];
}>;

/** The names of parts as a list in words: "Web", "Web and Top flange", "Web, Rib and 3 more". */
export const listNames = (names: readonly string[]): string => {
  const distinct = [...new Set(names)];
  if (distinct.length > 4) return `${distinct.slice(0, 3).join(", ")} and ${distinct.length - 3} more`;
  const last = distinct.at(-1) ?? "";
  return distinct.length < 2 ? last : `${distinct.slice(0, -1).join(", ")} and ${last}`;
};
