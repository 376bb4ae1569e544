/** A triangulation as delaunator makes it; changed in place. */
export type Triangulated = {
  readonly coords: ArrayLike<number>;
  readonly triangles: Uint32Array;
  readonly halfedges: Int32Array;
  readonly hull: Uint32Array;
};

/**
 * Flips edges until every given pair of points is an edge, then until all other edges are Delaunay.
 * @throws Error where edges cross, or pass through a point.
 * @source Sloan 1993.
 */
export const constrain: (triangulation: Triangulated, edges: readonly [number, number][]) => void;
