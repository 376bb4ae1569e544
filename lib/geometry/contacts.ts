import type { Notice, SharedLine, SharedLines } from "@/lib/geometry/arrange-types";
import { listNames } from "@/lib/geometry/arrange-types";
import type { Pair } from "@/lib/geometry/find-overlaps";
import type { NodedEdge, Noding } from "@/lib/geometry/noding";
import type { Point, Region } from "@/lib/geometry/region";
import { ringArea } from "@/lib/geometry/ring";
import type { OwnedEdge } from "@/lib/geometry/shared-edges";
import { edgeGroups, isShared } from "@/lib/geometry/shared-edges";
import { regionsOfRings, ringOfEdges, traceRings } from "@/lib/geometry/trace";

const lineOf = (nodes: readonly Point[], { from, to, bulge }: NodedEdge): SharedLine => {
  const [a, b] = [nodes[from] ?? { x: 0, y: 0 }, nodes[to] ?? { x: 0, y: 0 }];
  const line = { from: { x: a.x, y: a.y }, to: { x: b.x, y: b.y } };
  return bulge === 0 ? line : { ...line, bulge };
};

/** Two edges of a group with material on either side: where two parts, or two pieces of one, touch. */
type Touch = readonly [OwnedEdge, OwnedEdge];

const touchesOf = (groups: readonly (readonly OwnedEdge[])[]): readonly Touch[] =>
  groups.flatMap((group) =>
    group.flatMap((a, i) =>
      group.slice(i + 1).flatMap((b): Touch[] => {
        if (a.edge.from !== b.edge.to) return [];
        return [a.part <= b.part ? [a, b] : [b, a]];
      }),
    ),
  );

/** Which parts touch along which lines; noded parts that do not overlap. Point contact gives no line. */
export const sharedLines = (noding: Noding): readonly SharedLines[] => {
  const byPair = new Map<string, { parts: Pair; lines: SharedLine[] }>();
  for (const [a, b] of touchesOf(edgeGroups(noding))) {
    if (a.part === b.part) continue;
    const key = `${a.part} ${b.part}`;
    const known = byPair.get(key) ?? { parts: [a.part, b.part] as const, lines: [] };
    known.lines.push(lineOf(noding.nodes, a.edge));
    byPair.set(key, known);
  }
  return [...byPair.values()].sort((p, q) => p.parts[0] - q.parts[0] || p.parts[1] - q.parts[1]);
};

/**
 * The union of noded parts that do not overlap: the boundary that has material on one side only, traced.
 * Exact: no edge is moved. Pieces that touch in a point only stay apart.
 * @param parts which parts count.
 */
export const outlineOf = (noding: Noding, parts: (part: number) => boolean): readonly Region[] => {
  const untouched = noding.rings.map(({ edges }) => edges.every(({ from }) => !isShared(noding, from)));
  const open = edgeGroups(noding).flatMap((group) => {
    const own = group.filter(({ part, ring }) => parts(part) && untouched[ring] !== true);
    const first = own[0];
    if (first === undefined) return [];
    const forward = own.filter(({ edge }) => edge.from === first.edge.from);
    const backward = own.length - forward.length;
    if (forward.length === backward) return [];
    return [
      forward.length > backward ? first.edge : (own.find((e) => !forward.includes(e))?.edge ?? first.edge),
    ];
  });
  const whole = noding.rings.filter(
    ({ part, edges }, ring) => parts(part) && untouched[ring] && edges.length > 1,
  );
  const rings = [...whole.map(({ edges }) => edges), ...traceRings(noding.nodes, open)];
  return regionsOfRings(rings.map((edges) => ringOfEdges(noding, edges)));
};

/** Pieces (regions of parts) grouped by what hangs together along edges. */
export type Bodies = Readonly<{
  /** For each body the parts in it, in order, the largest body first. */
  parts: readonly (readonly number[])[];
  /** The body of a region of a part; undefined where the part does not count. */
  bodyOf: (part: number, region: number) => number | undefined;
}>;

const pieceKey = (part: number, region: number): string => `${part} ${region}`;

/**
 * What hangs together along edges, piece by piece: a part that was cut in two can belong to two bodies.
 * @param counts which parts carry; others neither belong to a body nor join two.
 */
