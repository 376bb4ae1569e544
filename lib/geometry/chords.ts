import type { Edge } from "@/lib/geometry/edge";
import type { Point } from "@/lib/geometry/region";
import { CHORDS_PER_CIRCLE } from "@/lib/geometry/tolerance";

/**
 * The points between the ends of an edge that turn it into chords enclosing the same area: none for a line. They lie a
 * little outside the circle; the ends stay where they are. The same curve run the other way gives the same points.
 * @param perCircle chords to a full turn; every arc gets two at least.
 * @source Equal area of the sector: with n chords of angle θ, inner radius R·f and ends at R,
 * (n − 2)·f²·sin θ + 2·f·sin θ = n·θ.
 */
export const chordPoints = ({ arc }: Edge, perCircle: number = CHORDS_PER_CIRCLE): readonly Point[] => {
  if (arc === null) return [];
  const forward = arc.sweep > 0;
  const sweep = Math.abs(arc.sweep);
  const first = forward ? arc.start : arc.start + arc.sweep;
  const n = Math.max(2, Math.ceil((sweep / (2 * Math.PI)) * perCircle));
  const angle = sweep / n;
  const ratio = angle / Math.sin(angle);
  const grow = n === 2 ? ratio : (Math.sqrt(1 + (n - 2) * n * ratio) - 1) / (n - 2);
  const radius = arc.radius * grow;
  const points = Array.from({ length: n - 1 }, (_, i) => ({
    x: arc.centre.x + radius * Math.cos(first + (i + 1) * angle),
    y: arc.centre.y + radius * Math.sin(first + (i + 1) * angle),
  }));
  return forward ? points : points.reverse();
};
