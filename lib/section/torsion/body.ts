import type { Point } from "@/lib/geometry/region";
import { sortElements, type SortedElements } from "@/lib/section/torsion/element/space";
import type { MeshRegion } from "@/lib/section/torsion/mesh/boundary-graph";
import type { BodyMesh } from "@/lib/section/torsion/mesh/build-meshes";
import type { Corner } from "@/lib/section/torsion/mesh/corners";
import type { Mesh } from "@/lib/section/torsion/mesh/mesh";
import { makeArenas, type Arenas } from "@/lib/section/torsion/solve/arena";
import { nestedBisection, type BisectionTree } from "@/lib/section/torsion/solve/nested-bisection";

/**
 * A connected body ready to be solved. Mesh and corners in mm from `centroid` (drawing coordinates), the centroid weighted
 * by E; `inside` as in `BodyMesh`; `shear` = G/G_ref and `axial` = E/E_ref of each element; area and second moments weighted by E/E_ref, of the meshed
 * polygon, about the centroid: Ixx = ∫y², Iyy = ∫x², Ixy = ∫xy.
 */
export type Body = Readonly<{
  mesh: Mesh;
  corners: readonly Corner[];
  inside: readonly number[];
  centroid: Point;
  shear: Float64Array;
  axial: Float64Array;
  area: number;
  Ixx: number;
  Iyy: number;
  Ixy: number;
  sorted: SortedElements;
  tree: BisectionTree;
  arenas: Arenas;
}>;

/** E-weighted ∫1, ∫x, ∫y, ∫x², ∫xy, ∫y² over the triangles. @source Exact for polygons: midpoints of the edges. */
const momentsOf = (mesh: Mesh, axial: Float64Array, dx: number, dy: number) => {
  let [area, mx, my, xx, xy, yy] = [0, 0, 0, 0, 0, 0];
  for (let t = 0; t < axial.length; t++) {
    const [a, b, c] = [mesh.triangles[3 * t]!, mesh.triangles[3 * t + 1]!, mesh.triangles[3 * t + 2]!];
    const [ax, bx, cx] = [mesh.x[a]! - dx, mesh.x[b]! - dx, mesh.x[c]! - dx];
    const [ay, by, cy] = [mesh.y[a]! - dy, mesh.y[b]! - dy, mesh.y[c]! - dy];
    const third = (axial[t]! * ((bx - ax) * (cy - ay) - (cx - ax) * (by - ay))) / 6;
    const [x0, x1, x2] = [(ax + bx) / 2, (bx + cx) / 2, (cx + ax) / 2];
    const [y0, y1, y2] = [(ay + by) / 2, (by + cy) / 2, (cy + ay) / 2];
    area += 3 * third;
    mx += third * (x0 + x1 + x2);
    my += third * (y0 + y1 + y2);
    xx += third * (x0 * x0 + x1 * x1 + x2 * x2);
    xy += third * (x0 * y0 + x1 * y1 + x2 * y2);
    yy += third * (y0 * y0 + y1 * y1 + y2 * y2);
  }
  return { area, mx, my, xx, xy, yy };
};

/** The body of a mesh, moved to its centroid. */
export const makeBody = (
  { mesh, corners, origin, inside }: BodyMesh,
  regions: readonly MeshRegion[],
): Body => {
  const shear = Float64Array.from(mesh.region, (r) => regions[r]!.shear);
  const axial = Float64Array.from(mesh.region, (r) => regions[r]!.axial);
  const rough = momentsOf(mesh, axial, 0, 0);
  const [dx, dy] = [rough.mx / rough.area, rough.my / rough.area];
  const { area, xx, xy, yy } = momentsOf(mesh, axial, dx, dy);
  return {
    mesh: { ...mesh, x: mesh.x.map((x) => x - dx), y: mesh.y.map((y) => y - dy) },
    corners: corners.map((corner) => ({ ...corner, x: corner.x - dx, y: corner.y - dy })),
    inside,
    centroid: { x: origin.x + dx, y: origin.y + dy },
    shear,
    axial,
    area,
    Ixx: yy,
    Iyy: xx,
    Ixy: xy,
    sorted: sortElements(mesh),
    tree: nestedBisection(mesh.twin),
    arenas: makeArenas(),
  };
};
