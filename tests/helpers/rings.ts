import fc from "fast-check";
import { arcOf, pointAt } from "@/lib/geometry/arc";
import type { Point, Region, Ring, Vertex } from "@/lib/geometry/region";

/** The ring with every arc replaced by this many chords to a full circle (a sixteenth for a flat arc), vertices on it. */
export const chorded = (ring: Ring, perCircle: number): Ring =>
  ring.flatMap((from, i): readonly Vertex[] => {
    const arc = arcOf(from, ring[(i + 1) % ring.length] ?? from);
    if (arc === null) return [{ x: from.x, y: from.y }];
    const share = Math.max(1 / 16, Math.abs(arc.sweep) / (2 * Math.PI));
    const steps = Math.round(perCircle * share);
    return Array.from({ length: steps }, (_, k) =>
      k === 0 ? { x: from.x, y: from.y } : pointAt(arc, k / steps),
    );
  });

export const chordedRegion = ({ outer, holes }: Region, perCircle: number): Region => ({
  outer: chorded(outer, perCircle),
  holes: holes.map((hole) => chorded(hole, perCircle)),
});

const mapRegion = (region: Region, at: (v: Vertex) => Vertex): Region => ({
  outer: region.outer.map(at),
  holes: region.holes.map((hole) => hole.map(at)),
});

const bulged = (p: Point, v: Vertex): Vertex => (v.bulge === undefined ? p : { ...p, bulge: v.bulge });

export const moved = (region: Region, dx: number, dy: number): Region =>
  mapRegion(region, (v) => bulged({ x: v.x + dx, y: v.y + dy }, v));

export const scaled = (region: Region, k: number): Region =>
  mapRegion(region, (v) => bulged({ x: v.x * k, y: v.y * k }, v));

/** Turned anticlockwise about the origin by radians. */
export const turned = (region: Region, angle: number): Region => {
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  return mapRegion(region, (v) => bulged({ x: c * v.x - s * v.y, y: s * v.x + c * v.y }, v));
};

/** A star-shaped ring about a centre with arcs on some edges: never crosses itself. */
export type StarSpec = Readonly<{ radii: readonly number[]; bulges: readonly number[]; phase: number }>;

export const starRing = ({ radii, bulges, phase }: StarSpec, centre: Point = { x: 0, y: 0 }): Ring =>
  radii.map((r, i) => {
    const angle = phase + (2 * Math.PI * i) / radii.length;
    const bulge = bulges[i] ?? 0;
    const at = { x: centre.x + r * Math.cos(angle), y: centre.y + r * Math.sin(angle) };
    return bulge === 0 ? at : { ...at, bulge };
  });

const finite = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

/**
 * Rings of 5 to 12 vertices, radii 50 to 100 mm. The bulges are small enough that an arc neither leaves the sector of its
 * edge by much nor meets its neighbours.
 */
export const starSpec = (withArcs: boolean): fc.Arbitrary<StarSpec> =>
  fc.integer({ min: 5, max: 12 }).chain((n) =>
    fc.record({
      radii: fc.array(finite(50, 100), { minLength: n, maxLength: n }),
      bulges: withArcs
        ? fc.array(fc.oneof(fc.constant(0), finite(-0.12, 0.12)), { minLength: n, maxLength: n })
        : fc.constant([]),
      phase: finite(0, 6),
    }),
  );

/** Star-shaped regions, half of them with a hole well inside. */
export const starRegion = (withArcs: boolean): fc.Arbitrary<Region> =>
  fc
    .record({ outer: starSpec(withArcs), hole: fc.option(starSpec(withArcs), { nil: null }) })
    .map(({ outer, hole }) => ({
      outer: starRing(outer),
      holes: hole === null ? [] : [reversed(starRing({ ...hole, radii: hole.radii.map((r) => r * 0.25) }))],
    }));

const reversed = (ring: Ring): Ring =>
  ring.map((_, i): Vertex => {
    const n = ring.length;
    const at = ring[n - 1 - i] as Vertex;
    const edge = ring[(2 * n - 2 - i) % n] as Vertex;
    return edge.bulge === undefined ? { x: at.x, y: at.y } : { x: at.x, y: at.y, bulge: -edge.bulge };
  });
