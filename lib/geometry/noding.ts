import type { Edge } from "@/lib/geometry/edge";
import {
  boxHolds,
  boxesMeet,
  bulgeBetween,
  distanceToEdge,
  edgeBox,
  edgeOf,
  shareOf,
} from "@/lib/geometry/edge";
import { edgeGrid, edgesNear } from "@/lib/geometry/edge-grid";
import type { Neighbours } from "@/lib/geometry/neighbours";
import { neighbourBoxes } from "@/lib/geometry/neighbours";
import type { Point, Region, Ring } from "@/lib/geometry/region";
import { vertexOf } from "@/lib/geometry/ring";
import { TOUCH_MM } from "@/lib/geometry/tolerance";

/** An edge between two nodes, given by their index; `bulge` as in `Vertex`, 0 for a line. */
export type NodedEdge = Readonly<{ from: number; to: number; bulge: number }>;

/** A ring of a part whose edges run from node to node; `hole` is false for the outer ring of its region. */
export type NodedRing = Readonly<{
  part: number;
  region: number;
  hole: boolean;
  edges: readonly NodedEdge[];
}>;

/**
 * Parts noded against each other: where they touch they share nodes, and edges run from node to node, so that touching
 * edges have the same two ends to the last bit. `partsAt` lists the parts that have a vertex at a node.
 */
export type Noding = Readonly<{
  nodes: readonly Point[];
  partsAt: readonly (readonly number[])[];
  rings: readonly NodedRing[];
}>;

/** Splitting an edge at a vertex beside it bends it by up to the tolerance, which may bring it to another vertex. */
const MAX_PASSES = 4;
/** Edges bent by less than this need no second look. */
const BENT_MM = TOUCH_MM / 100;

/** A vertex of a part; `near` where it lies in the box of another part, so that it may touch that part. */
type Corner = Readonly<{ point: Point; part: number; near: boolean }>;

/** For each corner the index of the first of its cluster: corners of different parts nearer than the tolerance. */
const clusters = (corners: readonly Corner[]): readonly number[] => {
  const parent = corners.map((_, i) => i);
  const rootOf = (i: number): number => {
    let at = i;
    while (parent[at] !== at) {
      parent[at] = parent[parent[at] ?? at] ?? at;
      at = parent[at] ?? at;
    }
    return at;
  };
  const size = 2 * TOUCH_MM;
  const cells = new Map<number, number[]>();
  const keyOf = (column: number, row: number) => column * 1_000_003 + row;
  corners.forEach(({ point, part, near }, i) => {
    if (!near) return;
    const [column, row] = [Math.floor(point.x / size), Math.floor(point.y / size)];
    for (let dx = -1; dx <= 1; dx++)
      for (let dy = -1; dy <= 1; dy++)
        for (const k of cells.get(keyOf(column + dx, row + dy)) ?? []) {
          const other = corners[k];
          if (other === undefined || other.part === part) continue;
          if (Math.hypot(other.point.x - point.x, other.point.y - point.y) > TOUCH_MM) continue;
          const [a, b] = [rootOf(i), rootOf(k)];
          parent[Math.max(a, b)] = Math.min(a, b);
        }
    const key = keyOf(column, row);
    const here = cells.get(key);
    if (here === undefined) cells.set(key, [i]);
    else here.push(i);
  });
  return corners.map((_, i) => rootOf(i));
};

const meanOf = (points: readonly Point[]): Point => {
  const first = points[0] ?? { x: 0, y: 0 };
  if (points.every((p) => p.x === first.x && p.y === first.y)) return { x: first.x, y: first.y };
  const sum = points.reduce((s, p) => ({ x: s.x + (p.x - first.x), y: s.y + (p.y - first.y) }), {
    x: 0,
    y: 0,
  });
  return { x: first.x + sum.x / points.length, y: first.y + sum.y / points.length };
};

type DrawnRing = Readonly<{ part: number; region: number; hole: boolean; ring: Ring }>;

const drawnRings = (parts: readonly (readonly Region[])[]): readonly DrawnRing[] =>
  parts.flatMap((regions, part) =>
    regions.flatMap(({ outer, holes }, region) => [
      { part, region, hole: false, ring: outer },
      ...holes.map((ring) => ({ part, region, hole: true, ring })),
    ]),
  );

const mergeCorners = (drawn: readonly DrawnRing[], neighbours: Neighbours): Noding => {
  const corners = drawn.flatMap(({ ring, part }) => {
    const boxes = neighbours[part] ?? [];
    return ring.map((point) => ({ point, part, near: boxes.some((box) => boxHolds(box, point)) }));
  });
  const cluster = clusters(corners);
  const members = new Map<number, number[]>();
  cluster.forEach((root, i) => {
    const here = members.get(root);
    if (here === undefined) members.set(root, [i]);
    else here.push(i);
  });
  const nodeOf = new Map([...members.keys()].map((root, node) => [root, node]));
  const groups = [...members.values()].map((indices) => indices.flatMap((i) => corners[i] ?? []));
  let next = 0;
  const rings = drawn.map(({ part, region, hole, ring }) => {
    const start = next;
    next += ring.length;
    const at = (i: number) => nodeOf.get(cluster[start + (i % ring.length)] ?? 0) ?? 0;
    const edges = ring
      .map((v, i) => ({ from: at(i), to: at(i + 1), bulge: v.bulge ?? 0 }))
      .filter(({ from, to }) => from !== to);
    return { part, region, hole, edges };
  });
  return {
    nodes: groups.map((group) => meanOf(group.map(({ point }) => point))),
    partsAt: groups.map((group) => [...new Set(group.map(({ part }) => part))]),
    rings,
  };
};

