import type { NodedEdge, Noding } from "@/lib/geometry/noding";
import { TOUCH_MM } from "@/lib/geometry/tolerance";

/** An edge of a noding with what it belongs to. `index` counts the edges of all rings in order. */
export type OwnedEdge = Readonly<{ index: number; part: number; ring: number; edge: NodedEdge }>;

/** Every edge of a noding, in the order of its rings. */
export const ownedEdges = ({ rings }: Noding): readonly OwnedEdge[] => {
  let index = 0;
  return rings.flatMap(({ part, edges }, ring) =>
    edges.map((edge) => ({ index: index++, part, ring, edge })),
  );
};

/** Height of an edge over its chord, mm, seen from the lower node to the higher: equal for equal curves run either way. */
const heightOf = ({ nodes }: Noding, { from, to, bulge }: NodedEdge): number => {
  const [a, b] = [nodes[from], nodes[to]];
  if (bulge === 0 || a === undefined || b === undefined) return 0;
  return (Math.hypot(b.x - a.x, b.y - a.y) / 2) * bulge * (from < to ? 1 : -1);
};

/** Whether more than one part has a vertex at a node. */
export const isShared = ({ partsAt }: Noding, node: number): boolean => (partsAt[node]?.length ?? 0) > 1;

const known = new WeakMap<Noding, readonly (readonly OwnedEdge[])[]>();

/**
 * Groups of edges that run along each other from node to node: each edge with the edges that coincide with it within
 * `TOUCH_MM`, itself first. Edges alone in their group are included.
 */
export const edgeGroups = (noding: Noding): readonly (readonly OwnedEdge[])[] => {
  const found = known.get(noding) ?? groupEdges(noding);
  known.set(noding, found);
  return found;
};

const groupEdges = (noding: Noding): readonly (readonly OwnedEdge[])[] => {
  const groups: OwnedEdge[][] = [];
  const byEnds = new Map<number, OwnedEdge[][]>();
  const count = noding.nodes.length;
  for (const owned of ownedEdges(noding)) {
    const { from, to } = owned.edge;
    // Edges of different parts coincide only between nodes that both parts have.
    if (!isShared(noding, from) || !isShared(noding, to)) {
      groups.push([owned]);
      continue;
    }
    const key = Math.min(from, to) * count + Math.max(from, to);
    const here = byEnds.get(key) ?? [];
    if (here.length === 0) byEnds.set(key, here);
    const height = heightOf(noding, owned.edge);
    const group = here.find(
      ([first]) => first !== undefined && Math.abs(heightOf(noding, first.edge) - height) <= TOUCH_MM,
    );
    if (group === undefined) {
      const fresh = [owned];
      here.push(fresh);
      groups.push(fresh);
    } else group.push(owned);
  }
  return groups;
};

/**
 * Gives edges that run along each other one curve, the mean of theirs, so that parts which touch leave neither gap nor
 * overlap however small. Equal curves stay as they are to the last bit.
 */
export const alignEdges = (noding: Noding): Noding => {
  const aligned = new Map<number, number>();
  for (const group of edgeGroups(noding)) {
    const [first] = group;
    if (first === undefined || group.length === 1) continue;
    const sideOf = ({ edge }: OwnedEdge) => (edge.from === first.edge.from ? 1 : -1);
    const bulges = group.map((owned) => sideOf(owned) * owned.edge.bulge);
    if (bulges.every((bulge) => bulge === first.edge.bulge)) continue;
    const mean = bulges.reduce((sum, bulge) => sum + bulge, 0) / bulges.length;
    for (const owned of group) aligned.set(owned.index, sideOf(owned) * mean);
  }
  if (aligned.size === 0) return noding;
  let index = 0;
  const rings = noding.rings.map((ring) => ({
    ...ring,
    edges: ring.edges.map((edge) => ({ ...edge, bulge: aligned.get(index++) ?? edge.bulge })),
  }));
  return { ...noding, rings };
};
