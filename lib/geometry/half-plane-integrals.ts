import { arcOf, type Arc } from "@/lib/geometry/arc";
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

type Line = Readonly<{ s0: number; s1: number; rise: number; weight: number }>;
type Curve = Readonly<{ s0: number; s1: number; rise: number; weight: number; centre: number; arc: Arc }>;

type Sum = { area: number; moment: number; width: number };

// ∫ over s < d of f dA = ∮ F dt with F = −(d − s)₊ for the area and −(d − s)₊²/2 for the moment.
const addLine = (sum: Sum, s0: number, s1: number, rise: number, d: number, weight: number): void => {
  const u0 = d - s0;
  const u1 = d - s1;
  if (u0 <= 0 && u1 <= 0) return;
  const share = u0 < 0 ? u1 / (u1 - u0) : u1 < 0 ? u0 / (u0 - u1) : 1;
  const dt = rise * share * weight;
  const a = Math.max(u0, 0);
  const b = Math.max(u1, 0);
  sum.area -= (dt * (a + b)) / 2;
  sum.moment -= (dt * (a * a + a * b + b * b)) / 6;
  sum.width -= dt;
};

/** The stretch of arc between two angles, all of it below the line: its chord and the segment beside the chord. */
const addStretch = (sum: Sum, curve: Curve, from: number, to: number, d: number): void => {
  const { radius, sweep } = curve.arc;
  const turn = Math.abs(to - from);
  if (turn === 0) return;
  const s0 = curve.centre + radius * Math.cos(from);
  const s1 = curve.centre + radius * Math.cos(to);
  const rise = radius * (Math.sin(to) - Math.sin(from));
  addLine(sum, Math.min(s0, d), Math.min(s1, d), rise, d, curve.weight);
  const chord = 2 * radius * Math.sin(Math.min(turn / 2, Math.PI));
  if (!(chord > 0)) return;
  const segment = segmentIntegrals(chord, Math.tan(turn / 4));
  const sign = Math.sign(sweep) * curve.weight;
  const towardsArc = Math.cos((from + to) / 2);
  sum.area += sign * segment.area;
  sum.moment += sign * ((d - (s0 + s1) / 2) * segment.area - towardsArc * segment.v);
};

const addCurve = (sum: Sum, curve: Curve, d: number): void => {
  const { radius, start, sweep } = curve.arc;
  const end = start + sweep;
  const k = (d - curve.centre) / radius;
  if (k <= -1) return;
  if (k >= 1) return addStretch(sum, curve, start, end, d);
  const gamma = Math.acos(k);
  const [low, high] = [Math.min(start, end), Math.max(start, end)];
  const turns = 2 * Math.PI;
  for (let m = Math.floor((low + gamma) / turns) - 1; gamma + m * turns < high; m += 1) {
    const a = Math.max(low, gamma + m * turns);
    const b = Math.min(high, turns - gamma + m * turns);
    if (b > a) addStretch(sum, curve, ...(sweep > 0 ? ([a, b] as const) : ([b, a] as const)), d);
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
  const lines: Line[] = [];
  const curves: Curve[] = [];
  let [sMin, sMax] = [Infinity, -Infinity];
  const turnBy = Math.atan2(normal.y, normal.x);
  const sOf = (p: Point) => (p.x - origin.x) * normal.x + (p.y - origin.y) * normal.y;
  const tOf = (p: Point) => (p.y - origin.y) * normal.x - (p.x - origin.x) * normal.y;
  const addEdge = (from: Vertex, to: Vertex, weight: number) => {
    const [s0, s1] = [sOf(from), sOf(to)];
    const rise = tOf(to) - tOf(from);
    sMin = Math.min(sMin, s0);
    sMax = Math.max(sMax, s0);
    const arc = arcOf(from, to);
    if (arc === null) {
      lines.push({ s0, s1, rise, weight });
      return;
    }
    const curve = {
      s0,
      s1,
      rise,
      weight,
      centre: sOf(arc.centre),
      arc: { ...arc, start: arc.start - turnBy },
    };
    curves.push(curve);
    const passes = (angle: number) => {
      const turn = 2 * Math.PI;
      const along = arc.sweep > 0 ? angle - curve.arc.start : curve.arc.start - angle;
      return ((along % turn) + turn) % turn <= Math.abs(arc.sweep);
    };
    if (passes(0)) sMax = Math.max(sMax, curve.centre + arc.radius);
    if (passes(Math.PI)) sMin = Math.min(sMin, curve.centre - arc.radius);
  };
  for (const { regions, weight } of sets)
    for (const region of regions)
      for (const ring of [region.outer, ...region.holes])
        ring.forEach((from, i) => {
          const to = ring[(i + 1) % ring.length];
          if (to !== undefined) addEdge(from, to, weight);
        });
  const below = (d: number): Below => {
    const sum: Sum = { area: 0, moment: 0, width: 0 };
    for (const line of lines) addLine(sum, line.s0, line.s1, line.rise, d, line.weight);
    for (const curve of curves) addCurve(sum, curve, d);
    return sum;
  };
  return { sMin, sMax, below };
};