/** An edge between nodes as a curve. */
export const curveOf = (nodes: readonly Point[], { from, to, bulge }: NodedEdge): Edge => {
  const [a, b] = [nodes[from] ?? { x: 0, y: 0 }, nodes[to] ?? { x: 0, y: 0 }];
  return edgeOf(vertexOf(a.x, a.y, bulge), b);
};

type Cut = Readonly<{ share: number; node: number }>;

const splitEdge = (edge: NodedEdge, curve: Edge, cuts: readonly Cut[]): readonly NodedEdge[] => {
  const ends = [{ share: 0, node: edge.from }, ...cuts, { share: 1, node: edge.to }];
  return ends.slice(1).map((end, i) => {
    const start = ends[i] ?? end;
    return { from: start.node, to: end.node, bulge: bulgeBetween(curve, start.share, end.share) };
  });
};

type Pass = Readonly<{ noding: Noding; bent: boolean }>;

/** Splits every edge at the nodes of other parts that lie on it. */
const splitEdges = (noding: Noding, neighbours: Neighbours): Pass => {
  const { nodes, partsAt, rings } = noding;
  const reachable = rings.flatMap(({ part, edges }) => {
    const boxes = neighbours[part] ?? [];
    if (boxes.length === 0) return [];
    return edges.flatMap((edge) => {
      const curve = curveOf(nodes, edge);
      const box = edgeBox(curve);
      return boxes.some((other) => boxesMeet(box, other)) ? [{ part, edge, curve }] : [];
    });
  });
  if (reachable.length === 0) return { noding, bent: false };
  const grid = edgeGrid(
    reachable.map(({ curve }) => curve),
    TOUCH_MM,
  );
  const cuts = new Map<number, Cut[]>();
  const alsoAt = partsAt.map((parts) => [...parts]);
  let bent = false;
  nodes.forEach((point, node) => {
    for (const index of edgesNear(grid, point)) {
      const found = reachable[index];
      if (found === undefined || found.edge.from === node || found.edge.to === node) continue;
      const { part, curve } = found;
      if (partsAt[node]?.includes(part) === true) continue;
      const off = distanceToEdge(curve, point);
      if (off > TOUCH_MM) continue;
      const share = shareOf(curve, point);
      if (!(share > 0 && share < 1)) continue;
      bent ||= off > BENT_MM;
      const here = cuts.get(index);
      if (here === undefined) cuts.set(index, [{ share, node }]);
      else here.push({ share, node });
      if (alsoAt[node]?.includes(part) === false) alsoAt[node].push(part);
    }
  });
  if (cuts.size === 0) return { noding, bent: false };
  const pieces = new Map<NodedEdge, readonly NodedEdge[]>();
  for (const [index, here] of cuts) {
    const found = reachable[index];
    const inOrder = here.sort((a, b) => a.share - b.share);
    if (found !== undefined) pieces.set(found.edge, splitEdge(found.edge, found.curve, inOrder));
  }
  const split = rings.map((ring) => ({
    ...ring,
    edges: ring.edges.flatMap((edge) => pieces.get(edge) ?? [edge]),
  }));
  return { noding: { nodes, partsAt: alsoAt, rings: split }, bent };
};

/**
 * Nodes parts against each other: vertices of different parts nearer than `TOUCH_MM` become one node (their mean), and
 * edges, arcs too, are split where another part's vertex lies on them within `TOUCH_MM`.
 * A part that comes near no other keeps its coordinates to the last bit.
 * @param parts the regions of each part, mm, in axes with an origin near the drawing.
 * @returns nodes and rings; a ring whose vertices all merge has fewer than two edges.
 */
export const nodeParts = (parts: readonly (readonly Region[])[]): Noding => {
  const neighbours = neighbourBoxes(parts);
  let noding = mergeCorners(drawnRings(parts), neighbours);
  for (let pass = 0; pass < MAX_PASSES; pass++) {
    const next = splitEdges(noding, neighbours);
    noding = next.noding;
    if (!next.bent) break;
  }
  return noding;
};

/** The rings of each part as regions again; rings that shrank to nothing are left out. */
export const regionsOfParts = (noding: Noding, parts: number): readonly (readonly Region[])[] => {
  const found = Array.from({ length: parts }, () => new Map<number, { outer: Ring; holes: Ring[] }>());
  for (const { part, region, hole, edges } of noding.rings) {
    if (edges.length < 2) continue;
    const ring = edges.map(({ from, bulge }) => {
      const p = noding.nodes[from] ?? { x: 0, y: 0 };
      return vertexOf(p.x, p.y, bulge);
    });
    const regions = found[part];
    const known = regions?.get(region);
    if (!hole) regions?.set(region, { outer: ring, holes: [] });
    else known?.holes.push(ring);
  }
  return found.map((regions) => [...regions.values()]);
};
