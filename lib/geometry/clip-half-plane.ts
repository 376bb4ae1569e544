import { chordArcOf, onChordArc } from "@/lib/geometry/chord-arc";
import { extremePoint } from "@/lib/geometry/extreme-point";
import type { Point, Region, Ring, Vertex } from "@/lib/geometry/region";
import { vertexOf } from "@/lib/geometry/ring";
import { regionsOfRings } from "@/lib/geometry/trace";
import { err, ok, type Result } from "@/lib/result";

/** The points with normal·p ≤ offset; `normal` a unit vector, `offset` in mm. */
export type HalfPlane = Readonly<{ normal: Point; offset: number }>;

/** A straight stretch of a cut, mm. */
export type CutSegment = Readonly<{ from: Point; to: Point }>;

/** What a half-plane leaves of an area, and the stretches of its line that had material on both sides. */
export type Clipped = Readonly<{ regions: readonly Region[]; segments: readonly CutSegment[] }>;

/** Heights above the line below this share of the section's size are on it: far above rounding, far below a nanometre. */
const ON_LINE_REL = 1e-12;

/** A stretch of an edge on one side of the line. */
type Stretch = Readonly<{ from: Vertex; to: Point; below: boolean; onLine: boolean }>;

/** A run of stretches below the line from where it is entered to where it is left. */
type Chain = Readonly<{ vertices: readonly Vertex[]; end: Point }>;

type Frame = Readonly<{ s: (p: Point) => number; t: (p: Point) => number; slack: number }>;

const linePlaces = (h0: number, h1: number): readonly number[] =>
  h0 * h1 < 0 ? [-1, (h0 + h1) / (h0 - h1), 1] : [-1, 1];

/** Splits an edge where it crosses the line; x runs from −1 to 1 along it. */
const stretchesOf = (from: Vertex, to: Point, { s, slack }: Frame): readonly Stretch[] => {
  const flat = (h: number) => (Math.abs(h) <= slack ? 0 : h);
  const [h0, h1] = [flat(s(from)), flat(s(to))];
  const arc = chordArcOf(from, to);
  if (arc === null) {
    const at = (x: number): Point =>
      x === -1
        ? from
        : x === 1
          ? to
          : { x: from.x + ((1 + x) / 2) * (to.x - from.x), y: from.y + ((1 + x) / 2) * (to.y - from.y) };
    return linePlaces(h0, h1)
      .slice(1)
      .map((x, i, ends): Stretch => {
        const a = i === 0 ? -1 : (ends[i - 1] ?? -1);
        const height = i === 0 ? (h0 === 0 ? h1 : h0) : h1;
        const p = at(a);
        return { from: { x: p.x, y: p.y }, to: at(x), below: height < 0, onLine: h0 === 0 && h1 === 0 };
      });
  }
  const { middle, half, along, towards, bulge, sign } = arc;
  const pointAt = (x: number): Point => {
    if (x === -1) return from;
    if (x === 1) return to;
    const { u, v } = onChordArc(arc, x);
    return { x: middle.x + u * along.x + v * towards.x, y: middle.y + u * along.y + v * towards.y };
  };
  const [us, vs] = [
    s({ x: middle.x + along.x, y: middle.y + along.y }) - s(middle),
    s({ x: middle.x + towards.x, y: middle.y + towards.y }) - s(middle),
  ];
  const h = -s(middle) / half;
  const [p, q, r] = [-bulge * (vs + bulge * h), us * (1 + bulge * bulge), bulge * vs - h];
  const square = q * q - 4 * p * r;
  const w = -(q + (q < 0 ? -1 : 1) * Math.sqrt(Math.max(square, 0))) / 2;
  const inside = [w / p, r / w].filter((x) => x > -1 && x < 1 && Math.abs(s(pointAt(x))) <= 1e3 * slack);
  const places = [-1, ...(square > 0 ? inside.sort((a, b) => a - b) : []), 1];
  return places.slice(1).map((x, i): Stretch => {
    const a = places[i] ?? -1;
    const heights = [a, (a + x) / 2, x].map((at) => flat(s(pointAt(at))));
    const furthest = heights.reduce((far, one) => (Math.abs(one) > Math.abs(far) ? one : far));
    const turn = (2 * (Math.atan(bulge * x) - Math.atan(bulge * a))) / 4;
    const start = pointAt(a);
    return {
      from: vertexOf(start.x, start.y, a === -1 && x === 1 ? sign * bulge : sign * Math.tan(turn)),
      to: pointAt(x),
      below: furthest < 0,
      onLine: false,
    };
  });
};

/** The ring as chains below the line; null where all of it is below. */
const chainsOf = (stretches: readonly Stretch[]): readonly Chain[] | null => {
  const start = stretches.findIndex(({ below }, i) => below && !(stretches.at(i - 1)?.below ?? false));
  if (start < 0) return stretches.every(({ below }) => below) ? null : [];
  const chains: Chain[] = [];
  let vertices: Vertex[] = [];
  for (let i = 0; i < stretches.length; i += 1) {
    const stretch = stretches[(start + i) % stretches.length];
    const next = stretches[(start + i + 1) % stretches.length];
    if (stretch === undefined || !stretch.below) continue;
    vertices.push(stretch.from);
    if (next?.below === true && i + 1 < stretches.length) continue;
    chains.push({ vertices, end: { x: stretch.to.x, y: stretch.to.y } });
    vertices = [];
  }
  return chains;
};

