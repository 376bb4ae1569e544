import type { Arc } from "@/lib/geometry/arc";
import type { Edge } from "@/lib/geometry/edge";
import { boxesMeet, distanceToEdge, edgeBox, pointOnEdge, shareOf } from "@/lib/geometry/edge";
import type { EdgeGrid } from "@/lib/geometry/edge-grid";
import { edgeGrid, edgesCrossedFrom, edgesNear } from "@/lib/geometry/edge-grid";
import { curvesMeet } from "@/lib/geometry/meet";
import type { Neighbours } from "@/lib/geometry/neighbours";
import type { Noding } from "@/lib/geometry/noding";
import { curveOf } from "@/lib/geometry/noding";
import type { Point } from "@/lib/geometry/region";
import type { OwnedEdge } from "@/lib/geometry/shared-edges";
import { edgeGroups, isShared, ownedEdges } from "@/lib/geometry/shared-edges";
import { TOUCH_MM } from "@/lib/geometry/tolerance";
import type { Result } from "@/lib/result";
import { err, ok } from "@/lib/result";

/** Two parts, by index, the lower first. */
export type Pair = readonly [number, number];

/**
 * How noded parts lie to each other. `overlaps`: pairs that share area deeper than the tolerance; `meeting`: keys
 * (`pairKey`) of pairs whose outlines cross or touch; `inside`: for each part, the parts that some of its outline lies
 * inside of; `grazes`: pairs whose arcs touch another edge smoothly in one point.
 */
export type Overlaps = Readonly<{
  overlaps: readonly Pair[];
  meeting: ReadonlySet<number>;
  inside: readonly ReadonlySet<number>[];
  grazes: readonly Pair[];
}>;

/** Comparisons of edges of different parts after which a drawing counts as too dense: about a second of work. */
const MAX_COMPARISONS = 20_000_000;

/** The key of a pair in `meeting`, whichever part is named first. */
export const pairKey = (a: number, b: number, parts: number): number =>
  Math.min(a, b) * parts + Math.max(a, b);

/** How deep two curves reach into each other where they meet, mm; 0 or less where they graze. Lines cross to any depth. */
const depthOf = (a: Edge, b: Edge): number => {
  if (a.arc === null && b.arc === null) return Infinity;
  if (a.arc !== null && b.arc !== null) return circlesDepth(a.arc, b.arc);
  const [line, arc] = a.arc === null ? [a, b.arc] : [b, a.arc];
  if (arc === null) return Infinity;
  const [dx, dy] = [line.to.x - line.from.x, line.to.y - line.from.y];
  const off = (dx * (arc.centre.y - line.from.y) - dy * (arc.centre.x - line.from.x)) / Math.hypot(dx, dy);
  return arc.radius - Math.abs(off);
};

const circlesDepth = (a: Arc, b: Arc): number => {
  const distance = Math.hypot(b.centre.x - a.centre.x, b.centre.y - a.centre.y);
  return Math.min(a.radius + b.radius - distance, distance - Math.abs(a.radius - b.radius));
};

type Meeting = "cross" | "graze" | null;

const onBoth = (a: Edge, b: Edge, p: Point): boolean =>
  [a, b].every((edge) => {
    const share = shareOf(edge, p);
    return share > 0 && share < 1 && distanceToEdge(edge, p) <= 2 * TOUCH_MM;
  });

/** How two noded edges of different parts meet between their ends. Nearer than this to a common node they are one there. */
const meetingOf = (a: Edge, b: Edge, common: readonly Point[]): Meeting => {
  if (a.arc === null && b.arc === null && common.length > 0) return null;
  const depth = depthOf(a, b);
  const points = curvesMeet(a, b, TOUCH_MM).filter(
    (p) => onBoth(a, b, p) && common.every((c) => Math.hypot(p.x - c.x, p.y - c.y) > 10 * TOUCH_MM),
  );
  if (points.length === 0) return null;
  return depth > TOUCH_MM ? "cross" : common.length === 0 ? "graze" : null;
};

type Found = {
  overlaps: Set<number>;
  crossing: Set<number>;
  touching: Set<number>;
  inside: Set<number>[];
  grazes: Set<number>;
};

