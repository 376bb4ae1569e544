import { EDGE_ENDS, sizesOf } from "@/lib/section/torsion/element/basis";
import { referenceElement, type ReferenceElement } from "@/lib/section/torsion/element/reference-element";
import { boundaryLoops, type Mesh } from "@/lib/section/torsion/mesh/mesh";

/** Corners of each element in order of their vertex number, and its edges 01, 02, 12 of that order. */
export type SortedElements = Readonly<{ corners: Int32Array; edges: Int32Array }>;

export const sortElements = (mesh: Mesh): SortedElements => {
  const count = mesh.region.length;
  const corners = new Int32Array(3 * count);
  const edges = new Int32Array(3 * count);
  for (let t = 0; t < count; t++) {
    const order = [0, 1, 2].toSorted((i, j) => mesh.triangles[3 * t + i]! - mesh.triangles[3 * t + j]!);
    order.forEach((k, i) => {
      corners[3 * t + i] = mesh.triangles[3 * t + k]!;
    });
    EDGE_ENDS.forEach(([i, j], k) => {
      const [from, to] = [order[i]!, order[j]!];
      edges[3 * t + k] = mesh.edge[3 * t + ((from + 1) % 3 === to ? from : to)]!;
    });
  }
  return { corners, edges };
};

/**
 * Unknowns of degree p on a mesh. Things that carry unknowns (vertices, edges, insides; a whole hole for the stress
 * function) are numbered; `things` holds seven to an element (corners, edges, inside), −1 where the value is fixed to 0.
 * Thing i has the unknowns from `start[i]` up to `start[i + 1]`.
 */
export type Space = Readonly<{
  element: ReferenceElement;
  corners: Int32Array;
  things: Int32Array;
  start: Int32Array;
  /** Thing of each hole with the hole's area, mm². */
  holes: readonly Readonly<{ thing: number; area: number }>[];
}>;

const PER_ELEMENT = 7;

const numbered = (
  mesh: Mesh,
  sorted: SortedElements,
  p: number,
  vertexThing: Int32Array,
  edgeThing: Int32Array,
  vertexThings: number,
  holes: Space["holes"],
): Space => {
  const { edge, inside } = sizesOf(p);
  const count = mesh.region.length;
  const edgeThings = edgeThing.reduce((n, thing) => Math.max(n, thing + 1), 0);
  const total = vertexThings + edgeThings + count;
  const start = new Int32Array(total + 1);
  for (let i = 0; i < total; i++)
    start[i + 1] = start[i]! + (i < vertexThings ? 1 : i < vertexThings + edgeThings ? edge : inside);
  const things = new Int32Array(PER_ELEMENT * count);
  for (let t = 0; t < count; t++) {
    for (let k = 0; k < 3; k++) {
      things[PER_ELEMENT * t + k] = vertexThing[sorted.corners[3 * t + k]!]!;
      const e = edgeThing[sorted.edges[3 * t + k]!]!;
      things[PER_ELEMENT * t + 3 + k] = e < 0 ? -1 : vertexThings + e;
    }
    things[PER_ELEMENT * t + 6] = vertexThings + edgeThings + t;
  }
  return { element: referenceElement(p), corners: sorted.corners, things, start, holes };
};

/** Unknowns for a function without conditions on the boundary, but for the value 0 at vertex 0, which fixes its constant. */
export const freeSpace = (mesh: Mesh, sorted: SortedElements, p: number): Space =>
  numbered(
    mesh,
    sorted,
    p,
    Int32Array.from(mesh.x, (_, v) => v - 1),
    Int32Array.from({ length: mesh.edgeCount }, (_, e) => e),
    mesh.x.length - 1,
    [],
  );

/** Unknowns for a function that is 0 on the outer boundary and constant on the boundary of each hole. */
export const stressFunctionSpace = (mesh: Mesh, sorted: SortedElements, p: number): Space => {
  const loops = boundaryLoops(mesh);
  const vertexThing = new Int32Array(mesh.x.length).fill(-2);
  const edgeThing = new Int32Array(mesh.edgeCount);
  const holes: { thing: number; area: number }[] = [];
  for (const { halves, vertices, area } of loops) {
    const thing = area > 0 ? -1 : holes.length;
    if (thing >= 0) holes.push({ thing, area: -area });
    for (const v of vertices) vertexThing[v] = thing;
    for (const e of halves) edgeThing[mesh.edge[e]!] = -1;
  }
  let things = holes.length;
  for (let v = 0; v < vertexThing.length; v++) if (vertexThing[v] === -2) vertexThing[v] = things++;
  let edges = 0;
  for (let e = 0; e < edgeThing.length; e++) if (edgeThing[e] === 0) edgeThing[e] = edges++;
  return numbered(mesh, sorted, p, vertexThing, edgeThing, things, holes);
};

/** Positions of an element's functions among the unknowns, in the order of the basis; −1 where fixed. */
export const unknownsOf = (space: Space, t: number, into: Int32Array): void => {
  const { edge, inside } = sizesOf(space.element.p);
  let n = 0;
  for (let k = 0; k < PER_ELEMENT; k++) {
    const thing = space.things[PER_ELEMENT * t + k]!;
    const size = k < 3 ? 1 : k < 6 ? edge : inside;
    for (let i = 0; i < size; i++) into[n++] = thing < 0 ? -1 : space.start[thing]! + i;
  }
};
