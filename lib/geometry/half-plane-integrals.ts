import { chordArcOf, furthestOnChordArc, onChordArc, type ChordArc } from "@/lib/geometry/chord-arc";
import { segmentIntegrals } from "@/lib/geometry/circular-segment";
import type { WeightedRegions } from "@/lib/geometry/moments";
import type { Point, Vertex } from "@/lib/geometry/region";

/**
 * What lies below a line across an area: `area` (mm², weighted), `moment` = ∫(d − s) dA over it (mm³) and `width`, the
 * length of the line inside the area (mm), which is d(area)/dd.
 */
export type Below = Readonly<{ area: number; moment: number; width: number }>;

/**
 * An area seen along one direction: s = (p − origin)·normal. `below(d)` integrates over s < d, exactly for lines and arcs.
 */
export type Strips = Readonly<{ sMin: number; sMax: number; below: (d: number) => Below }>;

/**
 * An arc with the directions of its chord frame resolved across (s) and along (t) the line; `low` and `high` are the
 * heights it reaches, and `whole` what it adds where all of it lies below: its chord, and area and ∫s dA of its segment.
 */
type Curve = Frame & Readonly<{ low: number; high: number; whole: Whole }>;

type Whole = Readonly<{ s0: number; s1: number; rise: number; area: number; first: number }>;

type Frame = Readonly<{
  arc: ChordArc;
  middle: number;
  us: number;
  ut: number;
  vs: number;
  vt: number;
  weight: number;
}>;

type Sum = { area: number; moment: number; width: number };

// ∫ over s < d of f dA = ∮ F dt with F = −(d − s)₊ for the area and −(d − s)₊²/2 for the moment.
const addLine = (sum: Sum, s0: number, s1: number, rise: number, d: number): void => {
  const u0 = d - s0;
  const u1 = d - s1;
  if (u0 <= 0 && u1 <= 0) return;
  const share = u0 < 0 ? u1 / (u1 - u0) : u1 < 0 ? u0 / (u0 - u1) : 1;
  const dt = rise * share;
  const a = u0 > 0 ? u0 : 0;
  const b = u1 > 0 ? u1 : 0;
  sum.area -= (dt * (a + b)) / 2;
  sum.moment -= (dt * (a * a + a * b + b * b)) / 6;
  sum.width -= dt;
};

/** The stretch of arc between two places: its chord and the segment beside the chord. */
const stretchOf = (frame: Frame, from: number, to: number): Whole => {
  const { arc, middle, us, ut, vs, vt, weight } = frame;
  const p = onChordArc(arc, from);
  const q = onChordArc(arc, to);
  const s0 = middle + us * p.u + vs * p.v;
  const s1 = middle + us * q.u + vs * q.v;
  const rise = weight * (ut * (q.u - p.u) + vt * (q.v - p.v));
  const psi0 = 2 * Math.atan(arc.bulge * from);
  const psi1 = 2 * Math.atan(arc.bulge * to);
  const bulge = Math.tan((psi1 - psi0) / 4);
  const chord = Math.hypot(q.u - p.u, q.v - p.v);
  if (!(chord > 0 && bulge > 0)) return { s0, s1, rise, area: 0, first: 0 };
  const segment = segmentIntegrals(chord, bulge);
  const psi = (psi0 + psi1) / 2;
  const towards = us * Math.sin(psi) + vs * Math.cos(psi);
  const signed = arc.sign * weight;
  return {
    s0,
    s1,
    rise,
    area: signed * segment.area,
    first: signed * (((s0 + s1) / 2) * segment.area + towards * segment.v),
  };
};

/** Adds a stretch of arc all of which lies below the line. */
const addStretch = (sum: Sum, { s0, s1, rise, area, first }: Whole, d: number): void => {
  // An end that the line cuts lies on it up to rounding: its height is clamped, and the width taken whole.
  addLine(sum, Math.min(s0, d), Math.min(s1, d), rise, d);
  if (s0 >= d && s1 >= d) sum.width -= rise;
  sum.area += area;
  sum.moment += d * area - first;
};

