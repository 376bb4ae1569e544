import { addMoments, NO_MOMENTS, regionMoments, type Moments } from "@/lib/geometry/moments";
import { elasticOf } from "@/lib/section/elastic";
import { seamsOf, type Seam } from "@/lib/section/seams";
import type { ContactLine, Section } from "@/lib/section/section";
import { modularRatio, stiffParts, weightedBy } from "@/lib/section/stiffness";
import { stressGrowth, type StressGrowth } from "@/lib/section/unit-shear";

/**
 * The force in one joint line per length of member.
 * `perVx`, `perVy`: N per mm of member for a shear of 1 N through the shear centre, positive when it pulls the side
 * `beyond` (ids of parts) forward; superpose Vx·perVx + Vy·perVy. `width` is the length of the line in the section, mm.
 * Null with the reason in `absent` where statics alone does not tell it.
 */
export type JointForce = Readonly<{
  parts: readonly [string, string];
  lines: readonly ContactLine[];
  width: number;
  beyond: readonly string[];
  perVx: number | null;
  perVy: number | null;
  absent: Readonly<{ code: string; detail: string }> | null;
}>;

const CLOSED = {
  code: "joint.closedCell",
  detail:
    "This line is part of a closed cell: the force in it follows from the shear solution, not from statics alone.",
};

const APART = {
  code: "section.notConnected",
  detail: "The section falls apart into several bodies: connect them to know the forces between parts.",
};

/** Pieces reached from the second end of a seam without crossing it; null when its first end is among them. */
const beyondSeam = (seams: readonly Seam[], cut: Seam): ReadonlySet<number> | null => {
  const reached = new Set([cut.ends[1]]);
  for (const piece of reached)
    for (const seam of seams) {
      if (seam === cut || !seam.ends.includes(piece)) continue;
      reached.add(seam.ends[0]);
      reached.add(seam.ends[1]);
    }
  return reached.has(cut.ends[0]) ? null : reached;
};

const flow = (m: Moments, { a, b }: StressGrowth): number => a * m.x + b * m.y;

/**
 * Longitudinal shear in every line along which parts touch, per unit Vx and Vy, for welds and bolts.
 * @param section with its contacts; parts that only count for mass carry nothing and join nothing.
 * @returns one entry for each line of contact. Exact for open sections; in a closed cell `absent` says why not. Empty
 * where parts do not touch or nothing has area.
 * @source Equilibrium of the part beyond the line: F = ∫ n(a·x + b·y) dA, `stressGrowth` for a and b; VQ/I where x and y
 * are principal.
 */
export const jointForces = (section: Section): readonly JointForce[] => {
  const parts = stiffParts(section);
  const ratio = modularRatio(section.reference);
  const elastic = elasticOf(weightedBy(parts, ratio));
  if (elastic === null) return [];
  const { pieces, seams } = seamsOf(section, parts);
  const moments = pieces.map(({ part, region }) => ({
    m: regionMoments([region], elastic.values.centroid),
    n: ratio(part.material),
  }));
  const growth = { x: stressGrowth(elastic.values, "x"), y: stressGrowth(elastic.values, "y") };
  const idsOf = (indices: Iterable<number>) => [
    ...new Set([...indices].flatMap((i) => pieces[i]?.part.id ?? [])),
  ];
  return seams.map((seam): JointForce => {
    const beyond = beyondSeam(seams, seam);
    const joint = {
      parts: [pieces[seam.ends[0]]?.part.id ?? "", pieces[seam.ends[1]]?.part.id ?? ""] as const,
      lines: seam.lines,
      width: seam.width,
    };
    const absent = section.bodies.length > 1 ? APART : CLOSED;
    if (beyond === null || absent === APART)
      return { ...joint, beyond: [], perVx: null, perVy: null, absent };
    const sum = moments.reduce(
      (acc, { m, n }, i) => (beyond.has(i) ? addMoments(acc, m, n) : acc),
      NO_MOMENTS,
    );
    return {
      ...joint,
      beyond: idsOf(beyond),
      perVx: flow(sum, growth.x),
      perVy: flow(sum, growth.y),
      absent: null,
    };
  });
};
