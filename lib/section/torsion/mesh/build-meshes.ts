import type { Point } from "@/lib/geometry/region";
import type { Result } from "@/lib/result";
import { ok } from "@/lib/result";
import {
  bodiesOf,
  boundaryGraph,
  graphOfBody,
  type BoundaryGraph,
  type MeshRegion,
} from "@/lib/section/torsion/mesh/boundary-graph";
import { findCorners, type Corner } from "@/lib/section/torsion/mesh/corners";
import { meshesOf, type Mesh } from "@/lib/section/torsion/mesh/mesh";
import { refine } from "@/lib/section/torsion/mesh/refine";
import { sizeField } from "@/lib/section/torsion/mesh/size-field";
import { triangulate } from "@/lib/section/torsion/mesh/triangulate";
import type { Pacer } from "@/lib/section/torsion/pacer";

/**
 * A mesh of one body with its corners; coordinates in mm from `origin` (drawing coordinates). `inside` says of each drawn
 * line how far inside its arc it acts, mm.
 */
export type BodyMesh = Readonly<{
  mesh: Mesh;
  corners: readonly Corner[];
  origin: Point;
  inside: readonly number[];
}>;

export type MeshOptions = Readonly<{
  /** More mesh points than this are refused. */
  maxVertices: number;
  /** Divides the element size at re-entrant corners. */
  refinement: number;
  /** Chords to a full circle of every arc. */
  chordsPerCircle: number;
}>;

/** Chords are made finer by this factor, so often, while arcs drawn as chords run into other edges. */
const FINER = 4;
const FINEST_CHORDS = 1024;

function* meshBody(
  graph: BoundaryGraph,
  regions: readonly MeshRegion[],
  options: MeshOptions,
  pacer: Pacer,
): Generator<void, Result<readonly BodyMesh[]>> {
  const first = triangulate(graph);
  if (!first.ok) return first;
  const { triangulation, used } = first.value;
  const { corners, acute } = yield* findCorners(graph, regions, options.refinement);
  const number = new Map(used.map((v, i) => [v, i]));
  const ends = graph.a.map((a, s): [number, number] => [number.get(a)!, number.get(graph.b[s]!)!]);
  const judge = { tooBig: sizeField(corners), ends, acute: used.map((v) => acute[v]!) };
  const refined = yield* refine(triangulation, judge, options.maxVertices, pacer);
  if (!refined.ok) return refined;
  return ok(
    meshesOf(refined.value).map((mesh) => ({ mesh, corners, origin: graph.origin, inside: graph.inside })),
  );
}

function* meshAll(
  regions: readonly MeshRegion[],
  options: MeshOptions,
  pacer: Pacer,
): Generator<void, Result<readonly BodyMesh[]>> {
  const graph = boundaryGraph(regions, options.chordsPerCircle);
  if (!graph.ok) return graph;
  const bodies = bodiesOf(graph.value, regions.length);
  const several = bodies.some((body) => body !== bodies[0]);
  // Each body is meshed by itself: that they do not cross one another shows only in a triangulation of them all.
  const whole = several ? triangulate(graph.value) : null;
  if (whole !== null && !whole.ok) return whole;
  const meshes: BodyMesh[] = [];
  for (let body = 0; body <= Math.max(...bodies); body++) {
    const made = yield* meshBody(graphOfBody(graph.value, bodies, body), regions, options, pacer);
    if (!made.ok) return made;
    meshes.push(...made.value);
  }
  return ok(meshes);
}

/**
 * One graded mesh for each body: regions that share an edge are one body, regions that touch in a point or not at all are
 * several.
 * @returns the meshes, or what is wrong: `torsion.overlap`, `torsion.crossing`, `torsion.tooManyVertices`, `torsion.noArea`.
 * @yields about every 8 ms.
 */
export function* buildMeshes(
  regions: readonly MeshRegion[],
  options: MeshOptions,
  pacer: Pacer,
): Generator<void, Result<readonly BodyMesh[]>> {
  let chords = options.chordsPerCircle;
  for (;;) {
    const made = yield* meshAll(regions, { ...options, chordsPerCircle: chords }, pacer);
    const curved = regions.some(({ region }) =>
      [region.outer, ...region.holes].some((ring) => ring.some((v) => (v.bulge ?? 0) !== 0)),
    );
    const retry = !made.ok && made.error.code === "torsion.crossing" && curved && chords < FINEST_CHORDS;
    if (!retry) return made;
    chords = Math.min(FINEST_CHORDS, chords * FINER);
  }
}
