import type { Mesh } from "@/lib/section/torsion/mesh/mesh";

/** A line along which two parts touch: its vertices in order, its two ends (equal for a closed line), its length in mm. */
export type JointLine = Readonly<{
  parts: readonly [number, number];
  vertices: readonly number[];
  ends: readonly [number, number];
  length: number;
}>;

type Link = Readonly<{ a: number; b: number; length: number }>;

/** Follows links from a vertex until none is left; takes them out of `around`. */
const follow = (
  start: number,
  around: Map<number, Link[]>,
): Readonly<{ vertices: number[]; length: number }> => {
  const vertices = [start];
  let length = 0;
  for (let at = start; ;) {
    const link = around.get(at)?.pop();
    if (link === undefined) return { vertices, length };
    const to = link.a === at ? link.b : link.a;
    around.set(
      to,
      (around.get(to) ?? []).filter((other) => other !== link),
    );
    vertices.push(to);
    length += link.length;
    at = to;
  }
};

/** The lines along which different parts touch, from the edges of the mesh. */
export const findJointLines = (mesh: Mesh, partOf: (t: number) => number): readonly JointLine[] => {
  const pairs = new Map<string, { parts: readonly [number, number]; around: Map<number, Link[]> }>();
  for (let e = 0; e < mesh.twin.length; e++) {
    const f = mesh.twin[e]!;
    if (f < e) continue;
    const [p, q] = [partOf((e / 3) | 0), partOf((f / 3) | 0)];
    if (p === q) continue;
    const parts = [Math.min(p, q), Math.max(p, q)] as const;
    const [a, b] = [mesh.triangles[e]!, mesh.triangles[f]!];
    const link = { a, b, length: Math.hypot(mesh.x[a]! - mesh.x[b]!, mesh.y[a]! - mesh.y[b]!) };
    const key = parts.join(" ");
    const pair = pairs.get(key) ?? { parts, around: new Map<number, Link[]>() };
    pairs.set(key, pair);
    for (const v of [a, b]) pair.around.set(v, [...(pair.around.get(v) ?? []), link]);
  }
  return [...pairs.values()].flatMap(({ parts, around }) => {
    const lines: JointLine[] = [];
    // Open lines first, from their ends; what is left is closed.
    const starts = [...around.keys()].toSorted(
      (u, v) => (around.get(u)!.length % 2 === 0 ? 1 : 0) - (around.get(v)!.length % 2 === 0 ? 1 : 0),
    );
    for (const start of starts) {
      if (around.get(start)!.length === 0) continue;
      const { vertices, length } = follow(start, around);
      const ends = [vertices[0]!, vertices.at(-1)!] as const;
      lines.push({ parts, vertices: [...new Set(vertices)], ends, length });
    }
    return lines;
  });
};