type End = Readonly<{ t: number; chain: number; kind: "exit" | "entry" }>;

/**
 * Pairs each exit with the entry that follows it along the line. Ends that coincide up to rounding are taken in the order
 * that keeps exits and entries in turn. Null where they cannot be paired.
 */
const pairEnds = (ends: readonly End[], slack: number): ReadonlyMap<number, number> | null => {
  const left = [...ends].sort((a, b) => a.t - b.t);
  const next = new Map<number, number>();
  let open: number | null = null;
  while (left.length > 0) {
    const wanted: End["kind"] = open === null ? "exit" : "entry";
    const i = left.findIndex((end) => end.kind === wanted);
    const end = left[i];
    if (end === undefined || end.t - (left[0]?.t ?? 0) > slack) return null;
    left.splice(i, 1);
    if (open === null) open = end.chain;
    else {
      next.set(open, end.chain);
      open = null;
    }
  }
  return open === null ? next : null;
};

/** Removes stretches of boundary that ran along the line anyway from the closing ones: they had material on one side only. */
const withoutBoundary = (
  closing: readonly (readonly [number, number])[],
  boundary: readonly (readonly [number, number])[],
): readonly (readonly [number, number])[] =>
  boundary.reduce<readonly (readonly [number, number])[]>(
    (parts, [low, high]) =>
      parts.flatMap(([a, b]): (readonly [number, number])[] =>
        high <= a || low >= b
          ? [[a, b]]
          : (
              [
                [a, Math.min(b, low)],
                [Math.max(a, high), b],
              ] as const
            ).filter(([p, q]) => q > p),
      ),
    closing,
  );

const linked = (
  chains: readonly Chain[],
  next: ReadonlyMap<number, number>,
  slack: number,
): readonly Ring[] => {
  const done = new Set<number>();
  return chains.flatMap((_, first): Ring[] => {
    const ring: Vertex[] = [];
    for (let at = first; !done.has(at); at = next.get(at) ?? first) {
      done.add(at);
      const chain = chains[at];
      const after = chains[next.get(at) ?? first];
      if (chain === undefined) break;
      ring.push(...chain.vertices);
      const entry = after?.vertices[0];
      if (entry === undefined || Math.hypot(entry.x - chain.end.x, entry.y - chain.end.y) > slack)
        ring.push(chain.end);
    }
    return ring.length < 2 ? [] : [ring];
  });
};

/**
 * The part of an area on one side of a line, exact for lines and arcs, and where the line went through material.
 * @param regions as `Region` asks, mm.
 * @returns regions (edges on the line belong to the side where their material lies) and the segments of the line, without
 * those along which the area ended anyway; `clip.failed` where rounding leaves crossings that do not pair.
 * @source Crossings sorted along the line; the material lies to the left, so that each exit joins the next entry.
 */
export const clipToHalfPlane = (
  regions: readonly Region[],
  { normal, offset }: HalfPlane,
): Result<Clipped> => {
  const size = [normal, { x: -normal.x, y: -normal.y }].reduce(
    (sum, n) => sum + Math.abs(extremePoint(regions, n, { x: 0, y: 0 })?.distance ?? 0),
    0,
  );
  const frame: Frame = {
    s: (p) => p.x * normal.x + p.y * normal.y - offset,
    t: (p) => p.y * normal.x - p.x * normal.y,
    slack: ON_LINE_REL * size,
  };
  const whole: Ring[] = [];
  const chains: Chain[] = [];
  const boundary: (readonly [number, number])[] = [];
  for (const { outer, holes } of regions)
    for (const ring of [outer, ...holes]) {
      const stretches = ring.flatMap((from, i) =>
        stretchesOf(from, ring[(i + 1) % ring.length] ?? from, frame),
      );
      const found = chainsOf(stretches);
      if (found === null) whole.push(ring);
      else chains.push(...found);
      for (const { from, to, onLine } of stretches)
        if (onLine && frame.t(to) > frame.t(from)) boundary.push([frame.t(from), frame.t(to)]);
    }
  const ends = chains.flatMap(({ vertices, end }, chain): End[] => {
    const entry = vertices[0] ?? end;
    return [
      { t: frame.t(entry), chain, kind: "entry" },
      { t: frame.t(end), chain, kind: "exit" },
    ];
  });
  const tolerance = 1e3 * frame.slack;
  const next = pairEnds(ends, tolerance);
  if (next === null)
    return err({
      code: "clip.failed",
      detail: "The cut could not be made here: move the line a little.",
    });
  const closing = chains.map(
    ({ end }, i) => [frame.t(end), frame.t(chains[next.get(i) ?? i]?.vertices[0] ?? end)] as const,
  );
  const at = (t: number): Point => ({
    x: offset * normal.x - t * normal.y,
    y: offset * normal.y + t * normal.x,
  });
  return ok({
    regions: regionsOfRings([...whole, ...linked(chains, next, frame.slack)]),
    segments: withoutBoundary(closing, boundary)
      .filter(([a, b]) => b - a > tolerance)
      .map(([a, b]) => ({ from: at(a), to: at(b) })),
  });
};
