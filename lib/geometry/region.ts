/**
 * The shapes of geometry. Drawing axes: x right, y up, lengths in mm, angles anticlockwise from +x.
 * Rings are not closed (the last vertex joins the first); outer rings run anticlockwise, holes clockwise,
 * so that material lies to the left of every edge.
 */
export type Point = Readonly<{ x: number; y: number }>;

/**
 * A vertex and the edge that leaves it. `bulge` = tan(included angle / 4) of that edge, positive when the arc turns
 * anticlockwise; absent or 0 is a straight line; |bulge| = 1 is a half circle.
 */
export type Vertex = Readonly<{ x: number; y: number; bulge?: number }>;

export type Ring = readonly Vertex[];

/** One connected piece of material: an outer ring and the holes in it. */
export type Region = Readonly<{ outer: Ring; holes: readonly Ring[] }>;
