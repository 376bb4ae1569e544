import { ringBox } from "@/lib/geometry/arc";
import { ringContains } from "@/lib/geometry/contains";
import type { Crossing, EdgeName } from "@/lib/geometry/find-crossing";
import { findCrossing } from "@/lib/geometry/find-crossing";
import type { Region, Ring, Vertex } from "@/lib/geometry/region";
import { orientRing, ringArea } from "@/lib/geometry/ring";
import { NO_AREA_REL, SAME_POINT_REL } from "@/lib/geometry/tolerance";
import type { Result } from "@/lib/result";
import { err, ok } from "@/lib/result";

/** What is wrong with a ring. `ring` 0 is the outer one, 1 the first hole; `edge` is the index of the vertex it leaves. */
export type RingFault = Readonly<{ code: string; detail: string; ring: number; edge?: number }>;

/** Words for a ring in a message: "outline" or "hole 2". */
export const ringName = (ring: number): string => (ring === 0 ? "outline" : `hole ${ring}`);

const isFinitePoint = ({ x, y, bulge = 0 }: Vertex): boolean =>
  Number.isFinite(x) && Number.isFinite(y) && Number.isFinite(bulge);

/** The longer side of a ring's box, mm; 0 for a ring without vertices. */
export const ringExtent = (ring: Ring): number => {
  const box = ringBox(ring);
  return box === null ? 0 : Math.max(box.xMax - box.xMin, box.yMax - box.yMin);
};

/** A ring without its edges of zero length, where each vertex stood in the drawn one, and the longer side of its box, mm. */
type Cleaned = Readonly<{ ring: Ring; drawn: readonly number[]; extent: number }>;

const clean = (ring: Ring): Cleaned => {
  const extent = ringExtent(ring);
  const least = SAME_POINT_REL * extent;
  const drawn = ring.flatMap((v, i) => {
    const next = ring[(i + 1) % ring.length];
    return next !== undefined && Math.hypot(next.x - v.x, next.y - v.y) > least ? [i] : [];
  });
  return { ring: drawn.flatMap((i) => ring[i] ?? []), drawn, extent };
};

const checkRing = (ring: Ring, index: number): Result<Cleaned, RingFault> => {
  const name = ringName(index);
  const bad = ring.findIndex((v) => !isFinitePoint(v));
  if (bad >= 0)
    return err({
      code: "ring.notFinite",
      detail: `Vertex ${bad + 1} of the ${name} is not a finite number. Give it an x, a y and, for an arc, a bulge.`,
      ring: index,
      edge: bad,
    });
  const cleaned = clean(ring);
  const kept = cleaned.ring;
  const curved = kept.some((v) => (v.bulge ?? 0) !== 0);
  if (kept.length < (curved ? 2 : 3))
    return err({
      code: "ring.tooFewPoints",
      detail: `The ${name} has ${kept.length} distinct points. It needs three, or two joined by an arc.`,
      ring: index,
    });
  if (Math.abs(ringArea(kept)) <= NO_AREA_REL * cleaned.extent ** 2)
    return err({
      code: "ring.noArea",
      detail: `The ${name} encloses no area. Move its points apart.`,
      ring: index,
    });
  return ok(cleaned);
};

const edgeWords = (rings: readonly Cleaned[], { ring, edge }: EdgeName): string => {
  const cleaned = rings[ring];
  const next = cleaned?.drawn[(edge + 1) % cleaned.drawn.length] ?? 0;
  return `the edge from vertex ${(cleaned?.drawn[edge] ?? 0) + 1} to ${next + 1} of the ${ringName(ring)}`;
};

const millimetres = (length: number): string => String(Number(length.toFixed(3)));

const crossingFault = (rings: readonly Cleaned[], { a, b, at }: Crossing): RingFault => {
  const place = `(${millimetres(at.x)}, ${millimetres(at.y)})`;
  const detail = `${edgeWords(rings, a)} crosses or touches ${edgeWords(rings, b)} at ${place} mm. Move a vertex so that they keep apart.`;
  return {
    code: "ring.selfCrossing",
    detail: detail.charAt(0).toUpperCase() + detail.slice(1),
    ring: a.ring,
    edge: rings[a.ring]?.drawn[a.edge] ?? 0,
  };
};

/** Holes outside the outline or inside another hole; known not to cross, so one vertex of each tells. */
const misplacedHoles = (rings: readonly Ring[]): readonly RingFault[] =>
  rings.slice(1).flatMap((hole, i) => {
    const at = hole[0];
    if (at === undefined) return [];
    const ring = i + 1;
    if (!ringContains(rings[0] ?? [], at))
      return [
        {
          code: "ring.holeOutside",
          detail: `Hole ${ring} lies outside the outline. Move it inside, or delete it.`,
          ring,
        },
      ];
    const other = rings.findIndex((around, k) => k > 0 && k !== ring && ringContains(around, at));
    if (other < 0) return [];
    return [
      {
        code: "ring.holeInHole",
        detail: `Hole ${ring} lies inside hole ${other}. Delete one of the two.`,
        ring,
      },
    ];
  });

/**
 * A region from its rings: the first is the outer one, the rest are holes. Rings may run either way; edges without length
 * are dropped.
 * @param rings n ≥ 1 rings of lines and arcs, mm, not closed.
 * @returns the region with its rings directed, or its faults: rings that are not finite, have fewer than three distinct
 * points (two, where an arc joins them) or enclose no area; the first two edges found that cross or touch; holes outside
 * the outline or in one another. O(n log n) in the edges, and the number of holes times n.
 */
export const checkRings = (rings: readonly Ring[]): Result<Region, readonly RingFault[]> => {
  const checked = rings.map(checkRing);
  const faults = checked.flatMap((r) => (r.ok ? [] : [r.error]));
  if (faults.length > 0) return err(faults);
  const cleaned = checked.flatMap((r) => (r.ok ? [r.value] : []));
  const kept = cleaned.map(({ ring }) => ring);
  const extent = cleaned.reduce((most, ring) => Math.max(most, ring.extent), 0);
  const crossing = findCrossing(kept, SAME_POINT_REL * extent);
  if (crossing !== null) return err([crossingFault(cleaned, crossing)]);
  const misplaced = misplacedHoles(kept);
  if (misplaced.length > 0) return err(misplaced);
  const [outer = [], ...holes] = kept;
  return ok({ outer: orientRing(outer, "outer"), holes: holes.map((hole) => orientRing(hole, "hole")) });
};
