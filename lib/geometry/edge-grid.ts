import type { Box } from "@/lib/geometry/arc";
import { rayCrosses } from "@/lib/geometry/contains";
import type { Edge } from "@/lib/geometry/edge";
import { edgeBox, pointOnEdge } from "@/lib/geometry/edge";
import type { Point } from "@/lib/geometry/region";

/**
 * Edges sorted into the cells of a grid that they pass through, so that what lies near a point, and what a ray from it
 * crosses, is found by looking into few cells. An edge stands in every cell that it passes nearer than `margin`.
 */
export type EdgeGrid = Readonly<{
  edges: readonly Edge[];
  origin: Point;
  columns: number;
  rows: number;
  cell: number;
  cells: ReadonlyMap<number, readonly number[]>;
}>;

/** Enough cells that a cell holds few edges, few enough that filling them costs no more than sorting. */
const CELLS_PER_EDGE = 2;

const NOTHING: readonly number[] = [];

const boxOfAll = (edges: readonly Edge[]): Box => {
  let [xMin, xMax, yMin, yMax] = [Infinity, -Infinity, Infinity, -Infinity];
  for (const edge of edges) {
    const box = edgeBox(edge);
    xMin = Math.min(xMin, box.xMin);
    xMax = Math.max(xMax, box.xMax);
    yMin = Math.min(yMin, box.yMin);
    yMax = Math.max(yMax, box.yMax);
  }
  return { xMin, xMax, yMin, yMax };
};

/** A stretch of an edge along which neither x nor y turns back; `xAt` gives x for a y within it. */
type Stretch = Readonly<{ low: Point; high: Point; xAt: (y: number) => number }>;

const QUARTER = Math.PI / 2;

const stretchesOf = (edge: Edge): readonly Stretch[] => {
  const { arc } = edge;
  const shares = [0];
  if (arc !== null) {
    const [start, end] = [arc.start, arc.start + arc.sweep];
    const [least, most] = [Math.min(start, end), Math.max(start, end)];
    const turns: number[] = [];
    for (let k = Math.ceil(least / QUARTER); k * QUARTER < most; k++)
      turns.push((k * QUARTER - start) / arc.sweep);
    shares.push(...turns.filter((share) => share > 0).sort((a, b) => a - b));
  }
  shares.push(1);
  return shares.slice(1).map((end, i) => {
    const start = shares[i] ?? 0;
    const [p, q] = [pointOnEdge(edge, start), pointOnEdge(edge, end)];
    const [low, high] = p.y <= q.y ? [p, q] : [q, p];
    const rise = high.y - low.y;
    if (arc === null || rise === 0)
      return {
        low,
        high,
        xAt: (y) => (rise === 0 ? low.x : low.x + ((y - low.y) / rise) * (high.x - low.x)),
      };
    const side = pointOnEdge(edge, (start + end) / 2).x < arc.centre.x ? -1 : 1;
    return {
      low,
      high,
      xAt: (y) => {
        const off = y - arc.centre.y;
        return arc.centre.x + side * Math.sqrt(Math.max(0, (arc.radius - off) * (arc.radius + off)));
      },
    };
  });
};

const within = (index: number, count: number): number => Math.min(Math.max(index, 0), count - 1);

/**
 * Sorts edges into a grid.
 * @param edges lines and arcs, mm.
 * @param margin mm; an edge is also found from points up to this far beside it.
 */
export const edgeGrid = (edges: readonly Edge[], margin: number): EdgeGrid => {
  const box = boxOfAll(edges);
  const [width, height] = [box.xMax - box.xMin + 4 * margin, box.yMax - box.yMin + 4 * margin];
  const wanted = CELLS_PER_EDGE * Math.max(edges.length, 1);
  const cell = Math.max(Math.sqrt((width * height) / wanted), Math.max(width, height) / wanted, 4 * margin);
  const origin = { x: box.xMin - 2 * margin, y: box.yMin - 2 * margin };
  const columns = edges.length === 0 ? 1 : Math.ceil(width / cell);
  const rows = edges.length === 0 ? 1 : Math.ceil(height / cell);
  const cells = new Map<number, number[]>();
  const put = (key: number, edge: number) => {
    const here = cells.get(key);
    if (here === undefined) cells.set(key, [edge]);
    else if (here.at(-1) !== edge) here.push(edge);
  };
  edges.forEach((edge, index) => {
    for (const { low, high, xAt } of stretchesOf(edge)) {
      const first = within(Math.floor((low.y - margin - origin.y) / cell), rows);
      const last = within(Math.floor((high.y + margin - origin.y) / cell), rows);
      for (let row = first; row <= last; row++) {
        const bottom = Math.max(low.y, origin.y + row * cell - margin);
        const top = Math.min(high.y, origin.y + (row + 1) * cell + margin);
        const level = high.y === low.y;
        const [a, b] = level ? [low.x, high.x] : [xAt(Math.min(bottom, high.y)), xAt(Math.max(top, low.y))];
        const left = within(Math.floor((Math.min(a, b) - margin - origin.x) / cell), columns);
        const right = within(Math.floor((Math.max(a, b) + margin - origin.x) / cell), columns);
        for (let column = left; column <= right; column++) put(row * columns + column, index);
      }
    }
  });
  return { edges, origin, columns, rows, cell, cells };
};

/** Indices of the edges in the cell of `p`: every edge nearer than the grid's margin is among them. */
export const edgesNear = (grid: EdgeGrid, p: Point): readonly number[] => {
  const column = Math.floor((p.x - grid.origin.x) / grid.cell);
  const row = Math.floor((p.y - grid.origin.y) / grid.cell);
  if (column < 0 || row < 0 || column >= grid.columns || row >= grid.rows) return NOTHING;
  return grid.cells.get(row * grid.columns + column) ?? NOTHING;
};

/**
 * Indices of the edges that a ray from `p` towards +x crosses an odd number of times. Where an odd number of the edges of
 * a part are among them, `p` lies in the part. A point on an edge may be answered either way.
 */
export const edgesCrossedFrom = (grid: EdgeGrid, p: Point): readonly number[] => {
  const row = Math.floor((p.y - grid.origin.y) / grid.cell);
  if (row < 0 || row >= grid.rows) return NOTHING;
  const seen = new Set<number>();
  const crossed: number[] = [];
  const first = Math.max(0, Math.floor((p.x - grid.origin.x) / grid.cell));
  for (let column = first; column < grid.columns; column++) {
    for (const index of grid.cells.get(row * grid.columns + column) ?? NOTHING) {
      if (seen.has(index)) continue;
      seen.add(index);
      const edge = grid.edges[index];
      if (edge !== undefined && rayCrosses(edge.from, edge.to, edge.arc, p)) crossed.push(index);
    }
  }
  return crossed;
};
