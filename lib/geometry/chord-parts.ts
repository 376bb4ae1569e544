import { chordPoints } from "@/lib/geometry/chords";
import type { Polygons } from "@/lib/geometry/clip";
import type { NodedRing, Noding } from "@/lib/geometry/noding";
import { curveOf } from "@/lib/geometry/noding";
import type { Sources } from "@/lib/geometry/recover";
import { sourcesOf } from "@/lib/geometry/recover";
import type { Point } from "@/lib/geometry/region";
import { edgeGroups } from "@/lib/geometry/shared-edges";

/** Parts as polygons for the clipper, by index, and the curves that the polygons stand for. */
export type ChordedParts = Readonly<{ polygons: (part: number) => Polygons; sources: Sources }>;

type Chords = Readonly<{ from: number; points: readonly Point[] }>;

/**
 * The parts concerned with their arcs cut into area-matched chords. Edges that run along each other are cut into the same
 * chords, whichever part they belong to.
 */
export const chordParts = (noding: Noding, concerned: ReadonlySet<number>): ChordedParts => {
  const chordsOf = new Map<number, Chords>();
  const curves = edgeGroups(noding).flatMap((group) => {
    const first = group.find(({ part }) => concerned.has(part));
    if (first === undefined) return [];
    const curve = curveOf(noding.nodes, first.edge);
    const points = chordPoints(curve);
    for (const { index } of group) chordsOf.set(index, { from: first.edge.from, points });
    return [curve];
  });
  const ringsOf = new Map<number, { ring: NodedRing; first: number }[]>();
  let next = 0;
  for (const ring of noding.rings) {
    if (concerned.has(ring.part) && ring.edges.length > 1)
      ringsOf.set(ring.part, [...(ringsOf.get(ring.part) ?? []), { ring, first: next }]);
    next += ring.edges.length;
  }
  const corners = ({ edges }: NodedRing, first: number): [number, number][] =>
    edges.flatMap(({ from }, i) => {
      const chords = chordsOf.get(first + i);
      const points = chords?.from === from ? chords.points : (chords?.points.toReversed() ?? []);
      const node = noding.nodes[from];
      return [...(node === undefined ? [] : [node]), ...points].map((p): [number, number] => [p.x, p.y]);
    });
  const polygons = (part: number): Polygons => {
    const regions = new Map<number, [number, number][][]>();
    for (const { ring, first } of ringsOf.get(part) ?? []) {
      if (!ring.hole) regions.set(ring.region, [corners(ring, first)]);
      else regions.get(ring.region)?.push(corners(ring, first));
    }
    return [...regions.values()];
  };
  return { polygons, sources: sourcesOf(curves) };
};
