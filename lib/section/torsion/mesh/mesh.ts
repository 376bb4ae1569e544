import type { Triangulation } from "@/lib/section/torsion/mesh/triangulation";
import { next } from "@/lib/section/torsion/mesh/triangulation";

/**
 * A triangle mesh of connected material. Vertices in mm from the origin of the graph it came from; triangles
 * anticlockwise, three vertices each; half-edge 3t + k leaves corner k of triangle t and `twin` is the one on its other
 * side (−1 on a boundary); `edge` numbers the edges, the same on both sides. `region` and `line` (the drawn segment an
 * edge lies on, −1 for none) refer to the graph. Material only hangs together along edges: where it touches in a point,
 * the point is there twice.
 */
export type Mesh = Readonly<{
  x: Float64Array;
  y: Float64Array;
  triangles: Int32Array;
  twin: Int32Array;
  edge: Int32Array;
  edgeCount: number;
  region: Int32Array;
  line: Int32Array;
}>;

const unionFind = (size: number) => {
  const parent = Int32Array.from({ length: size }, (_, i) => i);
  const rootOf = (i: number): number => {
    let at = i;
    while (parent[at] !== at) {
      parent[at] = parent[parent[at]!]!;
      at = parent[at]!;
    }
    return at;
  };
  const join = (a: number, b: number): void => {
    parent[rootOf(a)] = rootOf(b);
  };
  return { rootOf, join };
};

const renumbered = (count: number, rootOf: (i: number) => number) => {
  const numbers = new Map<number, number>();
  const of = Int32Array.from({ length: count }, (_, i) => {
    const root = rootOf(i);
    const known = numbers.get(root);
    if (known !== undefined) return known;
    numbers.set(root, numbers.size);
    return numbers.size - 1;
  });
  return { of, roots: [...numbers.keys()] };
};

/** The meshes of a triangulation, one for each piece that hangs together along edges. */
export const meshesOf = (t: Triangulation): readonly Mesh[] => {
  const live = t.region.flatMap((r, n) => (r >= 0 ? [n] : []));
  const pieces = unionFind(t.region.length);
  for (const n of live)
    for (let e = 3 * n; e < 3 * n + 3; e++) if (t.twin[e]! >= 0) pieces.join(n, (t.twin[e]! / 3) | 0);
  const byPiece = new Map<number, number[]>();
  for (const n of live) {
    const root = pieces.rootOf(n);
    const members = byPiece.get(root);
    if (members === undefined) byPiece.set(root, [n]);
    else members.push(n);
  }
  return [...byPiece.values()].map((members) => meshOf(t, members));
};

const meshOf = (t: Triangulation, members: readonly number[]): Mesh => {
  const number = new Map(members.map((n, i) => [n, i]));
  const count = 3 * members.length;
  const old = (e: number): number => 3 * members[(e / 3) | 0]! + (e % 3);
  const twin = Int32Array.from({ length: count }, (_, e) => {
    const across = t.twin[old(e)]!;
    return across < 0 ? -1 : 3 * number.get((across / 3) | 0)! + (across % 3);
  });
  // Corners of triangles are one vertex when edges join them, so that a point where material only touches is doubled.
  const corners = unionFind(count);
  for (let e = 0; e < count; e++) {
    const across = twin[e]!;
    if (across > e) {
      corners.join(e, next(across));
      corners.join(next(e), across);
    }
  }
  const { of: triangles, roots } = renumbered(count, corners.rootOf);
  let edgeCount = 0;
  const edge = new Int32Array(count);
  for (let e = 0; e < count; e++) edge[e] = twin[e]! >= 0 && twin[e]! < e ? edge[twin[e]!]! : edgeCount++;
  return {
    x: Float64Array.from(roots, (e) => t.x[t.corner[old(e)]!]!),
    y: Float64Array.from(roots, (e) => t.y[t.corner[old(e)]!]!),
    triangles,
    twin,
    edge,
    edgeCount,
    region: Int32Array.from(members, (n) => t.region[n]!),
    line: Int32Array.from({ length: count }, (_, e) => {
      const s = t.segment[old(e)]!;
      return s < 0 ? -1 : t.origin[s]!;
    }),
  };
};

/** A closed boundary of a mesh, material on its left; area in mm², negative round a hole. */
export type BoundaryLoop = Readonly<{ halves: readonly number[]; vertices: readonly number[]; area: number }>;

/** The boundary loops: one outer loop (positive area) and one for each hole. */
export const boundaryLoops = (mesh: Mesh): readonly BoundaryLoop[] => {
  const seen = new Uint8Array(mesh.twin.length);
  const loops: BoundaryLoop[] = [];
  for (let start = 0; start < mesh.twin.length; start++) {
    if (mesh.twin[start]! >= 0 || seen[start] === 1) continue;
    const halves: number[] = [];
    const vertices: number[] = [];
    let area = 0;
    const [ox, oy] = [mesh.x[mesh.triangles[start]!]!, mesh.y[mesh.triangles[start]!]!];
    let e = start;
    do {
      seen[e] = 1;
      const [a, b] = [mesh.triangles[e]!, mesh.triangles[next(e)]!];
      halves.push(e);
      vertices.push(a);
      area += ((mesh.x[a]! - ox) * (mesh.y[b]! - oy) - (mesh.x[b]! - ox) * (mesh.y[a]! - oy)) / 2;
      e = next(e);
      while (mesh.twin[e]! >= 0) e = next(mesh.twin[e]!);
    } while (e !== start);
    loops.push({ halves, vertices, area });
  }
  return loops;
};