export const bodiesOf = (noding: Noding, counts: (part: number) => boolean): Bodies => {
  const { rings } = noding;
  const parent = new Map<string, string>();
  const carrying = rings.filter(({ part, edges }) => counts(part) && edges.length > 1);
  for (const { part, region } of carrying) parent.set(pieceKey(part, region), pieceKey(part, region));
  const rootOf = (key: string): string => {
    let at = key;
    for (let up = parent.get(at); up !== undefined && up !== at; up = parent.get(at)) {
      parent.set(at, parent.get(up) ?? up);
      at = up;
    }
    return at;
  };
  const keyOf = (owned: OwnedEdge) => pieceKey(owned.part, rings[owned.ring]?.region ?? 0);
  for (const [a, b] of touchesOf(edgeGroups(noding))) {
    const [keyA, keyB] = [keyOf(a), keyOf(b)];
    if (parent.has(keyA) && parent.has(keyB)) parent.set(rootOf(keyA), rootOf(keyB));
  }
  const found = new Map<string, { area: number; parts: Set<number> }>();
  for (const { part, region, edges } of carrying) {
    const root = rootOf(pieceKey(part, region));
    const body = found.get(root) ?? { area: 0, parts: new Set<number>() };
    const area = body.area + ringArea(ringOfEdges(noding, edges));
    found.set(root, { area, parts: body.parts.add(part) });
  }
  const sorted = [...found.entries()].sort(([, a], [, b]) => b.area - a.area);
  const rank = new Map(sorted.map(([root], i) => [root, i]));
  return {
    parts: sorted.map(([, body]) => [...body.parts].sort((a, b) => a - b)),
    bodyOf: (part, region) => rank.get(rootOf(pieceKey(part, region))),
  };
};

/** Words for an index of a part. */
export type NameOf = (part: number) => Readonly<{ id: string; name: string }>;

const place = ({ x, y }: Point): string => `(${Number(x.toFixed(3))}, ${Number(y.toFixed(3))})`;

/**
 * Names what does not hang together: parts that touch in a point only, and bodies that float free of the largest one.
 * @param grazes pairs of parts that touch smoothly in one point, where neither has a vertex.
 * @param origin added to coordinates in the words.
 */
export const separationNotices = (
  noding: Noding,
  bodies: Bodies,
  grazes: readonly Pair[],
  nameOf: NameOf,
  origin: Point,
): readonly Notice[] => {
  if (bodies.parts.length < 2) return [];
  const notices: Notice[] = [];
  const inPoint = new Set<number>();
  const told = new Set<string>();
  const tell = (a: number, b: number, bodyA: number, bodyB: number, at: Point | null) => {
    inPoint.add(bodyA).add(bodyB);
    const key = `${Math.min(a, b)} ${Math.max(a, b)}`;
    if (told.has(key)) return;
    told.add(key);
    const [p, q] = [nameOf(Math.min(a, b)), nameOf(Math.max(a, b))];
    const where = at === null ? "" : `, at ${place({ x: at.x + origin.x, y: at.y + origin.y })} mm`;
    const detail = `${p.name} and ${q.name} touch in one point only${where}: nothing is carried across. Let them share an edge.`;
    notices.push({ code: "parts.pointContact", detail, parts: [p.id, q.id] });
  };
  const atNode = new Map<number, { part: number; body: number }[]>();
  for (const { part, region, edges } of noding.rings) {
    const body = bodies.bodyOf(part, region);
    if (body === undefined) continue;
    for (const { from } of edges) {
      const here = atNode.get(from) ?? [];
      atNode.set(from, here);
      for (const other of here)
        if (other.body !== body) tell(part, other.part, body, other.body, noding.nodes[from] ?? null);
      here.push({ part, body });
    }
  }
  for (const [a, b] of grazes) {
    const [bodyA, bodyB] = [bodies.bodyOf(a, 0), bodies.bodyOf(b, 0)];
    if (bodyA !== undefined && bodyB !== undefined && bodyA !== bodyB) tell(a, b, bodyA, bodyB, null);
  }
  bodies.parts.forEach((parts, body) => {
    if (body === 0 || inPoint.has(body)) return;
    const named = parts.map(nameOf);
    const many = parts.length > 1;
    notices.push({
      code: "parts.floating",
      detail: `${listNames(named.map(({ name }) => name))} ${many ? "float" : "floats"} free: ${many ? "they touch" : "it touches"} no other part along an edge. Bending counts all parts as one; torsion and shear do not.`,
      parts: named.map(({ id }) => id),
    });
  });
  return notices;
};
