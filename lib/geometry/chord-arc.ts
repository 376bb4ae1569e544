import type { Point, Vertex } from "@/lib/geometry/region";

/**
 * A circular arc seen from its chord, which needs no centre and so keeps its digits however flat the arc is.
 * `middle` of the chord and its half length (mm); unit vectors `along` the chord and `towards` the arc; `bulge` > 0 and
 * `sign` +1 for an arc that turns anticlockwise. A place on the arc is x in −1 (start) to 1 (end).
 */
export type ChordArc = Readonly<{
  middle: Point;
  half: number;
  along: Point;
  towards: Point;
  bulge: number;
  sign: number;
}>;

/** The edge as a chord arc; null where it is straight or has no length. */
export const chordArcOf = (from: Vertex, to: Point): ChordArc | null => {
  const bulge = from.bulge ?? 0;
  if (bulge === 0) return null;
  const half = Math.hypot(to.x - from.x, to.y - from.y) / 2;
  if (half === 0) return null;
  const sign = Math.sign(bulge);
  const along = { x: (to.x - from.x) / (2 * half), y: (to.y - from.y) / (2 * half) };
  return {
    middle: { x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 },
    half,
    along,
    towards: { x: sign * along.y, y: -sign * along.x },
    bulge: Math.abs(bulge),
    sign,
  };
};

/**
 * Where on the arc x lies: `u` along the chord from its middle, `v` towards the arc, mm.
 * @source With b the bulge and ψ the angle from the arc's middle, tan(ψ/2) = b·x; then u = a·x(1 + b²)/(1 + b²x²) and
 * v = a·b(1 − x²)/(1 + b²x²), a the half chord.
 */
export const onChordArc = ({ half, bulge }: ChordArc, x: number): Readonly<{ u: number; v: number }> => {
  const b2 = bulge * bulge;
  const share = half / (1 + b2 * x * x);
  return { u: share * x * (1 + b2), v: share * bulge * (1 - x * x) };
};

/** The place x at which the arc reaches furthest in a direction (unit vector), or null when an end does. */
export const furthestOnChordArc = (arc: ChordArc, direction: Point): number | null => {
  const us = arc.along.x * direction.x + arc.along.y * direction.y;
  const vs = arc.towards.x * direction.x + arc.towards.y * direction.y;
  const psi = Math.atan2(us, vs);
  return Math.abs(psi) < 2 * Math.atan(arc.bulge) ? Math.tan(psi / 2) / arc.bulge : null;
};
