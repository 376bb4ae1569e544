import { edgeLength } from "@/lib/geometry/arc";
import type { Region, Ring } from "@/lib/geometry/region";

/** Length of a ring of lines and arcs, mm. */
export const ringLength = (ring: Ring): number =>
  ring.reduce((sum, from, i) => sum + edgeLength(from, ring[(i + 1) % ring.length] ?? from), 0);

/** Length of the outer rings and of the holes, mm. */
export const perimeterOf = (regions: readonly Region[]): Readonly<{ outer: number; inner: number }> =>
  regions.reduce(
    (sum, { outer, holes }) => ({
      outer: sum.outer + ringLength(outer),
      inner: sum.inner + holes.reduce((length, hole) => length + ringLength(hole), 0),
    }),
    { outer: 0, inner: 0 },
  );
