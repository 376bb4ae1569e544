import type { BoundaryGraph, MeshRegion } from "@/lib/section/torsion/mesh/boundary-graph";

/**
 * A vertex at which the fields are not smooth. `h0` is the element size wanted there and `lfs` the local feature size
 * (distance to the nearest edge that does not end here, or the shorter edge that does), mm. `reentrant`: the material
 * turns through more than 210°, or materials meet, so that stress has no finite value here.
 */
export type Corner = Readonly<{
  vertex: number;
  x: number;
  y: number;
  h0: number;
  lfs: number;
  reentrant: boolean;
}>;

/** The corners of a graph and, for each vertex, whether two of its edges meet at less than 60°. */
export type Corners = Readonly<{ corners: readonly Corner[]; acute: readonly boolean[] }>;

const REENTRANT = (210 / 180) * Math.PI;
const SHARP = (150 / 180) * Math.PI;
const ACUTE = Math.PI / 3;
const TURN = 2 * Math.PI;

/** Element size over the local feature size at re-entrant and at sharp convex corners. */
const REENTRANT_SHARE = 0.05;
const SHARP_SHARE = 0.3;

type Spoke = Readonly<{
  angle: number;
  left: number;
  right: number;
  contact: boolean;
  length: number;
  segment: number;
}>;
type Wedge = { material: string; angle: number };

const spokesOf = (
  graph: BoundaryGraph,
  sameMaterial: (l: number, r: number) => boolean,
): readonly Spoke[][] => {
  const spokes: Spoke[][] = graph.x.map(() => []);
  graph.a.forEach((a, segment) => {
    const b = graph.b[segment]!;
    const [left, right] = [graph.left[segment]!, graph.right[segment]!];
    const [dx, dy] = [graph.x[b]! - graph.x[a]!, graph.y[b]! - graph.y[a]!];
    const common = { contact: sameMaterial(left, right), length: Math.hypot(dx, dy), segment };
    spokes[a]!.push({ angle: Math.atan2(dy, dx), left, right, ...common });
    spokes[b]!.push({ angle: Math.atan2(-dy, -dx), left: right, right: left, ...common });
  });
  return spokes.map((around) => around.toSorted((p, q) => p.angle - q.angle));
};

const gapAfter = (around: readonly Spoke[], i: number): number => {
  if (around.length < 2) return TURN;
  const next = around[(i + 1) % around.length]!.angle - around[i]!.angle;
  return next > 0 ? next : next + TURN;
};

/** Wedges round a vertex, neighbours of one material joined. */
const wedgesOf = (around: readonly Spoke[], materialOf: (region: number) => string): readonly Wedge[] => {
  const start = Math.max(
    0,
    around.findIndex((spoke) => !spoke.contact),
  );
  const wedges: Wedge[] = [];
  for (let k = 0; k < around.length; k++) {
    const i = (start + k) % around.length;
    const spoke = around[i]!;
    const last = wedges.at(-1);
    if (k > 0 && spoke.contact && last !== undefined) last.angle += gapAfter(around, i);
    else wedges.push({ material: materialOf(spoke.left), angle: gapAfter(around, i) });
  }
  return wedges;
};

type Kind = Readonly<{ share: number; reentrant: boolean }> | null;

const kindOf = (around: readonly Spoke[], materialOf: (region: number) => string): Kind => {
  if (around.every((spoke) => spoke.contact)) return null;
  const wedges = wedgesOf(around, materialOf);
  const solid = wedges.filter((wedge) => wedge.material !== "");
  const meeting = new Set(solid.map((wedge) => wedge.material)).size > 1;
  if (meeting) {
    const smooth =
      wedges.length === 2 &&
      solid.length === 2 &&
      solid.every(({ angle }) => angle > SHARP && angle < REENTRANT);
    return smooth ? null : { share: REENTRANT_SHARE, reentrant: true };
  }
  if (solid.some((wedge) => wedge.angle > REENTRANT)) return { share: REENTRANT_SHARE, reentrant: true };
  if (solid.some((wedge) => wedge.angle < SHARP)) return { share: SHARP_SHARE, reentrant: false };
  return null;
};

const distanceToSegment = (graph: BoundaryGraph, s: number, px: number, py: number): number => {
  const [a, b] = [graph.a[s]!, graph.b[s]!];
  const [ax, ay] = [graph.x[a]!, graph.y[a]!];
  const [dx, dy] = [graph.x[b]! - ax, graph.y[b]! - ay];
  const share = Math.min(1, Math.max(0, ((px - ax) * dx + (py - ay) * dy) / (dx * dx + dy * dy)));
  return Math.hypot(px - ax - share * dx, py - ay - share * dy);
};

const featureSize = (
  graph: BoundaryGraph,
  walls: readonly number[],
  v: number,
  around: readonly Spoke[],
): number => {
  const [px, py] = [graph.x[v]!, graph.y[v]!];
  let least = Infinity;
  for (const spoke of around) if (!spoke.contact) least = Math.min(least, spoke.length);
  for (const s of walls) {
    if (graph.a[s] === v || graph.b[s] === v) continue;
    least = Math.min(least, distanceToSegment(graph, s, px, py));
  }
  return least;
};

/**
 * Corners of a body's boundaries with the element size wanted at each: 0.05 of the local feature size where the material
 * turns through more than 210° or materials meet (the gradient has no limit there), 0.3 below 150°, none between. Contacts of parts of one
 * material are no boundary.
 * @param refinement divides the size at re-entrant corners (1, or 2 for a second run).
 * @yields now and then, so that it can be stopped: the search is of order corners × edges.
 * @source Kondrat'ev: the solution behaves as r^(π/ω) at a corner of angle ω; grading after Szabó & Babuška, Finite
 * Element Analysis (1991).
 */
export function* findCorners(
  graph: BoundaryGraph,
  regions: readonly MeshRegion[],
  refinement: number,
): Generator<void, Corners> {
  const materialOf = (region: number): string => {
    const of = regions[region];
    return of === undefined ? "" : `${of.shear} ${of.axial}`;
  };
  const same = (l: number, r: number) => l >= 0 && r >= 0 && materialOf(l) === materialOf(r);
  const spokes = spokesOf(graph, same);
  const walls = graph.a.map((_, s) => s).filter((s) => !same(graph.left[s]!, graph.right[s]!));
  const corners: Corner[] = [];
  for (const [vertex, around] of spokes.entries()) {
    if (around.length === 0) continue;
    const kind = kindOf(around, materialOf);
    if (kind === null) continue;
    const lfs = featureSize(graph, walls, vertex, around);
    const h0 = (kind.share * lfs) / (kind.reentrant ? refinement : 1);
    corners.push({ vertex, x: graph.x[vertex]!, y: graph.y[vertex]!, h0, lfs, reentrant: kind.reentrant });
    if (corners.length % 64 === 0) yield;
  }
  const acute = spokes.map(
    (around) => around.length > 1 && around.some((_, i) => gapAfter(around, i) < ACUTE),
  );
  return { corners, acute };
}
