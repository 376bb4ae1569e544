import { centralMoments } from "@/lib/geometry/moments";
import type { Section } from "@/lib/section/section";
import { modularRatio, stiffParts } from "@/lib/section/stiffness";
import { err, ok, type Fault, type Result } from "@/lib/result";

export type TabulationAxis = "x" | "y";

/**
 * One line a checker can follow: the part's own area and centroid, the first moment about the datum, the distance to the
 * section's centroid, and the parallel-axis terms. Lengths mm. `n` = E/E_ref; A, A·y, A·d² and I0 carry it already.
 */
export type TabulationRow = Readonly<{
  part: string;
  n: number;
  area: number;
  /** Coordinate of the part's centroid measured from the datum (y for x–x, x for y–y), mm. */
  at: number;
  firstMoment: number;
  distance: number;
  areaDistance2: number;
  own: number;
}>;

export type Tabulation = Readonly<{
  axis: TabulationAxis;
  rows: readonly TabulationRow[];
  sum: Readonly<{ area: number; firstMoment: number; areaDistance2: number; own: number }>;
  /** Σ A·y / Σ A, mm. */
  centroid: number;
  /** Σ A·d² + Σ I0, mm⁴. */
  inertia: number;
  /** Whether any part has a modulus ratio other than 1. */
  transformed: boolean;
}>;

/**
 * Second moment of area about x–x or y–y by parallel axes, part by part, as it is done by hand.
 * @param section parts that count for stiffness are tabulated; cut-outs are taken away already.
 * @returns the table, or `tabulation.noArea` where nothing has area.
 * @source Parallel-axis theorem, I = Σ(I0 + A·d²).
 */
export const tabulate = (section: Section, axis: TabulationAxis): Result<Tabulation, Fault> => {
  const ratio = modularRatio(section.reference);
  const parts = stiffParts(section).flatMap((p) => {
    const central = centralMoments([{ regions: p.regions, weight: 1 }]);
    if (!central) return [];
    const n = ratio(p.material);
    return [
      {
        part: p.id,
        n,
        area: n * central.moments.area,
        at: axis === "x" ? central.centroid.y : central.centroid.x,
        own: n * (axis === "x" ? central.moments.yy : central.moments.xx),
      },
    ];
  });
  const area = parts.reduce((sum, p) => sum + p.area, 0);
  if (!(area > 0)) return err({ code: "tabulation.noArea", detail: "Nothing has area yet. Add a part." });
  const firstMoment = parts.reduce((sum, p) => sum + p.area * p.at, 0);
  const centroid = firstMoment / area;
  const rows = parts.map((p): TabulationRow => {
    const distance = p.at - centroid;
    return { ...p, firstMoment: p.area * p.at, distance, areaDistance2: p.area * distance * distance };
  });
  const sum = {
    area,
    firstMoment,
    areaDistance2: rows.reduce((s, r) => s + r.areaDistance2, 0),
    own: rows.reduce((s, r) => s + r.own, 0),
  };
  return ok({
    axis,
    rows,
    sum,
    centroid,
    inertia: sum.areaDistance2 + sum.own,
    transformed: rows.some((r) => r.n !== 1),
  });
};