const compareInCells = (
  grid: EdgeGrid,
  owned: readonly OwnedEdge[],
  noding: Noding,
  parts: number,
  found: Found,
): boolean => {
  const boxes = grid.edges.map(edgeBox);
  let comparisons = 0;
  for (const cell of grid.cells.values()) {
    if (cell.every((i) => owned[i]?.part === owned[cell[0] ?? 0]?.part)) continue;
    for (let i = 0; i < cell.length; i++)
      for (let k = i + 1; k < cell.length; k++) {
        const [ai, bi] = [cell[i] ?? 0, cell[k] ?? 0];
        const [a, b] = [owned[ai], owned[bi]];
        if (++comparisons > MAX_COMPARISONS) return false;
        if (a === undefined || b === undefined || a.part === b.part) continue;
        const key = pairKey(a.part, b.part, parts);
        if (found.crossing.has(key)) continue;
        const [boxA, boxB, edgeA, edgeB] = [boxes[ai], boxes[bi], grid.edges[ai], grid.edges[bi]];
        if (boxA === undefined || boxB === undefined || edgeA === undefined || edgeB === undefined) continue;
        if (!boxesMeet(boxA, boxB)) continue;
        const common = [a.edge.from, a.edge.to].filter((n) => n === b.edge.from || n === b.edge.to);
        if (common.length === 2 && a.edge.bulge === 0 && b.edge.bulge === 0) continue;
        const meeting = meetingOf(
          edgeA,
          edgeB,
          common.flatMap((n) => noding.nodes[n] ?? []),
        );
        if (meeting === "cross") {
          found.overlaps.add(key);
          found.crossing.add(key);
        } else if (meeting === "graze") found.grazes.add(key);
      }
  }
  return true;
};

/** Edges along each other in the same direction have their material on the same side: their parts overlap. */
const compareGroups = (noding: Noding, parts: number, found: Found): ReadonlySet<number> => {
  const alone = new Set<number>();
  for (const group of edgeGroups(noding)) {
    const first = group[0];
    if (group.length === 1 && first !== undefined) alone.add(first.index);
    group.forEach((a, i) =>
      group.slice(i + 1).forEach((b) => {
        if (a.part === b.part) return;
        const key = pairKey(a.part, b.part, parts);
        if (a.edge.from === b.edge.from) found.overlaps.add(key);
      }),
    );
  }
  return alone;
};

/** Parts that hold `p` deeper than the tolerance. */
const holders = (grid: EdgeGrid, owned: readonly OwnedEdge[], p: Point): readonly number[] => {
  const odd = new Set<number>();
  for (const index of edgesCrossedFrom(grid, p)) {
    const part = owned[index]?.part ?? -1;
    if (odd.has(part)) odd.delete(part);
    else odd.add(part);
  }
  if (odd.size === 0) return [];
  for (const index of edgesNear(grid, p)) {
    const [edge, part] = [grid.edges[index], owned[index]?.part ?? -1];
    if (edge !== undefined && odd.has(part) && distanceToEdge(edge, p) <= TOUCH_MM) odd.delete(part);
  }
  return [...odd];
};

const unpack = (keys: ReadonlySet<number>, parts: number): readonly Pair[] =>
  [...keys].sort((a, b) => a - b).map((key) => [Math.floor(key / parts), key % parts]);

/**
 * Which noded parts overlap, and how.
 * @param neighbours of every part, as for the noding.
 * @returns `arrangement.tooDense` where the edges of different parts crowd so much that comparing them would take too
 * long. O(n log n) in the edges where few edges crowd in one place, and the number of crossings besides.
 */
export const findOverlaps = (noding: Noding, neighbours: Neighbours): Result<Overlaps> => {
  const parts = neighbours.length;
  const owned = ownedEdges(noding).filter(({ part }) => (neighbours[part]?.length ?? 0) > 0);
  const grid = edgeGrid(
    owned.map(({ edge }) => curveOf(noding.nodes, edge)),
    TOUCH_MM,
  );
  const found: Found = {
    overlaps: new Set(),
    crossing: new Set(),
    touching: new Set(),
    inside: Array.from({ length: parts }, () => new Set<number>()),
    grazes: new Set(),
  };
  for (const here of noding.partsAt)
    here.forEach((a, i) => here.slice(i + 1).forEach((b) => found.touching.add(pairKey(a, b, parts))));
  const alone = compareGroups(noding, parts, found);
  if (!compareInCells(grid, owned, noding, parts, found))
    return err({
      code: "arrangement.tooDense",
      detail:
        "Too many edges of different parts crowd in one place. Simplify the outlines or split the drawing.",
    });
  let ring = -1;
  for (const [at, { index, part, edge, ring: own }] of owned.entries()) {
    if (!alone.has(index)) continue;
    if (own === ring && !isShared(noding, edge.from) && !isShared(noding, edge.to)) continue;
    ring = own;
    const curve = grid.edges[at];
    if (curve === undefined) continue;
    for (const other of holders(grid, owned, pointOnEdge(curve, 0.5))) {
      if (other === part) continue;
      found.inside[part]?.add(other);
      found.overlaps.add(pairKey(part, other, parts));
    }
  }
  const touching = new Set([...found.grazes].filter((key) => !found.overlaps.has(key)));
  return ok({
    overlaps: unpack(found.overlaps, parts),
    meeting: new Set([...found.crossing, ...found.touching]),
    inside: found.inside,
    grazes: unpack(touching, parts),
  });
};
