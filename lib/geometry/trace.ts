import { ringBox } from "@/lib/geometry/arc";
import { ringContains } from "@/lib/geometry/contains";
import { boxHolds, directionAt, edgeOf, pointOnEdge } from "@/lib/geometry/edge";
import type { NodedEdge, Noding } from "@/lib/geometry/noding";
import { curveOf } from "@/lib/geometry/noding";
import type { Point, Region, Ring } from "@/lib/geometry/region";
import { ringArea, vertexOf } from "@/lib/geometry/ring";

const TURN = 2 * Math.PI;
/** Directions nearer than this, in radians, count as one; curvature then tells which edge lies to the right. */
const SAME_DIRECTION = 1e-9;

/** Angle turned clockwise from direction `a` to `b`, in (0, 2π]. */
const clockwise = (a: Point, b: Point): number => {
  const angle = Math.atan2(a.x * b.y - a.y * b.x, a.x * b.x + a.y * b.y);
  return angle < -SAME_DIRECTION ? -angle : TURN - Math.max(angle, 0);
};

const curvature = ({ arc }: ReturnType<typeof curveOf>): number =>
  arc === null ? 0 : Math.sign(arc.sweep) / arc.radius;

/** The edge that leaves a node first clockwise from where `arriving` came: it bounds the same piece of material. */
const follow = (
  nodes: readonly Point[],
  arriving: NodedEdge,
  leaving: readonly NodedEdge[],
): NodedEdge | null => {
  if (leaving.length < 2) return leaving[0] ?? null;
  const end = directionAt(curveOf(nodes, arriving), 1);
  const back = { x: -end.x, y: -end.y };
  let best: { edge: NodedEdge; turn: number; bend: number } | null = null;
  for (const edge of leaving) {
    const curve = curveOf(nodes, edge);
    const turn = clockwise(back, directionAt(curve, 0));
    const bend = curvature(curve);
    const sooner =
      best === null ||
      turn < best.turn - SAME_DIRECTION ||
      (turn < best.turn + SAME_DIRECTION && bend > best.bend);
    if (sooner) best = { edge, turn, bend };
  }
  return best?.edge ?? null;
};

/**
 * Rings that run through directed edges with material on their left. Where rings meet in a node each keeps to its own
 * piece of material, so that pieces which touch in a point stay apart.
 * @returns rings of nodes; edges that lead nowhere are left out.
 */
export const traceRings = (
  nodes: readonly Point[],
  edges: readonly NodedEdge[],
): readonly (readonly NodedEdge[])[] => {
  const leaving = new Map<number, NodedEdge[]>();
  for (const edge of edges) {
    const here = leaving.get(edge.from);
    if (here === undefined) leaving.set(edge.from, [edge]);
    else here.push(edge);
  }
  const used = new Set<NodedEdge>();
  const rings: NodedEdge[][] = [];
  for (const first of edges) {
    if (used.has(first)) continue;
    const ring: NodedEdge[] = [];
    let edge: NodedEdge | null = first;
    while (edge !== null && !used.has(edge)) {
      used.add(edge);
      ring.push(edge);
      const open = leaving.get(edge.to)?.filter((e) => !used.has(e) || e === first);
      edge = follow(nodes, edge, open ?? []);
    }
    if (edge === first) rings.push(ring);
  }
  return rings;
};

const midpoint = (ring: Ring): Point => {
  const [a, b] = [ring[0], ring[1]];
  return a === undefined || b === undefined ? { x: 0, y: 0 } : pointOnEdge(edgeOf(a, b), 0.5);
};

/** Rings as regions: those that run anticlockwise are outer ones, each other goes to the least outer one that holds it. */
export const regionsOfRings = (rings: readonly Ring[]): readonly Region[] => {
  const outers = rings.flatMap((ring) => {
    const [area, box] = [ringArea(ring), ringBox(ring)];
    return area > 0 && box !== null ? [{ ring, area, box, holes: [] as Ring[] }] : [];
  });
  for (const ring of rings) {
    if (ringArea(ring) >= 0) continue;
    const at = midpoint(ring);
    const around = outers
      .filter(({ box, ring: outer }) => boxHolds(box, at) && ringContains(outer, at))
      .reduce<(typeof outers)[number] | null>((a, b) => (a === null || b.area < a.area ? b : a), null);
    around?.holes.push(ring);
  }
  return outers.map(({ ring, holes }) => ({ outer: ring, holes }));
};

/** Traced edges as a ring of vertices. */
export const ringOfEdges = ({ nodes }: Pick<Noding, "nodes">, edges: readonly NodedEdge[]): Ring =>
  edges.map(({ from, bulge }) => {
    const p = nodes[from] ?? { x: 0, y: 0 };
    return vertexOf(p.x, p.y, bulge);
  });
