import { arcOf } from "@/lib/geometry/arc";
import type { Point, Ring, Vertex } from "@/lib/geometry/region";

/**
 * Radius, over that of the arc, on which the inner vertices of `n` equal chords lie so that the chords enclose the area
 * of the arc's sector exactly; the two ends stay on the arc. 1 for a single chord, which has no inner vertex.
 * @source The n − 2 inner sectors have area ½ρ² sin δ and the two outer ones ½ρ sin δ, δ = sweep/n; their sum is n·½δ.
 */
const pushedOut = (n: number, step: number): number => {
  if (n < 2) return 1;
  const s = Math.sin(step);
  const m = n - 2;
  return m === 0 ? step / s : (Math.sqrt(s * s + m * s * n * step) - s) / (m * s);
};

/**
 * How far inside the material, as a share of δ³·radius, a smooth boundary would have to lie to act on the stress function
 * as area-matched chords of angle δ do. Measured on regular polygons of 64 to 256 sides, whose J is 4 such shares low.
 */
const ACTS_INSIDE = 0.0103;

/** A vertex and, for the edge that leaves it, how far inside the arc the chord acts, mm (0 on straight edges). */
export type ChordPoint = Readonly<{ x: number; y: number; inside: number }>;

type ArcPoints = Readonly<{ points: readonly Point[]; inside: number }>;

const forward = (from: Vertex, to: Point): boolean => from.x < to.x || (from.x === to.x && from.y <= to.y);

const arcPoints = (from: Vertex, to: Point, chordsPerCircle: number): ArcPoints => {
  const arc = arcOf(from, to);
  if (arc === null) return { points: [], inside: 0 };
  const n = Math.max(2, Math.ceil((chordsPerCircle * Math.abs(arc.sweep)) / (2 * Math.PI) - 1e-9));
  const step = Math.abs(arc.sweep) / n;
  const radius = arc.radius * pushedOut(n, step);
  const points = Array.from({ length: n - 1 }, (_, i) => {
    const angle = arc.start + ((i + 1) / n) * arc.sweep;
    return { x: arc.centre.x + radius * Math.cos(angle), y: arc.centre.y + radius * Math.sin(angle) };
  });
  return { points, inside: ACTS_INSIDE * arc.radius * step ** 3 };
};

/**
 * The ring with every arc replaced by area-matched chords of equal angle; straight edges stay. The same arc gives the same
 * points to the last bit from both of its sides, so that parts in contact along it stay in contact.
 * @param ring lines and arcs, mm.
 * @param chordsPerCircle chords to a full circle, at least two to an arc.
 */
export const chordRing = (ring: Ring, chordsPerCircle: number): readonly ChordPoint[] =>
  ring.flatMap((from, i) => {
    const to = ring[(i + 1) % ring.length] ?? from;
    if (from.bulge === undefined || from.bulge === 0) return [{ x: from.x, y: from.y, inside: 0 }];
    const ahead = forward(from, to);
    const { points, inside } = ahead
      ? arcPoints(from, to, chordsPerCircle)
      : arcPoints({ x: to.x, y: to.y, bulge: -from.bulge }, from, chordsPerCircle);
    const between = ahead ? points : points.toReversed();
    return [from, ...between].map(({ x, y }) => ({ x, y, inside }));
  });