/** Places −1 < x < 1 at which the arc meets the line s = d, in order. */
const crossings = ({ arc, middle, us, vs }: Frame, d: number): readonly number[] => {
  // onChordArc put into s(x) = d, multiplied out: p·x² + q·x + r = 0.
  const b = arc.bulge;
  const h = (d - middle) / arc.half;
  const p = -b * (vs + b * h);
  const q = us * (1 + b * b);
  const r = b * vs - h;
  const square = q * q - 4 * p * r;
  if (square <= 0) return [];
  const w = -(q + (q < 0 ? -1 : 1) * Math.sqrt(square)) / 2;
  return [w / p, r / w].filter((x) => x > -1 && x < 1).sort((x, y) => x - y);
};

const heightAt = ({ arc, middle, us, vs }: Frame, x: number): number => {
  const { u, v } = onChordArc(arc, x);
  return middle + us * u + vs * v;
};

const addCurve = (sum: Sum, curve: Curve, d: number): void => {
  if (curve.low >= d) return;
  if (curve.high <= d) return addStretch(sum, curve.whole, d);
  const places = [-1, ...crossings(curve, d), 1];
  for (let i = 0; i + 1 < places.length; i += 1) {
    const [from = -1, to = 1] = [places[i], places[i + 1]];
    // The ends of a stretch may lie on the line, and so may the middle of one that touches it: the furthest decides.
    const heights = [from, (from + to) / 2, to].map((x) => heightAt(curve, x) - d);
    const furthest = heights.reduce((far, h) => (Math.abs(h) > Math.abs(far) ? h : far));
    if (furthest < 0) addStretch(sum, stretchOf(curve, from, to), d);
  }
};

/**
 * Prepares the integrals over everything below a line of given direction.
 * @param sets regions with weights (1 for geometry, fy for forces).
 * @param normal unit vector across the line; s grows along it.
 * @param origin where s = 0; take it near the area.
 * @returns `sMin` and `sMax` (exact on arcs; +∞ and −∞ for no regions) and the integrals as a function of d.
 * @source Green's theorem with F = −(d − s)₊: the line's own edge adds nothing, so nothing has to be clipped.
 */
export const stripsAlong = (sets: readonly WeightedRegions[], normal: Point, origin: Point): Strips => {
  // Straight edges as s0, s1, rise × weight: this list is run through at every step of a search.
  const lines: number[] = [];
  const curves: Curve[] = [];
  let [sMin, sMax] = [Infinity, -Infinity];
  const across = (v: Point) => v.x * normal.x + v.y * normal.y;
  const along = (v: Point) => v.y * normal.x - v.x * normal.y;
  const sOf = (p: Point) => across({ x: p.x - origin.x, y: p.y - origin.y });
  const reach = (s: number) => {
    sMin = Math.min(sMin, s);
    sMax = Math.max(sMax, s);
  };
  const addEdge = (from: Vertex, to: Vertex, weight: number) => {
    const s0 = (from.x - origin.x) * normal.x + (from.y - origin.y) * normal.y;
    const s1 = (to.x - origin.x) * normal.x + (to.y - origin.y) * normal.y;
    reach(s0);
    const arc = chordArcOf(from, to);
    if (arc === null) {
      lines.push(s0, s1, weight * ((to.y - from.y) * normal.x - (to.x - from.x) * normal.y));
      return;
    }
    const middle = sOf(arc.middle);
    const [us, vs] = [across(arc.along), across(arc.towards)];
    const frame: Frame = { arc, middle, us, vs, ut: along(arc.along), vt: along(arc.towards), weight };
    const heights = [s0, s1];
    for (const direction of [normal, { x: -normal.x, y: -normal.y }]) {
      const x = furthestOnChordArc(arc, direction);
      if (x !== null) heights.push(heightAt(frame, x));
    }
    const [low, high] = [Math.min(...heights), Math.max(...heights)];
    reach(low);
    reach(high);
    curves.push({ ...frame, low, high, whole: stretchOf(frame, -1, 1) });
  };
  for (const { regions, weight } of sets)
    for (const region of regions)
      for (const ring of [region.outer, ...region.holes])
        ring.forEach((from, i) => {
          const to = ring[(i + 1) % ring.length];
          if (to !== undefined) addEdge(from, to, weight);
        });
  const edges = Float64Array.from(lines);
  const below = (d: number): Below => {
    const sum: Sum = { area: 0, moment: 0, width: 0 };
    for (let i = 0; i < edges.length; i += 3)
      addLine(sum, edges[i] ?? 0, edges[i + 1] ?? 0, edges[i + 2] ?? 0, d);
    for (const curve of curves) addCurve(sum, curve, d);
    return sum;
  };
  return { sMin, sMax, below };
};
